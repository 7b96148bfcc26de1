import type { Section } from '../core'
import { resolveSection } from '../io/resolveSection'
import { wordOf } from './arguments'
import { Failure } from './failure'
import { fileReader } from './inputFiles'
import type { Terminal } from './terminal'

/** The options of every command that reads sections. */
export const SECTION_OPTIONS = {
  edge: { type: 'string' },
  'chord-line': { type: 'string' },
} as const

/** A section and what the section column of a file calls it. */
export interface NamedSection {
  readonly name: string
  readonly section: Section
}

/**
 * Reads all sections that are named, and says on standard error what deserves a second look.
 *
 * Throws Failure without any section, and what the reader throws for the first that cannot be read.
 */
export function readSections(
  named: readonly string[],
  given: { readonly edge?: string | undefined; readonly 'chord-line'?: string | undefined },
  terminal: Terminal,
): NamedSection[] {
  if (named.length === 0) throw new Failure('no section is named: give naca: and 4 or 5 digits, or a file')
  const edge = given.edge === undefined ? null : wordOf('--edge', given.edge, ['closed', 'open'])
  const line = given['chord-line']
  const chordLine = line === undefined ? null : wordOf('--chord-line', line, ['file', 'longest'])
  const readBytes = fileReader(terminal.folder)
  const read = named.map((argument) => resolveSection(argument, readBytes, { edge, chordLine }))
  const names = withRepeats(named)
  read.forEach(({ warnings }, i) => warnings.forEach((text) => terminal.complain(`${names[i]!}: ${text}`)))
  return read.map(({ section }, i) => ({ name: names[i]!, section }))
}

/** Names as typed; the second of the same name gets " (2)", and so on. */
export function withRepeats(names: readonly string[]): string[] {
  const met = new Map<string, number>()
  return names.map((name) => {
    const count = (met.get(name) ?? 0) + 1
    met.set(name, count)
    return count === 1 ? name : `${name} (${count})`
  })
}

/** The part of the help that these options share. */
export const SECTION_HELP = `  --edge closed|open        trailing edge of naca: sections (default closed); files keep theirs
  --chord-line file|longest measure a file from its own axis, or from its longest chord (default: its axis,
                            unless its longest chord is more than 1 deg off)
`
