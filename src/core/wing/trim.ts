import { tan } from '../numerics/elementary'
import type { MeanChord } from './planform'

/** Where the wing's lift and moment act; lengths aft of the quarter chord of the root, m. */
export interface WingMoment {
  /** Aerodynamic centre. */
  readonly aerodynamicCentre: number
  /** Moment about it over dynamic pressure, m3, nose up positive; it does not change with lift. */
  readonly momentOverPressure: number
}

/** Strips of the half wing: chord, place, section moment and lift at no total lift and per unit C_L. */
export interface MomentStrip {
  readonly y: number
  readonly width: number
  readonly chord: number
  readonly momentAtZeroLift: number
  /** c_l where the wing as a whole carries none. */
  readonly basicLift: number
  /** Growth of c_l with C_L. */
  readonly additionalLift: number
}

/**
 * Moment and aerodynamic centre of a wing from strips of one half. The additional lift acts on the swept
 * quarter-chord line and sets the aerodynamic centre; the basic lift, which sums to nothing, adds a couple
 * where the line is swept. Source: Anderson, NACA Report 572 (1936), equations 10 to 14.
 */
export function wingMoment(strips: readonly MomentStrip[], sweepQuarterChord: number): WingMoment {
  const aft = tan(sweepQuarterChord)
  let lift = 0
  let first = 0
  let moment = 0
  for (const { y, width, chord, momentAtZeroLift, basicLift, additionalLift } of strips) {
    lift += additionalLift * chord * width
    first += additionalLift * chord * width * y * aft
    moment += 2 * width * chord * (momentAtZeroLift * chord - basicLift * y * aft)
  }
  return { aerodynamicCentre: first / lift, momentOverPressure: moment }
}

/** What balance needs of the aircraft; lengths in m. */
export interface TrimInput {
  readonly dynamicPressure: number
  /** Load factor times weight, N. */
  readonly load: number
  readonly moment: WingMoment
  readonly meanChord: MeanChord
  readonly sweepQuarterChord: number
  /** Aft of the leading edge of the mean aerodynamic chord, in that chord; null: at the aerodynamic centre. */
  readonly centreOfGravity: number | null
  /** m; null: the tail load is not given and the wing carries all. */
  readonly tailArm: number | null
}

/** The tail load as a function of dynamic pressure q: perPressure (m2) times q, plus constant (N). */
export interface TailLoadLine {
  readonly perPressure: number
  readonly constant: number
}

/** The line of `tailLoad` in dynamic pressure, for a load that does not change; null without a tail arm. */
export function tailLoadLine(input: Omit<TrimInput, 'dynamicPressure'>): TailLoadLine | null {
  if (input.tailArm === null) return null
  const { moment, meanChord } = input
  const quarter = meanChord.y * tan(input.sweepQuarterChord)
  const lever =
    input.centreOfGravity === null
      ? 0
      : quarter + (input.centreOfGravity - 0.25) * meanChord.chord - moment.aerodynamicCentre
  return {
    perPressure: moment.momentOverPressure / input.tailArm,
    constant: (input.load * lever) / input.tailArm,
  }
}

/**
 * Load on the tail (N, up positive) that balances moments about the wing's aerodynamic centre:
 * (M_ac + n W (x_cg - x_ac)) / tail arm, x aft; null without a tail arm. Fuselage moment and tail drag are
 * not included.
 */
export function tailLoad(input: TrimInput): number | null {
  const line = tailLoadLine(input)
  return line === null ? null : line.perPressure * input.dynamicPressure + line.constant
}
