import type { Layer, TransitionLaw } from './boundaryLayer/layer'
import {
  EQUILIBRIUM,
  GROWTH,
  LAMINAR,
  RATES_LENGTH,
  stationRates,
  TURBULENT,
  type Stream,
} from './boundaryLayer/stationRates'
import { meanGrowth, stationStep, type Step } from './boundaryLayer/stationStep'
import { STARTING_SHEAR_SHARE } from './boundaryLayer/turbulentClosure'
import { edgeShear, STAGNATION_SHAPE, STAGNATION_THICKNESS, type Layers } from './couplingState'

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

/** Fills `rows` for the present state of the layers; returns the greatest balance met. */
export function linearise(rows: Answers, layers: Layers, step: Step, stream: Stream, gap: number): number {
  const { size } = rows
  rows.q.fill(0)
  rows.t.fill(0)
  rows.u.fill(0)
  const { upper, lower, wake, stagnation } = layers
  const worst = { value: 0 }
  startRows(rows, layers, stream, gap, worst)
  side(rows, upper, layers.upperLaw, step, stream, stagnation, -1, stagnation + 1, worst)
  side(rows, lower, layers.lowerLaw, step, stream, stagnation + 1, 1, stagnation, worst)
  joinRows(rows, layers, stream)
  const nodes = upper.count + lower.count
  for (let k = 1; k < wake.count; k++) {
    const g = nodes + k - 1
    stationStep(step, wake, k, stream, wake.q[k], wake.t[k], wake.m[k] / wake.u[k], wake.u[k])
    note(worst, step)
    advance(rows, wake, k, step, g, k === 1 ? size : g - 1, k === 1 ? size : g - 1, 0, nodes + k - 2, k === 1)
  }
  return worst.value
}

function note(worst: { value: number }, { balance }: Step): void {
  worst.value = Math.max(worst.value, Math.abs(balance[0]), Math.abs(balance[1]), Math.abs(balance[2]))
}

/** First stations: t falls with the root of u_a + u_b, and m = u H t on either side. */
function startRows(
  rows: Answers,
  { upper, lower, stagnation }: Layers,
  { reynolds }: Stream,
  gap: number,
  worst: { value: number },
): void {
  const sum = upper.u[0] + lower.u[0]
  const t = STAGNATION_THICKNESS * Math.sqrt(gap / (reynolds * sum))
  const at = [stagnation, stagnation + 1]
  const first = [upper, lower]
  // Logarithmic errors of t and of m = u H t.
  const r = first.map((layer) => layer.t[0] / t - 1)
  const e = first.map((layer) => layer.m[0] / (layer.u[0] * STAGNATION_SHAPE * layer.t[0]) - 1)
  const share = first.map((layer) => layer.u[0] / sum)
  for (let a = 0; a < 2; a++) worst.value = Math.max(worst.value, Math.abs(r[a]), Math.abs(e[a]))
  // d ln(u_a + u_b) = 2 sum of share (d ln m + r + e)
  const constant = 2 * (share[0] * (r[0] + e[0]) + share[1] * (r[1] + e[1]))
  for (let a = 0; a < 2; a++) {
    const g = at[a]
    const layer = first[a]
    rows.q0[g] = 0
    rows.t0[g] = layer.t[0] * (-0.5 * constant - r[a])
    rows.u0[g] = layer.u[0] * (e[a] + 0.5 * constant + r[a])
    for (let b = 0; b < 2; b++) {
      const bySum = 2 / (sum * STAGNATION_SHAPE * first[b].t[0])
      rows.t[g * rows.size + at[b]] = -0.5 * layer.t[0] * bySum
      rows.u[g * rows.size + at[b]] =
        0.5 * layer.u[0] * bySum + (a === b ? 1 / (STAGNATION_SHAPE * layer.t[0]) : 0)
    }
  }
}

function side(
  rows: Answers,
  layer: Layer,
  law: TransitionLaw,
  step: Step,
  stream: Stream,
  first: number,
  direction: 1 | -1,
  other: number,
  worst: { value: number },
): void {
  for (let i = 1; i < layer.count; i++) {
    const g = first + direction * i
    if (layer.kind[i - 1] === LAMINAR) meanGrowth(step, layer, i)
    stationStep(step, layer, i, stream, layer.q[i], layer.t[i], layer.m[i] / layer.u[i], layer.u[i])
    note(worst, step)
    const before = g - direction
    const farther = i > 1 ? before - direction : before
    if (layer.kind[i - 1] === LAMINAR) amplify(step, layer, i, law)
    advance(rows, layer, i, step, g, before, farther, Math.min(before, other), Math.max(before, other), false)
  }
}

/** Derivatives of the amplification over the interval by (q, t, d, u) of the two stations before. */
const near = new Float64Array(12)
const far = new Float64Array(12)
const CLEAR = new Float64Array(12)

/** Fills `near` and `far` with what the growth of amplification adds to the balances' derivatives. */
function amplify(step: Step, layer: Layer, i: number, law: TransitionLaw): void {
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
function advance(
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

const scratch = new Float64Array(RATES_LENGTH)

/** Row `size`: the wake's first station from both trailing edges. */
function joinRows(rows: Answers, layers: Layers, stream: Stream): void {
  const { size } = rows
  const { upper, lower, wake } = layers
  const nodes = upper.count + lower.count
  const to = size * size
  const sides: readonly (readonly [Layer, number])[] = [
    [upper, 0],
    [lower, nodes - 1],
  ]
  rows.q0[size] = rows.t0[size] = rows.u0[size] = 0
  for (const [layer, g] of sides) {
    const i = layer.count - 1
    const from = g * size
    const shear = edgeShear(layer, stream)
    const share = layer.t[i] / wake.t[0]
    let [byQ, byT, byM, byU] = [share, (shear - wake.q[0]) / wake.t[0], 0, 0]
    if (layer.kind[i] === LAMINAR) {
      const d = layer.m[i] / layer.u[i]
      stationRates(scratch, TURBULENT, stream, 0.03, layer.t[i], d, layer.u[i])
      const root = Math.sqrt(STARTING_SHEAR_SHARE) * share
      byQ = 0
      byT += root * scratch[EQUILIBRIUM + 2]
      byM = (root * scratch[EQUILIBRIUM + 3]) / layer.u[i]
      byU = root * (scratch[EQUILIBRIUM + 4] - (scratch[EQUILIBRIUM + 3] * d) / layer.u[i])
    }
    for (let j = 0; j < size; j++) {
      rows.t[to + j] += rows.t[from + j]
      rows.u[to + j] += 0.5 * rows.u[from + j]
      rows.q[to + j] += byQ * rows.q[from + j] + byT * rows.t[from + j] + byU * rows.u[from + j]
    }
    rows.q[to + g] += byM
    rows.t0[size] += rows.t0[g]
    rows.u0[size] += 0.5 * rows.u0[g]
    rows.q0[size] += byQ * rows.q0[g] + byT * rows.t0[g] + byU * rows.u0[g]
  }
}
