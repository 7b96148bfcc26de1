import {
  ENERGY,
  ENERGY_SHARE,
  FRICTION,
  GROWTH,
  LAMINAR,
  LOG_EXCESS,
  LOG_SHAPE,
  LOG_SPEED,
  MOMENTUM_SHARE,
  type LayerKind,
} from './stationRates'
import { LAG_RATE } from './turbulentClosure'
import { log } from '../../numerics/elementary'

/**
 * Balances of momentum, energy shape and shear stress between two neighbouring stations:
 *
 *   d ln t   + (2 + H - M^2) d ln u - (c_f/2 u/t) dX = 0
 *   d ln H_s + (1 - H)       d ln u - (2 D/H_s - c_f/2)(u/t) dX = 0
 *   2 d ln q - 4.2 (q_eq - q)/delta dx = 0     (turbulent)
 *
 * with dX = dx / (logarithmic mean of u), which makes the flow next to a stagnation point, u = a x, exact
 * however its first interval is cut. Source: von Karman's momentum and Wieghardt's energy equation; Drela and
 * Giles, AIAA Journal 25(10), 1987, for the lag.
 *
 * `out`: three balances; `slopes`: 3 x 9 derivatives with respect to q1 t1 d1 u1, q2 t2 d2 u2 and dx.
 */
export const SLOPES = 9

/** Change of ln(H - 1) over an interval at which the mean has moved half way from centred to downstream. */
const STIFF_CHANGE = 0.35

export function intervalBalance(
  out: Float64Array,
  slopes: Float64Array,
  kind: LayerKind,
  r1: Float64Array,
  r2: Float64Array,
  q1: number,
  t1: number,
  u1: number,
  q2: number,
  t2: number,
  u2: number,
  dx: number,
): void {
  // Downstream weight: 1/2 (second order), towards 1 where the shape changes fast and a centred rule rings.
  const z = (r2[LOG_EXCESS] - r1[LOG_EXCESS]) / STIFF_CHANGE
  const z1 = 1 + z * z
  const w = 0.5 + (0.5 * z * z) / z1
  const v = 1 - w
  const wz = z / (z1 * z1) / STIFF_CHANGE
  // dX and its derivatives.
  const ratio = log(u2 / u1)
  const near = Math.abs(ratio) < 1e-4
  const mean = near ? 0.5 * (u1 + u2) : (u2 - u1) / ratio
  const X = dx / mean
  const m2 = near ? 0.5 : (1 - mean / u2) / ratio
  const m1 = near ? 0.5 : (mean / u1 - 1) / ratio
  const X1 = (-X * m1) / mean
  const X2 = (-X * m2) / mean
  const dv = r2[LOG_SPEED] - r1[LOG_SPEED]
  balance(0, MOMENTUM_SHARE, FRICTION)
  balance(SLOPES, ENERGY_SHARE, ENERGY)
  out[0] += log(t2 / t1)
  slopes[1] -= 1 / t1
  slopes[5] += 1 / t2
  out[1] += r2[LOG_SHAPE] - r1[LOG_SHAPE]
  for (let j = 1; j <= 4; j++) {
    slopes[SLOPES + j - 1] -= r1[LOG_SHAPE + j]
    slopes[SLOPES + 3 + j] += r2[LOG_SHAPE + j]
  }
  const at = 2 * SLOPES
  if (kind === LAMINAR) {
    out[2] = 0
    slopes.fill(0, at, at + SLOPES)
    return
  }
  const g1 = r1[GROWTH]
  const g2 = r2[GROWTH]
  const g = v * g1 + w * g2
  out[2] = 2 * log(q2 / q1) - LAG_RATE * g * dx
  const gw = wz * (g2 - g1)
  for (let j = 1; j <= 4; j++) {
    slopes[at + j - 1] = -LAG_RATE * dx * (v * r1[GROWTH + j] - gw * r1[LOG_EXCESS + j])
    slopes[at + 3 + j] = -LAG_RATE * dx * (w * r2[GROWTH + j] + gw * r2[LOG_EXCESS + j])
  }
  slopes[at] -= 2 / q1
  slopes[at + 4] += 2 / q2
  slopes[at + 8] = -LAG_RATE * g

  function balance(at: number, share: number, source: number): void {
    const s1 = r1[share]
    const s2 = r2[share]
    const p1 = r1[source]
    const p2 = r2[source]
    const s = v * s1 + w * s2
    const p = v * p1 + w * p2
    out[at / SLOPES] = s * dv - p * X
    const ofWeight = wz * ((s2 - s1) * dv - (p2 - p1) * X)
    for (let j = 1; j <= 4; j++) {
      slopes[at + j - 1] =
        v * (r1[share + j] * dv - r1[source + j] * X) - s * r1[LOG_SPEED + j] - ofWeight * r1[LOG_EXCESS + j]
      slopes[at + 3 + j] =
        w * (r2[share + j] * dv - r2[source + j] * X) + s * r2[LOG_SPEED + j] + ofWeight * r2[LOG_EXCESS + j]
    }
    slopes[at + 3] -= p * X1
    slopes[at + 7] -= p * X2
    slopes[at + 8] = -p / mean
  }
}
