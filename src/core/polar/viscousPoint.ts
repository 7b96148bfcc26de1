import type { ViscousSetting } from '../flow/couplingState'
import type { ViscousSolution } from '../flow/interaction'
import { viscousLoads, type ViscousLoads } from '../flow/viscousLoads'
import type { ViscousSection } from '../flow/viscousSection'
import type { PolarPoint } from './polar'

/** A point without results. */
export function emptyPoint(alpha: number, reason: string): PolarPoint {
  return {
    alpha,
    liftCoefficient: null,
    dragCoefficient: null,
    momentCoefficient: null,
    transitionUpper: null,
    transitionLower: null,
    converged: false,
    reason,
  }
}

/** The polar point of a solution; what deserves a mark stands in its reason. */
export function pointOf(
  { flow }: ViscousSection,
  setting: ViscousSetting,
  alpha: number,
  solution: ViscousSolution,
): PolarPoint {
  if (!solution.converged) return emptyPoint(alpha, failureOf(solution))
  const loads = viscousLoads(flow, solution, setting.stream)
  return {
    alpha,
    liftCoefficient: loads.liftCoefficient,
    dragCoefficient: loads.dragCoefficient,
    momentCoefficient: loads.momentCoefficient,
    transitionUpper: loads.upper.transition,
    transitionLower: loads.lower.transition,
    converged: true,
    reason: marksOf(loads, setting),
  }
}

/** What deserves a mark at a solution, as one line; empty when nothing does. */
export function marksOf(loads: ViscousLoads, setting: ViscousSetting): string {
  const notes: string[] = []
  if (loads.sonic) notes.push('the flow turns sonic on the surface')
  const sides = [
    ['upper', loads.upper.laminarSeparation, setting.tripUpper],
    ['lower', loads.lower.laminarSeparation, setting.tripLower],
  ] as const
  for (const [side, separation, trip] of sides) {
    if (separation !== null && trip < 1 && separation < trip) {
      notes.push(`transition on the ${side} side is forced behind laminar separation`)
    }
  }
  return notes.join('; ')
}

/** Why a solution counts as not converged. */
export function failureOf({ residual, iterations }: ViscousSolution): string {
  const left = Number.isFinite(residual) ? residual.toExponential(1) : 'unbounded'
  return `layers and potential flow do not agree after ${iterations} steps (residual ${left}, allowed 1e-5)`
}
