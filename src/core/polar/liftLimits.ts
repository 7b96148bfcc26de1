import type { LiftLimit, PolarPoint } from './polar'

/** Lift that is regained within this angle was lost to a bubble, not to the stall; rad. */
const RECOVERY = (4 * Math.PI) / 180
/** For angles that rounding puts just beyond, rad. */
const SLACK = 1e-9

/**
 * The greatest lift of a polar (`direction` 1), or the least (-1): walking from the angle of least size
 * outwards, the first extreme that no point within the next 4 deg exceeds. `nose` is the angle that limits
 * the lift by its suction peak; a point must stand there. Null when lift still grows at the end of the points
 * or at the limit of a solved stretch: next to a point that did not converge an extreme is not known.
 */
export function liftLimit(
  points: readonly PolarPoint[],
  direction: 1 | -1,
  nose: number | null,
): LiftLimit | null {
  const outward = points
    .filter(({ alpha }) => alpha * direction >= 0)
    .sort((a, b) => direction * (a.alpha - b.alpha))
  let best: { readonly at: number; readonly alpha: number; readonly lift: number } | null = null
  for (let i = 0; i < outward.length; i++) {
    const { alpha, liftCoefficient, converged } = outward[i]
    if (best !== null && direction * (alpha - best.alpha) > RECOVERY + SLACK) break
    if (converged && liftCoefficient !== null) {
      if (best === null || direction * (liftCoefficient - best.lift) > 0) {
        best = { at: i, alpha, lift: liftCoefficient }
      }
    }
    if (nose !== null && direction * (alpha - nose) >= 0) {
      return best?.alpha === alpha
        ? { alpha, liftCoefficient: best.lift, by: 'nose' }
        : limitAt(outward, best)
    }
  }
  return limitAt(outward, best)
}

/** The extreme as the layers' own limit, unless it lies at an end of what is known. */
function limitAt(
  outward: readonly PolarPoint[],
  best: { readonly at: number; readonly alpha: number; readonly lift: number } | null,
): LiftLimit | null {
  if (best === null || !outward[best.at - 1]?.converged || !outward[best.at + 1]?.converged) return null
  return { alpha: best.alpha, liftCoefficient: best.lift, by: 'layers' }
}

/** Angles in a row without a solution behind which a way outwards is given up. */
const LOST = 3

/**
 * Whether a way outwards (`points` in the order in which they were computed) need not go on to an angle: it
 * lies so far behind the extreme on its side that no recovery counts any more, or the last three failed.
 */
export function isPastStall(points: readonly PolarPoint[], alpha: number): boolean {
  const direction = alpha < 0 ? -1 : 1
  let best: PolarPoint | null = null
  let lost = 0
  for (const point of points) {
    if (point.alpha * direction < 0) continue
    lost = point.converged ? 0 : lost + 1
    if (point.liftCoefficient === null) continue
    if (best === null || direction * (point.liftCoefficient - best.liftCoefficient!) > 0) best = point
  }
  return lost >= LOST || (best !== null && direction * (alpha - best.alpha) > RECOVERY + SLACK)
}
