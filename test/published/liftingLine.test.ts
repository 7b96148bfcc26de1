/**
 * The lifting line against converged solutions, textbook examples and an independent far-plane quadrature.
 */
import { describe, expect, it } from 'vitest'
import { handbookSlope } from '../../src/core/wing/handbookSlope'
import { helmboldSlope } from '../../src/core/wing/helmbold'
import {
  coefficientsAt,
  localLift,
  rootAngleForLift,
  solveLiftingLine,
  wingLiftAt,
  wingLiftSlope,
  type LiftingLine,
} from '../../src/core/wing/liftingLine'
import { ellipticLine, taperedLine } from '../support/wings'

const RADIAN = 180 / Math.PI

/**
 * Straight-tapered wings, section slope 2 pi, no twist. Source: lifting-line solutions with 1600 odd terms,
 * Richardson-extrapolated; an independent 3200-term extrapolation agrees to 1e-10.
 */
const TAPERED: [
  aspectRatio: number,
  taper: number,
  slope: number,
  delta: number,
  peak: number,
  peakAt: number,
  zero: number,
][] = [
  [4, 1.0, 4.028386731, 0.028476875, 1.170140447, 0, 0.44757884],
  [4, 0.6, 4.120001381, 0.009535897, 1.080293166, 0.430074, 0.43417252],
  [4, 0.45, 4.145115738, 0.005401494, 1.077208296, 0.562406, 0.42727318],
  [4, 0.3, 4.153333503, 0.005674582, 1.106073183, 0.697758, 0.41836194],
  [6, 1.0, 4.530424988, 0.048289711, 1.144152767, 0, 0.45401774],
  [6, 0.6, 4.632720368, 0.016922723, 1.070887631, 0.438573, 0.43694109],
  [6, 0.45, 4.661385306, 0.00985936, 1.068166593, 0.566628, 0.42812759],
  [6, 0.3, 4.671889329, 0.009880115, 1.091183666, 0.69839, 0.41681637],
  [10, 1.0, 5.046790854, 0.085906974, 1.111463265, 0, 0.46263312],
  [10, 0.6, 5.15086898, 0.032067258, 1.057768941, 0.450032, 0.44069488],
  [10, 0.45, 5.180936863, 0.019337284, 1.055335987, 0.573086, 0.42933583],
  [10, 0.3, 5.193673635, 0.018138749, 1.071351064, 0.700549, 0.41487755],
]

/** Five digits. */
const FIVE_DIGITS = 5e-6

/** Half a unit of the fourth decimal. */
const PRINTED = 0.5e-4

/** Glauert's factors of a wing without twist: of the lift slope (tau) and of the induced drag (delta). */
function factorsOf(line: LiftingLine, sectionSlope: number): { tau: number; delta: number } {
  const aspectRatio = line.input.span ** 2 / line.input.area
  const alpha = rootAngleForLift(line, 1)
  return {
    tau: Math.PI * aspectRatio * (1 / wingLiftSlope(line) - 1 / sectionSlope) - 1,
    delta: Math.PI * aspectRatio * wingLiftAt(line, alpha).inducedDragCoefficient - 1,
  }
}

describe('an untwisted elliptic wing', () => {
  it.each([4, 8, 20])(
    'of aspect ratio %i has slope 2 pi A / (A + 2), e = 1 and uniform lift (exact)',
    (aspectRatio) => {
      const line = ellipticLine(aspectRatio)
      expect(wingLiftSlope(line)).toBeCloseTo((2 * Math.PI * aspectRatio) / (aspectRatio + 2), 6)
      const { liftCoefficient, inducedDragCoefficient } = wingLiftAt(line, 0.1)
      expect(liftCoefficient ** 2 / (Math.PI * aspectRatio * inducedDragCoefficient)).toBeCloseTo(1, 6)
      for (const share of [0, 0.3, 0.6, 0.9]) {
        const local = localLift(line, 0.1, share * 0.5 * Math.sqrt(aspectRatio))
        expect(local.liftCoefficient).toBeCloseTo(liftCoefficient, 6)
        expect(local.inducedAngle).toBeCloseTo(liftCoefficient / (Math.PI * aspectRatio), 6)
      }
    },
  )
})

