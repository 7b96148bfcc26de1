import { atan2, hypot, log } from '../numerics/elementary'
import { solveColumn, sourceStream, type SurfaceAnswer } from './surfaceAnswer'
import { surfaceVelocity } from './surfaceVelocity'
import type { PanelFlow } from './vortexPanels'
import { unitAlong, WAKE_STATIONS, type Wake } from './wake'

/**
 * Linear answer of the edge speeds to displacement: at the n + 1 nodes (as vorticity, positive towards the
 * upper trailing edge) and at the wake stations behind the edge (downstream positive),
 * speed = along cos a + across sin a + sum over matrix x (signed mass defect). The signed mass defect is
 * minus u d on the upper side, u d on the lower side and in the wake; the sources are its derivative along
 * the node order, so the stagnation point may move without a change here.
 */
export interface DisplacementAnswer {
  readonly size: number
  readonly wake: Wake
  readonly along: Float64Array
  readonly across: Float64Array
  /** size x size, row by row. */
  readonly matrix: Float64Array
  /** Answer of each speed to the displacement of the dead air behind a blunt edge, for unit stream. */
  readonly deadAir: Float64Array
}

/** Length of the dead air behind a blunt edge in units of the gap; of the order seen behind blunt bases. */
const DEAD_AIR_LENGTH = 3

export function displacementAnswer(surface: SurfaceAnswer, wake: Wake): DisplacementAnswer {
  const { flow, factors, gamma } = surface
  const { x, y } = flow.panels
  const n = x.length - 1
  const nodes = n + 1
  const w = WAKE_STATIONS
  const size = nodes + w
  const sources = n + w
  // Speeds by source panels: surface rows, then wake rows.
  const bySource = new Float64Array(size * sources)
  for (let i = 0; i < nodes; i++) bySource.set(gamma.subarray(i * n, (i + 1) * n), i * sources)
  const column = new Float64Array(nodes)
  for (let k = 0; k < w; k++) {
    const h = wake.s[k + 1] - wake.s[k]
    const ax = (wake.x[k + 1] - wake.x[k]) / h
    const ay = (wake.y[k + 1] - wake.y[k]) / h
    for (let i = 0; i < nodes; i++) {
      const dx = x[i] - wake.x[k]
      const dy = y[i] - wake.y[k]
      column[i] = -sourceStream(dx * ax + dy * ay, dy * ax - dx * ay, h, true)
    }
    solveColumn(flow, factors, column)
    for (let i = 0; i < nodes; i++) bySource[i * sources + n + k] = column[i]
  }
  const along = new Float64Array(size)
  const across = new Float64Array(size)
  along.set(surface.along)
  across.set(surface.across)
  const [vu, vv] = [new Float64Array(nodes), new Float64Array(nodes)]
  const [su, sv] = [new Float64Array(n), new Float64Array(n)]
  for (let k = 1; k <= w; k++) {
    const row = nodes + k - 1
    const before = unitAlong(wake, k - 1)
    const after = k < w ? unitAlong(wake, k) : before
    const length = hypot(before.u + after.u, before.v + after.v)
    const tx = (before.u + after.u) / length
    const ty = (before.v + after.v) / length
    surfaceVelocity(flow, wake.x[k], wake.y[k], vu, vv, su, sv)
    along[row] = tx
    across[row] = ty
    const at = row * sources
    for (let j = 0; j < n; j++) bySource[at + j] = su[j] * tx + sv[j] * ty
    for (let i = 0; i < nodes; i++) {
      const g = vu[i] * tx + vv[i] * ty
      along[row] += g * along[i]
      across[row] += g * across[i]
      const from = i * sources
      for (let j = 0; j < sources; j++) bySource[at + j] += g * bySource[from + j]
    }
    for (let j = 0; j < w; j++) bySource[at + n + j] += wakeOnWake(wake, k, j, tx, ty)
  }
  const matrix = new Float64Array(size * size)
  const deadAir = new Float64Array(size)
  for (let i = 0; i < size; i++) {
    const from = i * sources
    const to = i * size
    for (let j = 0; j < n; j++) {
      const q = bySource[from + j] / hypot(x[j + 1] - x[j], y[j + 1] - y[j])
      matrix[to + j + 1] += q
      matrix[to + j] -= q
    }
    for (let k = 0; k < w; k++) {
      const q = bySource[from + n + k] / (wake.s[k + 1] - wake.s[k])
      matrix[to + nodes + k] += q
      if (k > 0) matrix[to + nodes + k - 1] -= q
      else {
        // The wake begins with the mass defect of both sides.
        matrix[to] += q
        matrix[to + n] -= q
      }
      if (!flow.edge.sharp) deadAir[i] += q * (deadAirAt(flow, wake.s[k + 1]) - deadAirAt(flow, wake.s[k]))
    }
  }
  return { size, wake, along, across, matrix, deadAir }
}

/** Thickness of the dead air at a distance behind a blunt edge: the gap, closing smoothly. */
function deadAirAt(flow: PanelFlow, s: number): number {
  const gap = flow.edge.gap * flow.edge.source
  const z = Math.min(s / (DEAD_AIR_LENGTH * flow.edge.gap), 1)
  return gap * (1 - z) * (1 - z) * (1 + 2 * z)
}

/**
 * Speed along the wake at station k of unit sources on wake panel j. At the ends of a panel it is infinite:
 * there the mean over the neighbouring half panels is taken, which is finite.
 */
function wakeOnWake(wake: Wake, k: number, j: number, tx: number, ty: number): number {
  const h = wake.s[j + 1] - wake.s[j]
  const scale = 1 / (2 * Math.PI)
  if (j !== k - 1 && j !== k) {
    const { u: ax, v: ay } = unitAlong(wake, j)
    const dx = wake.x[k] - wake.x[j]
    const dy = wake.y[k] - wake.y[j]
    const X = dx * ax + dy * ay
    const Y = dy * ax - dx * ay
    const F = X - h
    const L = 0.5 * log((X * X + Y * Y) / (F * F + Y * Y))
    const angle = atan2(Y * h, X * F + Y * Y)
    return scale * (L * (ax * tx + ay * ty) + angle * (ax * ty - ay * tx))
  }
  const last = wake.s.length - 1
  const left = wake.s[k] - wake.s[k - 1]
  const right = k < last ? wake.s[k + 1] - wake.s[k] : left
  const a = wake.s[j] - wake.s[k]
  const b = wake.s[j + 1] - wake.s[k]
  const antiderivative = (p: number): number => {
    const part = (r: number): number => (r === 0 ? 0 : r * log(Math.abs(r)))
    return part(p - a) - part(p - b)
  }
  return (scale * (antiderivative(0.5 * right) - antiderivative(-0.5 * left))) / (0.5 * (left + right))
}
