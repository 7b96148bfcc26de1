import { flightState, whyUnflyable, type FlightInput } from '../flight/conditions'
import { liftLine, type SectionLine } from '../polar/liftLine'
import { machBracket, polarBetween } from '../polar/machLattice'
import type { Polar } from '../polar/polar'
import type { SectionState } from '../polar/state'
import { loft } from '../shape/loft'
import type { Section } from '../shape/section'
import { meanAerodynamicChord } from '../wing/planform'
import { localLiftAt, wingAt, type WingAtCondition } from '../wing/wing'
import type { Condition, Job, JobEntry } from './job'
import type { Task, TaskResult } from './task'
import { taskKey } from './taskKey'

/** Results by the names of their tasks. */
export type Known = ReadonlyMap<string, TaskResult>

const DEGREE = Math.PI / 180
/** Angles of every polar of a brief: -12 to 20 deg by half a degree. */
export const POLAR_ALPHAS: readonly number[] = Array.from({ length: 65 }, (_, i) => (-12 + 0.5 * i) * DEGREE)

/** Why a condition gives no figures with this method; null when it does. */
export function whyNotComputed(condition: Condition): string | null {
  if (condition.speed === 'slowest') {
    return 'the slowest speed needs the viscous method: without a boundary layer no section stalls'
  }
  if (condition.flap !== 0) return 'a deflected flap is not computed by this method'
  return whyUnflyable({ ...condition, speed: condition.speed })
}

/** The state of flight of a condition whose speed is given. */
export function flightOf(condition: Condition, speed: number): FlightInput {
  const { altitude, isaOffset, loadFactor, mass } = condition
  return { speed, altitude, isaOffset, loadFactor, mass }
}

/** The state at which an entry's section is computed at a Mach number of the lattice. */
function sectionState(job: Job, entry: JobEntry, condition: Condition, mach: number): SectionState {
  const { tripUpper, tripLower } = entry
  return {
    ...{ method: job.method, reynolds: null, mach, surface: condition.surface, amplification: null },
    ...{ tripUpper, tripLower, flap: condition.flap, panels: job.panels },
  }
}

/** The tasks of the polars that one section of an entry needs at a condition: one or two Mach numbers. */
export function polarTasks(job: Job, entry: JobEntry, section: Section, condition: Condition): Task[] {
  const { low, high } = machBracket(job.method, machOf(job, condition))
  return [...new Set([low, high])].map((mach) => ({
    kind: 'polar',
    section,
    state: sectionState(job, entry, condition, mach),
    alphas: POLAR_ALPHAS,
  }))
}

function machOf(job: Job, condition: Condition): number {
  if (condition.speed === 'slowest') return 0
  return condition.speed / flightState(job.wing.area, flightOf(condition, condition.speed)).air.speedOfSound
}

/** The polar of a section at a condition's own Mach number; null until known, a reason when it failed. */
export function polarAt(
  job: Job,
  entry: JobEntry,
  section: Section,
  condition: Condition,
  known: Known,
): Polar | string | null {
  const polars: Polar[] = []
  for (const task of polarTasks(job, entry, section, condition)) {
    const result = known.get(taskKey(task))
    if (result === undefined) return null
    if (result.kind === 'failed') return result.reason
    if (result.kind === 'polar') polars.push(result.polar)
  }
  const mach = machOf(job, condition)
  return polarBetween(polars[0], polars[polars.length - 1], machBracket(job.method, mach).fraction, mach)
}

/** The wing of an entry at a condition; null until its polars are known, a reason when they failed. */
export function wingOf(
  job: Job,
  entry: JobEntry,
  condition: Condition,
  known: Known,
): WingAtCondition | string | null {
  if (condition.speed === 'slowest' || entry.root === null || entry.tip === null) return null
  const lines: SectionLine[] = []
  for (const section of [entry.root, entry.tip]) {
    const polar = polarAt(job, entry, section, condition, known)
    if (polar === null || typeof polar === 'string') return polar
    const line = liftLine(polar)
    if (line === null) return `${section.name}: no zero-lift angle between -12 and 20 deg`
    lines.push(line)
  }
  return wingAt({
    shape: job.wing,
    aircraft: job.aircraft,
    condition: flightOf(condition, condition.speed),
    root: lines[0],
    tip: lines[1],
    fixedReynolds: condition.reynolds,
  })
}

/** Distance of the shown station from the centreline, m. */
export function stationOf(job: Job): number {
  return job.station ?? meanAerodynamicChord(job.wing.stations).y
}

/** The section of an entry at the shown station. */
export function sectionAtStation(job: Job, entry: JobEntry): Section | null {
  if (entry.root === null || entry.tip === null) return null
  return loft(entry.root, entry.tip, (2 * stationOf(job)) / job.wing.span)
}

/** The task of the surface pressure at the shown station; null where the method gives none. */
export function pressureTask(
  job: Job,
  entry: JobEntry,
  condition: Condition,
  wing: WingAtCondition,
): Task | null {
  const section = sectionAtStation(job, entry)
  if (job.method === 'thin' || section === null || wing.mach > 0.5) return null
  return {
    kind: 'pressure',
    section,
    state: sectionState(job, entry, condition, wing.mach),
    at: { lift: localLiftAt(wing, stationOf(job)) },
  }
}
