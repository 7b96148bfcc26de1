import { describe, expect, it } from 'vitest'
import { fillVortexInfluence } from '../../../src/core/flow/panelInfluence'

describe('the stream function of vortex panels', () => {
  const panels = { x: Float64Array.of(1, 0.4, 0, 0.55), y: Float64Array.of(0.02, 0.15, 0, -0.1) }

  it('is the integral of the logarithm of the distance, weighted linearly along each panel', () => {
    const matrix = new Float64Array(16)
    fillVortexInfluence(panels, matrix, 4)
    for (let i = 0; i < 4; i++) {
      const sums = [0, 0, 0, 0]
      for (let j = 0; j < 3; j++) {
        const [dx, dy] = [panels.x[j + 1] - panels.x[j], panels.y[j + 1] - panels.y[j]]
        const count = 4000
        for (let k = 0; k < count; k++) {
          // Places crowd towards both ends, where the logarithm may be singular.
          const u = (k + 0.5) / count
          const t = u * u * (3 - 2 * u)
          const distance = Math.hypot(panels.x[i] - panels.x[j] - t * dx, panels.y[i] - panels.y[j] - t * dy)
          const part = (Math.log(distance) * Math.hypot(dx, dy) * 6 * u * (1 - u)) / count / (2 * Math.PI)
          sums[j] += (1 - t) * part
          sums[j + 1] += t * part
        }
      }
      for (let j = 0; j < 4; j++) expect(matrix[4 * i + j]).toBeCloseTo(sums[j], 6)
    }
  })
})
