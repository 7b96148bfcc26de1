import { describe, expect, it } from 'vitest'
import { depthAt, measure } from '../../../src/core/shape/measures'
import { loft } from '../../../src/core/shape/loft'
import { nacaSection } from '../../../src/core/shape/naca'
import { waviness } from '../../../src/core/shape/waviness'
import type { Section } from '../../../src/core/shape/section'

const rounded = (section: Section, digits: number): Section => ({
  ...section,
  x: section.x.map((value) => Number(value.toFixed(digits))),
  y: section.y.map((value) => Number(value.toFixed(digits))),
})

describe('measures of NACA sections, by the formulas of NACA Report 460 (1933)', () => {
  it.each(['0006', '0012', '0018'])(
    'NACA %s: thickness at 30 per cent, nose radius 1.1019 t^2 within 2 per cent, edge angle',
    (code) => {
      const t = Number(code) / 100
      const { maxThickness, maxThicknessAt, noseRadius, edgeAngle, edgeGap } = measure(nacaSection(code))
      expect(Math.abs(maxThickness / t - 1)).toBeLessThan(2e-4)
      expect(Math.abs(maxThicknessAt - 0.3)).toBeLessThan(0.002)
      // The radius is a mean over a short arc, along which the curvature of these sections changes by 2 %.
      expect(Math.abs(noseRadius / (1.1019 * t * t) - 1)).toBeLessThan(0.02)
      // Slope of the half thickness at the edge: 5 t (0.2969/2 - 0.126 - 2 0.3516 + 3 0.2843 - 4 0.1036).
      expect(Math.abs(edgeAngle / (2 * Math.atan(5 * t * 0.24225)) - 1)).toBeLessThan(0.005)
      expect(edgeGap).toBe(0)
    },
  )

  it('NACA 0012: the enclosed area is the integral of its thickness', () => {
    // 10 t (0.2969 2/3 - 0.126/2 - 0.3516/3 + 0.2843/4 - 0.1036/5)
    const exact = 1.2 * ((0.2969 * 2) / 3 - 0.063 - 0.1172 + 0.071075 - 0.02072)
    expect(Math.abs(measure(nacaSection('0012')).area - exact)).toBeLessThan(1e-5)
  })

  it('an open edge is 0.0021 of 5 t, on both sides, thick', () => {
    expect(measure(nacaSection('0012', { edge: 'open' })).edgeGap).toBeCloseTo(2 * 0.6 * 0.0021, 9)
  })

  it('NACA 4412 has its camber at 40 %, and its depth at 30 % near the thickness', () => {
    const section = nacaSection('4412')
    const { maxCamber, maxCamberAt } = measure(section)
    expect(Math.abs(maxCamber - 0.04)).toBeLessThan(5e-5)
    expect(Math.abs(maxCamberAt - 0.4)).toBeLessThan(0.01)
    expect(Math.abs(depthAt(section, 0.3) - 0.12)).toBeLessThan(5e-4)
  })

  it('camber keeps its sign on a section upside down', () => {
    const section = nacaSection('4412')
    const upsideDown = { ...section, x: section.x.toReversed(), y: section.y.map((y) => -y).reverse() }
    expect(measure(upsideDown).maxCamber).toBeCloseTo(-measure(section).maxCamber, 9)
  })
})

describe('the smoothness check', () => {
  it.each(['0012', '4415', '23012', '2421'])('is silent for NACA %s printed to four decimals', (code) => {
    expect(waviness(rounded(nacaSection(code), 4)).waves).toEqual([])
  })

  it('points at a kink of 0.1 % of the chord where it is', () => {
    const section = nacaSection('2412')
    const y = section.y.map(
      (value, i) => value + (section.x[i] > 0.48 && section.x[i] < 0.52 && i < 160 ? 0.001 : 0),
    )
    const [worst] = waviness({ ...section, y }).waves
    expect(worst?.side).toBe('upper')
    expect(Math.abs(worst!.at - 0.5)).toBeLessThan(0.05)
  })
})

describe('a straight-lofted wing', () => {
  it('has the mean of both thicknesses half-way', () => {
    const middle = loft(nacaSection('2415'), nacaSection('2412'), 0.5)
    expect(Math.abs(measure(middle).maxThickness - 0.135)).toBeLessThan(2e-4)
  })
})

describe('NACA designations', () => {
  it.each([
    ['63-415', /not generated here/],
    ['16012', /no such 5-digit mean line/],
    ['747A315', /not generated here/],
    ['2012', /second digit/],
    ['0000', /no thickness/],
    ['03012', /design lift of zero/],
    ['', /nothing/],
  ])('%s is refused in words', (code, words) => {
    expect(() => nacaSection(code)).toThrow(words)
  })

  it('may carry the word NACA', () => {
    expect(nacaSection(' naca 2412').name).toBe('NACA 2412')
  })
})
