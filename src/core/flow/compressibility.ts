import { power } from '../numerics/elementary'
import { BadInput } from '../numerics/errors'

/** Greatest free-stream Mach number for which the pressure correction is offered. */
export const GREATEST_MACH = 0.5
/** Ratio of specific heats of air. */
const KAPPA = 1.4

/** Throws BadInput unless 0 <= mach <= 0.5. */
export function checkMach(mach: number): void {
  if (!(mach >= 0 && mach <= GREATEST_MACH)) {
    throw new BadInput(`Mach number ${mach}: give a value from 0 to ${GREATEST_MACH}`)
  }
}

/**
 * Pressure coefficient in a subsonic stream of Mach number `mach` from the incompressible one:
 * c_p = c_p0 / (b + M^2 / (1 + b) c_p0 / 2) with b = sqrt(1 - M^2). Never below the pressure of a vacuum,
 * -2 / (1.4 M^2), which the rule passes at a suction peak far beyond its range.
 * Source: von Karman, Compressibility Effects in Aerodynamics, J. Aeronautical Sciences 8 (1941); Tsien (1939).
 */
export function compressiblePressure(incompressible: number, mach: number): number {
  if (mach === 0) return incompressible
  const b = Math.sqrt(1 - mach * mach)
  const vacuum = -2 / (KAPPA * mach * mach)
  const divisor = b + ((mach * mach) / (1 + b)) * 0.5 * incompressible
  return divisor > 0 ? Math.max(incompressible / divisor, vacuum) : vacuum
}

/**
 * Pressure coefficient at which the local flow is just sonic; -Infinity at Mach 0.
 * Source: isentropic flow; Anderson, Fundamentals of Aerodynamics (1991), equation 11.60.
 */
export function criticalPressure(mach: number): number {
  if (mach === 0) return -Infinity
  const ratio = (2 + (KAPPA - 1) * mach * mach) / (KAPPA + 1)
  return (2 / (KAPPA * mach * mach)) * (power(ratio, KAPPA / (KAPPA - 1)) - 1)
}
