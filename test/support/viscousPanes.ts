import type { Comparison, SideLayer, SurfaceLayers } from '../../src/core'

type Pane = NonNullable<Comparison['entries'][0]['conditions'][0]['pane']>

/** A comparison whose panes with a polar are changed. */
export function withPane(comparison: Comparison, change: (pane: Pane) => Pane): Comparison {
  return {
    ...comparison,
    entries: comparison.entries.map((entry) => ({
      ...entry,
      conditions: entry.conditions.map((state) =>
        state.pane?.polar ? { ...state, pane: change(state.pane) } : state,
      ),
    })),
  }
}

/** Layers with a bubble on the upper side and a separated edge on the lower one: invented numbers. */
export function inventedLayers(): SurfaceLayers {
  const x = Float64Array.from({ length: 51 }, (_, i) => i / 50)
  const side = (
    transition: number,
  ): Omit<SideLayer, 'laminarSeparation' | 'reattachment' | 'turbulentSeparation'> => ({
    x,
    transition,
    momentumThickness: x.map((at) => 0.003 * at),
    shapeFactor: x.map((at) => (at < transition ? 2.6 + at : 1.5)),
    frictionCoefficient: x.map((at) => 0.004 / (0.1 + at)),
    amplification: x.map((at) => (at < transition ? 9 * (at / transition) : Number.NaN)),
  })
  return {
    upper: { ...side(0.6), laminarSeparation: 0.55, reattachment: 0.65, turbulentSeparation: null },
    lower: { ...side(1), laminarSeparation: null, reattachment: null, turbulentSeparation: 0.9 },
    dragCoefficient: 0.01,
    frictionDrag: 0.007,
    pressureDrag: 0.003,
  }
}
