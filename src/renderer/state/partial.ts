import type { ComparedEntry, Comparison } from '../../core'

/** How far an entry is: conditions that need no further result, of all. */
export interface EntryProgress {
  readonly done: number
  readonly of: number
}

/** The progress of each entry; one with a fault has nothing to wait for. */
export function entryProgress({ entries }: Comparison): EntryProgress[] {
  return entries.map(({ conditions, fault }) => ({
    done: conditions.filter(({ status }) => fault !== null || status !== 'waiting').length,
    of: conditions.length,
  }))
}

/**
 * What to show while a comparison is computed: entries that are done as they are now, others as they were in
 * the last good one, found by name. An older comparison with other conditions or another method has nothing
 * to lend.
 */
export function shownMeanwhile(last: Comparison | null, next: Comparison): Comparison {
  if (last === null || last.method !== next.method || !sameConditions(last, next)) return next
  const older = new Map(last.entries.map((entry) => [entry.name, entry]))
  const progress = entryProgress(next)
  const lent = (entry: ComparedEntry, i: number): ComparedEntry =>
    progress[i]!.done === progress[i]!.of ? entry : (older.get(entry.name) ?? entry)
  return { ...next, entries: next.entries.map(lent) }
}

function sameConditions(a: Comparison, b: Comparison): boolean {
  return (
    a.conditions.length === b.conditions.length &&
    a.conditions.every(({ name }, i) => name === b.conditions[i]!.name)
  )
}

/** The progress of an entry in words; empty once it is done. */
export function progressWords(progress: EntryProgress | undefined): string {
  if (progress === undefined || progress.done === progress.of) return ''
  return progress.done === 0 ? 'waiting…' : `${progress.done} of ${progress.of} conditions done`
}
