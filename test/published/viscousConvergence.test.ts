import { describe, expect, it } from 'vitest'
import { copyLayers } from '../../src/core/flow/couplingState'
import { CONVERGED, solveAtAngle } from '../../src/core/flow/interaction'
import { viscousLoads } from '../../src/core/flow/viscousLoads'
import { solvePoint } from '../../src/core/polar/viscousMarch'
import { readySection, settingOf } from '../../src/core/polar/viscousState'
import { matrixCases } from '../support/viscousSections'
import { convergenceOf } from './report/convergence'
import { viscousState } from './report/polars'

/** Five Reynolds numbers of eight sections: some minutes on a slow machine. */
const LONG = 600_000
const REYNOLDS = [2e5, 5e5, 1e6, 3e6, 9e6]

describe('convergence of the viscous method', { timeout: LONG }, () => {
  // 98 % within each section's range and 90 % in the two degrees beyond: the aim of the method.
  it('is reached at 98 per cent of a matrix of sections, Reynolds numbers and half degrees, and holds cold', () => {
    expect(CONVERGED).toBe(1e-5)
    let [inside, failedInside, beyond, failedBeyond, count] = [0, 0, 0, 0, 0]
    const disagreements: string[] = []
    for (const each of matrixCases()) {
      for (const reynolds of REYNOLDS) {
        const result = convergenceOf(each, reynolds)
        inside += result.inside
        failedInside += result.failedInside
        beyond += result.beyond
        failedBeyond += result.failedBeyond
        for (const { reason } of result.failures) expect(reason).toMatch(/do not agree after \d+ steps/)
        for (const point of result.points) {
          // One in twenty again, from nothing and ten times tighter.
          if (!point.converged || count++ % 20 !== 0) continue
          const drag = tighterDrag(each.section, reynolds, point.alpha)
          if (!(Math.abs(drag / point.dragCoefficient! - 1) < 0.005)) {
            disagreements.push(`${each.name} ${reynolds} ${point.alpha}: ${drag} ${point.dragCoefficient}`)
          }
        }
      }
    }
    expect(failedInside / inside).toBeLessThanOrEqual(0.02)
    expect(failedBeyond / beyond).toBeLessThanOrEqual(0.1)
    // All but one of some hundred agree: beyond its range, at -9.5 deg, the blunt section has no solution from nothing.
    expect(disagreements.length, disagreements.join('\n')).toBeLessThanOrEqual(1)
  })
})

/** Drag from a cold start, converged ten times further; not a number where that fails. */
function tighterDrag(section: Parameters<typeof readySection>[0], reynolds: number, alpha: number): number {
  const state = viscousState(reynolds)
  const [ready, setting] = [readySection(section, state)!, settingOf(state)]
  const { solution } = solvePoint(ready, setting, alpha, null)
  const tight = solveAtAngle(ready, setting, copyLayers(solution.layers), alpha, {
    tolerance: CONVERGED / 10,
  })
  return tight.converged ? viscousLoads(ready.flow, tight, setting.stream).dragCoefficient : Number.NaN
}
