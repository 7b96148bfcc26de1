import { BadInput, nacaSection, type ChordLine, type Edge, type Section } from '../core'
import { decodeText, readSection } from './coordinates'
import { FileProblem } from './problem'

/** Gives the bytes of a coordinate file by the path that the user wrote. Throws a FileProblem. */
export type ReadBytes = (path: string) => Uint8Array

/** A section that an argument or an entry names. */
export interface ResolvedSection {
  readonly section: Section
  readonly warnings: readonly string[]
}

/** How a section is read: edge of generated ones, chord line of files. */
export interface SectionOptions {
  readonly edge?: Edge | null
  readonly chordLine?: ChordLine | null
}

/**
 * The section that a text names: `naca:2412`, or the path of a coordinate file. Throws a FileProblem with
 * the text as the file.
 */
export function resolveSection(
  text: string,
  readBytes: ReadBytes,
  options: SectionOptions = {},
): ResolvedSection {
  if (!/^naca:/i.test(text)) {
    const { section, warnings } = readSection(decodeText(readBytes(text), text), text, {
      chordLine: options.chordLine ?? null,
    })
    return { section, warnings }
  }
  try {
    return { section: nacaSection(text.slice(5), { edge: options.edge ?? 'closed' }), warnings: [] }
  } catch (error) {
    if (!(error instanceof BadInput)) throw error
    const [what, cure] = error.message.split(/; (?!.*; )/)
    throw new FileProblem(text, null, what!, cure ?? 'correct the designation')
  }
}
