import { atan, power, tan } from '../numerics/elementary'
import { handbookSlope } from './handbookSlope'
import { helmboldSlope } from './helmbold'
import type { LinearWing } from './linearSections'

/** Lift slopes (per rad) by quick formulas, beside the lifting line for a sanity check. */
export interface QuickSlopes {
  readonly helmbold: number
  readonly handbook: number
  /** Where a formula is used outside its range, in plain words. */
  readonly warnings: readonly string[]
}

/** What Helmbold's formula does not know changes the slope by 1 % or so from here on (common practice). */
const FELT_SWEEP = (5 * Math.PI) / 180
const FELT_MACH = 0.15

/**
 * Quick formulas for a wing at a Mach number; the half-chord sweep is that of the straight taper between
 * root and tip, the section slope the mean of theirs.
 */
export function quickSlopes({ shape, root, tip }: LinearWing, mach: number): QuickSlopes {
  const aspectRatio = power(shape.span, 2) / shape.area
  const atLowSpeed = 0.5 * (root.slope + tip.slope) * Math.sqrt(1 - power(Math.min(mach, 0.95), 2))
  const { stations, span, sweepQuarterChord } = shape
  const tapering = (stations[0].chord - stations[stations.length - 1].chord) / (0.5 * span)
  const sweepHalfChord = atan(tan(sweepQuarterChord) - 0.25 * tapering)
  const helmbold = helmboldSlope(aspectRatio)
  const handbook = handbookSlope({ aspectRatio, mach, kappa: atLowSpeed / (2 * Math.PI), sweepHalfChord })
  const unlike = Math.abs(sweepQuarterChord) > FELT_SWEEP || mach > FELT_MACH
  return {
    helmbold: helmbold.slope,
    handbook: handbook.slope,
    warnings: [
      helmbold.warning,
      unlike ? "Helmbold's formula knows neither sweep nor Mach number" : '',
      handbook.warning,
    ].filter((words) => words !== ''),
  }
}
