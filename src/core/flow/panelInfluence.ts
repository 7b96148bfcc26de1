import { atan2, hypot, log } from '../numerics/elementary'
import type { Panels } from '../shape/panels'

/**
 * Stream function of linear vorticity on straight panels, at the panel nodes.
 *
 * A clockwise vortex of strength g has the stream function (g / 2 pi) ln r. For a panel from node j to
 * j + 1, length h, vorticity running linearly from g[j] to g[j + 1], and a field point whose foot lies at
 * X along the panel and Y above it, the integrals of ln r and of (place) ln r along the panel are closed
 * forms of the logarithms of the distances to both ends and of the angle that the panel subtends.
 * Source: Katz and Plotkin, Low-Speed Aerodynamics (2001), sections 10.2.3 and 11.4.2 (same integrals).
 *
 * Fills `matrix` row by row (`stride` numbers a row): entry (i, j) is the stream function at node i for
 * unit vorticity at node j, n + 1 nodes. Each logarithm is computed once and serves both its panels.
 */
export function fillVortexInfluence(panels: Panels, matrix: Float64Array, stride: number): void {
  const { x, y } = panels
  const last = x.length - 1
  const length = new Float64Array(last)
  const alongX = new Float64Array(last)
  const alongY = new Float64Array(last)
  for (let j = 0; j < last; j++) {
    const dx = x[j + 1] - x[j]
    const dy = y[j + 1] - y[j]
    length[j] = hypot(dx, dy)
    alongX[j] = dx / length[j]
    alongY[j] = dy / length[j]
  }
  const scale = 1 / (4 * Math.PI)
  for (let i = 0; i <= last; i++) {
    const row = i * stride
    let dx = x[i] - x[0]
    let dy = y[i] - y[0]
    let square = dx * dx + dy * dy
    let logarithm = square > 0 ? log(square) : 0
    matrix[row] = 0
    for (let j = 0; j < last; j++) {
      const h = length[j]
      const place = dx * alongX[j] + dy * alongY[j]
      const above = dy * alongX[j] - dx * alongY[j]
      const nextX = x[i] - x[j + 1]
      const nextY = y[i] - y[j + 1]
      const nextSquare = nextX * nextX + nextY * nextY
      const nextLogarithm = nextSquare > 0 ? log(nextSquare) : 0
      const own = i === j || i === j + 1
      const subtended = own ? 0 : atan2(dx * nextY - dy * nextX, dx * nextX + dy * nextY)
      const beyond = place - h
      // Twice the integrals of ln r and of (distance from the foot) ln r.
      const zeroth = place * logarithm - beyond * nextLogarithm - 2 * h + 2 * above * subtended
      const first =
        place * zeroth +
        0.5 * (nextSquare * nextLogarithm - square * logarithm - beyond * beyond + place * place)
      const toEnd = (scale * first) / h
      matrix[row + j] += scale * zeroth - toEnd
      matrix[row + j + 1] = toEnd
      dx = nextX
      dy = nextY
      square = nextSquare
      logarithm = nextLogarithm
    }
  }
}
