import type { Plot, PointState } from '../../io/plots/plot'

/** How near the pointer must be to a point, px. */
const REACH = 24

/** The state of the point nearest to a place in px; null when none is within reach. */
export function nearestPoint(
  plot: Plot,
  pixel: (axis: 'x' | 'y', value: number) => number,
  px: number,
  py: number,
): PointState | null {
  let best: PointState | null = null
  let least = REACH
  for (const { x, y, states } of plot.curves) {
    states.forEach((state, i) => {
      const distance = Math.hypot(pixel('x', x[i]!) - px, pixel('y', y[i]!) - py)
      if (distance < least) [best, least] = [state, distance]
    })
  }
  return best
}