describe('a straight-tapered wing', () => {
  it.each(TAPERED)(
    'A %d, taper %d: slope, drag factor and zero-lift angle agree to five digits with 40 terms',
    (aspectRatio, taper, slope, delta, _peak, _at, zero) => {
      const line = taperedLine(aspectRatio, taper)
      expect(Math.abs(wingLiftSlope(line) / slope - 1)).toBeLessThan(FIVE_DIGITS)
      const { liftCoefficient, inducedDragCoefficient } = wingLiftAt(line, 0.1)
      const ours = (Math.PI * aspectRatio * inducedDragCoefficient) / liftCoefficient ** 2 - 1
      expect(Math.abs(ours - delta)).toBeLessThan(FIVE_DIGITS)
      expect(Math.abs(rootAngleForLift(taperedLine(aspectRatio, taper, 1), 0) - zero)).toBeLessThan(
        FIVE_DIGITS,
      )
    },
  )

  it.each(TAPERED)(
    'A %d, taper %d: the peak of local lift agrees in size to 1e-4 and in place to 0.002',
    (aspectRatio, taper, _slope, _delta, peak, peakAt) => {
      const line = taperedLine(aspectRatio, taper)
      const alpha = rootAngleForLift(line, 1)
      const half = 0.5 * Math.sqrt(aspectRatio)
      let best = [0, 0]
      for (let k = 0; k <= 2000; k++) {
        const { liftCoefficient } = localLift(line, alpha, (half * k) / 2001)
        if (liftCoefficient > best[1]) best = [k / 2001, liftCoefficient]
      }
      // 1e-4: the series of the local lift ends at the 79th sine.
      expect(Math.abs(best[1] - peak)).toBeLessThan(1e-4)
      expect(Math.abs(best[0] - peakAt)).toBeLessThan(0.002)
    },
  )

  it.each([20, 40])('of aspect ratio %i is converged: 40 and 80 terms agree to 1e-6', (aspectRatio) => {
    const [few, many] = [taperedLine(aspectRatio, 0.45, 0.05), taperedLine(aspectRatio, 0.45, 0.05, 80)]
    expect(Math.abs(wingLiftSlope(few) / wingLiftSlope(many) - 1)).toBeLessThan(1e-6)
    const drag = (line: typeof few) => wingLiftAt(line, rootAngleForLift(line, 0.8)).inducedDragCoefficient
    expect(Math.abs(drag(few) / drag(many) - 1)).toBeLessThan(2e-6)
  })
})

describe('linear washout', () => {
  /** Same source; root angle in deg and C_Di at a C_L. */
  const TWISTED: [
    aspectRatio: number,
    taper: number,
    washoutDeg: number,
    lift: number,
    rootDeg: number,
    drag: number,
  ][] = [
    [6, 1.0, 2, 0.0, 0.9080355, 0.000148792],
    [6, 1.0, 2, 0.5, 7.2314797, 0.013474654],
    [6, 1.0, 4, 0.3, 5.6101375, 0.004907368],
    [6, 1.0, 4, 1.0, 14.4629594, 0.053898616],
    [10, 0.45, 2, 0.3, 4.17636, 0.003011202],
    [10, 0.45, 4, 0.0, 1.7173433, 0.000569916],
    [10, 0.45, 4, 1.0, 12.7763045, 0.032673343],
    [10, 0.3, 2, 1.0, 11.8615957, 0.03279631],
    [10, 0.3, 4, 0.3, 4.9690624, 0.003606828],
  ]

  it.each(TWISTED)(
    'A %d, taper %d, %d deg at C_L %d: root angle to 1e-4 deg and drag to five digits',
    (aspectRatio, taper, washout, lift, rootDeg, drag) => {
      const line = taperedLine(aspectRatio, taper, washout / RADIAN)
      const alpha = rootAngleForLift(line, lift)
      expect(Math.abs(alpha * RADIAN - rootDeg)).toBeLessThan(1e-4)
      expect(Math.abs(wingLiftAt(line, alpha).inducedDragCoefficient - drag)).toBeLessThan(
        FIVE_DIGITS * Math.max(drag, 0.01),
      )
    },
  )
})

