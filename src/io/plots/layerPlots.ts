import type { Comparison, SideLayer } from '../../core'
import { shownName } from '../entryName'
import { stateOf, type Axis, type Curve, type Plot } from './plot'

interface Kind {
  readonly key: string
  readonly title: string
  readonly y: Axis
  readonly read: (layer: SideLayer) => Float64Array
}

const X: Axis = { label: 'x/c', symbol: 'x/c', unit: '', decimals: 2, from: 0, to: 1 }

const KINDS: readonly Kind[] = [
  {
    ...{ key: 'shape factor', title: 'Shape factor', read: (layer) => layer.shapeFactor },
    y: { label: 'shape factor H', symbol: 'H', unit: '', decimals: 2, from: 1 },
  },
  {
    ...{ key: 'momentum thickness', title: 'Momentum thickness', read: (layer) => layer.momentumThickness },
    y: { label: 'thickness θ/c', symbol: 'θ/c', unit: '', decimals: 5, from: 0 },
  },
  {
    ...{ key: 'friction', title: 'Friction coefficient', read: (layer) => layer.frictionCoefficient },
    y: { label: 'friction c_f', symbol: 'c_f', unit: '', decimals: 5 },
  },
  {
    ...{ key: 'amplification', title: 'Amplification', read: (layer) => layer.amplification },
    y: { label: 'exponent N', symbol: 'N', unit: '', decimals: 1, from: 0 },
  },
]

/** The boundary layers of every entry at a condition, at the shown station: both sides, four quantities. */
export function layerPlots(comparison: Comparison, condition: number): Plot[] {
  return KINDS.map(({ key, title, y, read }) => ({
    ...{ key, title, x: X, y, marks: [] },
    curves: comparison.entries.flatMap((entry, index): Curve[] => {
      const pressure = entry.conditions[condition]?.pane?.pressure
      const layers = pressure?.layers
      if (!layers) return []
      return (['upper', 'lower'] as const).map((side) => {
        const { x, y: values } = finite(layers[side].x, read(layers[side]))
        const states = x.map((xOverC) => stateOf(index, { alpha: pressure!.alpha, xOverC, side }))
        return { entry: index, name: shownName(entry.name), x, y: values, states, side }
      })
    }),
    lines: key === 'friction' ? [{ axis: 'y' as const, at: 0 }] : [],
  }))
}

/** Stations that have the value: amplification ends at transition. */
function finite(x: Float64Array, values: Float64Array): { x: number[]; y: number[] } {
  const kept = Array.from(x, (_, i) => i).filter((i) => Number.isFinite(values[i]!))
  return { x: kept.map((i) => x[i]!), y: kept.map((i) => values[i]!) }
}
