import type { Comparison, PolarPoint } from '../../core'
import { shownName } from '../entryName'
import { DEGREES, type Axis, type Curve, type Plot, type PlotMark } from './plot'

type Reading = (point: PolarPoint) => number | null

const alphaDeg: Reading = (point) => point.alpha * DEGREES
const lift: Reading = (point) => point.liftCoefficient
const moment: Reading = (point) => point.momentCoefficient
const drag: Reading = (point) => point.dragCoefficient
const liftToDrag: Reading = (point) =>
  point.liftCoefficient === null || !point.dragCoefficient
    ? null
    : point.liftCoefficient / point.dragCoefficient

const LIFT: Axis = { label: 'lift c_l' }

/** Polars of every entry at the state of a condition; those with drag only where some entry has it. */
export function polarPlots(comparison: Comparison, condition: number): Plot[] {
  const plots = [
    plotOf(
      comparison,
      condition,
      'lift',
      'Lift against angle',
      alphaDeg,
      lift,
      { label: 'angle, deg' },
      LIFT,
    ),
    plotOf(comparison, condition, 'moment', 'Moment against lift', lift, moment, LIFT, {
      label: 'c_m about ¼ chord',
    }),
  ]
  const withDrag = comparison.entries.some((entry) =>
    entry.conditions[condition]?.pane?.polar?.points.some((point) => point.dragCoefficient !== null),
  )
  if (!withDrag) return plots
  return [
    ...plots,
    plotOf(
      comparison,
      condition,
      'drag',
      'Lift against drag',
      drag,
      lift,
      { label: 'drag c_d', from: 0 },
      LIFT,
    ),
    plotOf(comparison, condition, 'glide', 'Lift to drag against lift', lift, liftToDrag, LIFT, {
      label: 'c_l / c_d',
    }),
  ]
}

function plotOf(
  comparison: Comparison,
  condition: number,
  key: string,
  title: string,
  readX: Reading,
  readY: Reading,
  x: Axis,
  y: Axis,
): Plot {
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
      states: points.map((point) => ({ entry: index, alpha: point.alpha, xOverC: null })),
    })
    const flown = pointAtLift(points, pane.liftCoefficient)
    if (flown !== null) marks.push({ entry: index, x: readX(flown)!, y: readY(flown)! })
  })
  return { key, title, x, y, curves, marks, lines: [] }
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
