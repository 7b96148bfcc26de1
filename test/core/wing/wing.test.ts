import { describe, expect, it } from 'vitest'
import { BadInput } from '../../../src/core/numerics/errors'
import {
  checkStations,
  meanAerodynamicChord,
  stationAt,
  taperedStations,
} from '../../../src/core/wing/planform'
import { localLiftAt, wingAt, type WingInput } from '../../../src/core/wing/wing'

const RADIAN = 180 / Math.PI

/** A wing like a small drone's, with sections of slope 2 pi. */
function drone(change: Partial<WingInput> = {}, sweepDeg = 0): WingInput {
  const section = { slope: 2 * Math.PI, zeroLift: -2 / RADIAN, momentAtZeroLift: -0.05 }
  return {
    shape: {
      area: 1.1,
      span: 3.6,
      stations: taperedStations(1.1, 3.6, 0.6, 2 / RADIAN),
      sweepQuarterChord: sweepDeg / RADIAN,
      sparAt: 0.3,
      skinThickness: 0,
      flap: null,
    },
    aircraft: { tailArm: null, centreOfGravity: null },
    condition: { speed: 25, altitude: 0, isaOffset: 0, loadFactor: 1, mass: 24 },
    root: section,
    tip: section,
    fixedReynolds: null,
    ...change,
  }
}

describe('a wing at a condition', () => {
  it('needs the lift of a worked example by hand', () => {
    // q = 0.5 x 1.225 x 25^2 = 382.8125 Pa; W = 24 x 9.80665 = 235.3596 N; C_L = 235.3596 / (382.8125 x 1.1).
    const wing = wingAt(drone())
    expect(wing.dynamicPressure).toBeCloseTo(382.8125, 3)
    expect(wing.liftCoefficient).toBeCloseTo(0.55893, 4)
    expect(wing.wingLoadingMass).toBeCloseTo(21.81818, 5)
    expect(wing.equivalentAirspeed).toBeCloseTo(25, 6)
    // Mean chord of taper 0.6: 2/3 c_root (1 + 0.6 + 0.36)/1.6 with c_root = 2 x 1.1/(3.6 x 1.6) = 0.381944 m.
    const { chord } = meanAerodynamicChord(drone().shape.stations)
    expect(chord).toBeCloseTo(0.311921, 5)
    expect(wing.reynolds / 1e3).toBeCloseTo((1.225 * 25 * 0.311921) / 1.78938e-5 / 1e3, 0)
  })

  it('carries with the tail what the moments ask, by hand', () => {
    // M_ac = q S c_mean c_m = 382.8125 x 1.1 x 0.311921 x (-0.05) = -6.5674 N m; the arm is 1.4 m.
    const atCentre = wingAt(drone({ aircraft: { tailArm: 1.4, centreOfGravity: null } }))
    expect(atCentre.tailLoad).toBeCloseTo(-4.691, 2)
    expect(atCentre.notes.join()).toContain('no centre of gravity given')
    // 5 % of the mean chord behind the aerodynamic centre adds 235.3596 x 0.05 x 0.311921 / 1.4 = 2.6220 N.
    const aft = wingAt(drone({ aircraft: { tailArm: 1.4, centreOfGravity: 0.3 } }))
    expect(aft.tailLoad! - atCentre.tailLoad!).toBeCloseTo(2.622, 3)
    expect(aft.liftCoefficient).toBeCloseTo((235.3596 - aft.tailLoad!) / (382.8125 * 1.1), 5)
  })

  it('without a tail arm gives no tail load and carries all', () => {
    expect(wingAt(drone()).tailLoad).toBeNull()
    expect(wingAt(drone()).notes.join()).toContain('no tail arm given')
  })

  it('exports stations that, integrated, give lift and root moment to 1e-3', () => {
    const wing = wingAt(drone())
    let lift = 0
    let moment = 0
    for (let k = 0; k + 1 < wing.stations.length; k++) {
      const [a, b] = [wing.stations[k], wing.stations[k + 1]]
      const [la, lb] = [a.liftCoefficient * a.chord, b.liftCoefficient * b.chord]
      lift += (b.y - a.y) * (la + lb)
      moment += 0.5 * (b.y - a.y) * (la * a.y + lb * b.y)
    }
    expect(wing.stations.length).toBeGreaterThanOrEqual(21)
    expect(wing.stations.at(-1)!.y).toBe(1.8)
    expect(Math.abs(lift / 1.1 / wing.liftCoefficient - 1)).toBeLessThan(1e-3)
    expect(Math.abs((moment * wing.dynamicPressure) / wing.rootBendingMoment - 1)).toBeLessThan(1e-3)
  })

  it('has a span efficiency only where there is lift to speak of', () => {
    expect(wingAt(drone()).spanEfficiency).toBeGreaterThan(0.9)
    const gliding = wingAt(drone({ condition: { ...drone().condition, mass: 0.5 } }))
    expect(Math.abs(gliding.liftCoefficient)).toBeLessThan(0.05)
    expect(gliding.spanEfficiency).toBeNull()
  })

  it('takes a fixed Reynolds number for that at the mean chord', () => {
    const wing = wingAt(drone({ fixedReynolds: 4e5 }))
    expect(wing.reynolds).toBe(4e5)
    expect(wing.stations[0].reynolds).toBeCloseTo((4e5 * 0.381944) / 0.311921, -2)
  })

  it('loses section slope by the cosine of the sweep, and says what is not computed', () => {
    const straight = wingAt(drone()).liftSlope
    const swept = wingAt(drone({}, 20))
    expect(swept.liftSlope).toBeLessThan(straight)
    expect(swept.liftSlope / straight).toBeGreaterThan(Math.cos(20 / RADIAN))
    expect(swept.notes.join()).toContain('sweep of 20 deg')
  })

  it.each([
    ['speed', { speed: 0 }],
    ['speed', { speed: -10 }],
    ['mass', { mass: 0 }],
    ['load factor', { loadFactor: -1 }],
  ])('refuses a %s that cannot be flown', (word, part) => {
    const input = drone()
    expect(() => wingAt({ ...input, condition: { ...input.condition, ...part } })).toThrow(BadInput)
    expect(() => wingAt({ ...input, condition: { ...input.condition, ...part } })).toThrow(word)
  })

  it('reads local lift between stations', () => {
    const wing = wingAt(drone())
    expect(localLiftAt(wing, 0)).toBeCloseTo(wing.stations[0].liftCoefficient, 12)
    expect(localLiftAt(wing, 1.8)).toBeCloseTo(0, 12)
  })
})

describe('stations', () => {
  const stations = taperedStations(10, 10, 0.5, 0)

  it('give chord and twist linearly between them', () => {
    expect(stationAt(stations, 2.5).chord).toBeCloseTo(1, 12)
  })

  it.each([
    ['an area that differs by 1 %', 10.1, 10, /area/],
    ['a span that differs', 10, 11, /span/],
  ])('refuse %s', (_, area, span, words) => {
    expect(() => checkStations(stations, area, span)).toThrow(words)
  })

  it('refuse a tip chord of zero, an order that goes back, and a first one off the centreline', () => {
    expect(() => taperedStations(10, 10, 0, 0)).toThrow(/tip chord of zero/)
    expect(() => checkStations([stations[0], { ...stations[1], chord: 0 }], 10, 10)).toThrow(/station 2/)
    expect(() => checkStations([stations[0], { ...stations[1], y: 0 }], 10, 10)).toThrow(/station 2/)
    expect(() => checkStations([{ ...stations[0], y: 1 }, stations[1]], 10, 10)).toThrow(/station 1/)
  })
})