describe('induced drag', () => {
  it('agrees to 1e-4 with the energy of the far-plane velocities', () => {
    // Independent: the wake sheet far behind induces the normal velocity w(y) = 1/(2 pi) P integral of
    // (dGamma/dy')/(y - y') dy'; the drag is rho/2 times the integral of Gamma w. Circulation from the
    // coefficients, its slope by differences at midpoints, vortex by vortex (no Fourier sum of the drag).
    const line = taperedLine(8, 0.5, 0.03)
    const alpha = rootAngleForLift(line, 0.7)
    const a = coefficientsAt(line, alpha)
    const span = line.input.span
    const n = 4000
    const circulation = (theta: number): number =>
      2 * span * a.reduce((sum, value, k) => sum + value * Math.sin((2 * k + 1) * theta), 0)
    const y = (theta: number): number => 0.5 * span * Math.cos(theta)
    let drag = 0
    const strengths = Array.from(
      { length: n },
      (_, j) => circulation(((j + 1) * Math.PI) / n) - circulation((j * Math.PI) / n),
    )
    const places = strengths.map((_, j) => y(((j + 0.5) * Math.PI) / n))
    for (let i = 1; i < n; i++) {
      const theta = (i * Math.PI) / n
      let w = 0
      for (let j = 0; j < n; j++) w -= strengths[j] / (2 * Math.PI * (y(theta) - places[j]))
      drag += circulation(theta) * w * 0.5 * span * Math.sin(theta) * (Math.PI / n)
    }
    const ours = wingLiftAt(line, alpha).inducedDragCoefficient
    expect(Math.abs(Math.abs(drag) / ours - 1)).toBeLessThan(1e-4)
  })
})

