import { log, tanh } from '../../numerics/elementary'

/**
 * Envelope of the spatially amplified Tollmien-Schlichting waves of self-similar layers: rate of growth of
 * the amplification exponent N, and the Reynolds number of its onset.
 *
 * Source: M. Drela, M. B. Giles, AIAA Journal 25(10), 1987, 1347-1355, fits to the Orr-Sommerfeld solutions
 * of the Falkner-Skan family.
 */

/** dN/dR as a function of the shape factor H; writes [value, derivative]. */
export function envelopeGrowth(H: number, out: Float64Array): void {
  const th = tanh(1.5 * H - 4.65)
  const z = 2.4 * H - 3.7 + 2.5 * th
  const root = Math.sqrt(z * z + 0.25)
  out[0] = 0.01 * root
  out[1] = (0.01 * z * (2.4 + 3.75 * (1 - th * th))) / root
}

/** Decimal logarithm of the R at which amplification begins; writes [value, derivative with respect to H]. */
export function envelopeOnset(H: number, out: Float64Array): void {
  const z = 1 / (H - 1)
  const th = tanh(20 * z - 12.9)
  const a = 1.415 * z - 0.489
  out[0] = a * th + 3.295 * z + 0.44
  out[1] = -z * z * (1.415 * th + a * 20 * (1 - th * th) + 3.295)
}

/** Half width, in lg R, of the smooth beginning that stands for the corner at the onset. */
const ONSET_WIDTH = 0.06

/**
 * Streamwise growth times momentum thickness, t dN/dx = (dN/dR) (m + 1)/2 l, zero below the onset; writes
 * [value, derivative with respect to H, derivative with respect to R]. The growth begins over a narrow band
 * of lg R about the onset, so that it has a derivative.
 */
export function amplificationRate(H: number, R: number, out: Float64Array): void {
  envelopeOnset(H, out)
  const p = (log(R) / Math.LN10 - out[0]) / (2 * ONSET_WIDTH) + 0.5
  if (p <= 0) {
    out[0] = out[1] = out[2] = 0
    return
  }
  const onsetSlope = out[1]
  const ramp = p < 1 ? p * p * (3 - 2 * p) : 1
  const rampSlope = p < 1 ? (6 * p * (1 - p)) / (2 * ONSET_WIDTH) : 0
  // (m + 1)/2 l = (0.058 (H-4)^2/(H-1) - 0.068 + l)/2
  const z = H - 4
  const m = (0.058 * z * z) / (H - 1) - 0.068
  const mSlope = (0.058 * z * (2 * (H - 1) - z)) / ((H - 1) * (H - 1))
  const l = (6.54 * H - 14.07) / (H * H)
  const lSlope = 6.54 / (H * H) - (2 * l) / H
  const g = (m + l) / 2
  envelopeGrowth(H, out)
  const rate = out[0]
  const rateSlope = out[1]
  const value = rate * g
  out[0] = value * ramp
  out[1] = (rateSlope * g + (rate * (mSlope + lSlope)) / 2) * ramp - value * rampSlope * onsetSlope
  out[2] = (value * rampSlope) / (R * Math.LN10)
}
