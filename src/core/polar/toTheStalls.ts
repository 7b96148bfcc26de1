import type { Polar } from './polar'

/** What is kept of a polar behind either stall, rad; rounding of half degrees included. */
const BEHIND = (2 * Math.PI) / 180 + 1e-9

/** A polar without the points that lie more than two degrees past its positive or negative stall. */
export function toTheStalls(polar: Polar): Polar {
  const least = (polar.minLift?.alpha ?? -Infinity) - BEHIND
  const most = (polar.maxLift?.alpha ?? Infinity) + BEHIND
  return { ...polar, points: polar.points.filter(({ alpha }) => alpha >= least && alpha <= most) }
}
