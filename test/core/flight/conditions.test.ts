import { describe, expect, it } from 'vitest'
import { flightState, reynoldsNumber, whyUnflyable } from '../../../src/core/flight/conditions'

const flight = { speed: 40, altitude: 2000, isaOffset: 0, loadFactor: 2, mass: 600 }

describe('the state of flight', () => {
  it('agrees with a worked example by hand at 2000 m', () => {
    // rho = 1.00649 kg/m3, p = 79495.2 Pa: q = 0.5 x 1.00649 x 1600 = 805.192 Pa; W = 600 x 9.80665 = 5883.99 N.
    const state = flightState(12, flight)
    expect(state.dynamicPressure).toBeCloseTo(805.192, 2)
    expect(state.load).toBeCloseTo(11767.98, 6)
    expect(state.wingLoadingMass).toBeCloseTo(50, 12)
    expect(state.wingLoadingForce).toBeCloseTo(490.3325, 8)
    expect(state.wingLoadingShare).toBeCloseTo(490.3325 / 79495.2, 8)
    // 11767.98 / (805.192 x 12) and 40 x sqrt(1.00649 / 1.225).
    expect(state.liftCoefficient).toBeCloseTo(1.21793, 4)
    expect(state.equivalentAirspeed).toBeCloseTo(36.2573, 3)
  })

  it('has the dynamic pressure of its equivalent airspeed at sea level', () => {
    const { dynamicPressure, equivalentAirspeed } = flightState(12, flight)
    const atSea = flightState(12, { ...flight, speed: equivalentAirspeed, altitude: 0 })
    expect(atSea.dynamicPressure / dynamicPressure).toBeCloseTo(1, 12)
  })

  it('gives a Reynolds number from the kinematic viscosity', () => {
    // nu at 2000 m is 1.714832e-5 m2/s: 40 x 1.5 / 1.714832e-5.
    const { air } = flightState(12, flight)
    expect(reynoldsNumber(air, 40, 1.5) / ((40 * 1.5) / 1.714832e-5)).toBeCloseTo(1, 6)
  })
})

describe('a condition that cannot be flown', () => {
  it.each([
    ['speed', { speed: 0 }],
    ['speed', { speed: -3 }],
    ['speed', { speed: Number.NaN }],
    ['speed', { speed: Infinity }],
    ['mass', { mass: 0 }],
    ['mass', { mass: Infinity }],
    ['load factor', { loadFactor: 0 }],
    ['load factor', { loadFactor: Number.NaN }],
  ])('names its %s when given %o', (word, part) => {
    expect(whyUnflyable({ ...flight, ...part })).toContain(word)
  })

  it('is none when speed, mass and load factor are positive', () => {
    expect(whyUnflyable(flight)).toBeNull()
  })
})
