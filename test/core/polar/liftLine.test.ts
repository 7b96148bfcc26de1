import { describe, expect, it } from 'vitest'
import { liftLine } from '../../../src/core/polar/liftLine'
import { NO_LIMITS, type Polar } from '../../../src/core/polar/polar'

const polarOf = (
  points: readonly (readonly [alpha: number, lift: number, converged?: boolean])[],
): Polar => ({
  method: 'panel',
  reynolds: null,
  mach: 0,
  surface: 'clean',
  amplification: null,
  tripUpper: 1,
  tripLower: 1,
  flap: 0,
  ...NO_LIMITS,
  points: points.map(([alpha, liftCoefficient, converged = true]) => ({
    alpha,
    liftCoefficient,
    dragCoefficient: null,
    momentCoefficient: -0.05 - 0.01 * liftCoefficient,
    transitionUpper: null,
    transitionLower: null,
    converged,
    reason: '',
  })),
})

describe('the straight line of a polar', () => {
  it('of a straight polar is that line, with the moment where the lift is zero', () => {
    const line = liftLine(polarOf([-0.1, -0.05, 0, 0.05, 0.1].map((a) => [a, 6 * (a + 0.03)])))!
    expect(line.slope).toBeCloseTo(6, 12)
    expect(line.zeroLift).toBeCloseTo(-0.03, 12)
    expect(line.momentAtZeroLift).toBeCloseTo(-0.05, 12)
  })

  it('leaves out what lies beyond a lift of 0.9', () => {
    const straight: [number, number][] = [-0.05, 0, 0.05, 0.1].map((a) => [a, 6 * a])
    expect(liftLine(polarOf([...straight, [0.3, 0.95]]))!.slope).toBeCloseTo(6, 12)
  })

  it('ends at what did not converge, on either side', () => {
    const line = liftLine(
      polarOf([
        [-0.025, -0.19],
        [-0.02, 0, false],
        [-0.01, -0.06],
        [0.05, 0.3],
        [0.1, 0.6],
        [0.11, 9, false],
        [0.12, 0.5],
      ]),
    )!
    expect(line.slope).toBeCloseTo(6, 12)
  })

  it('is none where the lift crosses zero beside a point that did not converge', () => {
    expect(
      liftLine(
        polarOf([
          [-0.05, -0.3],
          [0, 9, false],
          [0.05, 0.3],
          [0.1, 0.6],
        ]),
      ),
    ).toBeNull()
  })

  it.each([
    [
      'never crosses zero',
      [
        [0.1, 0.3],
        [0.2, 0.6],
      ],
    ],
    [
      'has no converged point beside the crossing within the range',
      [
        [-0.1, -0.5],
        [0.1, 1],
      ],
    ],
    ['is empty', []],
  ] as [string, [number, number][]][])('is none for a polar that %s', (_, points) => {
    expect(liftLine(polarOf(points))).toBeNull()
  })
})
