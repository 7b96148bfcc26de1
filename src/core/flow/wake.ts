import { cos, hypot, sin } from '../numerics/elementary'
import type { SurfaceAnswer } from './surfaceAnswer'
import { surfaceVelocity } from './surfaceVelocity'

/** Points of a wake, from the trailing edge downstream, and its influence, for one angle of attack. */
export interface Wake {
  readonly x: Float64Array
  readonly y: Float64Array
  /** Distance from the trailing edge, chords. */
  readonly s: Float64Array
}

/** Length of the computed wake, chords, and the number of its stations behind the trailing edge. */
const WAKE_LENGTH = 1
export const WAKE_STATIONS = 24

/** The wake as a streamline of the potential flow at `alpha` (rad), stretched from the last panels' length. */
export function traceWake({ flow, along, across }: SurfaceAnswer, alpha: number): Wake {
  const { x: px, y: py } = flow.panels
  const n = px.length - 1
  const first = 0.5 * (hypot(px[1] - px[0], py[1] - py[0]) + hypot(px[n] - px[n - 1], py[n] - py[n - 1]))
  const ratio = stretch(first, WAKE_LENGTH, WAKE_STATIONS)
  const x = new Float64Array(WAKE_STATIONS + 1)
  const y = new Float64Array(WAKE_STATIONS + 1)
  const s = new Float64Array(WAKE_STATIONS + 1)
  x[0] = 0.5 * (px[0] + px[n])
  y[0] = 0.5 * (py[0] + py[n])
  let dirX = flow.edge.bisectorX
  let dirY = flow.edge.bisectorY
  const vu = new Float64Array(n + 1)
  const vv = new Float64Array(n + 1)
  const [ca, sa] = [cos(alpha), sin(alpha)]
  let h = first
  for (let k = 1; k <= WAKE_STATIONS; k++) {
    // Midpoint rule: the direction half a step ahead.
    surfaceVelocity(flow, x[k - 1] + 0.5 * h * dirX, y[k - 1] + 0.5 * h * dirY, vu, vv, null, null)
    let u = ca
    let v = sa
    for (let i = 0; i <= n; i++) {
      const g = along[i] * ca + across[i] * sa
      u += g * vu[i]
      v += g * vv[i]
    }
    const size = hypot(u, v)
    dirX = u / size
    dirY = v / size
    x[k] = x[k - 1] + h * dirX
    y[k] = y[k - 1] + h * dirY
    s[k] = s[k - 1] + h
    h *= ratio
  }
  return { x, y, s }
}

/** Ratio of a geometric series of `count` terms from `first` that sums to `total`. */
function stretch(first: number, total: number, count: number): number {
  let low = 1
  let high = 3
  for (let n = 0; n < 60; n++) {
    const r = 0.5 * (low + high)
    let sum = 0
    for (let k = 0, term = first; k < count; k++, term *= r) sum += term
    if (sum < total) low = r
    else high = r
  }
  return low
}

/** Direction of wake panel k. */
export function unitAlong(wake: Wake, k: number): { readonly u: number; readonly v: number } {
  const h = wake.s[k + 1] - wake.s[k]
  return { u: (wake.x[k + 1] - wake.x[k]) / h, v: (wake.y[k + 1] - wake.y[k]) / h }
}
