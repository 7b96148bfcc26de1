/** Thin-airfoil theory against exact mean lines, a textbook example, and itself on outlines read as files. */
import { describe, expect, it } from 'vitest'
import { centreOfPressure, thinAirfoil, thinLift } from '../../src/core/flow/thinAirfoil'
import { meanLineAt, nacaSection } from '../../src/core/shape/naca'
import type { Section } from '../../src/core/shape/section'
import { readSection } from '../../src/io/coordinates'

const RADIAN = 180 / Math.PI

/**
 * Exact results: zero-lift angle rad, c_m about the quarter chord, ideal angle rad, ideal lift. Source: closed
 * forms and quadrature that agree to 1e-16, mean lines of NACA Reports 460 (1933) and 537 (1935).
 */
const EXACT: [code: string, zeroLift: number, moment: number, idealAngle: number, idealLift: number][] = [
  ['1408', -0.018127342211, -0.02655975673, 0.00224644319, 0.128012269078],
  ['2412', -0.036254684421, -0.05311951346, 0.004492886379, 0.256024538157],
  ['4412', -0.072509368842, -0.10623902692, 0.008985772759, 0.512049076313],
  ['6412', -0.108764053263, -0.15935854038, 0.013478659138, 0.76807361447],
  ['23012', -0.019086688023, -0.01283566452, 0.028666527549, 0.300042302454],
]

/** The printed digits of the exact values. */
const PRINTED = 1e-11

/** Glauert's integrals of a mean line by the midpoint rule in each piece, independent of the closed forms. */
function byQuadrature(section: Section): { zeroLift: number; moment: number } {
  const line = section.meanLine!
  const joint = Math.acos(1 - 2 * line.joint)
  let [i0, i1, i2] = [0, 0, 0]
  for (const [from, to] of [
    [0, joint],
    [joint, Math.PI],
  ] as const) {
    const n = 40_000
    for (let k = 0; k < n; k++) {
      const theta = from + ((k + 0.5) * (to - from)) / n
      const slope = (meanLineAt(line, 0.5 * (1 - Math.cos(theta))).slope * (to - from)) / n
      i0 += slope
      i1 += slope * Math.cos(theta)
      i2 += slope * Math.cos(2 * theta)
    }
  }
  return { zeroLift: (i0 - i1) / Math.PI, moment: -0.5 * (i1 - i2) }
}

describe('thin-airfoil theory', () => {
  it.each(EXACT)(
    'of NACA %s agrees with the exact values to their printed digits',
    (code, zeroLift, moment, angle, lift) => {
      const thin = thinAirfoil(nacaSection(code))
      expect(Math.abs(thin.zeroLiftAngle - zeroLift)).toBeLessThan(PRINTED)
      expect(Math.abs(thin.momentQuarterChord - moment)).toBeLessThan(PRINTED)
      expect(Math.abs(thin.idealAngle - angle)).toBeLessThan(PRINTED)
      expect(Math.abs(thin.idealLift - lift)).toBeLessThan(PRINTED)
    },
  )

  it.each(['2412', '4412', '6309', '21012', '23012', '25015', '23112', '43115'])(
    'closed form and quadrature of NACA %s agree to 1e-8',
    (code) => {
      const section = nacaSection(code)
      const thin = thinAirfoil(section)
      const { zeroLift, moment } = byQuadrature(section)
      expect(Math.abs(thin.zeroLiftAngle - zeroLift)).toBeLessThan(1e-8)
      expect(Math.abs(thin.momentQuarterChord - moment)).toBeLessThan(1e-8)
    },
  )

  it('gives the worked example of NACA 23012 in Anderson, Fundamentals of Aerodynamics (memory, high)', () => {
    // Printed: zero-lift angle -1.09 deg, c_l 0.559 and centre of pressure 0.273 at 4 deg, c_m -0.0127. The book
    // rounds its coefficients to three digits, which is the last digit of the moment.
    const thin = thinAirfoil(nacaSection('23012'))
    expect(thin.zeroLiftAngle * RADIAN).toBeCloseTo(-1.09, 2)
    expect(thinLift(thin, 4 / RADIAN)).toBeCloseTo(0.559, 3)
    expect(centreOfPressure(thin, 4 / RADIAN)).toBeCloseTo(0.273, 3)
    expect(Math.abs(thin.momentQuarterChord - -0.0127)).toBeLessThan(0.0002)
  })

  it('gives the flat plate at 5 deg of the same book: c_l 0.548, moments -0.137 and 0.411 about the edges', () => {
    const thin = thinAirfoil(nacaSection('0012'))
    const lift = thinLift(thin, 5 / RADIAN)
    expect(lift).toBeCloseTo(0.548, 3)
    expect(thin.momentQuarterChord - lift / 4).toBeCloseTo(-0.137, 3)
    expect(thin.momentQuarterChord + 0.75 * lift).toBeCloseTo(0.411, 3)
  })
})

describe('the same section read from a file, its mean line found from the outline', () => {
  const FILES: [code: string, points: number, decimals: number, angleDeg: number][] = [
    ['2412', 160, 6, 0.1],
    ['4412', 100, 6, 0.1],
    ['6412', 80, 5, 0.1],
    ['23012', 120, 6, 0.1],
    ['23112', 120, 5, 0.1],
    ['1408', 60, 5, 0.1],
    // Mean lines that bend sharply behind the nose.
    ['21012', 120, 6, 0.1],
    ['21012', 60, 5, 0.1],
    ['4112', 120, 6, 0.1],
    ['22012', 100, 6, 0.1],
    ['6209', 120, 6, 0.1],
    ['4415', 100, 6, 0.2],
    ['4418', 160, 6, 0.2],
    ['23018', 160, 6, 0.2],
    ['2418', 64, 5, 0.2],
  ]

  it.each(FILES)(
    'NACA %s in %d points of %d decimals: zero-lift angle within %d deg and moment within 0.003',
    (code, points, decimals, angleDeg) => {
      const exact = nacaSection(code)
      const step = (exact.x.length - 1) / points
      const lines = Array.from({ length: points + 1 }, (_, k) => {
        const i = Math.round(k * step)
        return `${exact.x[i].toFixed(decimals)} ${exact.y[i].toFixed(decimals)}`
      })
      const { section } = readSection(lines.join('\n'), `${code}.txt`)
      expect(section.meanLine).toBeNull()
      const [ours, truth] = [thinAirfoil(section), thinAirfoil(exact)]
      expect(Math.abs(ours.zeroLiftAngle - truth.zeroLiftAngle) * RADIAN).toBeLessThan(angleDeg)
      expect(Math.abs(ours.momentQuarterChord - truth.momentQuarterChord)).toBeLessThan(0.003)
    },
  )

  it('NACA 21018, the sharpest bend under a thick nose: zero-lift angle within 0.2 deg', () => {
    // No target is set for the moment of sections above 12 %; here it was measured 0.008 off.
    const exact = nacaSection('21018')
    const lines = Array.from(exact.x, (x, i) => `${x.toFixed(6)} ${exact.y[i].toFixed(6)}`)
    const ours = thinAirfoil(readSection(lines.join('\n'), '21018.txt').section)
    expect(Math.abs(ours.zeroLiftAngle - thinAirfoil(exact).zeroLiftAngle) * RADIAN).toBeLessThan(0.2)
  })
})
