import { panelLoads } from '../flow/panelLoads'
import type { PanelFlow } from '../flow/vortexPanels'

/**
 * Limit that the suction peak at the nose sets to the lift.
 *
 * The short laminar bubble behind the nose of a thin section bursts before the layers of an integral method
 * separate. W. O. Valarezo and V. D. Chin ("Method for the prediction of wing maximum lift", Journal of
 * Aircraft 31(1), 1994, 103-109) found that sections reach their maximum lift at the latest when the pressure
 * coefficients of the suction peak and of the trailing edge, both by potential flow, differ by a fixed
 * amount: 14 at low Mach number and high Reynolds number (value from memory, confidence medium). Below a
 * Reynolds number of about 6e6 their amount is smaller; here the one value stands for all, as an upper bound.
 */
export const CRITICAL_DIFFERENCE = 14

/** Farthest angle that is looked at, rad. */
const FARTHEST = 0.5
const HALVINGS = 30

/** Angles (rad) at which the difference is reached above and below; null where it is not by 29 deg. */
export interface NoseLimits {
  readonly above: number | null
  readonly below: number | null
}

export function noseLimits(flow: PanelFlow): NoseLimits {
  return { above: limitTowards(flow, FARTHEST), below: limitTowards(flow, -FARTHEST) }
}

/** Bisection: away from the ideal angle the peak grows with the square of the angle. */
function limitTowards(flow: PanelFlow, end: number): number | null {
  if (pressureDifference(flow, end) < CRITICAL_DIFFERENCE) return null
  let [inside, outside] = [0, end]
  for (let n = 0; n < HALVINGS; n++) {
    const middle = 0.5 * (inside + outside)
    if (pressureDifference(flow, middle) < CRITICAL_DIFFERENCE) inside = middle
    else outside = middle
  }
  return inside
}

/** Pressure coefficient at the trailing edge less that of the suction peak. */
export function pressureDifference(flow: PanelFlow, alpha: number): number {
  const { pressureCoefficient } = panelLoads(flow, alpha)
  let least = Infinity
  for (const value of pressureCoefficient) least = Math.min(least, value)
  return pressureCoefficient[0] - least
}
