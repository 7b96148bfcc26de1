import { decodeText, readSection } from '../../io/coordinates'
import { FileProblem } from '../../io/problem'
import { resolveSection } from '../../io/resolveSection'
import { BLANK_ENTRY } from '../state/blanks'
import type { Reading } from './protocol'

/** Reads texts as sections: each gives an entry that holds its outline, or says why not. */
export function readSections(files: readonly { name: string; bytes: Uint8Array }[]): Reading[] {
  return files.map(({ name, bytes }) =>
    reading(name, () => {
      const { section, understood, warnings } = readSection(decodeText(bytes, name), name)
      const coordinates = Array.from(section.x, (x, i) => [x, section.y[i]!] as const)
      return {
        entry: { ...BLANK_ENTRY, section: name, name: section.name, coordinates },
        understood,
        warnings,
      }
    }),
  )
}

/** Reads NACA codes set apart by spaces, commas or semicolons; `2415 > 2412` names a root and a tip. */
export function readCodes(text: string): Reading[] {
  const words = text
    .replace(/\bnaca[\s:-]*/gi, '')
    .replace(/\s*>\s*/g, '>')
    .split(/[\s,;]+/)
    .filter((word) => word !== '')
  return words.map((word) =>
    reading(`NACA ${word.replace('>', ' > ')}`, () => {
      const names = word.split('>').map((code) => `naca:${code}`)
      for (const name of names) resolveSection(name, () => new Uint8Array())
      const [root, tip] = names
      const named = names.length === 1 ? { section: root! } : { root: root!, tip: tip! }
      return { entry: { ...BLANK_ENTRY, ...named }, understood: [], warnings: [] }
    }),
  )
}

function reading(name: string, read: () => Pick<Reading, 'entry' | 'understood' | 'warnings'>): Reading {
  try {
    return { name, fault: null, ...read() }
  } catch (error) {
    if (!(error instanceof FileProblem)) throw error
    return { name, entry: null, understood: [], warnings: [], fault: error.message }
  }
}
