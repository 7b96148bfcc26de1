import type { NamedPolar } from '../io/csv'
import { degrees } from '../io/csv'
import { STATUS } from './failure'

/** A kind of mark: the angles (deg, by their place in the polar) that bear it, and how the first words it. */
interface Mark {
  readonly words: string
  readonly converged: boolean
  readonly at: number[]
}

/**
 * Names every point that failed or is marked, those of one kind in one line, and gives the status: 1 when a
 * point did not converge. Reasons that differ only in their numbers are of one kind; the numbers of the
 * first are shown.
 */
export function reportPoints(polars: readonly NamedPolar[], complain: (line: string) => void): number {
  const several = new Set(polars.map(({ polar }) => polar.reynolds)).size > 1
  for (const { section, polar } of polars) {
    const named = several ? `${section} at Reynolds number ${polar.reynolds}` : section
    const angles = polar.points.map(({ alpha }) => degrees(alpha))
    for (const { words, converged, at } of marksOf(polar)) {
      const where = `${named}, ${spans(angles, at)} deg`
      complain(converged ? `${where}: ${words}` : `${where}: not converged, left empty: ${words}`)
    }
  }
  const failed = polars.some(({ polar }) => polar.points.some(({ converged }) => !converged))
  return failed ? STATUS.marked : STATUS.done
}

function marksOf({ points }: NamedPolar['polar']): Iterable<Mark> {
  const marks = new Map<string, Mark>()
  points.forEach(({ converged, reason }, i) => {
    if (converged && reason === '') return
    // A converged point may bear several notes; a failed one has one reason.
    for (const words of converged ? reason.split('; ') : [reason || 'no reason is known']) {
      const kind = `${converged} ${words.replace(/\d[\d.]*(e[+-]?\d+)?/gi, '#')}`
      const mark = marks.get(kind) ?? { words, converged, at: [] }
      mark.at.push(i)
      marks.set(kind, mark)
    }
  })
  return marks.values()
}

/** Angles in words, three or more neighbours as "from to to". */
export function spans(angles: readonly number[], at: readonly number[]): string {
  const parts: string[] = []
  for (let i = 0; i < at.length;) {
    let last = i
    while (last + 1 < at.length && at[last + 1] === at[last]! + 1) last++
    if (last - i < 2) last = i
    parts.push(last === i ? `${angles[at[i]!]}` : `${angles[at[i]!]} to ${angles[at[last]!]}`)
    i = last + 1
  }
  return parts.join(', ')
}