describe('textbook examples', () => {
  it('Glauert (1926, memory), rectangular wings: his four-term tau and delta within 8 per cent', () => {
    const [ratios, taus, deltas] = [
      [0.5, 0.75, 1, 1.25, 1.5, 1.75],
      [0.1, 0.14, 0.17, 0.2, 0.22, 0.24],
      [0.019, 0.034, 0.049, 0.063, 0.076, 0.088],
    ]
    ratios.forEach((ratio, i) => {
      const { tau, delta } = factorsOf(taperedLine(ratio * 2 * Math.PI, 1), 2 * Math.PI)
      expect(Math.abs(tau / taus[i] - 1)).toBeLessThan(0.08)
      expect(Math.abs(delta / deltas[i] - 1)).toBeLessThan(0.08)
    })
  })

  it('Glauert, the same wings solved exactly: tau to four digits, delta to four decimals', () => {
    const ratios = [0.5, 0.75, 1, 1.25, 1.5, 1.75]
    const taus = [0.099, 0.1351, 0.1659, 0.1928, 0.2168, 0.2384]
    const deltas = [0.0202, 0.0355, 0.0511, 0.0662, 0.0808, 0.0946]
    ratios.forEach((ratio, i) => {
      const { tau, delta } = factorsOf(taperedLine(ratio * 2 * Math.PI, 1), 2 * Math.PI)
      expect(Math.abs(tau - taus[i])).toBeLessThan(PRINTED)
      expect(Math.abs(delta - deltas[i])).toBeLessThan(PRINTED)
    })
  })

  it('Anderson, Fundamentals of Aerodynamics, A 8, taper 0.8, 5 deg (memory): C_L 0.4335 within 2 %', () => {
    // He reads delta = tau = 0.055 off a chart and prints C_L 0.4335 and C_Di 0.00789. The converged lifting
    // line of that wing has tau 0.1377 and delta 0.0444: the lift is 1.6 % lower, the drag follows.
    const line = taperedLine(8, 0.8)
    const { tau, delta } = factorsOf(line, 2 * Math.PI)
    expect(Math.abs(tau - 0.1377)).toBeLessThan(PRINTED)
    expect(Math.abs(delta - 0.0444)).toBeLessThan(PRINTED)
    const ours = wingLiftAt(line, 5 / RADIAN)
    expect(Math.abs(ours.liftCoefficient / 0.4335 - 1)).toBeLessThan(0.02)
    // With the lift that he prints, our drag differs from his by the ratio of the factors alone.
    const drag = wingLiftAt(line, rootAngleForLift(line, 0.4335)).inducedDragCoefficient
    expect(Math.abs((drag * 1.055) / (1 + delta) - 0.00789)).toBeLessThan(0.5e-5)
  })

  it('Anderson, rectangular wings, A 6 to A 10 (memory, medium): 0.086 per deg, C_L 0.464, within 3 %', () => {
    // Section slope 5.989 per rad deduced at A 6, zero-lift angle -2 deg, 3.4 deg; he reads delta = tau = 0.105
    // for A 10, where the converged values are 0.22 and 0.09.
    const { chord, span, area, breaks } = taperedLine(10, 1).input
    const line = solveLiftingLine({ chord, span, area, breaks, slope: () => 5.989, set: () => 2 / RADIAN })
    expect(Math.abs(wingLiftSlope(line) / 4.95 - 1)).toBeLessThan(0.03)
    const ours = wingLiftAt(line, 3.4 / RADIAN)
    expect(Math.abs(ours.liftCoefficient / 0.464 - 1)).toBeLessThan(0.03)
    const { delta } = factorsOf(line, 5.989)
    const drag = wingLiftAt(line, rootAngleForLift(line, 0.464)).inducedDragCoefficient
    expect(Math.abs((drag * 1.105) / (1 + delta) - 0.0076)).toBeLessThan(0.5e-4)
  })

  it('the best straight taper for aspect ratios 4 to 15 lies between 0.34 and 0.40', () => {
    for (const aspectRatio of [4, 8, 15]) {
      const delta = (taper: number) => factorsOf(taperedLine(aspectRatio, taper), 2 * Math.PI).delta
      const tapers = Array.from({ length: 41 }, (_, k) => 0.2 + 0.01 * k)
      const best = tapers.reduce((a, b) => (delta(b) < delta(a) ? b : a))
      expect(best).toBeGreaterThanOrEqual(0.335)
      expect(best).toBeLessThanOrEqual(0.405)
    }
  })
})

describe('quick formulas', () => {
  /** Evaluated independently: A, Helmbold, handbook with 25 deg half-chord sweep, handbook at M 0.3 and kappa 0.95. */
  it.each([
    [2, 2.6025805691, 2.5242718037, 2.5994203336],
    [6, 4.5286637415, 4.2283606779, 4.5158573741],
    [10, 5.1509798363, 4.7550983787, 5.1338656253],
    [30, 5.8782534411, 5.3608199516, 5.855587981],
  ])('at aspect ratio %i agree to 1e-9', (aspectRatio, helmbold, swept, compressible) => {
    expect(helmboldSlope(aspectRatio).slope).toBeCloseTo(helmbold, 9)
    const sweepHalfChord = 25 / RADIAN
    expect(handbookSlope({ aspectRatio, mach: 0, kappa: 1, sweepHalfChord }).slope).toBeCloseTo(swept, 9)
    expect(handbookSlope({ aspectRatio, mach: 0.3, kappa: 0.95, sweepHalfChord: 0 }).slope).toBeCloseTo(
      compressible,
      9,
    )
  })

  it('Helmbold tends to the slender-wing limit of Jones, pi A / 2, as the aspect ratio goes to 0', () => {
    expect(helmboldSlope(1e-4).slope / (Math.PI * 0.5e-4)).toBeCloseTo(1, 4)
  })

  it('say in words when they are used outside their range', () => {
    expect(helmboldSlope(20).warning).not.toBe('')
    expect(helmboldSlope(4).warning).toBe('')
    expect(handbookSlope({ aspectRatio: 6, mach: 0.9, kappa: 1, sweepHalfChord: 0 }).warning).not.toBe('')
  })
})
