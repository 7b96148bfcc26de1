import { PAST_STALL, type Comparison, type LiftLimit, type Polar, type PolarPoint } from '../../core'
import { shownName } from '../entryName'
import { plotNumber } from './axisTicks'
import { DEGREES, type PlotFailure } from './plot'

/**
 * Converged points of a polar by angle, refinement points among them, in runs that end wherever a requested
 * angle failed: no line may cross such a gap.
 */
export function polarRuns({ points, between }: Polar): PolarPoint[][] {
  const runs: PolarPoint[][] = [[]]
  for (const point of [...points, ...between].sort((a, b) => a.alpha - b.alpha)) {
    if (point.converged && point.liftCoefficient !== null) runs.at(-1)!.push(point)
    else if (runs.at(-1)!.length > 0) runs.push([])
  }
  return runs.filter((run) => run.length > 0)
}

/** Requested angles without a result, of every entry at a condition. */
export function polarFailures(comparison: Comparison, condition: number): PlotFailure[] {
  return comparison.entries.flatMap((entry, index) =>
    (entry.conditions[condition]?.pane?.polar?.points ?? [])
      .filter(({ converged, reason }) => !converged && reason !== PAST_STALL)
      .map(({ alpha, reason }) => ({
        ...{ entry: index, name: shownName(entry.name), alpha },
        reason: reason || 'did not converge',
      })),
  )
}

/** Failures in sentences, one for each entry and reason: `NACA 4412: no result at 15.0°, 15.5° (…)`. */
export function failureWords(failures: readonly PlotFailure[]): string[] {
  const groups = new Map<string, { first: PlotFailure; angles: string[] }>()
  for (const failure of failures) {
    const key = `${failure.entry} ${failure.reason}`
    const group = groups.get(key) ?? { first: failure, angles: [] }
    group.angles.push(`${plotNumber(failure.alpha * DEGREES, 1)}°`)
    groups.set(key, group)
  }
  return [...groups.values()].map(
    ({ first, angles }) => `${first.name}: no result at ${angles.join(', ')} (${first.reason})`,
  )
}

/** The end of a polar's lift in words, with what limits it. */
export function limitWords({ alpha, liftCoefficient, by }: LiftLimit, greatest: boolean): string {
  const what = `${greatest ? 'greatest' : 'least'} lift c_l ${plotNumber(liftCoefficient, 2)} at ${plotNumber(alpha * DEGREES, 1)}°`
  return by === 'nose'
    ? `${what}, limited by the suction peak of the nose`
    : `${what}, limited by separation of the boundary layers`
}
