import type { Layer, TransitionLaw } from './boundaryLayer/layer'
import {
  EQUILIBRIUM,
  LAMINAR,
  RATES_LENGTH,
  stationRates,
  TURBULENT,
  type Stream,
} from './boundaryLayer/stationRates'
import { meanGrowth, stationStep, type Step } from './boundaryLayer/stationStep'
import { STARTING_SHEAR_SHARE } from './boundaryLayer/turbulentClosure'
import { advance, amplify, type Answers } from './couplingRows'
import { edgeShear, STAGNATION_SHAPE, STAGNATION_THICKNESS, type Layers } from './couplingState'

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
