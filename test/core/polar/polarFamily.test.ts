import { describe, expect, it } from 'vitest'
import type { Polar } from '../../../src/core/polar/polar'
import { atAngle, atLift } from '../../../src/core/polar/polarCurve'
import { lineAt, maxLiftAt, polarAt } from '../../../src/core/polar/polarFamily'
import { REYNOLDS_LATTICE, reynoldsBracket, reynoldsNodes } from '../../../src/core/polar/reynoldsLattice'
import { inventedPolar, type InventedSection } from '../../support/polars'

const section: InventedSection = {
  slope: 6,
  zeroLift: -0.05,
  maxLift: (reynolds) => 1 + 0.1 * Math.log(reynolds / 5e4),
  moment: -0.06,
  drag: (lift) => 0.008 + 0.005 * lift * lift,
}
const [low, high] = [REYNOLDS_LATTICE[4], REYNOLDS_LATTICE[5]]
const family = [low, high].flatMap((re) => [inventedPolar(section, re), inventedPolar(section, re, 0.15)])
const middle = Math.sqrt(low * high)

const withFailure = (polar: Polar, index: number): Polar => ({
  ...polar,
  points: polar.points.map((point, i) =>
    i === index
      ? { ...point, converged: false, liftCoefficient: null, dragCoefficient: null, reason: 'no way' }
      : point,
  ),
})

describe('the lattice of Reynolds numbers', () => {
  it('runs from 5e4 by factors of 1.5 to 2e7', () => {
    expect(REYNOLDS_LATTICE[0]).toBe(5e4)
    expect(REYNOLDS_LATTICE[3]).toBe(168750)
    expect(REYNOLDS_LATTICE.at(-1)).toBe(2e7)
    for (let k = 1; k + 1 < REYNOLDS_LATTICE.length; k++) {
      expect(REYNOLDS_LATTICE[k] / REYNOLDS_LATTICE[k - 1]).toBeCloseTo(1.5, 12)
    }
  })

  it('brackets a range with exactly the values needed', () => {
    expect(reynoldsNodes(8e4, 1.2e5)).toEqual([75000, 112500, 168750])
    expect(reynoldsNodes(75000, 112500)).toEqual([75000, 112500])
    expect(reynoldsNodes(1e3, 4e4)).toEqual([5e4])
    expect(reynoldsNodes(1.9e7, 3e7).at(-1)).toBe(2e7)
  })

  it('says when a Reynolds number is beyond it', () => {
    expect(reynoldsBracket(4.9e4)).toMatchObject({ low: 5e4, high: 5e4, outside: true })
    expect(reynoldsBracket(2.1e7).outside).toBe(true)
    expect(reynoldsBracket(2e7).outside).toBe(false)
    expect(reynoldsBracket(middle).fraction).toBeCloseTo(0.5, 12)
  })
})

describe('a family of polars', () => {
  it('is exact at its own polars', () => {
    expect(polarAt(family, low, 0)!.polar).toBe(family[0])
    expect(polarAt(family, high, 0.15)!.polar).toBe(family[3])
  })

  it('is linear in the logarithm of the Reynolds number, its maximum too, and the curve reaches it', () => {
    const { polar, outside } = polarAt(family, middle, 0)!
    expect(outside).toBe(false)
    expect(polar.maxLift!.liftCoefficient).toBeCloseTo(section.maxLift(middle), 12)
    expect(maxLiftAt(family, middle, 0.1)).toBeCloseTo(section.maxLift(middle), 12)
    const top = atLift(polar, polar.maxLift!.liftCoefficient)
    expect(top.kind === 'point' && top.point.alpha).toBeCloseTo(polar.maxLift!.alpha, 6)
    expect(lineAt(family, middle, 0.1)!.slope).toBeCloseTo(6, 10)
    expect(lineAt(family, middle, 0.1)!.zeroLift).toBeCloseTo(-0.05, 10)
  })

  it('says when it is asked outside its range, and has no maximum lift there', () => {
    expect(polarAt([inventedPolar(section, 5e4)], 3e4, 0)!.outside).toBe(true)
    expect(maxLiftAt([inventedPolar(section, 5e4)], 3e4, 0)).toBeNull()
    expect(polarAt([inventedPolar(section, low, 0.5)], low, 0.6)!.outside).toBe(true)
    expect(polarAt(family, 9e6, 0)).toBeNull()
  })

  it('fails where one of its polars failed', () => {
    const { polar } = polarAt([withFailure(family[0], 40), family[2]], middle, 0)!
    expect(polar.points[40]).toMatchObject({ converged: false, liftCoefficient: null, reason: 'no way' })
    expect(polar.points[39].converged).toBe(true)
  })
})

describe('a polar looked up', () => {
  const polar = inventedPolar(section, low)
  it('is exact at its points, and between them close to the invented curve', () => {
    const { alpha, liftCoefficient } = polar.points[30]
    expect(atAngle(polar, alpha)).toMatchObject({ kind: 'point', point: { alpha, liftCoefficient } })
    const found = atLift(polar, 0.631)
    if (found.kind !== 'point') throw new Error(found.kind)
    expect(found.point.alpha).toBeCloseTo(0.631 / 6 - 0.05, 10)
    expect(found.point.dragCoefficient).toBeCloseTo(section.drag(0.631), 6)
    expect(found.point.momentCoefficient).toBeCloseTo(-0.06, 12)
  })

  it('never extrapolates: beyond its angles and its maximum it says so', () => {
    expect(atAngle(polar, 0.36).kind).toBe('outside')
    expect(atAngle(polar, -0.22).kind).toBe('outside')
    expect(atLift(polar, section.maxLift(low) + 1e-4).kind).toBe('outside')
    expect(atLift(polar, -5).kind).toBe('outside')
  })

  it('never bridges over a point that failed, and looks up next to it', () => {
    const index = polar.points.findIndex((point) => point.liftCoefficient! > 0.6)
    const holed = withFailure(polar, index)
    const lift = polar.points[index].liftCoefficient!
    expect(atLift(holed, lift)).toEqual({ kind: 'failed', reason: 'no way' })
    expect(atAngle(holed, polar.points[index].alpha + 1e-4).kind).toBe('failed')
    expect(atLift(holed, polar.points[index - 1].liftCoefficient! - 1e-3).kind).toBe('point')
  })
})
