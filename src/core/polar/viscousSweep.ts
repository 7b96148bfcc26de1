import type { ViscousSetting } from '../flow/couplingState'
import type { ViscousSolution } from '../flow/interaction'
import type { ViscousSection } from '../flow/viscousSection'
import { BadInput } from '../numerics/errors'
import type { Section } from '../shape/section'
import { isPastStall, liftLimit } from './liftLimits'
import { noseLimits } from './noseSuction'
import { NO_LIMITS, PAST_STALL, type Polar, type PolarPoint } from './polar'
import { refinementAngles } from './refine'
import type { SectionState } from './state'
import { solvePoint, solveSweep } from './viscousMarch'
import { emptyPoint, pointOf } from './viscousPoint'
import { NO_PANELS, readySection, settingOf } from './viscousState'

/** Times that the polar is refined. */
const REFINEMENTS = 2
/** How far a sweep goes. */
export interface SweepExtent {
  /** Ends each way once the stall is sure (see liftLimits.ts); the points behind are empty and say so. */
  readonly toTheStall?: boolean
}

/** What stands in the reason of a point beyond the nose's limit. */
export const BEYOND_NOSE = 'beyond the suction peak that sections of this nose have been seen to hold'

/**
 * An angle sweep with boundary layers: one point for each of `alphas` (rad), in their order, computed from the
 * angle nearest to zero outwards, and between them points that catch maximum lift and least drag. Points that
 * do not converge are marked and empty. Throws BadInput for a Reynolds number outside 5e4 to 2e7, a Mach
 * number outside 0 to 0.5, an amplification outside 0 to 14, a trip outside 0 to 1, a deflected flap or an
 * angle that is no number.
 */
export function viscousSweep(
  section: Section,
  state: SectionState,
  alphas: readonly number[],
  { toTheStall = false }: SweepExtent = {},
): Polar {
  const setting = settingOf(state)
  const absurd = alphas.find((alpha) => !Number.isFinite(alpha))
  if (absurd !== undefined) throw new BadInput(`angle of attack ${absurd}: give a finite angle`)
  const ready = readySection(section, state)
  const results =
    ready === null
      ? { points: alphas.map((alpha) => emptyPoint(alpha, NO_PANELS)), ...NO_LIMITS }
      : sweepReady(ready, setting, alphas, toTheStall)
  return {
    method: 'viscous',
    reynolds: setting.stream.reynolds,
    mach: state.mach,
    surface: state.surface,
    amplification: setting.amplification,
    tripUpper: state.tripUpper,
    tripLower: state.tripLower,
    flap: state.flap,
    ...results,
  }
}

type Results = Pick<Polar, 'points' | 'between' | 'maxLift' | 'minLift'>

function sweepReady(
  ready: ViscousSection,
  setting: ViscousSetting,
  alphas: readonly number[],
  toTheStall: boolean,
): Results {
  const starts: ViscousSolution[] = []
  const asked = alphas.map((alpha) => emptyPoint(alpha, PAST_STALL))
  const reached: PolarPoint[] = []
  solveSweep(
    ready,
    setting,
    alphas,
    (i, { solution, guarded }) => {
      asked[i] = pointOf(ready, setting, alphas[i], solution)
      reached.push(asked[i])
      if (guarded.converged) starts.push(guarded)
    },
    (alpha) => toTheStall && isPastStall(reached, alpha),
  )
  const added: PolarPoint[] = []
  const add = (alpha: number): void => {
    const { solution, guarded } = solvePoint(ready, setting, alpha, nearest(starts, alpha))
    if (guarded.converged) starts.push(guarded)
    if (solution.converged) added.push(pointOf(ready, setting, alpha, solution))
  }
  const nose = noseLimits(ready.flow)
  for (const limit of [nose.above, nose.below]) {
    if (limit !== null && limit > Math.min(...alphas) && limit < Math.max(...alphas)) add(limit)
  }
  for (let n = 0; n < REFINEMENTS; n++) refinementAngles(byAngle([...asked, ...added])).forEach(add)
  const all = byAngle([...asked, ...added])
  const beyond = ({ alpha }: PolarPoint): boolean =>
    (nose.above !== null && alpha > nose.above) || (nose.below !== null && alpha < nose.below)
  const marked = (point: PolarPoint): PolarPoint =>
    point.converged && beyond(point)
      ? { ...point, reason: point.reason === '' ? BEYOND_NOSE : `${point.reason}; ${BEYOND_NOSE}` }
      : point
  return {
    points: asked.map(marked),
    between: byAngle(added).map(marked),
    maxLift: liftLimit(all, 1, nose.above),
    minLift: liftLimit(all, -1, nose.below),
  }
}

const byAngle = (points: readonly PolarPoint[]): PolarPoint[] => [...points].sort((a, b) => a.alpha - b.alpha)

function nearest(solutions: readonly ViscousSolution[], alpha: number): ViscousSolution | null {
  let best: ViscousSolution | null = null
  for (const solution of solutions) {
    if (best === null || Math.abs(solution.alpha - alpha) < Math.abs(best.alpha - alpha)) best = solution
  }
  return best
}
