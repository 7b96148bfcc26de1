import type { Comparison, StationState } from '../../core'
import { shownName } from '../entryName'
import { DEGREES, stateOf, type Axis, type Curve, type Plot } from './plot'

/** Local lift and induced angle of every entry along the half span at a condition. */
export function spanPlots(comparison: Comparison, condition: number): Plot[] {
  const curvesOf = (read: (station: StationState) => number): Curve[] =>
    comparison.entries.flatMap((entry, index): Curve[] => {
      const wing = entry.conditions[condition]?.wing
      if (!wing) return []
      const { stations } = wing
      return [
        {
          entry: index,
          name: shownName(entry.name),
          x: stations.map((station) => station.y),
          y: stations.map(read),
          states: stations.map((station) => stateOf(index, { spanY: station.y })),
        },
      ]
    })
  const x: Axis = {
    ...{ label: 'distance from the centreline, m', symbol: 'y', unit: ' m', decimals: 2 },
    ...{ from: 0, to: comparison.wing.span / 2 },
  }
  const lines = [{ axis: 'x' as const, at: comparison.stationY }]
  return [
    {
      ...{ key: 'span lift', title: 'Local lift along the span', x, lines, marks: [] },
      y: { label: 'local lift c_l', symbol: 'c_l', unit: '', decimals: 3 },
      curves: curvesOf((station) => station.liftCoefficient),
    },
    {
      ...{ key: 'induced angle', title: 'Induced angle along the span', x, lines, marks: [] },
      y: { label: 'induced angle, deg', symbol: 'angle', unit: '°', decimals: 2 },
      curves: curvesOf((station) => station.inducedAngle * DEGREES),
    },
  ]
}
