import type { Layer } from './boundaryLayer/layer'
import { FRICTION, LAMINAR } from './boundaryLayer/stationRates'
import { nodeOf, type Layers } from './couplingState'
import type { PanelFlow } from './vortexPanels'

/** Places on one side, x/c; null where the event does not occur. */
export interface SideEvents {
  /** Where the flow turns turbulent; 1 when laminar to the trailing edge. */
  readonly transition: number
  readonly laminarSeparation: number | null
  /** Where the flow behind a laminar separation closes on the surface again. */
  readonly reattachment: number | null
  readonly turbulentSeparation: number | null
}

/** One side's layer from the stagnation point to the trailing edge; one number a station in each array. */
export interface SideLayer extends SideEvents {
  /** x/c */
  readonly x: Float64Array
  /** Chords. */
  readonly momentumThickness: Float64Array
  readonly shapeFactor: Float64Array
  /** Wall stress over the dynamic pressure of the stream. */
  readonly frictionCoefficient: Float64Array
  /** Amplification exponent N up to transition, not a number behind it. */
  readonly amplification: Float64Array
}

/** The boundary layers of a section at one angle, and its drag. */
export interface SurfaceLayers {
  readonly upper: SideLayer
  readonly lower: SideLayer
  /** From the far wake. */
  readonly dragCoefficient: number
  readonly frictionDrag: number
  /** Integral of the surface pressures along the stream: a check on the wake's drag. */
  readonly pressureDrag: number
}

/** A side's layer (0 upper, 1 lower) as the user sees it. */
export function sideLayer(flow: PanelFlow, layers: Layers, side: 0 | 1): SideLayer {
  const layer = side === 0 ? layers.upper : layers.lower
  const each = (of: (i: number) => number): Float64Array => Float64Array.from(layer.t, (_, i) => of(i))
  return {
    ...sideEvents(flow, layers, side),
    x: each((i) => flow.panels.x[nodeOf(layers.stagnation, side, i)]),
    momentumThickness: Float64Array.from(layer.t),
    shapeFactor: each((i) => layer.m[i] / (layer.u[i] * layer.t[i])),
    frictionCoefficient: each((i) => wallStress(layer, i)),
    amplification: each((i) => (layer.kind[i] === LAMINAR ? layer.q[i] : Number.NaN)),
  }
}

/** Wall stress at a station over the dynamic pressure of the stream: 2 u t times the friction rate. */
export function wallStress({ rates, t, u }: Layer, i: number): number {
  return 2 * rates[i][FRICTION] * t[i] * u[i]
}

/** Transition, separation and reattachment of a side: zeros of the friction, found by straight lines between stations. */
export function sideEvents(flow: PanelFlow, layers: Layers, side: number): SideEvents {
  const { x } = flow.panels
  const layer = side === 0 ? layers.upper : layers.lower
  const between = (i: number, share: number): number => {
    const g = x[nodeOf(layers.stagnation, side, i)]
    const p = x[nodeOf(layers.stagnation, side, i - 1)]
    return p + share * (g - p)
  }
  const { at, share } = layer.transition
  const transition = at >= layer.count ? 1 : Math.max(0, Math.min(between(Math.max(at, 1), share), 1))
  let [laminarSeparation, reattachment, turbulentSeparation]: (number | null)[] = [null, null, null]
  for (let i = 1; i < layer.count; i++) {
    const before = layer.rates[i - 1][FRICTION]
    const here = layer.rates[i][FRICTION]
    if (before >= 0 === here >= 0) continue
    const place = between(i, before / (before - here))
    if (here < 0) {
      if (layer.kind[i] === LAMINAR) laminarSeparation ??= place
      else turbulentSeparation = place
    } else if (laminarSeparation !== null && reattachment === null) reattachment = place
    else turbulentSeparation = null
  }
  return { transition, laminarSeparation, reattachment, turbulentSeparation }
}
