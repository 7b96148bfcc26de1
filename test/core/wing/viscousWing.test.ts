import { describe, expect, it } from 'vitest'
import { REYNOLDS_LATTICE } from '../../../src/core/polar/reynoldsLattice'
import { MACH_LATTICE } from '../../../src/core/polar/machLattice'
import type { Polar } from '../../../src/core/polar/polar'
import { performance } from '../../../src/core/wing/performance'
import { taperedStations, type WingStation } from '../../../src/core/wing/planform'
import { slowestStep } from '../../../src/core/wing/slowest'
import { wingAt, type WingInput } from '../../../src/core/wing/wing'
import { inventedPolar, type InventedSection } from '../../support/polars'

const constant: InventedSection = {
  slope: 2 * Math.PI,
  zeroLift: -0.05,
  maxLift: () => 1.4,
  moment: 0,
  drag: (lift) => 0.01 + 0.004 * lift * lift,
}
const growing: InventedSection = { ...constant, maxLift: (re) => 1 + 0.12 * Math.log(re / 5e4) }

const familyOf = (section: InventedSection): Polar[] =>
  REYNOLDS_LATTICE.flatMap((re) => MACH_LATTICE.map((mach) => inventedPolar(section, re, mach)))

function wingOf(
  section: InventedSection | Polar[],
  speed: number,
  change: Partial<WingInput> = {},
  stations: readonly WingStation[] = taperedStations(1.1, 3.6, 0.6, 0),
): WingInput {
  const family = Array.isArray(section) ? section : familyOf(section)
  const line = { slope: 2 * Math.PI, zeroLift: -0.05, momentAtZeroLift: 0 }
  return {
    shape: {
      ...{ area: 1.1, span: 3.6, stations, sweepQuarterChord: 0 },
      ...{ sparAt: 0.3, skinThickness: 0, flap: null },
    },
    aircraft: { tailArm: null, centreOfGravity: null, tailless: false, dragArea: 0.021 },
    condition: { speed, altitude: 0, isaOffset: 0, loadFactor: 1, mass: 24 },
    root: line,
    tip: line,
    fixedReynolds: null,
    families: { root: family, tip: family },
    ...change,
  }
}

/** An ellipse of chords whose straight pieces enclose the area exactly; the tip keeps a chord. */
function ellipse(area: number, span: number): WingStation[] {
  const n = 300
  const raw = Array.from({ length: n + 1 }, (_, k) => {
    const y = 0.5 * span * Math.sin((Math.PI * k) / (2 * n))
    return { y, chord: Math.max(Math.cos((Math.PI * k) / (2 * n)), 1e-2), twist: 0 }
  })
  let half = 0
  for (let k = 0; k < n; k++) half += 0.5 * (raw[k + 1].y - raw[k].y) * (raw[k].chord + raw[k + 1].chord)
  return raw.map((station) => ({ ...station, chord: (station.chord * area) / (2 * half) }))
}

function slowest(input: WingInput): number {
  let speed = input.condition.speed
  for (let n = 0; n < 40; n++) {
    const next = slowestStep({ ...input, condition: { ...input.condition, speed } })
    if (typeof next === 'string') throw new Error(next)
    speed = next
  }
  return speed
}

describe('drag and what it costs', () => {
  it('follows a worked example by hand', () => {
    // q = 382.8125 Pa; D = q (1.1 (0.012 + 0.011) + 0.021) = 382.8125 x 0.0463 = 17.72421875 N;
    // P = D x 25 = 443.10546875 W; W = 235.3596 N: W/D = 13.27898, sink = P/W = 1.8826743 m/s.
    const input = {
      ...{ dynamicPressure: 382.8125, area: 1.1, profileDragCoefficient: 0.012 },
      ...{ inducedDragCoefficient: 0.011, dragArea: 0.021, speed: 25, weight: 235.3596, loadFactor: 1 },
    }
    const figures = performance(input)
    expect(figures.drag).toBeCloseTo(17.72421875, 9)
    expect(figures.power).toBeCloseTo(443.10546875, 8)
    expect(figures.glideRatio).toBeCloseTo(13.27898, 5)
    expect(figures.sink).toBeCloseTo(1.8826743, 6)
    expect(performance({ ...input, loadFactor: 2 })).toMatchObject({ glideRatio: null, sink: null })
    expect(performance({ ...input, profileDragCoefficient: null }).drag).toBeNull()
  })
})

