import { test, fc } from '@fast-check/vitest'
import { describe, expect, it } from 'vitest'
import * as own from '../../../src/core/numerics/elementary'

/** Units of the last place by which we may differ from the engine's own functions, each within 1 of the truth. */
const ULPS = 3

function ulps(ours: number, engine: number): number {
  if (ours === engine) return 0
  const size = Math.max(Math.abs(engine), 1e-300)
  return Math.abs(ours - engine) / (size * Number.EPSILON)
}

const angles = fc.double({ min: -50, max: 50, noNaN: true })
/** Without the negative zero, which the core takes for zero. */
const units = fc.double({ min: -1, max: 1, noNaN: true }).map((value) => value + 0)

describe('elementary functions agree with the engine in all but the last digits', () => {
  test.prop([angles], { numRuns: 5000 })('sin and cos, absolutely to 3e-16', (x) => {
    expect(Math.abs(own.sin(x) - Math.sin(x))).toBeLessThan(3.4e-16)
    expect(Math.abs(own.cos(x) - Math.cos(x))).toBeLessThan(3.4e-16)
  })
  test.prop([fc.double({ min: 1e-12, max: 1e12, noNaN: true })], { numRuns: 5000 })('log', (x) => {
    expect(Math.abs(own.log(x) - Math.log(x))).toBeLessThanOrEqual(
      4 * Number.EPSILON * Math.max(0.5, Math.abs(Math.log(x))),
    )
  })
  test.prop([fc.double({ min: -600, max: 600, noNaN: true })], { numRuns: 5000 })('exp', (x) => {
    expect(ulps(own.exp(x), Math.exp(x))).toBeLessThanOrEqual(ULPS)
  })
  test.prop([fc.double({ min: -1e6, max: 1e6, noNaN: true })], { numRuns: 5000 })('atan', (x) => {
    expect(ulps(own.atan(x), Math.atan(x))).toBeLessThanOrEqual(ULPS)
  })
  test.prop([units, units], { numRuns: 5000 })('atan2', (y, x) => {
    expect(Math.abs(own.atan2(y, x) - Math.atan2(y, x))).toBeLessThan(9e-16)
  })
  test.prop([units], { numRuns: 2000 })('acos, asin and tanh', (x) => {
    expect(Math.abs(own.acos(x) - Math.acos(x))).toBeLessThan(2e-15)
    expect(Math.abs(own.asin(x) - Math.asin(x))).toBeLessThan(2e-15)
    expect(Math.abs(own.tanh(3 * x) - Math.tanh(3 * x))).toBeLessThan(1e-15)
  })
  test.prop([fc.double({ min: 1e-3, max: 1e3, noNaN: true }), fc.double({ min: -6, max: 6, noNaN: true })])(
    'power',
    (x, y) => {
      expect(ulps(own.power(x, y), x ** y)).toBeLessThanOrEqual(200)
    },
  )
  it('keeps exact cases exact', () => {
    expect(own.sin(0)).toBe(0)
    expect(own.cos(0)).toBe(1)
    expect(own.exp(0)).toBe(1)
    expect(own.log(1)).toBe(0)
    expect(own.log(0)).toBe(-Infinity)
    expect(own.power(3, 4)).toBe(81)
    expect(own.power(0, 1.5)).toBe(0)
    expect(own.atan2(0, -1)).toBe(Math.PI)
    expect(own.log(-1)).toBeNaN()
  })
})
