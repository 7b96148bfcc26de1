import { describe, expect, it } from 'vitest'
import { monotoneSlopes, monotoneValue } from '../../../src/core/numerics/monotoneCubic'

/** Values on all pieces at many places. */
function values(x: readonly number[], y: readonly number[]): number[] {
  const slopes = monotoneSlopes(x, y)
  return x
    .slice(0, -1)
    .flatMap((from, i) =>
      Array.from({ length: 51 }, (_, k) =>
        monotoneValue(x, y, slopes, i, from + (k / 50) * (x[i + 1] - from)),
      ),
    )
}

describe('the monotone cubic', () => {
  it('is exact on straight data and at all points', () => {
    const x = [0, 1, 3, 4]
    const slopes = monotoneSlopes(x, [1, 3, 7, 9])
    expect(monotoneValue(x, [1, 3, 7, 9], slopes, 1, 2.2)).toBeCloseTo(5.4, 14)
    const y = [0, 5, -2, 8]
    const bent = monotoneSlopes(x, y)
    for (const i of [0, 1, 2]) {
      expect(monotoneValue(x, y, bent, i, x[i])).toBe(y[i])
      expect(monotoneValue(x, y, bent, i, x[i + 1])).toBeCloseTo(y[i + 1], 14)
    }
  })

  it('keeps monotone data monotone across steps that make a spline overshoot', () => {
    const curve = values([0, 1, 2, 3, 3.1, 4, 6], [0, 0.01, 0.02, 5, 5.001, 5.002, 9])
    for (let k = 1; k < curve.length; k++) expect(curve[k] - curve[k - 1]).toBeGreaterThanOrEqual(-1e-12)
  })

  it('never leaves the range of a piece where the data turn', () => {
    const curve = values([0, 1, 2, 3, 4], [0, 3, 1, 1, 6])
    expect(Math.max(...curve)).toBeLessThanOrEqual(6)
    expect(Math.min(...curve)).toBeGreaterThanOrEqual(0)
    expect(Math.max(...curve.slice(0, 102))).toBeLessThanOrEqual(3 + 1e-12)
  })

  it('meets a smooth curve to third order in the spacing', () => {
    const worst = (n: number): number => {
      const x = Array.from({ length: n + 1 }, (_, i) => i / n)
      const slopes = monotoneSlopes(x, x.map(Math.exp))
      return Math.max(
        ...x.slice(1, -2).map((from, i) => {
          const at = from + 0.5 / n
          return Math.abs(monotoneValue(x, x.map(Math.exp), slopes, i + 1, at) - Math.exp(at))
        }),
      )
    }
    expect(worst(20) / worst(40)).toBeGreaterThan(6)
  })
})
