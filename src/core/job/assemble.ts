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
import { follow, rootPolar, whyNotComputed, wingOf, type Known, type Planned } from './plan'
import { pressureTask, sectionAtStation, stationOf, stationReynolds } from './shownStation'
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
  const plans = job.conditions.map((condition) =>
    entry.fault !== null || whyNotComputed(job, condition) !== null
      ? null
      : follow(job, entry, condition, known),
  )
  const root = entry.root === null ? null : factsOf(entry.root, job.wing.sparAt)
  return {
    name: entry.name,
    rootName: entry.rootName,
    tipName: entry.tipName,
    fault: entry.fault,
    root,
    tip: entry.tip === entry.root || entry.tip === null ? root : factsOf(entry.tip, job.wing.sparAt),
    polars: usedPolars(entry, plans, known),
    conditions: job.conditions.map((condition, i) => atCondition(job, entry, condition, plans[i], known)),
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

/** Polars on which the entry's conditions rest. */
function usedPolars(entry: JobEntry, plans: readonly (Planned | null)[], known: Known): EntryPolar[] {
  const used = new Map<string, EntryPolar>()
  for (const task of plans.flatMap((planned) => planned?.tasks ?? [])) {
    const result = known.get(taskKey(task))
    if (result?.kind !== 'polar') continue
    used.set(taskKey(task), { at: task.section === entry.root ? 'root' : 'tip', polar: result.polar })
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

function atCondition(
  job: Job,
  entry: JobEntry,
  condition: Condition,
  planned: Planned | null,
  known: Known,
): EntryAtCondition {
  const marked = (note: string): EntryAtCondition => ({
    status: 'marked',
    wing: null,
    notes: [note],
    pane: null,
  })
  if (planned === null) return marked(entry.fault ?? whyNotComputed(job, condition) ?? '')
  if (planned.fault !== '') return marked(planned.fault)
  const wing = wingOf(planned)
  if (wing === null) return { status: 'waiting', wing: null, notes: [], pane: null }
  const { pane, waiting, note } = paneOf(job, entry, condition, planned, wing, known)
  const notes = [...wing.missing, ...wing.notes, note].filter((words) => words !== '')
  const status = waiting ? 'waiting' : wing.missing.length > 0 ? 'marked' : 'known'
  return { status, wing, notes, pane }
}

function paneOf(
  job: Job,
  entry: JobEntry,
  condition: Condition,
  planned: Planned,
  wing: WingAtCondition,
  known: Known,
): { pane: PaneState; waiting: boolean; note: string } {
  const stationY = stationOf(job)
  const reynolds = stationReynolds(job, wing)
  const task = pressureTask(job, entry, condition, planned, wing)
  const result = task === null ? undefined : known.get(taskKey(task))
  const pressure = result?.kind === 'pressure' ? result.pressure : null
  return {
    pane: {
      stationY,
      section: sectionAtStation(job, entry),
      liftCoefficient: localLiftAt(wing, stationY),
      reynolds,
      mach: wing.mach,
      surface: task?.state.surface ?? condition.surface,
      polar: rootPolar(job, entry, planned.tasks, known, { reynolds, mach: wing.mach }),
      pressure,
    },
    waiting: task !== null && result === undefined,
    note: result?.kind === 'failed' ? result.reason : (pressure?.reason ?? ''),
  }
}
