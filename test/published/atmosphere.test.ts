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

/**
 * The same atmosphere evaluated independently from the formulas of Doc 7488/3: altitude, temperature,
 * pressure, density, speed of sound, viscosity, kinematic viscosity.
 */
const EVALUATED: [m: number, K: number, Pa: number, rho: number, a: number, mu: number, nu: number][] = [
  [-1000, 294.65, 113929.0925, 1.34699598, 344.11071, 1.820575e-5, 1.351582e-5],
  [0, 288.15, 101325.0, 1.22500002, 340.29399, 1.78938e-5, 1.460719e-5],
  [500, 284.9, 95460.8353, 1.16726883, 338.36948, 1.773656e-5, 1.519492e-5],
  [1000, 281.65, 89874.5629, 1.1116425, 336.43397, 1.757845e-5, 1.581305e-5],
  [2000, 275.15, 79495.2019, 1.0064901, 332.52915, 1.725961e-5, 1.714832e-5],
  [3000, 268.65, 70108.5265, 0.90912186, 328.57793, 1.693719e-5, 1.863027e-5],
  [4000, 262.15, 61640.2137, 0.81912915, 324.57861, 1.661108e-5, 2.027895e-5],
  [5000, 255.65, 54019.8882, 0.73611555, 320.52939, 1.628118e-5, 2.211769e-5],
  [6000, 249.15, 47181.0022, 0.6596968, 316.42837, 1.594739e-5, 2.417381e-5],
  [8000, 236.15, 35599.7852, 0.52516713, 308.06257, 1.52677e-5, 2.907207e-5],
  [10000, 223.15, 26436.2426, 0.41270615, 299.46316, 1.457109e-5, 3.53062e-5],
  [11000, 216.65, 22632.0401, 0.36391765, 295.06949, 1.421613e-5, 3.906414e-5],
  [12000, 216.65, 19330.3825, 0.3108278, 295.06949, 1.421613e-5, 4.573635e-5],
  [15000, 216.65, 12044.5528, 0.19367345, 295.06949, 1.421613e-5, 7.340258e-5],
  [20000, 216.65, 5474.8774, 0.08803468, 295.06949, 1.421613e-5, 1.614833e-4],
]

/** Half a unit of the last printed digit, the digits being those of the table above. */
const LAST_DIGIT = { Pa: 0.5e-4, rho: 0.5e-8, a: 0.5e-5, mu: 0.5e-11 } as const
/** Seven significant digits. */
const SEVEN_DIGITS = 0.5e-6

describe('the standard atmosphere', () => {
  it.each(EVALUATED)(
    'at %d m agrees with an independent evaluation to its digits',
    (m, K, Pa, rho, a, mu, nu) => {
      const air = atmosphere(m, 0)
      expect(air.temperature).toBeCloseTo(K, 8)
      expect(Math.abs(air.pressure - Pa)).toBeLessThan(LAST_DIGIT.Pa * 1.01)
      expect(Math.abs(air.density - rho)).toBeLessThan(LAST_DIGIT.rho * 1.01)
      expect(Math.abs(air.speedOfSound - a)).toBeLessThan(LAST_DIGIT.a * 1.01)
      expect(Math.abs(air.viscosity - mu)).toBeLessThan(LAST_DIGIT.mu * 1.01)
      expect(Math.abs(air.viscosity / air.density / nu - 1)).toBeLessThan(SEVEN_DIGITS)
    },
  )

  it.each(TABLE)('at %d m agrees to the printed digits', (m, K, Pa, paDigit, rho, rhoDigit, a) => {
    const air = atmosphere(m, 0)
    expect(air.temperature).toBeCloseTo(K, 8)
    // Half a unit of the last digit, and the 2e-6 between the two printed values of the gas constant.
    expect(Math.abs(air.pressure - Pa)).toBeLessThan(0.5 * paDigit + 2e-6 * Pa)
    expect(Math.abs(air.density - rho)).toBeLessThan(0.5 * rhoDigit + 2e-6 * rho)
    if (a !== null) expect(Math.abs(air.speedOfSound - a)).toBeLessThan(0.0005)
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
