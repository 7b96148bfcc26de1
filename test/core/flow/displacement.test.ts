import { describe, expect, it } from 'vitest'
import { displacementAnswer } from '../../../src/core/flow/displacement'
import { surfaceAnswer } from '../../../src/core/flow/surfaceAnswer'
import { panelLoads } from '../../../src/core/flow/panelLoads'
import { solvePanels } from '../../../src/core/flow/vortexPanels'
import { traceWake } from '../../../src/core/flow/wake'
import { nacaSection } from '../../../src/core/shape/naca'
import { placePanels } from '../../../src/core/shape/panels'

const flow = solvePanels(placePanels(nacaSection('0004'), 180))
const surface = surfaceAnswer(flow)
const nodes = flow.panels.x.length
const answerAt = (alpha: number): ReturnType<typeof displacementAnswer> =>
  displacementAnswer(surface, traceWake(surface, alpha))

describe('the wake', () => {
  it('leaves a symmetric section along the chord at zero angle, and turns up with the angle towards the stream', () => {
    const still = traceWake(surface, 0)
    expect(Math.max(...still.y.map(Math.abs))).toBeLessThan(1e-9)
    const lifted = traceWake(surface, 0.1)
    const last = lifted.x.length - 1
    const slope = (lifted.y[last]! - lifted.y[last - 1]!) / (lifted.x[last]! - lifted.x[last - 1]!)
    expect(slope).toBeGreaterThan(0)
    // Down by the downwash of the section, so below the stream's own direction.
    expect(slope).toBeLessThan(0.1)
    expect(lifted.s[last]).toBeCloseTo(1, 6)
  })
})

describe('the answer of the edge speeds to displacement', () => {
  it('without displacement is the flow of the panels', () => {
    const { along, across } = answerAt(0.05)
    const { pressureCoefficient } = panelLoads(flow, 0.05)
    for (let i = 2; i < nodes - 2; i++) {
      const speed = along[i]! * Math.cos(0.05) + across[i]! * Math.sin(0.05)
      expect(1 - speed * speed).toBeCloseTo(pressureCoefficient[i]!, 3)
    }
  })

  it('to a thin bump on both sides is what panels laid on the thickened outline give', () => {
    // Displacement d of a bump that ends before the trailing edge: m = u d, with u of the bare section.
    const { size, matrix, along } = answerAt(0)
    const bump = (x: number): number =>
      1e-3 * (x > 0.2 && x < 0.8 ? Math.sin((Math.PI * (x - 0.2)) / 0.6) ** 2 : 0)
    const { x, y } = flow.panels
    const defect = new Float64Array(size)
    for (let i = 0; i < nodes; i++) defect[i] = -along[i]! * bump(x[i]!)
    const moved = y.map((value, i) => value + (i < nodes / 2 ? 1 : -1) * bump(x[i]!))
    const other = solvePanels({ ...flow.panels, y: moved })
    let compared = 0
    for (let i = 0; i < nodes; i++) {
      if (y[i]! <= 0 || x[i]! < 0.4 || x[i]! > 0.6) continue
      let change = 0
      for (let j = 0; j < size; j++) change += matrix[i * size + j]! * defect[j]!
      // First order in the bump, and in the curvature of the side, on which speed falls outwards.
      expect(Math.abs(change / (other.along[i]! - along[i]!) - 1)).toBeLessThan(0.03)
      compared++
    }
    expect(compared).toBeGreaterThan(10)
  })

  it('mirrors for a symmetric section', () => {
    const { size, matrix } = answerAt(0)
    for (const [i, j] of [
      [30, 50],
      [10, 120],
      [90, 91],
    ] as const) {
      const mirrored = matrix[(nodes - 1 - i) * size + (nodes - 1 - j)]!
      expect(mirrored).toBeCloseTo(matrix[i * size + j]!, 6)
    }
  })
})
