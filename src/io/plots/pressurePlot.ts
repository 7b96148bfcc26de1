import type { Comparison } from '../../core'
import { shownName } from '../entryName'
import type { Curve, Plot } from './plot'

/** Surface pressure of every entry at a condition, at the shown station, suction upward. */
export function pressurePlot(comparison: Comparison, condition: number): Plot {
  const curves = comparison.entries.flatMap((entry, index): Curve[] => {
    const pressure = entry.conditions[condition]?.pane?.pressure
    if (!pressure?.converged) return []
    const x = [...pressure.x]
    const states = x.map((xOverC) => ({ entry: index, alpha: pressure.alpha, xOverC }))
    return [{ entry: index, name: shownName(entry.name), x, y: [...pressure.pressureCoefficient], states }]
  })
  return {
    key: 'pressure',
    title: 'Pressure',
    x: { label: 'x/c', from: 0, to: 1 },
    y: { label: 'C_p', reversed: true, to: 1 },
    curves,
    marks: [],
    lines: [{ axis: 'y', at: 0 }],
  }
}
