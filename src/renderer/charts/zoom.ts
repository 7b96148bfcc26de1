import type { AxisEnds } from '../../io/plots/axisTicks'

/** The part of a plot that is looked at; null: all of it. */
export type Zoom = { readonly x: AxisEnds; readonly y: AxisEnds } | null

/** The narrowest part of an axis that can be looked at, as a share of the whole. */
const NARROWEST = 1e-3

/**
 * The part seen after stretching by a factor (above 1: closer) about a place given in values of the axes.
 * Looking at the whole or more is null.
 */
export function zoomed(
  whole: NonNullable<Zoom>,
  seen: NonNullable<Zoom>,
  place: { readonly x: number; readonly y: number },
  factor: number,
): Zoom {
  const stretch = ([from, to]: AxisEnds, at: number): AxisEnds => [
    at + (from - at) / factor,
    at + (to - at) / factor,
  ]
  const next = { x: stretch(seen.x, place.x), y: stretch(seen.y, place.y) }
  const share = (next.x[1] - next.x[0]) / (whole.x[1] - whole.x[0])
  if (share >= 1) return null
  return share < NARROWEST ? seen : next
}

/** The part seen after moving by shares of what is seen, x to the right and y upward. */
export function moved(seen: NonNullable<Zoom>, right: number, up: number): NonNullable<Zoom> {
  const shift = ([from, to]: AxisEnds, share: number): AxisEnds => {
    const by = share * (to - from)
    return [from + by, to + by]
  }
  return { x: shift(seen.x, right), y: shift(seen.y, up) }
}
