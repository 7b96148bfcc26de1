import { atan2, hypot, log } from '../numerics/elementary'
import type { PanelFlow } from './vortexPanels'

/** Velocity at (px, py) of unit vorticity at each node, in `vu`, `vv`, and of unit sources on each panel. */
export function surfaceVelocity(
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
