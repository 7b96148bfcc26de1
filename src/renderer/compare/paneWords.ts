import type { Comparison } from '../../core'

/** What a pane says when it has nothing to draw; null when it has. */
export function paneWords(comparison: Comparison | null, condition: number, drawn: number): string | null {
  if (comparison === null) return 'Computing…'
  if (comparison.entries.length === 0) return 'Add a section to the shortlist below.'
  if (comparison.conditions.length === 0) return 'Add a flight condition on the left.'
  if (drawn > 0) return null
  const states = comparison.entries.map((entry) => entry.conditions[condition])
  const note = states.find((state) => state?.status === 'marked')?.notes[0]
  return note === undefined ? 'Computing…' : `Nothing to show at this condition: ${note}.`
}
