import { atmosphere } from '../flight/atmosphere'
import { thinAirfoil } from '../flow/thinAirfoil'
import type { Polar } from '../polar/polar'
import { depthAt, measure } from '../shape/measures'
import type { Section } from '../shape/section'
import { waviness } from '../shape/waviness'
import { localLiftAt, type WingAtCondition } from '../wing/wing'
import type {
  ComparedEntry,
  Comparison,
  EntryAtCondition,
  EntryPolar,
  PaneState,
  SectionFacts,
} from './comparison'
import type { Condition, Job, JobEntry } from './job'
import {
  polarAt,
  polarTasks,
  pressureTask,
  sectionAtStation,
  stationOf,
  whyNotComputed,
  wingOf,
  type Known,
} from './plan'
import { taskKey } from './taskKey'

/** The comparison that any subset of the results allows. */
export function assemble(job: Job, known: Known): Comparison {
  return {
    method: job.method,
    wing: job.wing,
    stationY: stationOf(job),
    conditions: job.conditions,
    densities: job.conditions.map(({ altitude, isaOffset }) => atmosphere(altitude, isaOffset).density),
    entries: job.entries.map((entry) => comparedEntry(job, entry, known)),
  }
}

function comparedEntry(job: Job, entry: JobEntry, known: Known): ComparedEntry {
  const root = entry.root === null ? null : factsOf(entry.root, job.wing.sparAt)
  return {
    name: entry.name,
    rootName: entry.rootName,
    tipName: entry.tipName,
    fault: entry.fault,
    root,
    tip: entry.tip === entry.root || entry.tip === null ? root : factsOf(entry.tip, job.wing.sparAt),
    polars: usedPolars(job, entry, known),
    conditions: job.conditions.map((condition) => atCondition(job, entry, condition, known)),
  }
}

/** Facts of sections met before: they depend on nothing but the section, which never changes. */
const met = new WeakMap<Section, Omit<SectionFacts, 'depthAtSpar'>>()

function factsOf(section: Section, sparAt: number): SectionFacts {
  let facts = met.get(section)
  if (facts === undefined) {
    facts = {
      section,
      measures: measure(section),
      thin: thinAirfoil(section),
      waviness: waviness(section),
    }
    met.set(section, facts)
  }
  return { ...facts, depthAtSpar: depthAt(section, sparAt) }
}

function usedPolars(job: Job, entry: JobEntry, known: Known): EntryPolar[] {
  if (entry.root === null || entry.tip === null) return []
  const used = new Map<string, EntryPolar>()
  for (const [at, section] of Object.entries({ root: entry.root, tip: entry.tip })) {
    if (at === 'tip' && entry.tip === entry.root) continue
    for (const condition of job.conditions) {
      if (whyNotComputed(condition) !== null) continue
      for (const task of polarTasks(job, entry, section, condition)) {
        const result = known.get(taskKey(task))
        if (result?.kind !== 'polar') continue
        used.set(`${at} ${taskKey(task)}`, { at: at === 'root' ? 'root' : 'tip', polar: result.polar })
      }
    }
  }
  return [...used.values()].sort((a, b) =>
    a.at === b.at ? byState(a.polar, b.polar) : a.at === 'root' ? -1 : 1,
  )
}

/** Reynolds number, then Mach number, surface state and flap. */
function byState(a: Polar, b: Polar): number {
  return (
    (a.reynolds ?? 0) - (b.reynolds ?? 0) ||
    a.mach - b.mach ||
    a.surface.localeCompare(b.surface) ||
    a.flap - b.flap
  )
}

function atCondition(job: Job, entry: JobEntry, condition: Condition, known: Known): EntryAtCondition {
  const marked = (note: string): EntryAtCondition => ({
    status: 'marked',
    wing: null,
    notes: [note],
    pane: null,
  })
  if (entry.fault !== null) return marked(entry.fault)
  const reason = whyNotComputed(condition)
  if (reason !== null) return marked(reason)
  const wing = wingOf(job, entry, condition, known)
  if (wing === null) return { status: 'waiting', wing: null, notes: [], pane: null }
  if (typeof wing === 'string') return marked(wing)
  const { pane, waiting, note } = paneOf(job, entry, condition, wing, known)
  const notes = note === '' ? wing.notes : [...wing.notes, note]
  return { status: waiting ? 'waiting' : 'known', wing, notes, pane }
}

function paneOf(
  job: Job,
  entry: JobEntry,
  condition: Condition,
  wing: WingAtCondition,
  known: Known,
): { pane: PaneState; waiting: boolean; note: string } {
  const stationY = stationOf(job)
  const task = pressureTask(job, entry, condition, wing)
  const result = task === null ? undefined : known.get(taskKey(task))
  const pressure = result?.kind === 'pressure' ? result.pressure : null
  const polar = entry.root === null ? null : polarAt(job, entry, entry.root, condition, known)
  return {
    pane: {
      stationY,
      section: sectionAtStation(job, entry),
      liftCoefficient: localLiftAt(wing, stationY),
      reynolds: wing.stations.reduce((best, s) =>
        Math.abs(s.y - stationY) < Math.abs(best.y - stationY) ? s : best,
      ).reynolds,
      mach: wing.mach,
      surface: condition.surface,
      polar: polar === null || typeof polar === 'string' ? null : polar,
      pressure,
    },
    waiting: task !== null && result === undefined,
    note: result?.kind === 'failed' ? result.reason : (pressure?.reason ?? ''),
  }
}
