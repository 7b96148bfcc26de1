import type { Comparison } from '../../core'
import { shownName } from '../../io/entryName'

const COMPUTING = 'Computing…'

/** What a pane says when it has nothing to draw; null when it has. */
export function paneWords(comparison: Comparison | null, condition: number, drawn: number): string | null {
  if (comparison === null) return COMPUTING
  if (comparison.entries.length === 0) return 'Add a section to the shortlist below.'
  if (comparison.conditions.length === 0) return 'Add a flight condition on the left.'
  if (drawn > 0) return null
  const notes = comparison.entries.map((entry) => missingNote(comparison, condition, entry))
  const [first] = notes
  // An entry without a note is still to come.
  if (first === undefined || notes.includes(null)) return COMPUTING
  const reasons = notes.every((note) => note === first) ? first : leftOut(comparison, condition).join('; ')
  return `Nothing to show at this condition: ${reasons}.`
}

/** What the pressure pane says when it has nothing to draw; null when it has. */
export function pressureWords(
  comparison: Comparison | null,
  condition: number,
  drawn: number,
): string | null {
  const words = paneWords(comparison, condition, drawn)
  const thin = comparison?.method === 'thin' && comparison.entries.length > 0
  return thin && words === COMPUTING
    ? 'Thin-airfoil theory gives no surface pressure: choose the panel method to see it.'
    : words
}

/** Entries that a pane leaves out while it draws others, each with the reason. */
export function leftOut(comparison: Comparison | null, condition: number): string[] {
  return (comparison?.entries ?? []).flatMap((entry) => {
    const note = missingNote(comparison!, condition, entry)
    return note === null ? [] : [`${shownName(entry.name)}: ${note}`]
  })
}

function missingNote(
  { method }: Comparison,
  condition: number,
  { fault, conditions }: Comparison['entries'][number],
): string | null {
  if (fault !== null) return fault
  const state = conditions[condition]
  if (state?.status === 'marked') return state.notes[0] ?? null
  const pressure = state?.pane?.pressure
  if (method !== 'thin' && pressure && !pressure.converged) return pressure.reason
  return null
}
