import type { ChartConfiguration, ChartDataset } from 'chart.js'
import { axisEnds, axisTicks, plotNumber } from '../../io/plots/axisTicks'
import type { Curve, Plot, PointState } from '../../io/plots/plot'
import { pointOfState } from '../../io/plots/pointOfState'
import type { EntryStyle } from '../style/palette'
import { markSets } from './plotMarks'
import type { Zoom } from './zoom'

interface Point {
  readonly x: number
  readonly y: number
}
export type PlotConfiguration = ChartConfiguration<'line', Point[]>
type LineSet = ChartDataset<'line', Point[]>

/** Reads the style sheet where the chart stands. */
export interface Ink {
  /** The value of a colour, by its name or `var(--name)`. */
  readonly colour: (name: string) => string
  /** The family of the text round the chart. */
  readonly font: string
}

/** What is hovered anywhere and which part of the plot is looked at. */
export interface Look {
  readonly hover: PointState | null
  readonly zoom: Zoom
}

/** All of a plot. */
export const wholeOf = (plot: Plot): NonNullable<Zoom> => ({ x: axisEnds(plot, 'x'), y: axisEnds(plot, 'y') })

/** What the chart library draws for a plot. */
export function chartOf(
  plot: Plot,
  styles: readonly EntryStyle[],
  { hover, zoom }: Look,
  ink: Ink,
): PlotConfiguration {
  const seen = zoom ?? wholeOf(plot)
  const soft = ink.colour('var(--ink-soft)')
  const colour = (entry: number): string => ink.colour(styles[entry]?.colour ?? 'var(--ink)')
  const hoveredFirst = (a: Curve, b: Curve): number =>
    Number(b.entry === hover?.entry) - Number(a.entry === hover?.entry)
  const curves = plot.curves.map((curve): LineSet => ({
    label: curve.name,
    data: pointsOf(curve),
    borderColor: colour(curve.entry),
    borderDash: [...(styles[curve.entry]?.dash ?? [])],
    borderWidth: (hover?.entry === curve.entry ? 2.6 : 1.7) * (curve.side === 'lower' ? THINNER : 1),
    borderJoinStyle: 'round',
    pointRadius: 0,
  }))
  const spot = (at: Point, entry: number, radius: number, fill: string): LineSet => ({
    data: [at],
    showLine: false,
    // A mark on the end of a curve is drawn whole.
    clip: zoom === null ? false : 0,
    pointStyle: styles[entry]?.marker ?? 'circle',
    pointRadius: radius,
    pointBorderWidth: 1.8,
    pointBackgroundColor: fill,
    pointBorderColor: colour(entry),
  })
  const marks = plot.marks.map(({ entry, x, y }) => spot({ x, y }, entry, 4, colour(entry)))
  const hovered = [...plot.curves].sort(hoveredFirst).flatMap(({ states, x, y, entry }) => {
    const i = hover === null ? -1 : pointOfState(states, hover)
    return i < 0 ? [] : [spot({ x: x[i]!, y: y[i]! }, entry, 5.5, ink.colour('var(--panel)'))]
  })
  const others = markSets(plot, seen.y, colour, ink.colour('var(--panel)'))
  return {
    type: 'line',
    // The library draws the first set on top.
    data: { datasets: [...hovered, ...marks, ...others, ...curves, ...referenceLines(plot, seen, soft)] },
    options: {
      animation: false,
      responsive: true,
      maintainAspectRatio: false,
      events: [],
      layout: { padding: { top: 6, right: 10 } },
      plugins: { legend: { display: false }, tooltip: { enabled: false } },
      scales: { x: axisOf(plot, 'x', seen, ink), y: axisOf(plot, 'y', seen, ink) },
    },
  }
}

/** Strokes of the lower side are thinner by this. */
const THINNER = 0.6
/** Not drawn: the line ends before it and begins anew behind it. */
const GAP: Point = { x: Number.NaN, y: Number.NaN }

/** The points of a curve with a gap wherever it is broken. */
function pointsOf({ x, y, breaks = [] }: Curve): Point[] {
  return x.flatMap((at, i) => [...(breaks.includes(i) ? [GAP] : []), { x: at, y: y[i]! }])
}

function axisOf(plot: Plot, which: 'x' | 'y', seen: NonNullable<Zoom>, ink: Ink) {
  const { label, reversed } = plot[which]
  const [min, max] = seen[which]
  const { values, decimals } = axisTicks(seen[which])
  const soft = ink.colour('var(--ink-soft)')
  const font = { size: 11, family: ink.font }
  return {
    type: 'linear' as const,
    ...{ min, max, reverse: reversed ?? false },
    title: { display: true, text: label, color: soft, font, padding: 2 },
    afterBuildTicks: (axis: { ticks: { value: number }[] }): void => {
      axis.ticks = values.map((value) => ({ value }))
    },
    ticks: {
      ...{ color: soft, font, maxRotation: 0, autoSkipPadding: 8 },
      callback: (value: string | number): string => plotNumber(Number(value), decimals),
    },
    border: { color: soft },
    grid: { color: ink.colour('var(--line)'), lineWidth: 0.8, tickLength: 4 },
  }
}

/** Lines across what is seen of the plot. */
function referenceLines(plot: Plot, seen: NonNullable<Zoom>, colour: string): LineSet[] {
  return plot.lines.map(({ axis, at }): LineSet => {
    const ends = seen[axis === 'x' ? 'y' : 'x'].map((end) =>
      axis === 'x' ? { x: at, y: end } : { x: end, y: at },
    )
    return { data: ends, borderColor: colour, borderWidth: 1, borderDash: [3, 3], pointRadius: 0 }
  })
}
