/** The standard atmosphere against the printed table: ICAO Doc 7488/3 (1993), values from memory, high confidence. */
import { describe, expect, it } from 'vitest'
import { atmosphere } from '../../src/core/flight/atmosphere'

/** Altitude, temperature, pressure and its last printed digit, density and its last digit, speed of sound. */
const TABLE: [
  m: number,
  K: number,
  Pa: number,
  paDigit: number,
  rho: number,
  rhoDigit: number,
  a: number | null,
][] = [
  [-1000, 294.65, 113929, 1, 1.347, 1e-5, null],
  [0, 288.15, 101325, 1, 1.225, 1e-5, 340.294],
  [1000, 281.65, 89874.6, 0.1, 1.11164, 1e-5, 336.434],
  [2000, 275.15, 79495.2, 0.1, 1.00649, 1e-5, 332.529],
  [3000, 268.65, 70108.5, 0.1, 0.909122, 1e-6, 328.578],
  [5000, 255.65, 54019.9, 0.1, 0.736116, 1e-6, 320.529],
  [8000, 236.15, 35599.8, 0.1, 0.525168, 1e-6, 308.063],
  [11000, 216.65, 22632.1, 0.1, 0.363918, 1e-6, 295.069],
  [15000, 216.65, 12044.6, 0.1, 0.193674, 1e-6, 295.069],
  [20000, 216.65, 5474.89, 0.01, 0.0880349, 1e-7, 295.069],
]

describe('the standard atmosphere', () => {
  it.each(TABLE)('at %d m agrees to the printed digits', (m, K, Pa, paDigit, rho, rhoDigit, a) => {
    const air = atmosphere(m, 0)
    expect(air.temperature).toBeCloseTo(K, 8)
    // Half a unit of the last digit, and the 2e-6 between the two printed values of the gas constant.
    expect(Math.abs(air.pressure - Pa)).toBeLessThan(0.5 * paDigit + 2e-6 * Pa)
    expect(Math.abs(air.density - rho)).toBeLessThan(0.5 * rhoDigit + 2e-6 * rho)
    if (a !== null) expect(Math.abs(air.speedOfSound - a)).toBeLessThan(0.0006)
  })

  it.each([
    [0, 1.78938e-5],
    [5000, 1.628211e-5],
    [11000, 1.421613e-5],
  ])('at %d m has the viscosity of Sutherland within 1e-4 (Doc 7488/3, memory)', (m, mu) => {
    expect(Math.abs(atmosphere(m, 0).viscosity / mu - 1)).toBeLessThan(1e-4)
  })

  it('keeps the pressure and lowers the density when the air is warmer than standard', () => {
    const [standard, warm] = [atmosphere(2000, 0), atmosphere(2000, 20)]
    expect(warm.pressure).toBe(standard.pressure)
    expect(warm.density / standard.density).toBeCloseTo(275.15 / 295.15, 12)
  })

  it.each([-1001, 20001, Number.NaN])('refuses an altitude of %d m and says the range', (m) => {
    expect(() => atmosphere(m, 0)).toThrow(/-1000 to 20000/)
  })
})
