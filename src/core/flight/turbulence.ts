import { log } from '../numerics/elementary'

/**
 * Critical amplification factor N of free-stream turbulence given as a fraction (0.0007 to 0.0298):
 * N = -8.43 - 2.4 ln Tu.
 * Source: Mack, Transition prediction and linear stability theory, AGARD CP-224 (1977), equation 1-1.
 */
export function criticalAmplification(turbulence: number): number {
  return -8.43 - 2.4 * log(turbulence)
}
