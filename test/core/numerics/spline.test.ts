import { describe, expect, it } from 'vitest'
import { cubicSpline, evaluate } from '../../../src/core/numerics/spline'

describe('a cubic spline', () => {
  const knots = (n: number): Float64Array => Float64Array.from({ length: n }, (_, i) => (i / (n - 1)) ** 1.3)

  it('reproduces a parabola with its derivatives, ends included', () => {
    const s = knots(9)
    const spline = cubicSpline(
      s,
      s.map((v) => 3 * v * v - v + 2),
    )
    for (const at of [0, 0.2, 0.71, 1]) {
      const { value, first, second } = evaluate(spline, at)
      expect(value).toBeCloseTo(3 * at * at - at + 2, 12)
      expect(first).toBeCloseTo(6 * at - 1, 11)
      expect(second).toBeCloseTo(6, 9)
    }
  })

  it('comes nearer to a smooth function at third order or better', () => {
    const error = (n: number): number => {
      const s = knots(n)
      const spline = cubicSpline(
        s,
        s.map((v) => Math.sin(4 * v)),
      )
      let worst = 0
      for (let at = 0; at <= 1; at += 0.001) {
        worst = Math.max(worst, Math.abs(evaluate(spline, at).value - Math.sin(4 * at)))
      }
      return worst
    }
    expect(Math.log2(error(17) / error(33))).toBeGreaterThan(2.9)
  })

  it('is a straight line through two points', () => {
    const spline = cubicSpline(Float64Array.of(1, 3), Float64Array.of(0, 4))
    expect(evaluate(spline, 2)).toEqual({ value: 2, first: 2, second: 0 })
  })
})
