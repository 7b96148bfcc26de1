import type { BriefEntry } from './briefTypes'

/** What an entry is called in files and tables: its name, else its text; a pair is `root > tip`. */
export function entryName(entry: BriefEntry): string {
  return entry.name ?? entry.section ?? `${entry.root ?? '?'} > ${entry.tip ?? '?'}`
}

/** A name as the window shows it: generated sections by the words of the trade. */
export function shownName(name: string): string {
  return name.replace(/\bnaca:/gi, 'NACA ')
}
