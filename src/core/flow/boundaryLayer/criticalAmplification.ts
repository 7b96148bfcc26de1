import { log } from '../../numerics/elementary'
import { BadInput } from '../../numerics/errors'

/**
 * Critical amplification exponent N of a free stream with turbulence `percent` (root mean square over mean
 * speed, in per cent): N = -8.43 - 2.4 ln(Tu).
 *
 * Source: L. M. Mack, "Transition and laminar instability", JPL Publication 77-15, 1977.
 * Throws BadInput outside 0.07 to 2.98 per cent, where the relation was not fitted.
 */
export function criticalAmplification(percent: number): number {
  if (!(percent >= 0.07 && percent <= 2.98))
    throw new BadInput(
      `free-stream turbulence is ${percent} %; Mack's relation holds from 0.07 to 2.98 %: give a value inside, or the amplification N itself`,
    )
  // At 2.98 % the relation gives -0.0004: N cannot be negative.
  return Math.max(0, -8.43 - 2.4 * log(percent / 100))
}
