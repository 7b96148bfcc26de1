import { readFileSync, statSync } from 'node:fs'
import { resolve } from 'node:path'
import { plainReason } from '../files/plainReason'
import { refuseLarge } from '../io/coordinates'
import { FileProblem } from '../io/problem'

/**
 * Reads files named relative to a folder. A file that is too large is refused by its size.
 *
 * The reader throws FileProblem that names the file, says why it cannot be read and what to do.
 */
export function fileReader(folder: string): (path: string) => Uint8Array {
  return (path) => {
    try {
      const found = statSync(resolve(folder, path))
      if (found.isDirectory()) throw Object.assign(new Error('it is a folder'), { code: 'EISDIR' })
      refuseLarge(found.size, path)
      return readFileSync(resolve(folder, path))
    } catch (error) {
      if (error instanceof FileProblem) throw error
      throw new FileProblem(
        path,
        null,
        `cannot be read: ${plainReason(error)}`,
        'check the name and the folder',
      )
    }
  }
}
