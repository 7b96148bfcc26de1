import { atan2, cos, hypot, log, sin } from '../numerics/elementary'
import { factorInPlace, solveInPlace, type Factors } from '../numerics/denseSolve'
import type { Panels } from '../shape/panels'
import { panelMatrix, type PanelFlow } from './vortexPanels'

/**
 * What the displacement of body and wake does to the flow round a section: sources on panels and wake
 * carry off the mass defect, and the vorticity answers.
 */

/** Points of a wake, from the trailing edge downstream, and its influence, for one angle of attack. */
export interface Wake {
  readonly x: Float64Array
  readonly y: Float64Array
  /** Distance from the trailing edge, chords. */
  readonly s: Float64Array
}

/** Speed that a point sees: for a unit stream along and across the chord, and for unit sources. */
interface Velocity {
  u: number
  v: number
}

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
function sourceStream(place: number, above: number, h: number, upstream: boolean): number {
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
  finish(flow, factors, along)
  finish(flow, factors, across)
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
    finish(flow, factors, column)
    for (let i = 0; i <= n; i++) gamma[i * n + j] = column[i]
  }
  return { flow, factors, along, across, gamma }
}

/** Solves one column; the sharp edge's last equation has no stream function and its value is set by the first. */
function finish(flow: PanelFlow, factors: Factors, column: Float64Array): void {
  const n = column.length - 1
  if (flow.edge.sharp) column[n] = 0
  solveInPlace(factors, column)
  column[n] = -column[0]
}

/** Velocity at (px, py) of unit vorticity at each node, in `vu`, `vv`, and of unit sources on each panel. */
function surfaceVelocity(
  flow: PanelFlow,
  px: number,
  py: number,
  vu: Float64Array,
  vv: Float64Array,
  su: Float64Array | null,
  sv: Float64Array | null,
): void {
  const { x, y } = flow.panels
  const n = x.length - 1
  vu.fill(0)
  vv.fill(0)
  const k = 1 / (2 * Math.PI)
  for (let j = 0; j <= n; j++) {
    const base = j === n
    if (base && flow.edge.sharp) break
    const end = base ? 0 : j + 1
    const h = hypot(x[end] - x[j], y[end] - y[j])
    const ax = (x[end] - x[j]) / h
    const ay = (y[end] - y[j]) / h
    const dx = px - x[j]
    const dy = py - y[j]
    const X = dx * ax + dy * ay
    const Y = dy * ax - dx * ay
    const F = X - h
    const angle = atan2(Y * h, X * F + Y * Y)
    const L = 0.5 * log((X * X + Y * Y) / (F * F + Y * Y))
    // Constant and linear vorticity, along the panel and above it.
    const c1 = k * angle
    const c2 = -k * L
    if (base) {
      const g = flow.edge.vorticity
      const q = flow.edge.source
      vu[0] += g * (c1 * ax - c2 * ay) + q * k * (L * ax - angle * ay)
      vv[0] += g * (c1 * ay + c2 * ax) + q * k * (L * ay + angle * ax)
      break
    }
    const l1 = (k / h) * (X * angle - Y * L)
    const l2 = -(k / h) * (X * L - h + Y * angle)
    vu[j] += (c1 - l1) * ax - (c2 - l2) * ay
    vv[j] += (c1 - l1) * ay + (c2 - l2) * ax
    vu[j + 1] += l1 * ax - l2 * ay
    vv[j + 1] += l1 * ay + l2 * ax
    if (su && sv) {
      su[j] = k * (L * ax - angle * ay)
      sv[j] = k * (L * ay + angle * ax)
    }
  }
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
    finish(flow, factors, column)
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

function unitAlong(wake: Wake, k: number): Velocity {
  const h = wake.s[k + 1] - wake.s[k]
  return { u: (wake.x[k + 1] - wake.x[k]) / h, v: (wake.y[k + 1] - wake.y[k]) / h }
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