describe('a wing with viscous polars', () => {
  it('flies an ellipse as slowly as its section, by hand', () => {
    // Uniform c_l: C_Lmax = 1.4. V = sqrt(2 x 235.3596 / (1.225 x 1.1 x 1.4)) = sqrt(249.520) = 15.7962 m/s.
    const input = wingOf(constant, 20, { fixedReynolds: 1e7 }, ellipse(1.1, 3.6))
    // The stations' polygon and the finite tip chord leave the local lift uniform to some 1e-3.
    expect(Math.abs(slowest(input) / 15.7962 - 1)).toBeLessThan(2e-3)
  })

  it('stalls an untwisted wing where its local lift peaks, at exactly the speed that this gives', () => {
    const wing = wingAt(wingOf(constant, 25))
    const peak = Math.max(...wing.stations.map((station) => station.liftCoefficient))
    const at = wing.stations.find((station) => station.liftCoefficient === peak)!
    // With zero twist the basic lift vanishes: local lift scales with C_L.
    const most = (1.4 * wing.liftCoefficient) / peak
    expect(wing.maxLiftCoefficient).toBeCloseTo(most, 9)
    expect(wing.stallAtSemispan).toBeCloseTo(at.y / 1.8, 12)
    const speed = Math.sqrt((2 * 24 * 9.80665) / (wing.density * 1.1 * most))
    expect(slowest(wingOf(constant, 25))).toBeCloseTo(speed, 8)
  })

  it('has profile drag up to first stall where root and tip stall at different lift', () => {
    const weak: InventedSection = { ...constant, maxLift: () => 1.2 }
    const families = { root: familyOf(constant), tip: familyOf(weak) }
    const input = wingOf(constant, 25, { families })
    const speed = slowest({ ...input, condition: { ...input.condition, speed: 18 } })
    const atStall = wingAt({ ...input, condition: { ...input.condition, speed } })
    // Near the stall the station lies between: more than the tip section alone would carry.
    expect(Math.max(...atStall.stations.map(({ liftCoefficient }) => liftCoefficient))).toBeGreaterThan(1.2)
    expect(atStall.profileDragCoefficient).not.toBeNull()
    const slower = wingAt({ ...input, condition: { ...input.condition, speed: 0.95 * speed } })
    expect(slower.profileDragCoefficient).toBeNull()
    expect(slower.missing.join()).toMatch(/beyond the stall/)
  })

  it('keeps a tip margin: the smallest over the outer 40 % at first stall', () => {
    const wing = wingAt(wingOf(constant, 25))
    const scale = wing.maxLiftCoefficient! / wing.liftCoefficient
    const outer = wing.stations.filter(({ y }) => y >= 1.08)
    expect(wing.tipMargin).toBeCloseTo(
      Math.min(...outer.map((station) => 1.4 - scale * station.liftCoefficient)),
      9,
    )
    const swept = wingOf(constant, 25)
    const aft = wingAt({ ...swept, shape: { ...swept.shape, sweepQuarterChord: 0.1 } })
    expect(aft.tipMargin).toBeNull()
    expect(aft.stations[0].maxLiftCoefficient).toBeCloseTo(1.4 * Math.cos(0.1) ** 2, 9)
  })

  it('settles with Reynolds number and tail load together, from above and from below alike', () => {
    const change = { aircraft: { tailArm: 1.4, centreOfGravity: 0.35, tailless: false, dragArea: 0 } }
    const nose = { ...growing, moment: -0.08 }
    const speed = slowest(wingOf(nose, 25, change))
    expect(slowest(wingOf(nose, 9, change))).toBeCloseTo(speed, 9)
    const wing = wingAt(wingOf(nose, speed, change))
    expect(wing.liftCoefficient).toBeCloseTo(wing.maxLiftCoefficient!, 8)
    const carried = wing.liftCoefficient * wing.dynamicPressure * 1.1
    expect(carried + wing.tailLoad!).toBeCloseTo(24 * 9.80665, 6)
    expect(wing.missing).toEqual([])
    expect(wing.drag).toBeGreaterThan(0)
  })

  it('exports stations that, integrated, give the profile drag of the totals to 1e-3', () => {
    const wing = wingAt(wingOf(growing, 20))
    let sum = 0
    for (let k = 0; k + 1 < wing.stations.length; k++) {
      const [a, b] = [wing.stations[k], wing.stations[k + 1]]
      sum += (b.y - a.y) * (a.profileDragCoefficient! * a.chord + b.profileDragCoefficient! * b.chord)
    }
    expect(Math.abs(sum / 1.1 / wing.profileDragCoefficient! - 1)).toBeLessThan(1e-3)
    for (const station of wing.stations) {
      expect(station.profileDragCoefficient).toBeCloseTo(constant.drag(station.liftCoefficient), 5)
      expect(station.maxLiftCoefficient).toBeCloseTo(growing.maxLift(station.reynolds), 9)
    }
    const drag = wing.dynamicPressure * (1.1 * (sum / 1.1 + wing.inducedDragCoefficient) + 0.021)
    expect(wing.drag).toBeCloseTo(drag, 9)
  })

  it('says that it cannot be flown where it needs more lift than it has', () => {
    const wing = wingAt(wingOf(constant, 12))
    expect(wing.missing.join()).toContain('cannot be flown: the wing needs C_L 2.43')
    expect(wing.drag).toBeNull()
  })

  it('has no profile drag where a point next to the local lift failed, and says so', () => {
    const family = familyOf(constant).map((polar) => ({
      ...polar,
      points: polar.points.map((point) =>
        point.liftCoefficient! > 0.5 && point.liftCoefficient! < 0.7
          ? { ...point, converged: false, reason: 'no way' }
          : point,
      ),
    }))
    const wing = wingAt(wingOf(family, 25))
    expect(wing.profileDragCoefficient).toBeNull()
    expect(wing.missing.join()).toContain('did not converge (no way)')
    expect(wing.maxLiftCoefficient).not.toBeNull()
  })

  it('marks Reynolds numbers below the lattice and gives no figures that rest on them', () => {
    const wing = wingAt(wingOf(constant, 25, { fixedReynolds: 5.5e4 }))
    expect(wing.stations.at(-1)!.maxLiftCoefficient).toBeNull()
    expect(wing.stations[0].maxLiftCoefficient).toBeCloseTo(1.4, 9)
    expect(wing.maxLiftCoefficient).toBeNull()
    expect(wing.missing.join()).toContain('outside the polars')
  })
})
