import { describe, expect, it } from 'vitest'
import { linearLiftingLine, momentStrips, type LinearWing } from '../../../src/core/wing/linearSections'
import { meanAerodynamicChord, taperedStations } from '../../../src/core/wing/planform'
import { tailLoad, wingMoment } from '../../../src/core/wing/trim'

const SECTION = { slope: 6, zeroLift: -0.04, momentAtZeroLift: -0.06 }

function wing(taper: number, washout: number, sweepQuarterChord: number): LinearWing {
  const stations = taperedStations(12, 10, taper, washout)
  const rest = { sparAt: 0.3, skinThickness: 0, flap: null }
  return { shape: { area: 12, span: 10, stations, sweepQuarterChord, ...rest }, root: SECTION, tip: SECTION }
}

const momentOf = (given: LinearWing) =>
  wingMoment(momentStrips(given, linearLiftingLine(given)), given.shape.sweepQuarterChord)

describe('moment and aerodynamic centre of a wing', () => {
  it.each([1, 0.5])(
    'without sweep, taper %d: quarter chord, and the section moment over S times mean chord',
    (taper) => {
      const { aerodynamicCentre, momentOverPressure } = momentOf(wing(taper, 0.05, 0))
      expect(aerodynamicCentre).toBeCloseTo(0, 12)
      const { chord } = meanAerodynamicChord(wing(taper, 0, 0).shape.stations)
      // 1e-4: the midpoint sum over 100 strips.
      expect(Math.abs(momentOverPressure / (-0.06 * 12 * chord) - 1)).toBeLessThan(1e-4)
    },
  )

  it('with sweep lies behind the root quarter chord by tan(sweep) times the centroid of the additional lift', () => {
    const swept = wing(1, 0, 0.3)
    const { aerodynamicCentre } = momentOf(swept)
    // The centroid of lift on half a wing of uniform chord lies between that of an ellipse, 4/(3 pi), and 1/2.
    const centroid = aerodynamicCentre / Math.tan(0.3) / 5
    expect(centroid).toBeGreaterThan(4 / (3 * Math.PI))
    expect(centroid).toBeLessThan(0.5)
  })

  it('washout on a swept-back wing pitches nose up, swept forward as much nose down, linearly in both', () => {
    const plain = momentOf(wing(0.6, 0, 0.3)).momentOverPressure
    const couple = (washout: number, sweep: number) =>
      momentOf(wing(0.6, washout, sweep)).momentOverPressure - plain
    expect(couple(0.05, 0.3)).toBeGreaterThan(0)
    expect(couple(0.05, -0.3)).toBeCloseTo(-couple(0.05, 0.3), 10)
    expect(couple(0.1, 0.3)).toBeCloseTo(2 * couple(0.05, 0.3), 10)
  })
})

describe('the tail load', () => {
  const given = {
    dynamicPressure: 500,
    load: 6000,
    moment: { aerodynamicCentre: 0, momentOverPressure: -0.8 },
    meanChord: { chord: 1.2, y: 2.5 },
    sweepQuarterChord: 0,
    centreOfGravity: 0.3,
    tailArm: 4,
  }

  it('agrees with a worked example by hand', () => {
    // (-0.8 x 500 + 6000 x (0.30 - 0.25) x 1.2) / 4 = (-400 + 360) / 4.
    expect(tailLoad(given)).toBeCloseTo(-10, 12)
  })

  it('of a canard, whose arm is negative, turns its sign', () => {
    expect(tailLoad({ ...given, tailArm: -4 })).toBeCloseTo(10, 12)
  })

  it('without a centre of gravity balances the moment alone, and without an arm is not given', () => {
    expect(tailLoad({ ...given, centreOfGravity: null })).toBeCloseTo(-100, 12)
    expect(tailLoad({ ...given, tailArm: null })).toBeNull()
  })

  it('measures the centre of gravity from the mean chord, wherever sweep puts it', () => {
    // The quarter of the mean chord lies 2.5 tan(0.2) behind that of the root; a centre of 0.25 sits on it.
    const moment = { aerodynamicCentre: 2.5 * Math.tan(0.2), momentOverPressure: 0 }
    expect(tailLoad({ ...given, moment, sweepQuarterChord: 0.2, centreOfGravity: 0.25 })).toBeCloseTo(0, 10)
  })
})
