import { describe, expect, it } from 'vitest'
import { BadInput } from '../../../src/core/numerics/errors'
import { meanAerodynamicChord, taperedStations } from '../../../src/core/wing/planform'
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
    aircraft: { tailArm: null, centreOfGravity: null, tailless: false },
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
    const atCentre = wingAt(drone({ aircraft: { tailArm: 1.4, centreOfGravity: null, tailless: false } }))
    expect(atCentre.tailLoad).toBeCloseTo(-4.691, 2)
    expect(atCentre.notes.join()).toContain('no centre of gravity given')
    // 5 % of the mean chord behind the aerodynamic centre adds 235.3596 x 0.05 x 0.311921 / 1.4 = 2.6220 N.
    const aft = wingAt(drone({ aircraft: { tailArm: 1.4, centreOfGravity: 0.3, tailless: false } }))
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

  it('without a tail gives no tail load, whatever the arm, and says that balance is not judged', () => {
    const tailless = wingAt(drone({ aircraft: { tailArm: 1.4, centreOfGravity: 0.2, tailless: true } }))
    expect(tailless.tailLoad).toBeNull()
    expect(tailless.notes.join()).toContain('tailless')
    expect(tailless.notes.join()).not.toContain('no tail arm')
  })

  it('finds the peak of local lift between its stations', () => {
    // Untwisted, taper 0.45, aspect ratio 10: peak 1.0553360 of C_L at 0.573086 of the semispan
    // (converged lifting line, 1600 odd terms, extrapolated).
    const flat = { slope: 2 * Math.PI, zeroLift: 0, momentAtZeroLift: 0 }
    const stations = taperedStations(10, 10, 0.45, 0)
    const shape = { ...drone().shape, area: 10, span: 10, stations }
    const wing = wingAt(drone({ shape, root: flat, tip: flat }))
    expect(Math.abs(wing.peakLiftCoefficient / wing.liftCoefficient - 1.055335987)).toBeLessThan(2e-5)
    expect(Math.abs(wing.peakLiftAt / 5 - 0.573086)).toBeLessThan(0.005)
    for (const station of wing.stations) {
      expect(station.liftCoefficient).toBeLessThanOrEqual(wing.peakLiftCoefficient)
    }
  })

  it('takes stations whose span differs from the brief by the 0.1 % allowed, down to a pointed tip', () => {
    const pointed = taperedStations(1.1, 3.6, 1e-4, 0.035)
    const shape = { ...drone().shape, span: 3.6035, stations: pointed }
    const wing = wingAt(drone({ shape }))
    const exact = wingAt(drone({ shape: { ...shape, span: 3.6 } }))
    expect(wing.stations.at(-1)!.y).toBe(1.8)
    expect(wing.liftSlope).toBe(exact.liftSlope)
    for (const { liftCoefficient, inducedAngle } of wing.stations) {
      expect(Number.isFinite(liftCoefficient)).toBe(true)
      expect(Number.isFinite(inducedAngle)).toBe(true)
    }
  })

  it('warns of a quick formula outside its range beside its figure, not among the notes', () => {
    const wing = wingAt(drone())
    expect(wing.helmboldSlope).toBeGreaterThan(wing.liftSlope * 0.95)
    expect(wing.quickWarnings.join()).toContain('Helmbold')
    expect(wing.notes.join()).not.toContain('Helmbold')
  })

  it('marks a speed so low that straight lift curves ask for more than sections carry', () => {
    const slow = wingAt(drone({ condition: { ...drone().condition, speed: 11 } }))
    expect(slow.notes.join()).toContain('do not stall')
  })

  it('reads local lift between stations', () => {
    const wing = wingAt(drone())
    expect(localLiftAt(wing, 0)).toBeCloseTo(wing.stations[0].liftCoefficient, 12)
    expect(localLiftAt(wing, 1.8)).toBeCloseTo(0, 12)
  })
})
