import type { Plot } from './plot'

/** Steps that an axis goes in, times a power of ten. */
const NICE = [1, 2, 2.5, 5, 10]
const MOST_STEPS = 7
/** Rounding of the ends to whole steps forgives this share of a step. */
const WHOLE = 1e-9

/** Values that an axis runs between. */
export type AxisEnds = readonly [from: number, to: number]

/** The round step that divides a span into seven parts at most. */
export function niceStep(span: number): number {
  const power = 10 ** Math.floor(Math.log10(span / MOST_STEPS))
  return power * (NICE.find((nice) => nice * power * MOST_STEPS >= span * (1 - WHOLE)) ?? 10)
}

/** Ends of an axis: whole steps just outside what is drawn, unless the plot gives its ends. */
export function axisEnds(plot: Plot, which: 'x' | 'y'): AxisEnds {
  const axis = plot[which]
  const values = plot.curves.flatMap((curve) => curve[which])
  if (values.length === 0) return [axis.from ?? 0, axis.to ?? (axis.from ?? 0) + 1]
  let low = axis.from ?? Math.min(...values)
  let high = axis.to ?? Math.max(...values)
  const missing = (axis.leastSpan ?? Math.max(1e-6 * Math.abs(high), 1e-12)) - (high - low)
  if (missing > 0) [low, high] = [low - missing / 2, high + missing / 2]
  // Ends moved out to whole steps may span so much that ticks go in a larger step: the ends follow it.
  let step = niceStep(high - low)
  for (;;) {
    const from = axis.from ?? step * Math.floor(low / step + WHOLE)
    const to = axis.to ?? step * Math.ceil(high / step - WHOLE)
    const next = niceStep(to - from)
    if (next <= step) return [from, to]
    step = next
  }
}

/** Round values between the ends of an axis, with the decimals that tell them apart. */
export function axisTicks([from, to]: AxisEnds): { values: number[]; decimals: number } {
  const step = niceStep(to - from)
  const first = Math.ceil(from / step - WHOLE)
  const last = Math.floor(to / step + WHOLE)
  const values = Array.from({ length: last - first + 1 }, (_, k) => (first + k) * step)
  const digits = [0, 1, 2, 3, 4, 5, 6, 7, 8].find(
    (count) => Math.abs(step * 10 ** count - Math.round(step * 10 ** count)) < 1e-6,
  )
  return { values, decimals: digits ?? 9 }
}

/** A number as plots write it: fixed decimals and a true minus sign, no minus zero. */
export function plotNumber(value: number, decimals: number): string {
  const text = value.toFixed(decimals)
  return Number(text) === 0 ? text.replace('-', '') : text.replace('-', '−')
}
