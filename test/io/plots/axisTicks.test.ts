import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { axisEnds, axisTicks, plotNumber } from '../../../src/io/plots/axisTicks'
import type { Axis, Plot } from '../../../src/io/plots/plot'

const axis = (over: Partial<Axis> = {}): Axis => ({
  ...{ label: 'lift', symbol: 'c_l', unit: '', decimals: 2 },
  ...over,
})
const plotOf = (y: number[], over: Partial<Axis> = {}): Plot => ({
  ...{ key: 'k', title: 't', x: axis(), y: axis(over), marks: [], lines: [] },
  curves: [{ entry: 0, name: 'n', x: y.map((_, i) => i), y, states: [] }],
})

describe('the ends of an axis', () => {
  it('hold all values, within a step, on round steps', () => {
    const value = fc.double({ min: -1e4, max: 1e4, noNaN: true })
    fc.assert(
      fc.property(value, value, (a, b) => {
        fc.pre(Math.abs(a - b) > 1e-3)
        const [from, to] = axisEnds(plotOf([a, b]), 'y')
        const { values } = axisTicks([from, to])
        const rounding = 1e-6 * (to - from)
        expect(from).toBeLessThanOrEqual(Math.min(a, b) + rounding)
        expect(to).toBeGreaterThanOrEqual(Math.max(a, b) - rounding)
        expect(values.length).toBeGreaterThanOrEqual(3)
        expect(values.length).toBeLessThanOrEqual(10)
        expect(Math.abs(values[0]! - from)).toBeLessThan(rounding)
        expect(Math.abs(values.at(-1)! - to)).toBeLessThan(rounding)
      }),
    )
  })

  it('fall on ticks when moving them out to whole steps makes the step larger', () => {
    // -0.5 to 6.4 goes in seven steps of 1, but -1 to 7 does not.
    const [from, to] = axisEnds(plotOf([-0.5, 6.4]), 'y')
    const { values } = axisTicks([from, to])
    expect([values[0], values.at(-1)]).toEqual([from, to])
  })

  it('are those that the plot gives', () => {
    expect(axisEnds(plotOf([0.2, 0.7], { from: 0, to: 1 }), 'y')).toEqual([0, 1])
  })

  it('keep a level line level', () => {
    const [from, to] = axisEnds(plotOf([-0.05, -0.05 + 1e-15], { leastSpan: 0.04 }), 'y')
    expect(to - from).toBeGreaterThanOrEqual(0.04)
    expect(axisEnds(plotOf([2, 2]), 'y').every(Number.isFinite)).toBe(true)
  })

  it('are there without a curve', () => {
    expect(axisEnds({ ...plotOf([]), curves: [] }, 'y')).toEqual([0, 1])
  })
})

describe('the ticks of an axis', () => {
  it('carry the decimals that tell them apart', () => {
    expect(axisTicks([-0.1, 0.05])).toEqual({ values: expect.any(Array), decimals: 3 })
    expect(axisTicks([0, 7])).toEqual({ values: [0, 1, 2, 3, 4, 5, 6, 7], decimals: 0 })
  })

  it('stay inside ends that are not round', () => {
    expect(axisTicks([0.3, 6.9]).values).toEqual([1, 2, 3, 4, 5, 6])
  })
})

it('plotNumber writes a true minus sign and no minus zero', () => {
  expect([plotNumber(-1.25, 1), plotNumber(-0.001, 1), plotNumber(3, 2)]).toEqual(['−1.3', '0.0', '3.00'])
})
