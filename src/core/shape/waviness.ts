import { power } from '../numerics/elementary'
import { contourOf, ordinateAt, type Side } from './contour'
import type { Section } from './section'

/** A place where the outline departs from a smooth curve through its neighbourhood. */
export interface Wave {
  readonly side: Side
  /** x/c */
  readonly at: number
  /** Departure from the smooth curve, chords, outward positive. */
  readonly height: number
}

/** What the smoothness check found, the worst places first. */
export interface Waviness {
  readonly waves: readonly Wave[]
  /** Root-mean-square departure over both sides, chords. */
  readonly roughness: number
}

/**
 * Departure that counts: above the last digit of coordinates printed to four decimals, below the surface
 * waves of 0.0002 chord that common practice for laminar surfaces warns of.
 */
const NOTABLE = 0.00015
const STATIONS = 121
/** Half-width of the neighbourhood, in stations: 8 of 120 over the aft 97 % of the chord. */
const REACH = 8
const MOST_WAVES = 6

/**
 * Points at waviness and kinks: each side, aft of the nose region, is compared with the parabola that fits
 * the square-root-stretched neighbourhood of each place in the least-squares sense. An outline as smooth
 * as the families in use departs by less than the threshold; scans and typing slips stand out.
 */
export function waviness(section: Section): Waviness {
  const contour = contourOf(section)
  const waves: Wave[] = []
  let sum = 0
  let count = 0
  for (const side of ['upper', 'lower'] as const) {
    const places = Array.from({ length: STATIONS }, (_, k) => power(0.17 + (0.82 * k) / (STATIONS - 1), 2))
    const heights = places.map((x) => (ordinateAt(contour, side, x) ?? 0) * (side === 'upper' ? 1 : -1))
    const departures = heights.map((_, k) => departure(heights, k))
    departures.forEach((value, k) => {
      sum += value * value
      count++
      const peak = departures
        .slice(Math.max(0, k - 4), k + 5)
        .every((other) => Math.abs(other) <= Math.abs(value))
      if (peak && Math.abs(value) > NOTABLE) waves.push({ side, at: places[k], height: value })
    })
  }
  waves.sort((a, b) => Math.abs(b.height) - Math.abs(a.height))
  return { waves: waves.slice(0, MOST_WAVES), roughness: Math.sqrt(sum / count) }
}

/** Height above the least-squares quartic of the neighbourhood (Savitzky and Golay, 1964), at its middle. */
function departure(heights: readonly number[], k: number): number {
  if (k < REACH || k + REACH >= heights.length) return 0
  const weights = SMOOTHING
  return weights.reduce((left, weight, j) => left - weight * heights[k + j - REACH], heights[k])
}

/** Smoothing weights of a quartic over 2 REACH + 1 equal steps; Savitzky and Golay (1964), closed form. */
const SMOOTHING: readonly number[] = (() => {
  const m = REACH
  const scale = (4 * (2 * m + 5) * (2 * m + 3) * (2 * m + 1) * (2 * m - 1) * (2 * m - 3)) / 15
  return Array.from({ length: 2 * m + 1 }, (_, j) => {
    const i = j - m
    const top =
      15 * power(m, 4) +
      30 * power(m, 3) -
      35 * power(m, 2) -
      50 * m +
      12 -
      35 * (2 * power(m, 2) + 2 * m - 3) * power(i, 2) +
      63 * power(i, 4)
    return top / scale
  })
})()
