import { atLift } from '../polar/polarCurve'
import { polarAt } from '../polar/polarFamily'
import { loft } from '../shape/loft'
import type { Section } from '../shape/section'
import { meanAerodynamicChord } from '../wing/planform'
import { sweptLift } from '../wing/stall'
import { localLiftAt, type WingAtCondition } from '../wing/wing'
import type { Condition, Job, JobEntry } from './job'
import type { Planned } from './plan'
import { sectionState } from './polarNeeds'
import type { Task } from './task'

/** Distance of the shown station from the centreline, m. */
export function stationOf(job: Job): number {
  return job.station ?? meanAerodynamicChord(job.wing.stations).y
}

/** Reynolds number at the reported station nearest to the shown one. */
export function stationReynolds(job: Job, wing: WingAtCondition): number {
  const y = stationOf(job)
  return wing.stations.reduce((best, s) => (Math.abs(s.y - y) < Math.abs(best.y - y) ? s : best)).reynolds
}

/** The section of an entry at the shown station. */
export function sectionAtStation(job: Job, entry: JobEntry): Section | null {
  if (entry.root === null || entry.tip === null) return null
  return loft(entry.root, entry.tip, (2 * stationOf(job)) / job.wing.span)
}

/**
 * The task of the surface pressure at the shown station, null where the method gives none: at the station's
 * lift, and at the slowest speed, where that may be the greatest there is, at the angle of the polars' look-up.
 */
export function pressureTask(
  job: Job,
  entry: JobEntry,
  condition: Condition,
  planned: Planned,
  wing: WingAtCondition,
): Task | null {
  const section = sectionAtStation(job, entry)
  if (job.method === 'thin' || section === null || wing.mach > 0.5) return null
  const lift = localLiftAt(wing, stationOf(job))
  const reynolds = stationReynolds(job, wing)
  const alpha = condition.speed === 'slowest' ? stationAngle(job, planned, reynolds, wing.mach, lift) : null
  return {
    kind: 'pressure',
    section,
    state: sectionState(job, entry, condition, { reynolds, mach: wing.mach }),
    at: alpha === null ? { lift } : { alpha },
  }
}

/** Angle (rad) at which the section of the shown station has a lift; null where the polars have none. */
function stationAngle(
  job: Job,
  { input }: Planned,
  reynolds: number,
  mach: number,
  lift: number,
): number | null {
  if (input?.families === undefined) return null
  const straight = lift / sweptLift(1, job.wing.sweepQuarterChord)
  const [root, tip] = [input.families.root, input.families.tip].map((family) => {
    const found = polarAt(family, reynolds, mach)
    const looked = found === null ? null : atLift(found.polar, straight)
    return looked?.kind === 'point' ? looked.point.alpha : null
  })
  if (root === null || tip === null) return null
  return root + ((2 * stationOf(job)) / job.wing.span) * (tip - root)
}
