import { describe, expect, it } from 'vitest'
import { alphaForLift, panelLoads } from '../../src/core/flow/panelLoads'
import { solvePanels } from '../../src/core/flow/vortexPanels'
import { nacaSection } from '../../src/core/shape/naca'
import { placePanels } from '../../src/core/shape/panels'

const DEG = Math.PI / 180

/**
 * Measured zero-lift angle (deg) and lift-curve slope (1/deg) of smooth sections. 0012: the digitised points
 * of Abbott and von Doenhoff, Theory of Wing Sections (1959), appendix IV, Reynolds number 6e6, below 8 deg,
 * +-0.003. The others: USAF Stability and Control DATCOM (Finck, 1978), section 4.1.1, Reynolds number 9e6.
 */
const MEASURED: readonly (readonly [string, number, number])[] = [
  ['0012', 0, 0.106],
  ['2412', -2.0, 0.105],
  ['4412', -3.8, 0.105],
  ['23012', -1.4, 0.107],
]

describe.each(MEASURED)('NACA %s without a boundary layer', (code, zeroLiftDeg, slopePerDeg) => {
  const flow = solvePanels(placePanels(nacaSection(code)))
  const lift = (alphaDeg: number): number => panelLoads(flow, alphaDeg * DEG).liftCoefficient

  it('lifts 3 to 15 % more a degree than measured, over the linear range from -4 to 8 deg', () => {
    const ratio = (lift(8) - lift(-4)) / 12 / slopePerDeg
    expect(ratio).toBeGreaterThan(1.03)
    expect(ratio).toBeLessThan(1.15)
  })

  it('has no lift within half a degree of the measured angle', () => {
    const alpha = alphaForLift(flow, 0) ?? NaN
    expect(Math.abs(alpha / DEG - zeroLiftDeg)).toBeLessThan(0.5)
  })
})
