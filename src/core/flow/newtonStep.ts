import type { Layer } from './boundaryLayer/layer'
import { LAMINAR } from './boundaryLayer/stationRates'
import type { Layers } from './couplingState'
import type { Answers } from './couplingRows'

/** Greatest relative changes that a full step may make. */
const GREATEST_RELATIVE = 0.6
const GREATEST_SPEED_CHANGE = 0.25
/** Least shape factor after a step; closures have none below 1, and false solutions with such layers exist. */
const LEAST_SHAPE = 1.05
/** A step is not shortened further for the sake of a few stations: those are held back alone. */
const LEAST_SCALE = 0.1

/** Stations of one part, their places in the linear relation, and the first that is an unknown. */
type Part = readonly [layer: Layer, place: (i: number) => number, first: number]

/**
 * Adds a step to the layers: `change` of the mass defects, times `share`, and what q, t and u answer to it by
 * `rows`; shortened so that no variable changes too much. Returns the greatest relative change that the whole
 * step would have made.
 */
export function newtonStep(layers: Layers, rows: Answers, change: Float64Array, share: number): number {
  const { upper, lower, wake, stagnation } = layers
  const nodes = upper.count + lower.count
  const parts: readonly Part[] = [
    [upper, (i) => stagnation - i, 0],
    [lower, (i) => stagnation + 1 + i, 0],
    [wake, (k) => nodes + k - 1, 1],
  ]
  const dq = answered(rows.q, rows.q0, change)
  const dt = answered(rows.t, rows.t0, change)
  const du = answered(rows.u, rows.u0, change)
  let scale = share
  let greatest = 0
  const limit = (size: number, most: number): void => {
    greatest = Math.max(greatest, size)
    if (size * scale > most) scale = most / size
  }
  for (const [layer, place] of parts) {
    for (let i = 1; i < layer.count; i++) {
      const g = place(i)
      limit(Math.abs(dt[g]) / layer.t[i], GREATEST_RELATIVE)
      limit(Math.abs(change[g]) / layer.m[i], GREATEST_RELATIVE)
      if (layer.kind[i] !== LAMINAR) limit(Math.abs(dq[g]) / layer.q[i], GREATEST_RELATIVE)
      limit(Math.abs(du[g]), GREATEST_SPEED_CHANGE)
    }
  }
  scale = Math.max(scale, LEAST_SCALE)
  const within = (change: number, most: number): number => Math.max(-most, Math.min(most, scale * change))
  for (const [layer, place, first] of parts) {
    const { kind, q, t, m, u } = layer
    // The first station's thickness and mass defect follow from its speed.
    if (first === 0) u[0] += within(du[place(0)], GREATEST_SPEED_CHANGE)
    for (let i = 1; i < layer.count; i++) {
      const g = place(i)
      if (kind[i] === LAMINAR) q[i] = Math.max(q[i] + scale * dq[g], 0)
      else q[i] += within(dq[g], GREATEST_RELATIVE * q[i])
      t[i] += within(dt[g], GREATEST_RELATIVE * t[i])
      m[i] += within(change[g], GREATEST_RELATIVE * m[i])
      u[i] += within(du[g], GREATEST_SPEED_CHANGE)
      if (layer !== wake) m[i] = Math.max(m[i], LEAST_SHAPE * t[i] * u[i])
    }
  }
  return greatest
}

/** Rows times the change, plus the constant. */
function answered(rows: Float64Array, constant: Float64Array, change: Float64Array): Float64Array {
  const size = change.length
  const out = new Float64Array(size)
  for (let g = 0, row = 0; g < size; g++, row += size) {
    let sum = constant[g]
    for (let j = 0; j < size; j++) sum += rows[row + j] * change[j]
    out[g] = sum
  }
  return out
}
