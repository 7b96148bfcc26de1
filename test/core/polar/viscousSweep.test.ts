import { describe, expect, it } from 'vitest'
import type { Polar } from '../../../src/core/polar/polar'
import type { SectionState } from '../../../src/core/polar/state'
import { pressureAt, sweep } from '../../../src/core/polar/sweep'
import { nacaSection } from '../../../src/core/shape/naca'
import { viscousState } from '../../published/report/polars'

const DEGREE = Math.PI / 180
const angles = (from: number, to: number, step = 1): number[] =>
  Array.from({ length: Math.round((to - from) / step) + 1 }, (_, i) => (from + step * i) * DEGREE)
const polarOf = (code: string, state: SectionState, alphas: readonly number[]): Polar =>
  sweep(nacaSection(code), state, alphas)

describe('a viscous sweep', { timeout: 120_000 }, () => {
  it('comes to the same points whatever the order of its angles', () => {
    // Up from below stall, and down from beyond it: each way starts at the angle nearest to zero it is given.
    for (const [code, reynolds] of [
      ['2412', 1e6],
      ['0012', 6e6],
      ['4415', 5e5],
    ] as const) {
      const state = viscousState(reynolds)
      const up = polarOf(code, state, angles(-4, 11))
      for (const [from, to] of [
        [3, 11],
        [6, 11],
        [10, 11],
      ] as const) {
        const part = polarOf(code, state, angles(from, to))
        part.points.forEach((point, i) => {
          const same = up.points[from + 4 + i]!
          expect([point.converged, same.converged]).toEqual([true, true])
          expect(Math.abs(point.dragCoefficient! / same.dragCoefficient! - 1)).toBeLessThan(0.005)
        })
      }
      expect(up.points.filter(({ converged }) => converged).length).toBeGreaterThanOrEqual(15)
    }
  })

  it('gives the same bits when a section is swept again after other work', () => {
    const section = nacaSection('4412')
    const first = sweep(section, viscousState(1e6), angles(-2, 6, 2))
    sweep(section, viscousState(3e5, { mach: 0.2 }), angles(0, 8, 4))
    expect(sweep(section, viscousState(1e6), angles(-2, 6, 2))).toEqual(first)
  })

  it('mirrors for a symmetric section', () => {
    const { points } = polarOf('0012', viscousState(1e6), angles(-6, 6, 2))
    points.forEach((point, i) => {
      const other = points[points.length - 1 - i]!
      expect(point.converged).toBe(true)
      expect(point.liftCoefficient! + other.liftCoefficient!).toBeCloseTo(0, 4)
      expect(point.dragCoefficient! - other.dragCoefficient!).toBeCloseTo(0, 6)
      expect(point.transitionUpper! - other.transitionLower!).toBeCloseTo(0, 3)
    })
  })

  it('has a lift curve without steps where the layers turn turbulent, and steps where one is laminar to the edge', () => {
    // Second differences over quarter degrees, of which each lifts by about 0.027.
    const worst = (code: string, reynolds: number, from: number, to: number): number => {
      const { points } = polarOf(code, viscousState(reynolds), angles(from, to, 0.25))
      const lifts = points.map(({ liftCoefficient }) => liftCoefficient ?? NaN)
      const seconds = lifts.slice(2).map((lift, i) => lift - 2 * lifts[i + 1]! + lifts[i]!)
      return Math.max(...seconds.map(Math.abs))
    }
    expect(worst('0012', 6e6, -1, 10)).toBeLessThan(0.005)
    // Real kinks, up to half a step of lift.
    expect(worst('2412', 1e6, 0, 8)).toBeLessThan(0.015)
    // Missed: at 7 deg one point lies on another branch, 0.02 low in lift and 6 per cent high in drag.
    expect(worst('0012', 1e6, 0, 8)).toBeLessThan(0.045)
    // Missed most: one point of the five-digit section lies 0.05 off its neighbours, at little change of drag.
    expect(worst('23015', 1e6, -8, -6)).toBeLessThan(0.11)
  })

  it('moves by less than 2 per cent from 180 to 270 panels', () => {
    // Away from the kinks where a layer is laminar almost to the trailing edge; NACA 2415 has one at 6 deg.
    for (const [code, reynolds] of [
      ['2412', 1e6],
      ['0012', 3e6],
      ['4412', 6e6],
    ] as const) {
      const [coarse, fine] = [180, 270].map((panels) =>
        polarOf(code, { ...viscousState(reynolds), panels }, angles(-2, 10, 2)),
      )
      coarse!.points.forEach((point, i) => {
        const other = fine!.points[i]!
        expect(Math.abs(point.dragCoefficient! / other.dragCoefficient! - 1)).toBeLessThan(0.02)
        expect(Math.abs(point.liftCoefficient! - other.liftCoefficient!)).toBeLessThan(0.01)
      })
    }
  })

  it('has less drag on the surface than in the wake, by more than is aimed at away from zero lift, closer with more panels', () => {
    // Aim for lift from -0.8 to 0.8: 0.0010 or a tenth of the drag. Missed: NACA 2412 meets it from -4 to 2 deg only.
    const missOf = (code: string, panels: number, alphas: readonly number[]): number =>
      Math.max(
        ...alphas.map((alpha) => {
          const state = { ...viscousState(3e6), panels }
          const section = nacaSection(code)
          const { converged, layers, liftCoefficient } = pressureAt(section, state, { alpha: alpha * DEGREE })
          expect(converged).toBe(true)
          expect(Math.abs(liftCoefficient)).toBeLessThan(0.8)
          return Math.abs(layers!.frictionDrag + layers!.pressureDrag - layers!.dragCoefficient)
        }),
      )
    expect(missOf('2412', 180, [-4, -2, 0, 2])).toBeLessThan(0.001)
    // Over the whole range of lift: 0.0016 for 2412 and 4415, 0.0032 for the thick 2421.
    expect(missOf('2412', 180, [-8, -4, 4])).toBeLessThan(0.0018)
    expect(missOf('4415', 180, [-8, -4, 2])).toBeLessThan(0.0018)
    expect(missOf('2421', 180, [-8, -4, 2, 6])).toBeLessThan(0.0035)
    for (const code of ['2412', '4415']) {
      const misses = [120, 180, 270].map((panels) => missOf(code, panels, [-8, -2, 0, 2]))
      expect(misses[1]).toBeLessThan(misses[0]!)
      expect(misses[2]).toBeLessThan(misses[1]!)
    }
  })

  it('finds its greatest lift between the angles asked for, without exporting what it added', () => {
    const polar = polarOf('4415', viscousState(3e6), angles(8, 19))
    expect(polar.points.length).toBe(12)
    expect(polar.between.length).toBeGreaterThan(2)
    const most = Math.max(...polar.points.map(({ liftCoefficient }) => liftCoefficient ?? 0))
    expect(polar.maxLift!.liftCoefficient).toBeGreaterThanOrEqual(most)
    expect(polar.maxLift!.by).toBe('layers')
  })

  it('says what limits a thin nose, and marks the points beyond', () => {
    const polar = polarOf('0006', viscousState(6e6), angles(0, 12))
    expect(polar.maxLift!.by).toBe('nose')
    expect(polar.points.at(-1)!.reason).toMatch(/suction peak/)
    expect(polar.points[5]!.reason).toBe('')
  })

  it('goes no farther than the stall when that is enough', () => {
    const polar = sweep(nacaSection('4415'), viscousState(5e5), angles(0, 24), { toTheStall: true })
    expect(polar.points.at(-1)!.reason).toMatch(/not computed/)
    expect(polar.maxLift!.liftCoefficient).toBeGreaterThan(1)
  })

  it('turns turbulent where it is told to, and warns of a trip behind laminar separation', () => {
    const { points } = polarOf('0012', viscousState(1e6, { tripUpper: 0.2, tripLower: 0.3 }), [0])
    expect(points[0]!.transitionUpper).toBeCloseTo(0.2, 2)
    expect(points[0]!.transitionLower).toBeCloseTo(0.3, 2)
    const late = polarOf('4412', viscousState(1e5, { tripUpper: 0.8 }), [2 * DEGREE])
    expect(late.points[0]!.reason).toMatch(/upper side is forced behind laminar separation/)
  })

  it('turns turbulent earlier in rougher air', () => {
    const places = [4, 9, 11].map(
      (amplification) =>
        polarOf('2412', viscousState(1e6, { amplification }), [0]).points[0]!.transitionUpper!,
    )
    expect(places[0]).toBeLessThan(places[1]!)
    expect(places[1]).toBeLessThan(places[2]!)
  })

  it('marks flow that turns sonic', () => {
    const { points } = polarOf('2412', viscousState(6e6, { mach: 0.4 }), [0, 9 * DEGREE])
    expect(points[0]!.reason).toBe('')
    expect(points[1]!.reason).toMatch(/sonic/)
  })

  it('refuses what is outside its range', () => {
    const refused: [Partial<SectionState>, RegExp][] = [
      [{ reynolds: 4e4 }, /Reynolds number 40000: give a value from 5e4 to 2e7/],
      [{ reynolds: 3e7 }, /Reynolds number/],
      [{ reynolds: null }, /Reynolds number/],
      [{ reynolds: Number.NaN }, /Reynolds number/],
      [{ amplification: 15 }, /amplification 15: give a value from 0 to 14/],
      [{ tripUpper: -0.1 }, /forced transition at -0.1/],
      [{ mach: 0.6 }, /Mach/],
      [{ flap: 0.1 }, /flap/],
    ]
    for (const [change, message] of refused) {
      expect(() => polarOf('2412', viscousState(1e6, change), [0])).toThrow(message)
    }
    expect(() => polarOf('2412', viscousState(1e6), [Number.NaN])).toThrow(/finite angle/)
  })
})

describe('a viscous pressure', { timeout: 60_000 }, () => {
  it('stands at the lift that is asked for, with its layers', () => {
    const result = pressureAt(nacaSection('4412'), viscousState(1e6), { lift: 0.7 })
    expect(result.converged).toBe(true)
    expect(result.liftCoefficient).toBeCloseTo(0.7, 4)
    expect(result.layers!.upper.transition).toBeGreaterThan(0.1)
    expect(result.layers!.upper.x.length).toBe(result.layers!.upper.shapeFactor.length)
  })

  it('says so when no flow carries the lift', () => {
    const result = pressureAt(nacaSection('0012'), viscousState(1e6), { lift: 2.5 })
    expect(result.converged).toBe(false)
    expect(result.reason).not.toBe('')
    expect(result.x.length).toBe(0)
  })
})
