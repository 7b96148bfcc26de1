import { hypot } from '../numerics/elementary'
import { cubicSpline } from '../numerics/spline'
import type { Panels } from '../shape/panels'
import type { TrailingEdge } from './trailingEdge'

/** Weights of the node pressures in the forces along and across the chord and in the moment. */
export interface LoadWeights {
  readonly along: Float64Array
  readonly across: Float64Array
  readonly moment: Float64Array
  /** Weights of the node vorticity in the circulation. */
  readonly circulation: Float64Array
}

/** End weights of Gregory's rule of fourth order; Abramowitz and Stegun (1964), section 25.4. */
const GREGORY = [3 / 8, 7 / 6, 23 / 24] as const

/**
 * The nodes lie evenly in a smooth parameter (their own number), so the contour integrals of the pressure
 * are taken in it: slopes of a spline through the nodes and Gregory's end-corrected trapezoidal rule, of
 * fourth order. On a blunt edge the base carries the pressure of the edge, and the
 * vorticity along it counts in the circulation.
 */
export function loadWeights({ x, y }: Panels, edge: TrailingEdge): LoadWeights {
  const n = x.length - 1
  const number = Float64Array.from(x, (_, i) => i)
  const dx = cubicSpline(number, x).slope
  const dy = cubicSpline(number, y).slope
  const along = new Float64Array(n + 1)
  const across = new Float64Array(n + 1)
  const moment = new Float64Array(n + 1)
  const circulation = new Float64Array(n + 1)
  for (let i = 0; i <= n; i++) {
    const weight = GREGORY[Math.min(i, n - i)] ?? 1
    along[i] = -weight * dy[i]
    across[i] = weight * dx[i]
    moment[i] = -weight * ((x[i] - 0.25) * dx[i] + y[i] * dy[i])
    const before = i > 0 ? hypot(x[i] - x[i - 1], y[i] - y[i - 1]) : 0
    const after = i < n ? hypot(x[i + 1] - x[i], y[i + 1] - y[i]) : 0
    circulation[i] = 0.5 * (before + after)
  }
  const gapX = x[0] - x[n]
  const gapY = y[0] - y[n]
  const arm = (0.5 * (x[0] + x[n]) - 0.25) * gapX + 0.5 * (y[0] + y[n]) * gapY
  for (const i of [0, n]) {
    along[i] -= 0.5 * gapY
    across[i] += 0.5 * gapX
    moment[i] -= 0.5 * arm
  }
  circulation[0] += edge.vorticity * edge.gap
  return { along, across, moment, circulation }
}
