import { plotNumber } from './axisTicks'
import type { Axis, Curve, Plot, PointState } from './plot'

/**
 * The point of a curve that shows a hovered state best: the nearest along the span, else along the chord on
 * the same side, else in angle; -1 when the curve cannot show it. A place on the chord of one entry belongs
 * to that entry's angle, so it marks no other entry's point in angle.
 */
export function pointOfState(states: readonly PointState[], hover: PointState): number {
  let best = -1
  let least = Infinity
  states.forEach((state, i) => {
    const distance = distanceOf(state, hover)
    if (distance < least) [best, least] = [i, distance]
  })
  return best
}

function distanceOf(state: PointState, hover: PointState): number {
  if (state.spanY !== null) return hover.spanY === null ? Infinity : Math.abs(state.spanY - hover.spanY)
  if (state.xOverC !== null) {
    const otherSide = hover.side !== null && state.side !== null && state.side !== hover.side
    return hover.xOverC === null || otherSide ? Infinity : Math.abs(state.xOverC - hover.xOverC)
  }
  if (state.alpha === null || hover.alpha === null) return Infinity
  if (hover.xOverC !== null && state.entry !== hover.entry) return Infinity
  return Math.abs(state.alpha - hover.alpha)
}

/** The values of a curve at a hovered state in words, `angle 4.0°, c_l 0.92`; null when it has none. */
export function readOut(plot: Plot, curve: Curve, hover: PointState): string | null {
  const i = pointOfState(curve.states, hover)
  return i < 0 ? null : `${worded(plot.x, curve.x[i]!)}, ${worded(plot.y, curve.y[i]!)}`
}

/** The read-out of the entry that is hovered; null without. */
export function hoveredReadOut(plot: Plot, hover: PointState | null): string | null {
  const curve = hover === null ? undefined : plot.curves.find(({ entry }) => entry === hover.entry)
  return hover === null || curve === undefined ? null : readOut(plot, curve, hover)
}

/** A value with its symbol and unit. */
export function worded(axis: Axis, value: number): string {
  return `${axis.symbol} ${plotNumber(value, axis.decimals)}${axis.unit}`
}
