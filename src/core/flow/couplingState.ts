import { cos, hypot, sin } from '../numerics/elementary'
import { emptyLayer, type Layer, type TransitionLaw } from './boundaryLayer/layer'
import { refreshStation } from './boundaryLayer/march'
import { stagnationLayer } from './boundaryLayer/stagnation'
import {
  EQUILIBRIUM,
  LAMINAR,
  RATES_LENGTH,
  stationRates,
  TURBULENT,
  WAKE,
  type Stream,
} from './boundaryLayer/stationRates'
import { STARTING_SHEAR_SHARE } from './boundaryLayer/turbulentClosure'
import type { DisplacementAnswer } from './displacement'
import { WAKE_STATIONS } from './wake'
import type { PanelFlow } from './vortexPanels'

/** What a coupled solution is asked for, besides the angle. */
export interface ViscousSetting {
  readonly stream: Stream
  readonly amplification: number
  /** x/c of forced transition, 1 when free. */
  readonly tripUpper: number
  readonly tripLower: number
}

/** Both layers and the wake of a section. The upper layer's station i is node `stagnation` - i. */
export interface Layers {
  /** The flow divides between this node and the next. */
  readonly stagnation: number
  readonly upper: Layer
  readonly lower: Layer
  readonly wake: Layer
  readonly upperLaw: TransitionLaw
  readonly lowerLaw: TransitionLaw
}

const START = stagnationLayer()

/** Arc length at the nodes from the upper trailing edge. */
export function arcLength({ panels: { x, y } }: PanelFlow): Float64Array {
  const s = new Float64Array(x.length)
  for (let i = 1; i < s.length; i++) s[i] = s[i - 1] + hypot(x[i] - x[i - 1], y[i] - y[i - 1])
  return s
}

/** Node that a station of the upper (side 0) or lower layer stands on. */
export const nodeOf = (stagnation: number, side: number, i: number): number =>
  side === 0 ? stagnation - i : stagnation + 1 + i

/**
 * Layers with their stations placed for flow that divides behind node `stagnation`, values zero. Distances
 * start at that node's share of the interval for the first station's `speeds` ratio, which only places trips.
 */
export function layersAt(
  flow: PanelFlow,
  s: Float64Array,
  stagnation: number,
  wakeS: Float64Array,
  setting: ViscousSetting,
): Layers {
  const n = s.length - 1
  const upper = emptyLayer(stagnation + 1)
  const lower = emptyLayer(n - stagnation)
  const wake = emptyLayer(WAKE_STATIONS + 1)
  const middle = 0.5 * (s[stagnation] + s[stagnation + 1])
  for (let i = 0; i < upper.count; i++) upper.x[i] = middle - s[stagnation - i]
  for (let i = 0; i < lower.count; i++) lower.x[i] = s[stagnation + 1 + i] - middle
  wake.x.set(wakeS)
  wake.kind.fill(WAKE)
  return { stagnation, upper, lower, wake, ...lawsOf(flow, stagnation, upper, lower, setting) }
}

/** The same layers under the transition laws of another setting. */
export function withLaws(flow: PanelFlow, layers: Layers, setting: ViscousSetting): Layers {
  return { ...layers, ...lawsOf(flow, layers.stagnation, layers.upper, layers.lower, setting) }
}

function lawsOf(
  flow: PanelFlow,
  stagnation: number,
  upper: Layer,
  lower: Layer,
  { amplification, tripUpper, tripLower }: ViscousSetting,
): { upperLaw: TransitionLaw; lowerLaw: TransitionLaw } {
  const law = (layer: Layer, side: number, trip: number): TransitionLaw => ({
    amplification,
    forcedAt: tripPlace(flow, layer, stagnation, side, trip),
  })
  return { upperLaw: law(upper, 0, tripUpper), lowerLaw: law(lower, 1, tripLower) }
}

/** Distance along a layer at which x/c reaches `trip` on the way to the trailing edge; Infinity when free. */
function tripPlace(flow: PanelFlow, layer: Layer, stagnation: number, side: number, trip: number): number {
  if (trip >= 1) return Infinity
  const { x } = flow.panels
  for (let i = layer.count - 1; i > 0; i--) {
    const here = x[nodeOf(stagnation, side, i)]
    const before = x[nodeOf(stagnation, side, i - 1)]
    if (before <= trip && here > trip) {
      return layer.x[i - 1] + ((trip - before) / (here - before)) * (layer.x[i] - layer.x[i - 1])
    }
  }
  return 0
}

