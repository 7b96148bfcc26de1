import type { Comparison } from '../../core'
import { shownName } from '../entryName'
import { stateOf, type Curve, type Plot } from './plot'

/** Surface pressure of every entry at a condition, at the shown station, suction upward. */
export function pressurePlot(comparison: Comparison, condition: number): Plot {
  const curves = comparison.entries.flatMap((entry, index): Curve[] => {
    const pressure = entry.conditions[condition]?.pane?.pressure
    if (!pressure?.converged) return []
    const { alpha } = pressure
    const x = [...pressure.x]
    // The outline runs from the upper trailing edge round the nose to the lower one.
    const nose = x.indexOf(Math.min(...x))
    const states = x.map((xOverC, i) =>
      stateOf(index, { alpha, xOverC, side: i <= nose ? 'upper' : 'lower' }),
    )
    return [{ entry: index, name: shownName(entry.name), x, y: [...pressure.pressureCoefficient], states }]
  })
  return {
    key: 'pressure',
    title: 'Pressure',
    x: { label: 'x/c', symbol: 'x/c', unit: '', decimals: 2, from: 0, to: 1 },
    y: { label: 'C_p', symbol: 'C_p', unit: '', decimals: 2, reversed: true, to: 1 },
    curves,
    marks: [],
    lines: [{ axis: 'y', at: 0 }],
  }
}
