import type { ChartConfiguration, ChartDataset } from 'chart.js'
import type { Plot, PointState } from '../../io/plots/plot'
import type { EntryStyle } from '../style/palette'

type LineSet = ChartDataset<'line', { x: number; y: number }[]>

/** Reads the value of a style-sheet colour where the chart stands. */
export type ColourOf = (name: string) => string

/** The point of a curve that shows a hovered state best: the nearest in place, else in angle. */
export function pointOfState(states: readonly PointState[], hover: PointState): number {
  const distance = (state: PointState): number =>
    hover.xOverC !== null && state.xOverC !== null
      ? Math.abs(state.xOverC - hover.xOverC)
      : hover.alpha !== null && state.alpha !== null && state.xOverC === null
        ? Math.abs(state.alpha - hover.alpha)
        : Infinity
  let best = -1
  let least = Infinity
  states.forEach((state, i) => {
    if (distance(state) < least) [best, least] = [i, distance(state)]
  })
  return best
}

/** What the chart library draws for a plot. */
export function chartOf(
  plot: Plot,
  styles: readonly EntryStyle[],
  hover: PointState | null,
  colourOf: ColourOf,
): ChartConfiguration<'line', { x: number; y: number }[]> {
  const ink = colourOf('var(--ink-soft)')
  const grid = colourOf('var(--line)')
  const colour = (entry: number): string => colourOf(styles[entry]?.colour ?? 'var(--ink)')
  const curves = plot.curves.map((curve): LineSet => ({
    label: curve.name,
    data: curve.x.map((x, i) => ({ x, y: curve.y[i]! })),
    borderColor: colour(curve.entry),
    borderDash: [...(styles[curve.entry]?.dash ?? [])],
    borderWidth: hover?.entry === curve.entry ? 2.6 : 1.7,
    pointRadius: 0,
    pointHitRadius: 0,
  }))
  const points = (
    data: { x: number; y: number }[],
    entry: number,
    radius: number,
    filled: boolean,
  ): LineSet => ({
    data,
    showLine: false,
    borderColor: colour(entry),
    pointStyle: styles[entry]?.marker ?? 'circle',
    pointRadius: radius,
    pointBorderWidth: 1.8,
    pointBackgroundColor: filled ? colour(entry) : 'transparent',
    pointBorderColor: colour(entry),
  })
  const marks = plot.marks.map(({ entry, x, y }) => points([{ x, y }], entry, 4, true))
  const hovered = plot.curves.flatMap((curve) => {
    const i = hover === null ? -1 : pointOfState(curve.states, hover)
    return i < 0 ? [] : [points([{ x: curve.x[i]!, y: curve.y[i]! }], curve.entry, 6, false)]
  })
  const axis = (which: 'x' | 'y') => {
    const { label, reversed } = plot[which]
    const { from, to, step } = axisRange(plot, which)
    return {
      type: 'linear' as const,
      reverse: reversed ?? false,
      min: from,
      max: to,
      title: { display: true, text: label, color: ink, font: { size: 11 } },
      ticks: { color: ink, font: { size: 11 }, stepSize: step, maxTicksLimit: 9, maxRotation: 0 },
      border: { color: grid },
      grid: { color: grid, lineWidth: 0.7 },
    }
  }
  return {
    type: 'line',
    data: { datasets: [...referenceLines(plot, ink), ...curves, ...marks, ...hovered] },
    options: {
      animation: false,
      responsive: true,
      maintainAspectRatio: false,
      events: [],
      plugins: { legend: { display: false }, tooltip: { enabled: false } },
      scales: { x: axis('x'), y: axis('y') },
    },
  }
}

/** Lines across the plot, from end to end of what is drawn. */
function referenceLines(plot: Plot, ink: string): LineSet[] {
  return plot.lines.map(({ axis, at }): LineSet => {
    const other = axis === 'x' ? 'y' : 'x'
    const values = plot.curves.flatMap((curve) => curve[other])
    const low = plot[other].from ?? Math.min(...values)
    const high = plot[other].to ?? Math.max(...values)
    const ends = [low, high].map((end) => (axis === 'x' ? { x: at, y: end } : { x: end, y: at }))
    return { data: ends, borderColor: ink, borderWidth: 1, borderDash: [3, 3], pointRadius: 0 }
  })
}

/** Steps that an axis goes in, times a power of ten. */
const NICE = [1, 2, 2.5, 5, 10]
const ABOUT_STEPS = 5

/** Ends and step of an axis: round numbers just outside what is drawn, unless the plot gives its ends. */
function axisRange(plot: Plot, which: 'x' | 'y'): { from: number; to: number; step: number } {
  const axis = plot[which]
  const values = plot.curves.flatMap((curve) => curve[which])
  const low = axis.from ?? (values.length > 0 ? Math.min(...values) : 0)
  const high = axis.to ?? (values.length > 0 ? Math.max(...values) : 1)
  const span = high - low || 1
  const power = 10 ** Math.floor(Math.log10(span / ABOUT_STEPS))
  const step = power * (NICE.find((nice) => nice * power * ABOUT_STEPS >= span) ?? 10)
  return {
    from: axis.from ?? step * Math.floor(low / step + 1e-9),
    to: axis.to ?? step * Math.ceil(high / step - 1e-9),
    step,
  }
}
