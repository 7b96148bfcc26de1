import type { PolarPoint } from '../../../src/core/polar/polar'
import { sweep } from '../../../src/core/polar/sweep'
import type { MatrixCase } from '../../support/viscousSections'
import { viscousState } from './polars'

const DEGREE = Math.PI / 180
/** Step of the angle, deg. */
const STEP = 0.5
/** How far beyond the range of a section points are counted apart, deg. */
const BEYOND = 2

/** How a section converges at a Reynolds number. */
export interface Convergence {
  readonly inside: number
  readonly failedInside: number
  readonly beyond: number
  readonly failedBeyond: number
  /** Angles (deg) without a solution, and why. */
  readonly failures: readonly { readonly alphaDeg: number; readonly reason: string }[]
  readonly points: readonly PolarPoint[]
}

/** Sweeps a case over its range and two degrees beyond either end. */
export function convergenceOf({ section, from, to }: MatrixCase, reynolds: number): Convergence {
  const count = Math.round((to - from + 2 * BEYOND) / STEP) + 1
  const angles = Array.from({ length: count }, (_, i) => from - BEYOND + STEP * i)
  const { points } = sweep(
    section,
    viscousState(reynolds),
    angles.map((angle) => angle * DEGREE),
  )
  const isInside = (i: number): boolean => angles[i]! >= from && angles[i]! <= to
  const of = (test: (point: PolarPoint, i: number) => boolean): number => points.filter(test).length
  return {
    inside: of((_, i) => isInside(i)),
    failedInside: of(({ converged }, i) => !converged && isInside(i)),
    beyond: of((_, i) => !isInside(i)),
    failedBeyond: of(({ converged }, i) => !converged && !isInside(i)),
    failures: points.flatMap(({ converged, reason }, i) =>
      converged ? [] : [{ alphaDeg: angles[i]!, reason }],
    ),
    points,
  }
}

/** The matrix as lines of text. */
export function printConvergence(cases: readonly MatrixCase[], numbers: readonly number[]): string {
  const lines: string[] = []
  let [inside, failedInside, beyond, failedBeyond] = [0, 0, 0, 0]
  for (const each of cases) {
    for (const reynolds of numbers) {
      const result = convergenceOf(each, reynolds)
      inside += result.inside
      failedInside += result.failedInside
      beyond += result.beyond
      failedBeyond += result.failedBeyond
      const where = result.failures.map(({ alphaDeg }) => alphaDeg).join(' ')
      lines.push(
        `  ${each.name.padEnd(18)}${reynolds.toExponential(0).padEnd(7)}${`${result.inside - result.failedInside} of ${result.inside}`.padEnd(11)}${where === '' ? '' : `not at ${where} deg`}`,
      )
    }
  }
  const share = (failed: number, all: number): string => `${(100 * (1 - failed / all)).toFixed(2)} %`
  lines.push(
    `  within the ranges ${share(failedInside, inside)} of ${inside}, two degrees beyond ${share(failedBeyond, beyond)} of ${beyond}`,
  )
  return lines.join('\n')
}
