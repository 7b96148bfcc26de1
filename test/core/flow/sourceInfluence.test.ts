import { describe, expect, it } from 'vitest'
import { fillSourceInfluence } from '../../../src/core/flow/sourceInfluence'
import { nacaSection } from '../../../src/core/shape/naca'
import { placePanels } from '../../../src/core/shape/panels'

describe('the stream function of source panels', () => {
  it('is the integral of the angle from the inward normal, weighted linearly along each panel', () => {
    const x = Float64Array.of(1, 0.4, 0, 0.55)
    const y = Float64Array.of(0.02, 0.15, 0, -0.1)
    const matrix = new Float64Array(16)
    fillSourceInfluence({ x, y }, matrix, 4)
    for (let i = 0; i < 4; i++) {
      const sums = [0, 0, 0, 0]
      for (let j = 0; j < 3; j++) {
        const [dx, dy] = [x[j + 1] - x[j], y[j + 1] - y[j]]
        const h = Math.hypot(dx, dy)
        const count = 4000
        for (let k = 0; k < count; k++) {
          const t = (k + 0.5) / count
          const [toX, toY] = [x[i] - x[j] - t * dx, y[i] - y[j] - t * dy]
          const angle = Math.atan2(-(toX * dx + toY * dy), toY * dx - toX * dy)
          sums[j] += ((1 - t) * angle * h) / count / (2 * Math.PI)
          sums[j + 1] += (t * angle * h) / count / (2 * Math.PI)
        }
      }
      for (let j = 0; j < 4; j++) expect(matrix[4 * i + j]).toBeCloseTo(sums[j], 6)
    }
  })

  it('varies smoothly from node to node round a section: no branch cut crosses it', () => {
    const panels = placePanels(nacaSection('4412'), 120)
    const matrix = new Float64Array(121 * 121)
    fillSourceInfluence(panels, matrix, 121)
    for (let j = 0; j <= 120; j++) {
      for (let i = 1; i <= 120; i++) {
        // Normal speed is at most half the strength; a cut would jump by strength times a panel length.
        const moved = Math.hypot(panels.x[i] - panels.x[i - 1], panels.y[i] - panels.y[i - 1])
        expect(Math.abs(matrix[i * 121 + j] - matrix[(i - 1) * 121 + j])).toBeLessThan(0.51 * moved + 1e-3)
      }
    }
  })
})
