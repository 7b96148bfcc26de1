import { describe, expect, it } from 'vitest'
import { compressiblePressure, criticalPressure } from '../../../src/core/flow/compressibility'

describe('the compressibility correction', () => {
  it('leaves incompressible pressures alone', () => {
    expect(compressiblePressure(-1.3, 0)).toBe(-1.3)
  })

  it('is the rule of Prandtl and Glauert for small disturbances', () => {
    expect(compressiblePressure(-1e-6, 0.5) * Math.sqrt(0.75)).toBeCloseTo(-1e-6, 11)
  })

  it('never passes the pressure of a vacuum', () => {
    expect(compressiblePressure(-40, 0.5)).toBeCloseTo(-2 / (1.4 * 0.25), 12)
  })

  // Isentropic flow with ratio of specific heats 1.4; -3.66 at 0.4 and -2.13 at 0.5 are read in the usual
  // charts of critical pressure coefficient (Abbott and von Doenhoff, Theory of Wing Sections, 1959, ch. 9).
  it.each([
    [0.4, -3.66],
    [0.5, -2.13],
    [1, 0],
  ])('has the critical pressure of Mach %d', (mach, expected) => {
    expect(Math.abs(criticalPressure(mach) - expected)).toBeLessThan(0.005)
  })
})
