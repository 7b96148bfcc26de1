import { flightState, reynoldsNumber, type FlightInput } from '../flight/conditions'
import { machBracket } from '../polar/machLattice'
import { reynoldsNodes } from '../polar/reynoldsLattice'
import type { SectionState } from '../polar/state'
import type { Section } from '../shape/section'
import { meanAerodynamicChord } from '../wing/planform'
import type { Condition, Job, JobEntry } from './job'
import type { Task } from './task'

const DEGREE = Math.PI / 180
/** Angles of every polar of a brief: -12 to 20 deg by half a degree. */
export const POLAR_ALPHAS: readonly number[] = Array.from({ length: 65 }, (_, i) => (-12 + 0.5 * i) * DEGREE)

/** x/c at which a dirty surface trips the flow. */
const DIRTY = { upper: 0.05, lower: 0.1 } as const

/** The state of flight of a condition at a speed (m/s). */
export function flightOf(condition: Condition, speed: number): FlightInput {
  const { altitude, isaOffset, loadFactor, mass } = condition
  return { speed, altitude, isaOffset, loadFactor, mass }
}

/**
 * The state at which an entry's section is computed. A dirty surface trips near the leading edge unless the
 * entry says where, and a trip of the entry makes the surface dirty.
 */
export function sectionState(
  job: Job,
  entry: JobEntry,
  condition: Condition,
  at: { readonly reynolds: number | null; readonly mach: number },
): SectionState {
  const usual = condition.surface === 'dirty' ? DIRTY : { upper: 1, lower: 1 }
  const tripUpper = entry.tripUpper ?? usual.upper
  const tripLower = entry.tripLower ?? usual.lower
  const viscous = job.method === 'viscous'
  return {
    method: job.method,
    reynolds: viscous ? at.reynolds : null,
    mach: at.mach,
    surface: tripUpper < 1 || tripLower < 1 ? 'dirty' : condition.surface,
    amplification: viscous ? job.amplification : null,
    tripUpper,
    tripLower,
    flap: condition.flap,
    panels: job.panels,
  }
}

/**
 * The tasks of the polars that one section of an entry needs at a condition flown at a speed (m/s): the Mach
 * numbers of the lattice that bracket the flown one, and with the viscous method the Reynolds numbers that
 * bracket those of all stations.
 */
export function polarTasks(
  job: Job,
  entry: JobEntry,
  section: Section,
  condition: Condition,
  speed: number,
): Task[] {
  const { air } = flightState(job.wing.area, flightOf(condition, speed))
  const { low, high } = machBracket(job.method, speed / air.speedOfSound)
  const meanChord = meanAerodynamicChord(job.wing.stations).chord
  const mean = condition.reynolds ?? reynoldsNumber(air, speed, meanChord)
  const chords = job.wing.stations.map(({ chord }) => (mean * chord) / meanChord)
  const nodes: readonly (number | null)[] =
    job.method === 'viscous' ? reynoldsNodes(Math.min(...chords), Math.max(...chords)) : [null]
  return nodes.flatMap((reynolds) =>
    [...new Set([low, high])].map((mach): Task => ({
      kind: 'polar',
      section,
      state: sectionState(job, entry, condition, { reynolds, mach }),
      alphas: POLAR_ALPHAS,
      toTheStall: true,
    })),
  )
}
