import { resolve } from 'node:path'
import { writeFiles } from '../files/writeFiles'
import { Failure } from './failure'
import type { Terminal } from './terminal'

/** Text and where it goes: a path, or `-` for standard output. */
export interface Output {
  readonly to: string
  readonly text: string
}

/** Checks that outputs do not overwrite one another. Throws Failure that names the place. */
export function checkPlaces(places: readonly string[], terminal: Terminal): void {
  const full = places.map((place) => (place === '-' ? '-' : resolve(terminal.folder, place)))
  const twice = places.find((_, i) => full.indexOf(full[i]!) !== i)
  if (places.includes('')) throw new Failure('an output has an empty file name')
  if (twice !== undefined) {
    throw new Failure(`two outputs cannot both go to ${twice === '-' ? 'standard output' : twice}`)
  }
}

/** Writes all files whole, or none; what goes to standard output follows when the files are in place. */
export async function writeOutputs(outputs: readonly Output[], terminal: Terminal): Promise<void> {
  terminal.signal.throwIfAborted()
  const files = outputs.filter(({ to }) => to !== '-')
  try {
    await writeFiles(files.map(({ to, text }) => ({ path: resolve(terminal.folder, to), content: text })))
  } catch (error) {
    throw new Failure((error as Error).message)
  }
  for (const { to, text } of outputs) if (to === '-') await terminal.print(text)
}
