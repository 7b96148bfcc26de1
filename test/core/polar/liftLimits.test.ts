import { describe, expect, it } from 'vitest'
import { isPastStall, liftLimit } from '../../../src/core/polar/liftLimits'
import type { PolarPoint } from '../../../src/core/polar/polar'

const DEGREE = Math.PI / 180

/** Points at whole degrees from 0, null where the solution failed. */
const pointsOf = (lifts: readonly (number | null)[], direction = 1): PolarPoint[] =>
  lifts.map((lift, i) => ({
    alpha: direction * i * DEGREE,
    liftCoefficient: lift === null ? null : direction * lift,
    dragCoefficient: 0.01,
    momentCoefficient: 0,
    transitionUpper: 0.5,
    transitionLower: 0.5,
    converged: lift !== null,
    reason: '',
  }))

describe('the limit of the lift of a polar', () => {
  it('is the extreme behind which lift falls, on either side', () => {
    const lifts = [0, 0.5, 1, 1.2, 1.1, 0.9]
    expect(liftLimit(pointsOf(lifts), 1, null)).toEqual({
      ...{ alpha: 3 * DEGREE, liftCoefficient: 1.2, by: 'layers' },
    })
    expect(liftLimit(pointsOf(lifts, -1), -1, null)?.liftCoefficient).toBe(-1.2)
  })

  it('is not a dip that is made good within 4 deg', () => {
    const limit = liftLimit(pointsOf([0, 0.5, 0.9, 0.85, 0.88, 1, 1.2, 1.1, 1]), 1, null)
    expect(limit?.liftCoefficient).toBe(1.2)
  })

  it('is not the lift that separated flow regains far behind the stall', () => {
    const limit = liftLimit(pointsOf([0, 0.5, 1, 0.9, 0.8, 0.8, 0.85, 0.95, 1.05, 1.1, 1]), 1, null)
    expect(limit?.liftCoefficient).toBe(1)
  })

  it('is unknown while lift grows, and beside a failed point, but not for one failed far from it', () => {
    expect(liftLimit(pointsOf([0, 0.5, 1]), 1, null)).toBeNull()
    expect(liftLimit(pointsOf([0, 0.5, 1, null, 0.9]), 1, null)).toBeNull()
    expect(liftLimit(pointsOf([0, null, 0.9, 1, 0.9]), 1, null)?.liftCoefficient).toBe(1)
  })

  it('is set by the nose where its suction comes first, and not where the layers stalled before', () => {
    expect(liftLimit(pointsOf([0, 0.5, 1, 1.5, 1.2]), 1, 2 * DEGREE)).toEqual({
      ...{ alpha: 2 * DEGREE, liftCoefficient: 1, by: 'nose' },
    })
    expect(liftLimit(pointsOf([0, 0.5, 1, 0.9, 0.8]), 1, 4 * DEGREE)?.by).toBe('layers')
  })
})

describe('a way outwards along a polar', () => {
  it('goes on until no recovery counts, 4 deg behind the extreme', () => {
    const points = pointsOf([0, 0.5, 1, 0.9, 0.8, 0.7, 0.6])
    expect(isPastStall(points, 6 * DEGREE)).toBe(false)
    expect(isPastStall(points, 6.5 * DEGREE)).toBe(true)
  })

  it('is given up after three angles without a solution, not after two', () => {
    expect(isPastStall(pointsOf([0, 0.5, null, null]), 4 * DEGREE)).toBe(false)
    expect(isPastStall(pointsOf([0, 0.5, null, null, null]), 5 * DEGREE)).toBe(true)
  })

  it('does not mind the other side', () => {
    expect(isPastStall(pointsOf([0, 0.5, 1, 0.9, 0.8, 0.7, 0.6]), -0.5 * DEGREE)).toBe(false)
  })
})
