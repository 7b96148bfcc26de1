import type { Comparison, PolarPoint } from '../../core'
import { shownName } from '../entryName'
import { DEGREES, stateOf, type Axis, type Curve, type Plot, type PlotMark, type ReferenceLine } from './plot'

type Reading = (point: PolarPoint) => number | null

const alphaDeg: Reading = (point) => point.alpha * DEGREES
const lift: Reading = (point) => point.liftCoefficient
const moment: Reading = (point) => point.momentCoefficient
const drag: Reading = (point) => point.dragCoefficient
const liftToDrag: Reading = (point) =>
  point.liftCoefficient === null || !point.dragCoefficient
    ? null
    : point.liftCoefficient / point.dragCoefficient

const LIFT: Axis = { label: 'lift c_l', symbol: 'c_l', unit: '', decimals: 2 }
const ANGLE: Axis = { label: 'angle, deg', symbol: 'angle', unit: '°', decimals: 1 }
const MOMENT: Axis = {
  ...{ label: 'c_m about ¼ chord', symbol: 'c_m', unit: '', decimals: 3 },
  // Thin-airfoil theory holds the moment constant to rounding: that is a level line, not noise.
  leastSpan: 0.04,
}
const DRAG: Axis = { label: 'drag c_d', symbol: 'c_d', unit: '', decimals: 4, from: 0 }
const GLIDE: Axis = { label: 'c_l / c_d', symbol: 'c_l / c_d', unit: '', decimals: 0 }

/** A kind of polar plot: what is read along each axis. */
interface Kind {
  readonly key: string
  readonly title: string
  readonly x: readonly [Axis, Reading]
  readonly y: readonly [Axis, Reading]
}

const KINDS: readonly Kind[] = [
  { key: 'lift', title: 'Lift against angle', x: [ANGLE, alphaDeg], y: [LIFT, lift] },
  { key: 'moment', title: 'Moment against lift', x: [LIFT, lift], y: [MOMENT, moment] },
]
const KINDS_WITH_DRAG: readonly Kind[] = [
  { key: 'drag', title: 'Lift against drag', x: [DRAG, drag], y: [LIFT, lift] },
  { key: 'glide', title: 'Lift to drag against lift', x: [LIFT, lift], y: [GLIDE, liftToDrag] },
]

/** Polars of every entry at the state of a condition; those with drag only where some entry has it. */
export function polarPlots(comparison: Comparison, condition: number): Plot[] {
  const withDrag = comparison.entries.some((entry) =>
    entry.conditions[condition]?.pane?.polar?.points.some((point) => point.dragCoefficient !== null),
  )
  const kinds = withDrag ? [...KINDS, ...KINDS_WITH_DRAG] : KINDS
  return kinds.map((kind) => plotOf(comparison, condition, kind))
}

function plotOf(comparison: Comparison, condition: number, { key, title, x, y }: Kind): Plot {
  const [[xAxis, readX], [yAxis, readY]] = [x, y]
  const curves: Curve[] = []
  const marks: PlotMark[] = []
  comparison.entries.forEach((entry, index) => {
    const pane = entry.conditions[condition]?.pane
    const points = (pane?.polar?.points ?? []).filter(
      (point) => point.converged && readX(point) !== null && readY(point) !== null,
    )
    if (!pane || points.length === 0) return
    curves.push({
      entry: index,
      name: shownName(entry.name),
      x: points.map((point) => readX(point)!),
      y: points.map((point) => readY(point)!),
      states: points.map(({ alpha }) => stateOf(index, { alpha })),
    })
    const flown = pointAtLift(points, pane.liftCoefficient)
    if (flown !== null) marks.push({ entry: index, x: readX(flown)!, y: readY(flown)! })
  })
  const lines = liftLines(marks, xAxis === LIFT ? 'x' : 'y')
  return { key, title, x: xAxis, y: yAxis, curves, marks, lines }
}

/** Lifts nearer than this share a line: a plot cannot tell them apart. */
const LIFT_LINES_APART = 0.05

/** A line at the lift of each mark. */
function liftLines(marks: readonly PlotMark[], axis: 'x' | 'y'): ReferenceLine[] {
  const lines: ReferenceLine[] = []
  for (const at of marks.map((mark) => mark[axis]).sort((a, b) => a - b)) {
    if (at - (lines.at(-1)?.at ?? -Infinity) > LIFT_LINES_APART) lines.push({ axis, at })
  }
  return lines
}

/** The point of a polar at a lift coefficient, linear between its neighbours; null outside. */
function pointAtLift(points: readonly PolarPoint[], wanted: number): PolarPoint | null {
  for (let i = 0; i + 1 < points.length; i++) {
    const a = points[i]!
    const b = points[i + 1]!
    if (a.liftCoefficient! > wanted || b.liftCoefficient! < wanted) continue
    const t = (wanted - a.liftCoefficient!) / (b.liftCoefficient! - a.liftCoefficient! || 1)
    const mix = (p: number | null, q: number | null): number | null =>
      p === null || q === null ? null : p + t * (q - p)
    return {
      ...a,
      alpha: a.alpha + t * (b.alpha - a.alpha),
      liftCoefficient: wanted,
      momentCoefficient: mix(a.momentCoefficient, b.momentCoefficient),
      dragCoefficient: mix(a.dragCoefficient, b.dragCoefficient),
    }
  }
  return null
}
