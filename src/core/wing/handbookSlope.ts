import { power, tan } from '../numerics/elementary'
import type { QuickSlope } from './helmbold'

/** What the handbook formula needs of a wing. */
export interface HandbookWing {
  readonly aspectRatio: number
  readonly mach: number
  /** Section lift slope over 2 pi, at low speed. */
  readonly kappa: number
  /** Sweep of the half-chord line, rad. */
  readonly sweepHalfChord: number
}

/**
 * Lift slope of a wing with compressibility and sweep:
 * 2 pi A / (2 + sqrt((A beta / kappa)^2 (1 + tan^2 L / beta^2) + 4)), beta^2 = 1 - M^2.
 * Source: USAF Stability and Control Datcom, AFWAL-TR-83-3048 (1978), section 4.1.3.2.
 */
export function handbookSlope({ aspectRatio, mach, kappa, sweepHalfChord }: HandbookWing): QuickSlope {
  const beta = Math.sqrt(1 - power(Math.min(mach, 0.95), 2))
  const stretched = power((aspectRatio * beta) / kappa, 2) * (1 + power(tan(sweepHalfChord) / beta, 2))
  return {
    slope: (2 * Math.PI * aspectRatio) / (2 + Math.sqrt(stretched + 4)),
    warning: mach > 0.7 ? 'the handbook slope holds below the drag rise, to Mach 0.7 or so' : '',
  }
}
