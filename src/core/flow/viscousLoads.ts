import { cos, power, sin } from '../numerics/elementary'
import type { Layer } from './boundaryLayer/layer'
import type { Stream } from './boundaryLayer/stationRates'
import { nodeOf, type Layers } from './couplingState'
import type { ViscousSolution } from './interaction'
import { sideEvents, wallStress, type SideEvents } from './surfaceLayers'
import { compressiblePressure, criticalPressure } from './compressibility'
import type { PanelFlow } from './vortexPanels'

/** Loads on a section with its boundary layers; coefficients of chord 1, moment about the quarter chord. */
export interface ViscousLoads {
  readonly alpha: number
  readonly liftCoefficient: number
  /** From the momentum thickness of the far wake. */
  readonly dragCoefficient: number
  readonly frictionDrag: number
  /** Integral of the surface pressures, along the stream; a check, not the wake drag less friction. */
  readonly pressureDrag: number
  readonly momentCoefficient: number
  readonly pressureCoefficient: Float64Array
  readonly upper: SideEvents
  readonly lower: SideEvents
  /** True where the surface flow is faster than sound. */
  readonly sonic: boolean
}

/**
 * Loads from a coupled solution: pressures by Bernoulli's equation and the rule of von Karman and Tsien, lift
 * and moment from them, drag from the end of the computed wake by the formula of H. B. Squire and A. D. Young
 * (ARC R&M 1838, 1937), c_d = 2 t u^((H + 5)/2).
 */
export function viscousLoads(
  flow: PanelFlow,
  { layers, alpha }: ViscousSolution,
  stream: Stream,
): ViscousLoads {
  const { weights } = flow
  const nodes = flow.along.length
  const [ca, sa] = [cos(alpha), sin(alpha)]
  const pressureCoefficient = new Float64Array(nodes)
  let [fx, fy, moment, lowest] = [0, 0, 0, 1]
  const set = (layer: Layer, side: number): void => {
    for (let i = 0; i < layer.count; i++) {
      const cp = compressiblePressure(1 - layer.u[i] * layer.u[i], stream.mach)
      const g = nodeOf(layers.stagnation, side, i)
      pressureCoefficient[g] = cp
      lowest = Math.min(lowest, cp)
      fx += cp * weights.along[g]
      fy += cp * weights.across[g]
      moment += cp * weights.moment[g]
    }
  }
  set(layers.upper, 0)
  set(layers.lower, 1)
  const { wake } = layers
  const end = wake.count - 1
  const H = wake.m[end] / (wake.u[end] * wake.t[end])
  return {
    alpha,
    liftCoefficient: fy * ca - fx * sa,
    dragCoefficient: 2 * wake.t[end] * power(wake.u[end], (H + 5) / 2),
    frictionDrag: frictionOf(flow, layers, 0, ca, sa) + frictionOf(flow, layers, 1, ca, sa),
    pressureDrag: fx * ca + fy * sa,
    momentCoefficient: moment,
    pressureCoefficient,
    upper: sideEvents(flow, layers, 0),
    lower: sideEvents(flow, layers, 1),
    sonic: lowest < criticalPressure(stream.mach),
  }
}

/** Friction of a side along the stream: tau over the dynamic pressure is 2 u t times the friction rate. */
function frictionOf(flow: PanelFlow, layers: Layers, side: number, ca: number, sa: number): number {
  const { x, y } = flow.panels
  const layer = side === 0 ? layers.upper : layers.lower
  const shear = (i: number): number => wallStress(layer, i)
  let sum = 0
  for (let i = 1; i < layer.count; i++) {
    const g = nodeOf(layers.stagnation, side, i)
    const p = nodeOf(layers.stagnation, side, i - 1)
    sum += 0.5 * (shear(i) + shear(i - 1)) * ((x[g] - x[p]) * ca + (y[g] - y[p]) * sa)
  }
  return sum
}
