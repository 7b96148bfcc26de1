import { mkdir, stat } from 'node:fs/promises'
import { dirname } from 'node:path'

/**
 * Makes a folder and those above it; true when it was not there. One step at a time: Node's own recursive
 * way never ends on file systems that refuse a folder by calling it missing (/proc on Linux).
 *
 * Throws the error of the file system; EEXIST when a file is in the place.
 */
export async function makeFolder(folder: string): Promise<boolean> {
  const found = await stat(folder).catch(() => null)
  if (found?.isDirectory()) return false
  if (found !== null) throw Object.assign(new Error('it is a file'), { code: 'EEXIST' })
  const parent = dirname(folder)
  if (parent !== folder) await makeFolder(parent)
  await mkdir(folder).catch((error: NodeJS.ErrnoException) => {
    // Another process may have made it in between.
    if (error.code !== 'EEXIST') throw error
  })
  return true
}
