import type { Layer, TransitionLaw } from './boundaryLayer/layer'
import { GROWTH, LAMINAR } from './boundaryLayer/stationRates'
import type { Step } from './boundaryLayer/stationStep'

/**
 * Linear answer of all station values to the mass defects: changes of q, t and u at place g (node order, then
 * wake) are rows over the changes of m at all places plus a constant. Marching the linearised balances
 * downstream in their inverse form (m given, u found) builds them without a singularity at separation.
 */
export interface Answers {
  readonly size: number
  readonly q: Float64Array
  readonly t: Float64Array
  readonly u: Float64Array
  readonly q0: Float64Array
  readonly t0: Float64Array
  readonly u0: Float64Array
}

export function newAnswers(size: number): Answers {
  const square = (): Float64Array => new Float64Array(size * size + 3 * size)
  const line = (): Float64Array => new Float64Array(size + 1)
  return { size, q: square(), t: square(), u: square(), q0: line(), t0: line(), u0: line() }
}

/** Derivatives of the amplification over the interval by (q, t, d, u) of the two stations before. */
const near = new Float64Array(12)
const far = new Float64Array(12)
const CLEAR = new Float64Array(12)

/** Fills `near` and `far` with what the growth of amplification adds to the balances' derivatives. */
export function amplify(step: Step, layer: Layer, i: number, law: TransitionLaw): void {
  near.set(CLEAR)
  far.set(CLEAR)
  const dx = layer.x[i] - layer.x[i - 1]
  const one = layer.rates[i - 1]
  const two = layer.rates[Math.max(i - 2, 0)]
  if (i !== layer.transition.at) {
    for (let j = 1; j < 4; j++) {
      near[8 + j] = -0.1 * dx * step.growthBefore * one[GROWTH + 1 + j]
      far[8 + j] = -0.1 * dx * step.growthFarther * two[GROWTH + 1 + j]
    }
    return
  }
  const room = law.amplification - layer.q[i - 1]
  if (layer.transition.forced || room <= 0) return
  // share = room / (growth dx)
  const byQ = -1 / (step.growth * dx)
  const byGrowth = -layer.transition.share / step.growth
  for (let r = 0; r < 3; r++) {
    near[4 * r] = step.share[r] * byQ
    for (let j = 1; j < 4; j++) {
      near[4 * r + j] = step.share[r] * byGrowth * step.growthBefore * one[GROWTH + 1 + j]
      far[4 * r + j] = step.share[r] * byGrowth * step.growthFarther * two[GROWTH + 1 + j]
    }
  }
}

/** Solves the linearised balances of station i for its changes: row g from rows `before` and `farther`. */
export function advance(
  rows: Answers,
  layer: Layer,
  i: number,
  step: Step,
  g: number,
  before: number,
  farther: number,
  low: number,
  high: number,
  joined: boolean,
): void {
  const { size } = rows
  const grows = layer.kind[i - 1] === LAMINAR
  const { balance, here, before: ahead } = step
  const u = layer.u[i]
  const d = layer.m[i] / u
  const u1 = layer.u[i - 1]
  const d1 = layer.m[i - 1] / u1
  const inverse = invert3(here, d / u)
  // Coefficients of (q, t, m, u) before and farther, already multiplied by minus the inverse.
  const c = new Float64Array(12)
  const f = new Float64Array(12)
  const k0 = new Float64Array(3)
  const own = new Float64Array(3)
  const u2 = grows && i > 1 ? layer.u[i - 2] : 1
  const d2 = grows && i > 1 ? layer.m[i - 2] / u2 : 0
  const reach = grows && i > 1
  for (let p = 0; p < 3; p++) {
    for (let r = 0; r < 3; r++) {
      const v = -inverse[3 * p + r]
      const a = 4 * r
      const q = ahead[a] + (grows ? near[a] : 0)
      const t = ahead[a + 1] + (grows ? near[a + 1] : 0)
      const dd = ahead[a + 2] + (grows ? near[a + 2] : 0)
      const uu = ahead[a + 3] + (grows ? near[a + 3] : 0)
      c[4 * p] += v * q
      c[4 * p + 1] += v * t
      c[4 * p + 2] += (v * dd) / u1
      c[4 * p + 3] += v * (uu - (dd * d1) / u1)
      if (reach) {
        f[4 * p] += v * far[a]
        f[4 * p + 1] += v * far[a + 1]
        f[4 * p + 2] += (v * far[a + 2]) / u2
        f[4 * p + 3] += v * (far[a + 3] - (far[a + 2] * d2) / u2)
      }
      k0[p] += v * balance[r]
      own[p] += (v * here[a + 2]) / u
    }
  }
  const out = [rows.q, rows.t, rows.u]
  const out0 = [rows.q0, rows.t0, rows.u0]
  const to = g * size
  const from = before * size
  const from2 = farther * size
  for (let p = 0; p < 3; p++) {
    const row = out[p]
    const [cq, ct, cm, cu] = [c[4 * p], c[4 * p + 1], c[4 * p + 2], c[4 * p + 3]]
    for (let j = low; j <= high; j++)
      row[to + j] = cq * rows.q[from + j] + ct * rows.t[from + j] + cu * rows.u[from + j]
    let constant = k0[p] + cq * rows.q0[before] + ct * rows.t0[before] + cu * rows.u0[before]
    if ((reach && p === 0) || (reach && i === layer.transition.at)) {
      const [fq, ft, fm, fu] = [f[4 * p], f[4 * p + 1], f[4 * p + 2], f[4 * p + 3]]
      for (let j = low; j <= high; j++)
        row[to + j] += fq * rows.q[from2 + j] + ft * rows.t[from2 + j] + fu * rows.u[from2 + j]
      constant += fq * rows.q0[farther] + ft * rows.t0[farther] + fu * rows.u0[farther]
      row[to + farther] += fm
    }
    if (joined) {
      // The wake's first mass defect is the sum of both edges'.
      const nodes = g
      row[to] += cm
      row[to + nodes - 1] += cm
    } else row[to + before] += cm
    row[to + g] += own[p]
    out0[p][g] = constant
  }
}

/** Inverse of the 3 x 3 derivatives by (q, t, u) with m held: u also changes d = m/u. */
function invert3(here: Float64Array, dOverU: number): Float64Array {
  const out = new Float64Array(9)
  const a = here[0],
    b = here[1],
    c = here[3] - here[2] * dOverU
  const d = here[4],
    e = here[5],
    f = here[7] - here[6] * dOverU
  const g = here[8],
    h = here[9],
    k = here[11] - here[10] * dOverU
  const det = a * (e * k - f * h) - b * (d * k - f * g) + c * (d * h - e * g)
  const s = 1 / det
  out[0] = (e * k - f * h) * s
  out[1] = (c * h - b * k) * s
  out[2] = (b * f - c * e) * s
  out[3] = (f * g - d * k) * s
  out[4] = (a * k - c * g) * s
  out[5] = (c * d - a * f) * s
  out[6] = (d * h - e * g) * s
  out[7] = (b * g - a * h) * s
  out[8] = (a * e - b * d) * s
  return out
}
