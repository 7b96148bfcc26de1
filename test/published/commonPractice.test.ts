/** Facts of the trade and rules of thumb, all "common practice": sanity bands, not measurements. */
import { describe, expect, it } from 'vitest'
import { flightState, reynoldsNumber } from '../../src/core/flight/conditions'
import { wingLiftAt } from '../../src/core/wing/liftingLine'
import { taperedLine } from '../support/wings'

const level = { altitude: 0, isaOffset: 0, loadFactor: 1 }

describe('common practice', () => {
  it('sea-level air weighs 1.225 kg/m3 and presses with 101325 Pa', () => {
    const { air } = flightState(10, { ...level, speed: 50, mass: 500 })
    expect(air.density).toBeCloseTo(1.225, 4)
    expect(air.pressure).toBeCloseTo(101325, 6)
  })

  it('a large transport of 600 kg/m2 is carried by almost 6 % of the ambient pressure', () => {
    const { wingLoadingShare } = flightState(500, { ...level, speed: 150, mass: 300_000 })
    expect(wingLoadingShare).toBeGreaterThan(0.055)
    expect(wingLoadingShare).toBeLessThan(0.06)
  })

  it('a lift coefficient of 1 means that lift equals dynamic pressure times area', () => {
    const area = 12
    const speed = 30
    const { dynamicPressure } = flightState(area, { ...level, speed, mass: 1 })
    const mass = (dynamicPressure * area) / 9.80665
    expect(flightState(area, { ...level, speed, mass }).liftCoefficient).toBeCloseTo(1, 12)
  })

  it.each([
    [1.0, 6, 0.92, 0.955],
    [1.0, 10, 0.92, 0.955],
    [0.4, 6, 0.983, 0.992],
    [0.4, 8, 0.983, 0.992],
  ])(
    'span efficiency of taper %d at aspect ratio %d lies between %d and %d',
    (taper, aspectRatio, low, high) => {
      const { liftCoefficient, inducedDragCoefficient } = wingLiftAt(taperedLine(aspectRatio, taper), 0.1)
      const e = liftCoefficient ** 2 / (Math.PI * aspectRatio * inducedDragCoefficient)
      expect(e).toBeGreaterThan(low)
      expect(e).toBeLessThan(high)
    },
  )

  it.each([
    ['a radio-controlled model', 12, 0.25, 5e4, 5e5],
    ['a sailplane', 30, 0.75, 5e5, 3e6],
    ['a light aircraft', 55, 1.4, 2e6, 8e6],
  ])('%s flies at the usual Reynolds number', (_, speed, chord, low, high) => {
    const { air } = flightState(1, { ...level, speed, mass: 1 })
    const reynolds = reynoldsNumber(air, speed, chord)
    expect(reynolds).toBeGreaterThan(low)
    expect(reynolds).toBeLessThan(high)
  })
})
