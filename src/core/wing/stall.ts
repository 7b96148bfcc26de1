import { cos, power } from '../numerics/elementary'
import { coefficientsAt, localLift, type LiftingLine } from './liftingLine'

/** Where a wing reaches its greatest lift before any station exceeds its section's. */
export interface FirstStall {
  /** Largest wing C_L. */
  readonly liftCoefficient: number
  /** Root angle, rad. */
  readonly alpha: number
  /** Distance from the centreline of the station that stalls first, m. */
  readonly y: number
}

/** A station with the greatest lift of its section at its own Reynolds number. */
export interface StallStation {
  /** m */
  readonly y: number
  readonly maxLiftCoefficient: number
}

/** Growth of local lift with root angle (per rad) below which a station, such as the tip, cannot stall first. */
const NO_GROWTH = 1e-6

/**
 * Section lift on a wing whose quarter chord is swept by an angle (rad), from that of the section in
 * straight flow: cos squared, by simple sweep theory.
 * Source: Jones, Effects of sweepback on boundary layer and separation, NACA Report 884 (1947).
 */
export function sweptLift(liftCoefficient: number, sweep: number): number {
  return liftCoefficient * power(cos(sweep), 2)
}

/**
 * The first stall of a wing by the critical section: local lift grows linearly with the angle, and the
 * station that first reaches its own maximum section lift sets the wing's. Null without any station that
 * can.
 * Source: Anderson, Determination of the characteristics of tapered wings, NACA Report 572 (1936), section
 * on maximum lift coefficient.
 */
export function firstStall(line: LiftingLine, stations: readonly StallStation[]): FirstStall | null {
  const atZero = coefficientsAt(line, 0)
  const atOne = coefficientsAt(line, 1)
  let alpha = Infinity
  let y = 0
  for (const station of stations) {
    const none = localLift(line, 0, station.y, atZero).liftCoefficient
    const growth = localLift(line, 1, station.y, atOne).liftCoefficient - none
    if (growth < NO_GROWTH) continue
    const reached = (station.maxLiftCoefficient - none) / growth
    if (reached < alpha) [alpha, y] = [reached, station.y]
  }
  if (alpha === Infinity) return null
  const { span, area } = line.input
  const lift = (Math.PI * power(span, 2)) / area
  return { alpha, y, liftCoefficient: lift * (line.atZero[0] + alpha * line.perAngle[0]) }
}

/** The part of the semispan over which the tip margin is judged. */
const OUTER_FROM = 0.6

/**
 * Tip margin: the smallest difference of maximum section lift and local lift over the outer 40 % of the
 * semispan at first stall.
 */
export function tipMargin(
  line: LiftingLine,
  stall: FirstStall,
  stations: readonly StallStation[],
): number | null {
  const coefficients = coefficientsAt(line, stall.alpha)
  const outer = stations.filter(({ y }) => y >= 0.5 * OUTER_FROM * line.input.span)
  if (outer.length === 0) return null
  return Math.min(
    ...outer.map(
      ({ y, maxLiftCoefficient }) =>
        maxLiftCoefficient - localLift(line, stall.alpha, y, coefficients).liftCoefficient,
    ),
  )
}
