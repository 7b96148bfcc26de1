import type { Comparison } from '../../core'
import { shownName } from '../entryName'
import { layerEvents } from './layerEvents'
import { stateOf, type Curve, type Plot, type PlotEvent } from './plot'

/** The stagnation value grows with the Mach number: an axis that must end above 1 leaves this room. */
const ROOM = 0.02

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
  const highest = curves.reduce((most, curve) => Math.max(most, ...curve.y), 1)
  return {
    key: 'pressure',
    title: 'Pressure',
    x: { label: 'x/c', symbol: 'x/c', unit: '', decimals: 2, from: 0, to: 1 },
    y: {
      label: 'C_p',
      symbol: 'C_p',
      unit: '',
      decimals: 2,
      reversed: true,
      to: highest > 1 ? highest + ROOM : 1,
    },
    curves,
    marks: [],
    lines: [{ axis: 'y', at: 0 }],
    events: curves.flatMap((curve) =>
      eventsOn(curve, layerEvents(comparison.entries[curve.entry]!.conditions[condition]!.pane!.pressure)),
    ),
  }
}

/** Events laid on the curve of pressure, straight between its points. */
function eventsOn({ entry, x, y, states }: Curve, events: ReturnType<typeof layerEvents>): PlotEvent[] {
  return events.flatMap(({ kind, side, xOverC }) => {
    const k = x.findIndex(
      (at, i) =>
        i > 0 &&
        states[i]!.side === side &&
        Math.min(x[i - 1]!, at) <= xOverC &&
        xOverC <= Math.max(x[i - 1]!, at),
    )
    if (k < 0) return []
    const share = (xOverC - x[k - 1]!) / (x[k]! - x[k - 1]! || 1)
    return [{ entry, kind, x: xOverC, y: y[k - 1]! + share * (y[k]! - y[k - 1]!) }]
  })
}
