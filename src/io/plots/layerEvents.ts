import type { PressureResult } from '../../core'
import type { LayerEventKind } from './plot'

/** An event of a boundary layer at a place of the surface. */
export interface LayerEvent {
  readonly kind: LayerEventKind
  readonly side: 'upper' | 'lower'
  readonly xOverC: number
}

/** Kinds of events in the order in which a legend names them. */
export const LAYER_EVENTS: readonly LayerEventKind[] = [
  'transition',
  'laminar separation',
  'reattachment',
  'turbulent separation',
]

/** What happens to the layers of a section, upper side first; a layer laminar to the edge has no transition. */
export function layerEvents(pressure: PressureResult | null | undefined): LayerEvent[] {
  const layers = pressure?.layers
  if (!layers) return []
  return (['upper', 'lower'] as const).flatMap((side) => {
    const { transition, laminarSeparation, reattachment, turbulentSeparation } = layers[side]
    const places = [transition < 1 ? transition : null, laminarSeparation, reattachment, turbulentSeparation]
    return places.flatMap((xOverC, i) => (xOverC === null ? [] : [{ kind: LAYER_EVENTS[i]!, side, xOverC }]))
  })
}