/** Sets the first station of both sides: the similar layer of the stagnation point between them. */
export function startLayers({ upper, lower, stagnation }: Layers, s: Float64Array, stream: Stream): void {
  const gap = s[stagnation + 1] - s[stagnation]
  const t = START.thickness * Math.sqrt(gap / (stream.reynolds * (upper.u[0] + lower.u[0])))
  for (const layer of [upper, lower]) {
    layer.kind[0] = LAMINAR
    layer.q[0] = 0
    layer.t[0] = t
    layer.m[0] = layer.u[0] * START.shape * t
    refreshStation(layer, 0, stream)
  }
}

export const STAGNATION_SHAPE = START.shape
export const STAGNATION_THICKNESS = START.thickness

const scratch = new Float64Array(RATES_LENGTH)

/** Root of the shear stress with which a side enters the wake: a laminar side turns turbulent there. */
export function edgeShear(layer: Layer, stream: Stream): number {
  const i = layer.count - 1
  if (layer.kind[i] !== LAMINAR) return layer.q[i]
  stationRates(scratch, TURBULENT, stream, 0.03, layer.t[i], layer.m[i] / layer.u[i], layer.u[i])
  return Math.sqrt(STARTING_SHEAR_SHARE) * scratch[EQUILIBRIUM]
}

/** Joins both sides into the wake's first station: thicknesses add, shear stress is their weighted mean. */
export function joinWake({ upper, lower, wake }: Layers, stream: Stream): void {
  const a = upper.count - 1
  const b = lower.count - 1
  wake.kind[0] = WAKE
  wake.t[0] = upper.t[a] + lower.t[b]
  wake.m[0] = upper.m[a] + lower.m[b]
  wake.u[0] = 0.5 * (upper.u[a] + lower.u[b])
  wake.q[0] = (edgeShear(upper, stream) * upper.t[a] + edgeShear(lower, stream) * lower.t[b]) / wake.t[0]
  refreshStation(wake, 0, stream)
}

/** Sizes of speed and mass defect in node order, then wake: where station values go in the linear relation. */
export function gather(layers: Layers, speed: Float64Array, defect: Float64Array): void {
  const { upper, lower, wake, stagnation } = layers
  for (let i = 0; i < upper.count; i++) {
    speed[stagnation - i] = upper.u[i]
    defect[stagnation - i] = upper.m[i]
  }
  const start = stagnation + 1
  for (let i = 0; i < lower.count; i++) {
    speed[start + i] = lower.u[i]
    defect[start + i] = lower.m[i]
  }
  for (let k = 1; k < wake.count; k++) {
    speed[start + lower.count + k - 1] = wake.u[k]
    defect[start + lower.count + k - 1] = wake.m[k]
  }
}

/** Edge speeds that the potential flow gives for the signed mass defects, as vorticity and wake speeds. */
export function answeredSpeeds(
  answer: DisplacementAnswer,
  alpha: number,
  stagnation: number,
  defect: Float64Array,
  out: Float64Array,
): void {
  const { size, along, across, matrix, deadAir } = answer
  const [ca, sa] = [cos(alpha), sin(alpha)]
  for (let i = 0; i < size; i++) {
    let sum = along[i] * ca + across[i] * sa + deadAir[i]
    const row = i * size
    for (let j = 0; j <= stagnation; j++) sum -= matrix[row + j] * defect[j]
    for (let j = stagnation + 1; j < size; j++) sum += matrix[row + j] * defect[j]
    out[i] = sum
  }
}

/** A copy that can be used up while the original stays. */
export function copyLayers(layers: Layers): Layers {
  const copy = (layer: Layer): Layer => {
    const to = emptyLayer(layer.count)
    to.x.set(layer.x)
    to.kind.set(layer.kind)
    to.q.set(layer.q)
    to.t.set(layer.t)
    to.m.set(layer.m)
    to.u.set(layer.u)
    layer.rates.forEach((row, i) => to.rates[i].set(row))
    Object.assign(to.transition, layer.transition)
    return to
  }
  return { ...layers, upper: copy(layers.upper), lower: copy(layers.lower), wake: copy(layers.wake) }
}
