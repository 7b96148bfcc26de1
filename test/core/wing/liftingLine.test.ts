import { describe, expect, it } from 'vitest'
import { fc, test } from '@fast-check/vitest'
import { factorInPlace, solveInPlace } from '../../../src/core/numerics/denseSolve'
import {
  coefficientsAt,
  localLift,
  rootAngleForLift,
  solveLiftingLine,
  wingLiftAt,
  wingLiftSlope,
  type LiftingLineInput,
} from '../../../src/core/wing/liftingLine'
import { stationAt } from '../../../src/core/wing/planform'
import { taperedLine } from '../../support/wings'

/** A wing with a straight centre part, two tapers, twist from the first kink on and unlike sections. */
function kinked(size = 1): LiftingLineInput {
  const stations = [
    { y: 0, chord: 1.1, twist: 0 },
    { y: 1.8, chord: 1.1, twist: 0 },
    { y: 3.6, chord: 0.8, twist: -0.02 },
    { y: 4.5, chord: 0.4, twist: -0.05 },
  ].map(({ y, chord, twist }) => ({ y: y * size, chord: chord * size, twist }))
  const tip = 4.5 * size
  return {
    span: 2 * tip,
    area: 8.4 * size ** 2,
    chord: (y) => stationAt(stations, y).chord,
    slope: (y) => 6.2 - (0.5 * y) / tip,
    set: (y) => stationAt(stations, y).twist + 0.05 - (0.02 * y) / tip,
    breaks: stations.map(({ y }) => y),
  }
}

/**
 * Glauert's own way, collocation at equal angles, as an independent check: 200 odd terms.
 * Source: Glauert, The Elements of Aerofoil and Airscrew Theory (1926), equation 11.16.
 */
function collocated({ span, chord, slope, set }: LiftingLineInput, alpha: number): Float64Array {
  const terms = 200
  const matrix = new Float64Array(terms * terms)
  const right = new Float64Array(terms)
  for (let row = 0; row < terms; row++) {
    const theta = ((row + 1) * Math.PI) / (2 * terms)
    const y = 0.5 * span * Math.cos(theta)
    const mu = (chord(y) * slope(y)) / (4 * span)
    for (let k = 0; k < terms; k++) {
      const n = 2 * k + 1
      matrix[row * terms + k] = Math.sin(n * theta) * (mu * n + Math.sin(theta))
    }
    right[row] = mu * Math.sin(theta) * (alpha + set(y))
  }
  solveInPlace(factorInPlace(matrix, terms), right)
  return right
}

describe('the lifting line of a wing with kinks and unlike sections', () => {
  it('agrees with collocation in lift, drag and root moment', () => {
    const input = kinked()
    const alpha = 0.08
    const ours = wingLiftAt(solveLiftingLine(input), alpha)
    const a = collocated(input, alpha)
    const aspectRatio = input.span ** 2 / input.area
    const lift = Math.PI * aspectRatio * a[0]
    const drag = Math.PI * aspectRatio * a.reduce((sum, value, k) => sum + (2 * k + 1) * value * value, 0)
    // 1e-4 of each: what collocation with 200 terms leaves at kinks.
    expect(Math.abs(ours.liftCoefficient / lift - 1)).toBeLessThan(1e-4)
    expect(Math.abs(ours.inducedDragCoefficient / drag - 1)).toBeLessThan(1e-4)
    let moment = 0
    const steps = 2000
    for (let k = 0; k < steps; k++) {
      const y = ((k + 0.5) * 0.5 * input.span) / steps
      const theta = Math.acos((2 * y) / input.span)
      const load =
        4 * input.span * a.reduce((sum, value, n) => sum + value * Math.sin((2 * n + 1) * theta), 0)
      moment += (load * y * 0.5 * input.span) / steps
    }
    expect(Math.abs(ours.rootMomentOverPressure / moment - 1)).toBeLessThan(1e-4)
  })

  it('satisfies the section lift curve with the downwash of the wake at each place', () => {
    const line = solveLiftingLine(kinked(), 160)
    const a = coefficientsAt(line, 0.08)
    for (const y of [0.5, 1.5, 2.5, 4]) {
      const theta = Math.acos(y / 4.5)
      const wake = a.reduce((sum, value, k) => {
        const n = 2 * k + 1
        return sum + (n * value * Math.sin(n * theta)) / Math.sin(theta)
      }, 0)
      // 2e-4 rad: the series of the downwash ends at the 319th sine and rings about the kinks.
      expect(Math.abs(localLift(line, 0.08, y).inducedAngle - wake)).toBeLessThan(2e-4)
    }
  })

  it('has the same coefficients at twice the size', () => {
    const [small, large] = [solveLiftingLine(kinked()), solveLiftingLine(kinked(2))]
    expect(wingLiftSlope(large) / wingLiftSlope(small)).toBeCloseTo(1, 12)
    expect(
      wingLiftAt(large, 0.1).inducedDragCoefficient / wingLiftAt(small, 0.1).inducedDragCoefficient,
    ).toBeCloseTo(1, 12)
    expect(
      wingLiftAt(large, 0.1).rootMomentOverPressure / wingLiftAt(small, 0.1).rootMomentOverPressure,
    ).toBeCloseTo(8, 10)
  })

  it('does not change when a station is added on a straight stretch', () => {
    const plain = solveLiftingLine(kinked())
    const more = solveLiftingLine({ ...kinked(), breaks: [0, 0.7, 1.8, 2.2, 3.6, 4.5] })
    expect(wingLiftSlope(more) / wingLiftSlope(plain)).toBeCloseTo(1, 9)
  })
})

