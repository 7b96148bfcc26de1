import { laminarDissipation, laminarFriction } from './laminarClosure'

/** The layer next to a stagnation point, u = a x: its shape factor, and its momentum thickness over sqrt(nu/a). */
export interface StagnationLayer {
  readonly shape: number
  readonly thickness: number
}

/**
 * Similar layer at a stagnation point by the laminar closure: nothing changes along it, so both balances
 * become algebraic, (2 + H) t^2 a/nu = F and (1 - H) t^2 a/nu = G - F with F = R c_f/2 and G = 2 R D/H_s.
 * Bisection for H. Exact (Hiemenz): H 2.216, t 0.2923 sqrt(nu/a); the closure gives 2.24 and 0.290.
 */
export function stagnationLayer(): StagnationLayer {
  const friction = new Float64Array(2)
  const dissipation = new Float64Array(2)
  let low = 2
  let high = 2.6
  for (let n = 0; n < 60; n++) {
    const H = 0.5 * (low + high)
    laminarFriction(H, friction)
    laminarDissipation(H, dissipation)
    const excess = (1 - H) * friction[0] - (2 + H) * (dissipation[0] - friction[0])
    if (excess > 0) low = H
    else high = H
  }
  laminarFriction(low, friction)
  return { shape: low, thickness: Math.sqrt(friction[0] / (2 + low)) }
}
