import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { factorInPlace, solveInPlace } from '../../../src/core/numerics/denseSolve'

/** Numbers in -1 to 1 that depend on the seed only. */
function numbers(seed: number, count: number): Float64Array {
  let state = seed >>> 0
  return Float64Array.from({ length: count }, () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0
    return state / 2 ** 31 - 1
  })
}

describe('the dense solve', () => {
  it('leaves no residual beyond rounding for any size, odd ones and blocks included', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 70 }),
        fc.integer({ min: 0, max: 5 }),
        fc.nat(),
        (n, spare, seed) => {
          const stride = n + spare
          const a = numbers(seed, n * stride)
          const b = numbers(seed + 1, n)
          const factors = factorInPlace(a.slice(), n, stride)
          fc.pre(!factors.singular)
          const x = b.slice()
          solveInPlace(factors, x)
          const size = Math.max(1, ...x.map(Math.abs))
          for (let i = 0; i < n; i++) {
            let sum = -b[i]
            for (let j = 0; j < n; j++) sum += a[i * stride + j] * x[j]
            expect(Math.abs(sum)).toBeLessThan(1e-12 * n * size)
          }
        },
      ),
    )
  })

  it('exchanges rows where the diagonal is empty', () => {
    const x = Float64Array.of(3, 5)
    solveInPlace(factorInPlace(Float64Array.of(0, 1, 1, 0), 2), x)
    expect([...x]).toEqual([5, 3])
  })

  it('serves several right-hand sides with one factorisation', () => {
    const a = numbers(4, 30 * 30)
    const factors = factorInPlace(a.slice(), 30)
    for (const column of [0, 7, 29]) {
      const rhs = Float64Array.from({ length: 30 }, (_, i) => a[i * 30 + column])
      solveInPlace(factors, rhs)
      rhs.forEach((value, i) => expect(value).toBeCloseTo(i === column ? 1 : 0, 9))
    }
  })

  it.each([
    ['zero', [0, 0, 0, 0]],
    ['rank-one', [1, 2, 2, 4]],
    ['non-finite', [1, NaN, 0, 1]],
    ['infinite', [1, Infinity, 0, 1]],
  ])('reports a %s matrix as singular', (_, values) => {
    expect(factorInPlace(Float64Array.from(values), 2).singular).toBe(true)
  })
})