describe('unlike sections at root and tip', () => {
  it('whose zero-lift angles differ by an angle act as that much washout', () => {
    const twisted = taperedLine(10, 0.45, 0.035)
    const { span, area, chord, slope, breaks } = twisted.input
    // Symmetric at the root, zero-lift angle of 0.035 rad at the tip: the zero-lift line is set by minus that.
    const unlike = solveLiftingLine({
      span,
      area,
      chord,
      slope,
      breaks,
      set: (y) => 0 - (0.035 * 2 * y) / span,
    })
    expect(rootAngleForLift(unlike, 0.4)).toBeCloseTo(rootAngleForLift(twisted, 0.4), 12)
  })
})

describe('lift and drag', () => {
  const wings = {
    aspectRatio: fc.double({ min: 2, max: 40, noNaN: true }),
    taper: fc.double({ min: 0.05, max: 1, noNaN: true }),
  }

  test.prop(
    [
      wings.aspectRatio,
      wings.taper,
      fc.double({ min: -0.1, max: 0.1, noNaN: true }),
      fc.double({ min: -1, max: 1.5, noNaN: true }),
    ],
    { numRuns: 40, seed: 11 },
  )(
    'are linear and quadratic in angle, and no wing beats the ellipse (any taper, washout, lift)',
    (aspectRatio, taper, washout, lift) => {
      const line = taperedLine(aspectRatio, taper, washout)
      const alpha = rootAngleForLift(line, lift)
      const totals = wingLiftAt(line, alpha)
      expect(totals.liftCoefficient).toBeCloseTo(lift, 10)
      expect(wingLiftSlope(line)).toBeLessThan((2 * Math.PI * aspectRatio) / (aspectRatio + 2) + 1e-9)
      expect(totals.inducedDragCoefficient).toBeGreaterThanOrEqual(
        lift ** 2 / (Math.PI * aspectRatio) - 1e-12,
      )
      const drag = (step: number) => wingLiftAt(line, alpha + step).inducedDragCoefficient
      const [a, b] = [drag(0.1) - 2 * drag(0) + drag(-0.1), drag(0.2) - 2 * drag(0.1) + drag(0)]
      expect(a).toBeCloseTo(b, 10)
    },
  )

  test.prop([wings.aspectRatio, wings.taper], { numRuns: 20, seed: 12 })(
    'turn their signs with angle and twist',
    (aspectRatio, taper) => {
      const [up, down] = [taperedLine(aspectRatio, taper, 0.05), taperedLine(aspectRatio, taper, -0.05)]
      expect(wingLiftAt(down, -0.1).liftCoefficient).toBeCloseTo(-wingLiftAt(up, 0.1).liftCoefficient, 12)
      expect(wingLiftAt(down, -0.1).inducedDragCoefficient).toBeCloseTo(
        wingLiftAt(up, 0.1).inducedDragCoefficient,
        12,
      )
      const [a, b] = [localLift(up, 0.1, 0.3), localLift(down, -0.1, 0.3)]
      expect(b.inducedAngle).toBeCloseTo(-a.inducedAngle, 12)
    },
  )
})
