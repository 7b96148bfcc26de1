import type { PolarPoint } from './polar'

/** Step of the angle below which a polar is not refined, rad. */
const FINEST = (0.15 * Math.PI) / 180
/** Intervals longer than this are not refined: a coarse sweep asks for a coarse answer; rad. */
const COARSEST = (1.1 * Math.PI) / 180

/**
 * Angles to add to a polar (points by angle): the middles of the intervals beside the greatest and the least
 * lift and beside the least drag, where a polar bends most and its limits are read.
 */
export function refinementAngles(points: readonly PolarPoint[]): number[] {
  const wanted = new Set<number>()
  for (const place of [extremeOf(points, lift), extremeOf(points, minusLift), extremeOf(points, minusDrag)]) {
    if (place === null) continue
    for (const i of [place - 1, place]) {
      const [a, b] = [points[i], points[i + 1]]
      if (!a?.converged || !b?.converged) continue
      const step = b.alpha - a.alpha
      if (step > 2 * FINEST && step < COARSEST) wanted.add(0.5 * (a.alpha + b.alpha))
    }
  }
  return [...wanted]
}

const lift = ({ liftCoefficient }: PolarPoint): number | null => liftCoefficient
const minusLift = ({ liftCoefficient }: PolarPoint): number | null =>
  liftCoefficient === null ? null : -liftCoefficient
const minusDrag = ({ dragCoefficient }: PolarPoint): number | null =>
  dragCoefficient === null ? null : -dragCoefficient

/** Index of the greatest value when it is not at an end of the points. */
function extremeOf(points: readonly PolarPoint[], of: (point: PolarPoint) => number | null): number | null {
  let best = -1
  points.forEach((point, i) => {
    const value = of(point)
    if (value !== null && (best < 0 || value > of(points[best])!)) best = i
  })
  return best > 0 && best < points.length - 1 ? best : null
}
