import type { Comparison, Polar, PolarPoint } from '../../core'
import { shownName } from '../entryName'
import {
  DEGREES,
  stateOf,
  type Axis,
  type Curve,
  type Plot,
  type PlotEnd,
  type PlotMark,
  type ReferenceLine,
} from './plot'
import { limitWords, polarFailures, polarRuns } from './polarRuns'

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
const ANGLE: Axis = { label: 'angle of attack, deg', symbol: 'angle', unit: '°', decimals: 1 }
const MOMENT: Axis = {
  ...{ label: 'c_m at ¼ chord', symbol: 'c_m', unit: '', decimals: 3 },
  // Thin-airfoil theory holds the moment constant to rounding: that is a level line, not noise.
  leastSpan: 0.04,
}
const DRAG: Axis = { label: 'drag c_d', symbol: 'c_d', unit: '', decimals: 4, from: 0 }
const GLIDE: Axis = { label: 'c_l / c_d', symbol: 'c_l / c_d', unit: '', decimals: 0 }
const PLACE: Axis = {
  ...{ label: 'transition x/c', symbol: 'transition x/c', unit: '', decimals: 2 },
  ...{ from: 0, to: 1 },
}

/** A kind of polar plot: what is read along each axis, once for a curve of each side where there are two. */
interface Kind {
  readonly key: PolarPlotKey
  readonly title: string
  readonly x: readonly [Axis, Reading]
  readonly y: readonly [Axis, Reading]
  readonly lowerY?: Reading
}

export type PolarPlotKey = 'lift' | 'drag' | 'moment' | 'glide' | 'transition'

const KINDS: readonly Kind[] = [
  { key: 'lift', title: 'Lift against angle', x: [ANGLE, alphaDeg], y: [LIFT, lift] },
  { key: 'drag', title: 'Lift against drag', x: [DRAG, drag], y: [LIFT, lift] },
  { key: 'moment', title: 'Moment against lift', x: [LIFT, lift], y: [MOMENT, moment] },
  { key: 'glide', title: 'Lift to drag against lift', x: [LIFT, lift], y: [GLIDE, liftToDrag] },
  {
    ...{ key: 'transition', title: 'Transition against lift', x: [LIFT, lift] },
    ...{ y: [PLACE, (point) => point.transitionUpper], lowerY: (point) => point.transitionLower },
  },
]

/** Polars of every entry at the state of a condition; kinds that no entry has a value for are left out. */
export function polarPlots(comparison: Comparison, condition: number): Plot[] {
  const points = comparison.entries.flatMap((entry) => {
    const polar = entry.conditions[condition]?.pane?.polar
    return polar ? polar.points.filter((point) => point.converged) : []
  })
  const has = ({ x, y }: Kind): boolean =>
    points.some((point) => x[1](point) !== null && y[1](point) !== null)
  const inviscid = (kind: Kind): boolean => kind.key === 'lift' || kind.key === 'moment'
  return KINDS.filter((kind) => inviscid(kind) || has(kind)).map((kind) =>
    plotOf(comparison, condition, kind),
  )
}

function plotOf(comparison: Comparison, condition: number, kind: Kind): Plot {
  const { key, title, x, y, lowerY } = kind
  const [[xAxis, readX], [yAxis, readY]] = [x, y]
  const curves: Curve[] = []
  const marks: PlotMark[] = []
  const ends: PlotEnd[] = []
  comparison.entries.forEach((entry, index) => {
    const pane = entry.conditions[condition]?.pane
    if (!pane?.polar) return
    const name = shownName(entry.name)
    const upper = curveOf(pane.polar, readX, readY)
    if (upper.x.length === 0) return
    const curve = { entry: index, name }
    const named = ({ alphas, ...drawn }: ReturnType<typeof curveOf>): Curve => ({
      ...curve,
      ...drawn,
      states: alphas.map((alpha) => stateOf(index, { alpha })),
    })
    curves.push(lowerY ? { ...named(upper), side: 'upper' } : named(upper))
    if (lowerY) {
      curves.push({ ...named(curveOf(pane.polar, readX, lowerY)), side: 'lower' })
    }
    const flown = pointAtLift(polarRuns(pane.polar), pane.liftCoefficient)
    const flownY = flown && readY(flown)
    if (flown && flownY !== null) marks.push({ entry: index, x: readX(flown)!, y: flownY! })
    if (key === 'lift') ends.push(...endsOf(index, name, pane.polar))
  })
  const lines = liftLines(marks, xAxis === LIFT ? 'x' : 'y')
  const failures = xAxis === ANGLE ? polarFailures(comparison, condition) : []
  return { key, title, x: xAxis, y: yAxis, curves, marks, lines, failures, ends }
}

/** Values along both axes at the points that have them, broken wherever a point between has none. */
function curveOf(polar: Polar, readX: Reading, readY: Reading) {
  const [x, y, alphas, breaks]: number[][] = [[], [], [], []]
  for (const run of polarRuns(polar)) {
    let joined = false
    for (const point of run) {
      const [atX, atY] = [readX(point), readY(point)]
      if (atX !== null && atY !== null) {
        if (!joined && x!.length > 0) breaks!.push(x!.length)
        x!.push(atX)
        y!.push(atY)
        alphas!.push(point.alpha)
      }
      joined = atX !== null && atY !== null
    }
  }
  return { x: x!, y: y!, alphas: alphas!, breaks: breaks! }
}

/** Greatest and least lift where the polar knows them. */
function endsOf(entry: number, name: string, { maxLift, minLift }: Polar): PlotEnd[] {
  return [maxLift, minLift].flatMap((limit, i) =>
    limit === null
      ? []
      : [
          {
            entry,
            x: limit.alpha * DEGREES,
            y: limit.liftCoefficient,
            words: `${name}: ${limitWords(limit, i === 0)}`,
          },
        ],
  )
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

/** The first point of a polar at a lift coefficient, linear between neighbours of one run; null outside. */
function pointAtLift(runs: readonly (readonly PolarPoint[])[], wanted: number): PolarPoint | null {
  for (const points of runs) {
    for (let i = 0; i + 1 < points.length; i++) {
      const [a, b] = [points[i]!, points[i + 1]!]
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
        transitionUpper: mix(a.transitionUpper, b.transitionUpper),
        transitionLower: mix(a.transitionLower, b.transitionLower),
      }
    }
  }
  return null
}
