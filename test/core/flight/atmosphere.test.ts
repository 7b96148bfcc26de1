import { describe, expect, it } from 'vitest'
import { atmosphere } from '../../../src/core/flight/atmosphere'
import { BadInput } from '../../../src/core/numerics/errors'

describe('the atmosphere', () => {
  it.each([0, 5000, 10999, 11001, 18000])('at %d m is in hydrostatic balance: dp/dh = -g rho', (altitude) => {
    const step = 0.5
    const rate =
      (atmosphere(altitude + step, 0).pressure - atmosphere(altitude - step, 0).pressure) / (2 * step)
    // 1e-6: the difference quotient over 1 m, kept on one side of the tropopause.
    expect(Math.abs(rate / (-9.80665 * atmosphere(altitude, 0).density) - 1)).toBeLessThan(1e-6)
  })

  it('takes an offset in temperature, sound and viscosity, and leaves the pressure alone', () => {
    const [standard, cold] = [atmosphere(3000, 0), atmosphere(3000, -15)]
    expect(cold.pressure).toBe(standard.pressure)
    expect(cold.temperature).toBeCloseTo(268.65 - 15, 10)
    expect(cold.speedOfSound / standard.speedOfSound).toBeCloseTo(Math.sqrt(253.65 / 268.65), 12)
    expect(cold.viscosity).toBeLessThan(standard.viscosity)
  })

  it.each([-400, 400, Number.NaN, Infinity])('refuses an offset of %d K and names it', (offset) => {
    expect(() => atmosphere(0, offset)).toThrow(BadInput)
    expect(() => atmosphere(0, offset)).toThrow(/ISA offset/)
  })
})
