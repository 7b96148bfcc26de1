import { describe, expect, it } from 'vitest'
import { BadInput } from '../../../src/core/numerics/errors'
import type { SectionState } from '../../../src/core/polar/state'
import { pressureAt, sweep } from '../../../src/core/polar/sweep'
import { nacaSection } from '../../../src/core/shape/naca'
import { sectionState } from '../../support/states'

const section = nacaSection('2412')
const DEG = Math.PI / 180
const state = (change: Partial<SectionState> = {}): SectionState => sectionState({ panels: 100, ...change })

describe('an angle sweep', () => {
  it('has one point for each angle, in the order asked, with what panels cannot give left empty', () => {
    const polar = sweep(section, state({ mach: 0.2 }), [4 * DEG, -2 * DEG])
    expect(polar.mach).toBe(0.2)
    expect(polar.points.map((point) => point.alpha)).toEqual([4 * DEG, -2 * DEG])
    for (const point of polar.points) {
      expect(point).toMatchObject({
        dragCoefficient: null,
        transitionUpper: null,
        transitionLower: null,
        converged: true,
      })
    }
  })

  it('by thin-airfoil theory rises by 2 pi a radian, at Mach 0 whatever is asked', () => {
    const polar = sweep(section, state({ method: 'thin', mach: 0.3 }), [0, 0.1])
    const [a, b] = polar.points.map((point) => point.liftCoefficient ?? NaN)
    expect(b - a).toBeCloseTo(0.2 * Math.PI, 12)
    expect(polar.mach).toBe(0)
  })

  it('refuses the viscous method, a deflected flap, and panels or Mach numbers out of range', () => {
    for (const change of [{ method: 'viscous' }, { flap: 0.1 }, { panels: 20 }, { mach: 0.7 }] as const) {
      expect(() => sweep(section, state(change), [0])).toThrow(BadInput)
      expect(() => pressureAt(section, state(change), { alpha: 0 })).toThrow(BadInput)
    }
  })
})

describe('the surface pressure', () => {
  it('and the sweep refuse an angle or a lift that is no number', () => {
    expect(() => sweep(section, state(), [0, NaN])).toThrow(BadInput)
    expect(() => pressureAt(section, state(), { alpha: Infinity })).toThrow(BadInput)
    expect(() => pressureAt(section, state(), { lift: NaN })).toThrow(BadInput)
  })

  it('at a lift has that lift, and agrees with the sweep at its angle', () => {
    const pressure = pressureAt(section, state({ mach: 0.2 }), { lift: 0.6 })
    expect(pressure.liftCoefficient).toBeCloseTo(0.6, 8)
    expect(pressure.x.length).toBe(101)
    const [point] = sweep(section, state({ mach: 0.2 }), [pressure.alpha]).points
    expect(point.liftCoefficient).toBeCloseTo(0.6, 8)
    expect(point.momentCoefficient).toBe(pressure.momentCoefficient)
  })

  it('at a lift that no angle gives is a result that did not converge', () => {
    const pressure = pressureAt(section, state(), { lift: 12 })
    expect(pressure).toMatchObject({ converged: false, reason: 'no angle gives this lift coefficient' })
  })

  it('is refused for thin-airfoil theory', () => {
    expect(() => pressureAt(section, state({ method: 'thin' }), { alpha: 0 })).toThrow(
      'thin-airfoil theory gives no surface pressure; use the panel method',
    )
  })
})
