import type { LiftLimit, PolarPoint } from './polar'

/** Fall of the lift coefficient behind a maximum that makes it the stall, not a kink of the polar. */
const STALL_FALL = 0.02

/**
 * The greatest lift of a polar (`direction` 1), or the least (-1): walking from the angle of least size
 * outwards, the first extreme behind which the lift falls by 0.02, or the last one if the walk ends on lower
 * lift. Null when lift still grows at the end of the points, or the walk meets a point that did not converge
 * before the extreme is passed. `nose` is the angle that limits the lift by its suction peak; a point must
 * stand there.
 */
export function liftLimit(
  points: readonly PolarPoint[],
  direction: 1 | -1,
  nose: number | null,
): LiftLimit | null {
  const outward = points
    .filter(({ alpha }) => alpha * direction >= 0)
    .sort((a, b) => direction * (a.alpha - b.alpha))
  let best: LiftLimit | null = null
  let fallen = false
  for (const { alpha, liftCoefficient, converged } of outward) {
    if (!converged || liftCoefficient === null) return null
    if (best === null || direction * (liftCoefficient - best.liftCoefficient) > 0) {
      best = { alpha, liftCoefficient, by: 'layers' }
      fallen = false
    } else {
      fallen = true
      if (direction * (best.liftCoefficient - liftCoefficient) >= STALL_FALL) return best
    }
    if (nose !== null && direction * (alpha - nose) >= 0) return fallen ? best : { ...best, by: 'nose' }
  }
  return fallen ? best : null
}
