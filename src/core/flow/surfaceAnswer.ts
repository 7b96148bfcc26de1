import { atan2, hypot, log } from '../numerics/elementary'
import { factorInPlace, solveInPlace, type Factors } from '../numerics/denseSolve'
import type { Panels } from '../shape/panels'
import { panelMatrix, type PanelFlow } from './vortexPanels'

/** The part that does not depend on the angle: answer of the surface vorticity to sources on the panels. */
export interface SurfaceAnswer {
  readonly flow: PanelFlow
  readonly factors: Factors
  /** Vorticity at the nodes for a unit stream along and across the chord. */
  readonly along: Float64Array
  readonly across: Float64Array
  /** (n + 1) x n: vorticity at node i for unit source strength on panel j. */
  readonly gamma: Float64Array
}

/**
 * Last equation of a sharp edge under layers: the mean speed of the two sides is that of the next pair of
 * nodes. Under layers the speed is nearly level there; the straight continuation of potential flow answers
 * to a kink in the displacement with more than its own size, and near laminar separation at the edge the
 * equations then have no solution, or several (12 of 370 points instead of none).
 */
function levelEdge({ x }: Panels, row: Float64Array): void {
  const n = x.length - 1
  row[0] = 1
  row[1] = -0.5
  row[n - 1] = 0.5
}

/** Stream function at a point for unit sources on a panel, its angle counted from (ax, ay). */
export function sourceStream(place: number, above: number, h: number, upstream: boolean): number {
  const far = place - h
  // From the inward normal for surface panels (cut outside), from upstream for the wake (cut downstream).
  const near = upstream ? atan2(-above, -place) : atan2(-place, above)
  const end = upstream ? atan2(-above, -far) : atan2(-far, above)
  const r1 = place * place + above * above
  const r2 = far * far + above * above
  const logarithms = above === 0 || r1 === 0 || r2 === 0 ? 0 : 0.5 * above * log(r1 / r2)
  return (place * near - far * end + logarithms) / (2 * Math.PI)
}

/** Solves for the answer of the surface to unit sources on each of its panels. */
export function surfaceAnswer(flow: PanelFlow): SurfaceAnswer {
  const { x, y } = flow.panels
  const n = x.length - 1
  const size = n + 1
  const factors = factorInPlace(panelMatrix(flow.panels, flow.edge, levelEdge), size)
  const along = Float64Array.from(y, (value) => -value)
  const across = Float64Array.from(x)
  solveColumn(flow, factors, along)
  solveColumn(flow, factors, across)
  const gamma = new Float64Array(size * n)
  const column = new Float64Array(size)
  for (let j = 0; j < n; j++) {
    const h = hypot(x[j + 1] - x[j], y[j + 1] - y[j])
    const ax = (x[j + 1] - x[j]) / h
    const ay = (y[j + 1] - y[j]) / h
    for (let i = 0; i <= n; i++) {
      const dx = x[i] - x[j]
      const dy = y[i] - y[j]
      const own = i === j || i === j + 1
      column[i] = -sourceStream(dx * ax + dy * ay, own ? 0 : dy * ax - dx * ay, h, false)
    }
    solveColumn(flow, factors, column)
    for (let i = 0; i <= n; i++) gamma[i * n + j] = column[i]
  }
  return { flow, factors, along, across, gamma }
}

/** Solves one column; the sharp edge's last equation has no stream function and its value is set by the first. */
export function solveColumn(flow: PanelFlow, factors: Factors, column: Float64Array): void {
  const n = column.length - 1
  if (flow.edge.sharp) column[n] = 0
  solveInPlace(factors, column)
  column[n] = -column[0]
}
