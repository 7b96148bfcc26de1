import { describe, expect, it } from 'vitest'
import { contourOf, crossing, ordinateAt, pointAt } from '../../../src/core/shape/contour'

/** Ellipse with unit chord and the given thickness, from its rear end over the top and back. */
function ellipse(thickness: number, points: number): { x: Float64Array; y: Float64Array } {
  const turn = (i: number): number => (2 * Math.PI * i) / (points - 1)
  return {
    x: Float64Array.from({ length: points }, (_, i) => 0.5 + 0.5 * Math.cos(turn(i))),
    y: Float64Array.from({ length: points }, (_, i) => 0.5 * thickness * Math.sin(turn(i))),
  }
}

describe('the contour of a section', () => {
  it('has the length of a circle to 1e-7 with 161 points', () => {
    const contour = contourOf(ellipse(1, 161))
    expect(Math.abs(contour.length - Math.PI)).toBeLessThan(1e-7)
  })

  it('runs at unit speed and has the curvature of a circle away from the edge', () => {
    const contour = contourOf(ellipse(1, 161))
    for (const share of [0.1, 0.3, 0.5, 0.77]) {
      const point = pointAt(contour, share * contour.length)
      expect(Math.hypot(point.dx, point.dy)).toBeCloseTo(1, 6)
      expect(point.curvature).toBeCloseTo(2, 3)
    }
  })

  it('finds the nose of a symmetric section at its foremost point', () => {
    const contour = contourOf(ellipse(0.12, 201))
    expect(contour.nose).toBeCloseTo(0.5 * contour.length, 9)
    expect(pointAt(contour, contour.nose).x).toBeCloseTo(0, 9)
  })

  it('gives the ordinate of either side at an abscissa, and null beyond the ends', () => {
    const contour = contourOf(ellipse(0.12, 201))
    const exact = 0.06 * Math.sqrt(1 - 0.4 ** 2)
    expect(ordinateAt(contour, 'upper', 0.3)).toBeCloseTo(exact, 7)
    expect(ordinateAt(contour, 'lower', 0.3)).toBeCloseTo(-exact, 7)
    expect(crossing(contour, 'upper', 1.01)).toBeNull()
    expect(crossing(contour, 'lower', -0.01)).toBeNull()
  })

  it('does not mind repeated points', () => {
    const { x, y } = ellipse(0.2, 81)
    const twice = (values: Float64Array): Float64Array =>
      Float64Array.from(values, (v) => v).fill(values[30], 30, 32)
    const repeated = contourOf({ x: twice(x), y: twice(y) })
    const dropped = contourOf({ x: x.filter((_, i) => i !== 31), y: y.filter((_, i) => i !== 31) })
    expect(repeated.length).toBe(dropped.length)
    expect(Number.isFinite(pointAt(repeated, 0.4).curvature)).toBe(true)
  })
})
