import { hypot, power } from '../numerics/elementary'
import { bisect } from '../numerics/roots'
import { cubicSpline, evaluate, type Spline } from '../numerics/spline'
import type { Section } from './section'

/**
 * The outline of a section as a smooth curve: cubic splines x(s), y(s) over arc length, from the upper
 * trailing edge (s = 0) round the nose to the lower one. The trailing edge is a corner: the ends are free.
 */
export interface Contour {
  readonly x: Spline
  readonly y: Spline
  /** Total length in chords. */
  readonly length: number
  /** Arc length of the leading edge: the point farthest from the middle of the trailing edge. */
  readonly nose: number
}

/** Rounds of refining the arc length: chord lengths first, then lengths along the spline itself. */
const ARC_LENGTH_ROUNDS = 2

/** The outline of a section of at least three distinct points as a smooth curve. */
export function contourOf(section: Pick<Section, 'x' | 'y'>): Contour {
  const { x, y } = withoutRepeats(section)
  let s = new Float64Array(x.length)
  for (let i = 1; i < x.length; i++) s[i] = s[i - 1] + hypot(x[i] - x[i - 1], y[i] - y[i - 1])
  let curve = { x: cubicSpline(s, x), y: cubicSpline(s, y) }
  for (let round = 0; round < ARC_LENGTH_ROUNDS; round++) {
    s = arcLengths(curve.x, curve.y)
    curve = { x: cubicSpline(s, x), y: cubicSpline(s, y) }
  }
  return { ...curve, length: s[s.length - 1], nose: noseOf(curve.x, curve.y) }
}

function withoutRepeats({ x, y }: Pick<Section, 'x' | 'y'>): { x: Float64Array; y: Float64Array } {
  const kept: number[] = []
  for (let i = 0; i < x.length; i++) if (i === 0 || x[i] !== x[i - 1] || y[i] !== y[i - 1]) kept.push(i)
  return { x: Float64Array.from(kept, (i) => x[i]), y: Float64Array.from(kept, (i) => y[i]) }
}

/** Five-point Gauss-Legendre nodes and weights on [0, 1]; Abramowitz and Stegun (1964), table 25.4. */
const GAUSS_5 = [
  [0.5, 0.284444444444444],
  [0.230765344947158, 0.239314335249683],
  [0.769234655052842, 0.239314335249683],
  [0.046910077030668, 0.118463442528095],
  [0.953089922969332, 0.118463442528095],
] as const

function arcLengths(x: Spline, y: Spline): Float64Array<ArrayBuffer> {
  const s = new Float64Array(x.s.length)
  for (let i = 1; i < s.length; i++) {
    const h = x.s[i] - x.s[i - 1]
    let length = 0
    for (const [place, weight] of GAUSS_5) {
      const at = x.s[i - 1] + place * h
      length += weight * h * hypot(evaluate(x, at).first, evaluate(y, at).first)
    }
    s[i] = s[i - 1] + length
  }
  return s
}

function noseOf(x: Spline, y: Spline): number {
  const last = x.s.length - 1
  const edgeX = 0.5 * (x.f[0] + x.f[last])
  const edgeY = 0.5 * (y.f[0] + y.f[last])
  let farthest = 0
  let best = -1
  for (let i = 0; i <= last; i++) {
    const distance = hypot(x.f[i] - edgeX, y.f[i] - edgeY)
    if (distance > best) [farthest, best] = [i, distance]
  }
  const leaving = (s: number): number => {
    const px = evaluate(x, s)
    const py = evaluate(y, s)
    return (px.value - edgeX) * px.first + (py.value - edgeY) * py.first
  }
  const low = x.s[Math.max(farthest - 1, 0)]
  const high = x.s[Math.min(farthest + 1, last)]
  return leaving(low) > 0 && leaving(high) < 0 ? bisect(leaving, low, high) : x.s[farthest]
}

/** A point of the outline: place, unit-speed derivatives and curvature (1/chord, positive where convex). */
export interface ContourPoint {
  readonly x: number
  readonly y: number
  readonly dx: number
  readonly dy: number
  readonly curvature: number
}

/** The outline at arc length s. */
export function pointAt(contour: Contour, s: number): ContourPoint {
  const x = evaluate(contour.x, s)
  const y = evaluate(contour.y, s)
  const speed = hypot(x.first, y.first)
  return {
    x: x.value,
    y: y.value,
    dx: x.first,
    dy: y.first,
    curvature: (x.first * y.second - y.first * x.second) / power(speed, 3),
  }
}

/** The side of a section between its trailing and leading edges. */
export type Side = 'upper' | 'lower'

/**
 * Arc length at which a side passes the abscissa x; null outside the side's range. On a side that passes
 * it more than once (a blunt or noisy nose) the crossing nearest to the trailing edge is taken.
 */
export function crossing(contour: Contour, side: Side, x: number): number | null {
  const { s, f } = contour.x
  const last = s.length - 1
  const ahead = (at: number): number => evaluate(contour.x, at).value - x
  const scan = side === 'upper' ? { from: 0, step: 1 } : { from: last, step: -1 }
  if (f[scan.from] < x) return f[scan.from] > x - 1e-12 ? s[scan.from] : null
  for (let i = scan.from; i + scan.step >= 0 && i + scan.step <= last; i += scan.step) {
    const next = i + scan.step
    const beyondNose = side === 'upper' ? s[i] >= contour.nose : s[i] <= contour.nose
    if (beyondNose) return null
    const noseInside = side === 'upper' ? s[next] > contour.nose : s[next] < contour.nose
    const end = noseInside ? contour.nose : s[next]
    const endX = noseInside ? evaluate(contour.x, end).value : f[next]
    if (endX <= x) return bisect(ahead, s[i], end)
  }
  return null
}

/** Ordinate of a side at the abscissa x, or null outside the side's range. */
export function ordinateAt(contour: Contour, side: Side, x: number): number | null {
  const s = crossing(contour, side, x)
  return s === null ? null : evaluate(contour.y, s).value
}
