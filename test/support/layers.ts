import { emptyLayer, type Layer, type TransitionLaw } from '../../src/core/flow/boundaryLayer/layer'
import { marchLayer } from '../../src/core/flow/boundaryLayer/march'
import { LAMINAR, TURBULENT } from '../../src/core/flow/boundaryLayer/stationRates'
import { newStep } from '../../src/core/flow/boundaryLayer/stationStep'

/** No transition: laminar to the end. */
export const LAMINAR_TO_THE_END: TransitionLaw = { amplification: Infinity, forcedAt: Infinity }

/** How a layer of a test begins. */
export interface LayerStart {
  readonly momentum: number
  readonly shape: number
  /** Root of the shear stress coefficient for a layer that starts turbulent; null when laminar. */
  readonly shearRoot: number | null
}

/** A layer at the places `x` under prescribed edge speeds, marched from its start; `failed` as marchLayer says. */
export function marched(
  x: readonly number[],
  speed: (x: number) => number,
  reynolds: number,
  start: LayerStart,
  law: TransitionLaw = LAMINAR_TO_THE_END,
): { layer: Layer; failed: number } {
  const layer = emptyLayer(x.length)
  layer.x.set(x)
  layer.u.set(x.map(speed))
  layer.kind[0] = start.shearRoot === null ? LAMINAR : TURBULENT
  layer.q[0] = start.shearRoot ?? 0
  layer.t[0] = start.momentum
  layer.m[0] = start.momentum * start.shape * layer.u[0]
  const edge = {
    speed: Float64Array.from(layer.u),
    answer: new Float64Array(x.length),
    defect: new Float64Array(x.length),
  }
  const failed = marchLayer(layer, newStep(), { reynolds, mach: 0 }, law, edge, 1, false)
  return { layer, failed }
}

/** Displacement over momentum thickness at a station. */
export const shapeOf = (layer: Layer, i: number): number => layer.m[i] / (layer.u[i] * layer.t[i])

/** Friction coefficient c_f at a station: its rate is c_f/2 u/t. */
export const frictionOf = (layer: Layer, i: number): number =>
  (2 * layer.rates[i][0] * layer.t[i]) / layer.u[i]

/** Blasius's layer at a distance x from the edge of a plate. */
export const blasius = (x: number, reynolds: number): LayerStart => ({
  momentum: 0.664114672 * Math.sqrt(x / reynolds),
  shape: 2.591100195,
  shearRoot: null,
})

/** n + 1 places from a to b, each a fixed ratio from the one before. */
export const geometric = (a: number, b: number, n: number): number[] =>
  Array.from({ length: n + 1 }, (_, i) => a * (b / a) ** (i / n))
