import { atan2, hypot, log } from '../numerics/elementary'
import type { Panels } from '../shape/panels'

/**
 * Stream function of linear sources on straight panels, at the panel nodes: what a boundary layer's
 * displacement adds to the outline.
 *
 * A source of strength q has the stream function (q / 2 pi) times the angle at which the point is seen from
 * it. The angle is counted from the inward normal of the panel, so its branch cut leaves outwards and no node
 * of the section sees a jump. For a panel from node j to j + 1, length h, with the field point's foot X along
 * it and Y inside it, u = X - t and f(u) = atan2(-u, Y), the two integrals over t are closed forms of
 * f and of the distances to both ends.
 * Source: Katz and Plotkin, Low-Speed Aerodynamics (2001), sections 10.2.1 and 11.2.1 (same integrals).
 *
 * Fills `matrix` row by row (`stride` numbers a row): entry (i, j) is the stream function at node i for unit
 * source strength at node j.
 */
export function fillSourceInfluence({ x, y }: Panels, matrix: Float64Array, stride: number): void {
  const last = x.length - 1
  for (let i = 0; i <= last; i++) {
    const row = i * stride
    matrix[row] = 0
    for (let j = 0; j < last; j++) {
      const h = hypot(x[j + 1] - x[j], y[j + 1] - y[j])
      const alongX = (x[j + 1] - x[j]) / h
      const alongY = (y[j + 1] - y[j]) / h
      const own = i === j || i === j + 1
      const place = (x[i] - x[j]) * alongX + (y[i] - y[j]) * alongY
      const inside = own ? 0 : (y[i] - y[j]) * alongX - (x[i] - x[j]) * alongY
      const [zeroth, moment] = integrals(place, inside, h)
      const toEnd = moment / (2 * Math.PI * h)
      matrix[row + j] += zeroth / (2 * Math.PI) - toEnd
      matrix[row + j + 1] = toEnd
    }
  }
}

/** Integrals over the panel of the angle and of t times the angle. */
function integrals(place: number, inside: number, h: number): readonly [number, number] {
  const beyond = place - h
  const near = atan2(-place, inside)
  const far = atan2(-beyond, inside)
  const nearSquare = place * place + inside * inside
  const farSquare = beyond * beyond + inside * inside
  const logarithms = inside === 0 ? 0 : 0.5 * inside * log(nearSquare / farSquare)
  const zeroth = place * near - beyond * far + logarithms
  const ofDistance = 0.5 * (nearSquare * near - farSquare * far + inside * h)
  return [zeroth, place * zeroth - ofDistance]
}
