import { describe, expect, it } from 'vitest'
import type { Polar } from '../../src/core/polar/polar'
import { polarAt } from '../../src/core/polar/polarFamily'
import { reynoldsBracket } from '../../src/core/polar/reynoldsLattice'
import { sweep } from '../../src/core/polar/sweep'
import { nacaSection } from '../../src/core/shape/naca'
import { sectionState } from '../support/states'

/**
 * What interpolation between the polars of the lattice costs, against the method's own direct solution at
 * the logarithmic middle of two lattice values, where the error is greatest.
 */
describe('the lattice of polars', () => {
  it.each([
    ['naca:2412', 3.1e5],
    ['naca:2412', 3.5e6],
  ])(
    '%s near Reynolds number %d: interpolated and direct agree',
    (code, near) => {
      const section = nacaSection(code)
      const { low, high } = reynoldsBracket(near)
      const alphas = [-2, 0, 2, 4, 6, 8].map((angle) => (angle * Math.PI) / 180)
      const at = (reynolds: number): Polar =>
        sweep(section, sectionState({ method: 'viscous', reynolds, amplification: 9 }), alphas)
      const middle = Math.sqrt(low * high)
      const direct = at(middle)
      const { polar } = polarAt([at(low), at(high)], middle, 0)!
      let lift = 0
      let drag = 0
      let compared = 0
      polar.points.forEach((point, i) => {
        const other = direct.points[i]
        if (!point.converged || !other.converged) return
        compared++
        lift = Math.max(lift, Math.abs(point.liftCoefficient! - other.liftCoefficient!))
        drag = Math.max(drag, Math.abs(point.dragCoefficient! / other.dragCoefficient! - 1))
      })
      console.info(
        `${code}, Reynolds number ${middle.toExponential(2)}: ${compared} angles, ` +
          `lift within ${lift.toFixed(4)}, drag within ${(100 * drag).toFixed(2)} %`,
      )
      expect(compared).toBeGreaterThanOrEqual(5)
      expect(lift).toBeLessThan(0.01)
      expect(drag).toBeLessThan(0.02)
    },
    120_000,
  )
})
