import { hypot } from '../numerics/elementary'
import { factorInPlace, solveInPlace } from '../numerics/denseSolve'
import type { Panels } from '../shape/panels'
import { loadWeights, type LoadWeights } from './loadWeights'
import { fillVortexInfluence } from './panelInfluence'
import { gapInfluence, trailingEdgeOf, type TrailingEdge } from './trailingEdge'

/**
 * The flow round a section at every angle: vorticity at the n + 1 nodes for a unit stream along the chord
 * (angle 0) and across it (90 deg). At angle a it is `along` cos a + `across` sin a. Clockwise positive;
 * its size is the surface speed, and it is positive where the flow runs towards the upper trailing edge.
 */
export interface PanelFlow {
  readonly panels: Panels
  readonly edge: TrailingEdge
  readonly along: Float64Array
  readonly across: Float64Array
  readonly weights: LoadWeights
  /** False when the equations had no solution; the vorticity is then zero. */
  readonly solved: boolean
}

/**
 * Solves the potential flow round a section with vorticity that varies linearly along straight panels.
 *
 * The outline is a streamline: the stream function has one unknown value at all nodes. The flow leaves the
 * trailing edge smoothly: the vorticity of its two sides is equal and opposite. On a blunt edge the gap
 * panel carries the jump to the fluid behind it. On a sharp edge the first and last node coincide and give
 * the same equation; in its place the edge speed continues the mean speed of both sides (see straightEdge).
 * The matrix does not depend on the angle: one factorisation serves all.
 *
 * Errors fall with the square of the panel count (chords of a curve, vorticity linear on them). At 4 deg on
 * panels of placePanels, against exact flows:
 *
 *   panels                60       90      120      180      240      360   order    60    90 .. 360
 *   c_l 10^4  NACA 0012  -7.5     -3.4     -1.9    -0.85    -0.47    -0.21          1.95  to  2.05
 *             NACA 4412 -37.7    -16.9     -9.5    -4.1     -2.3     -1.0           1.98  to  2.07
 *             J3        -55.5    -25.9    -14.9    -6.8     -3.9     -1.7           1.88  to  1.97
 *   c_m 10^4  NACA 0012   1.8      0.89     0.52    0.24     0.13     0.06          1.77  to  2.09
 *             NACA 4412   4.9      2.4      1.4     0.62     0.35     0.15          1.81  to  2.04
 *             J3          9.4      4.7      2.8     1.3      0.77     0.35          1.73  to  1.91
 *
 * J3 is a cambered cusp (Joukowski, 12 % thick, 4 % camber). The moment starts below second order because the
 * error of the nose, which counts little in the lift, has not yet settled at 60 panels.
 *
 * Source: Katz and Plotkin, Low-Speed Aerodynamics (2001), sections 11.3 to 11.5.
 */
export function solvePanels(panels: Panels): PanelFlow {
  const n = panels.x.length - 1
  const size = n + 1
  const edge = trailingEdgeOf(panels)
  const along = Float64Array.from(panels.y, (y) => -y)
  const across = Float64Array.from(panels.x)
  if (edge.sharp) along[n] = across[n] = 0
  const weights = loadWeights(panels, edge)
  const factors = factorInPlace(panelMatrix(panels, edge), size)
  if (factors.singular) {
    return { panels, edge, weights, along: along.fill(0), across: across.fill(0), solved: false }
  }
  for (const rhs of [along, across]) {
    solveInPlace(factors, rhs)
    rhs[n] = -rhs[0]
  }
  return { panels, edge, weights, along, across, solved: true }
}

/** Fills the last equation of a sharp edge. */
export type EdgeRow = (panels: Panels, row: Float64Array) => void

/**
 * Matrix of the panel equations, row by row, one row a node. The unknowns are the vorticity at all nodes but
 * the last, whose vorticity is minus the first, and in its place the stream function of the outline.
 */
export function panelMatrix(panels: Panels, edge: TrailingEdge, row: EdgeRow = straightEdge): Float64Array {
  const n = panels.x.length - 1
  const size = n + 1
  const matrix = new Float64Array(size * size)
  fillVortexInfluence(panels, matrix, size)
  for (let i = 0; i <= n; i++) {
    const row = i * size
    const gap = edge.sharp ? 0 : gapInfluence(panels, edge, panels.x[i], panels.y[i])
    matrix[row] += gap - matrix[row + n]
    matrix[row + n] = -1
  }
  if (edge.sharp) {
    matrix.fill(0, n * size)
    row(panels, matrix.subarray(n * size))
  }
  return matrix
}

/**
 * The last equation of a sharp edge. The mean speed of the two sides, v(d) = (upper - lower) / 2 at the
 * distance d from the edge, is smooth even for a cusp, where the speeds themselves are fixed only by the
 * difference of two nearly equal equations. The edge speed is its straight continuation through the next
 * two pairs of nodes. A parabola through three would change the lift by 3e-7 (cusp) to 1e-5 at 180 panels.
 */
function straightEdge({ x, y }: Panels, row: Float64Array): void {
  const n = x.length - 1
  const distance = (k: number): number =>
    0.5 * (hypot(x[k] - x[0], y[k] - y[0]) + hypot(x[n - k] - x[n], y[n - k] - y[n]))
  const near = distance(1)
  const far = distance(2)
  row[0] = 1
  row[1] = (-0.5 * far) / (far - near)
  row[2] = (0.5 * near) / (far - near)
  row[n - 1] = -row[1]
  row[n - 2] = -row[2]
}
