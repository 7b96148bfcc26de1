import { randomBytes } from 'node:crypto'
import { open, realpath, rename, rm, stat } from 'node:fs/promises'
import { basename, dirname, join } from 'node:path'
import { plainReason } from './plainReason'

/** A file to write. */
export interface FileToWrite {
  readonly path: string
  readonly content: string | Uint8Array
}

/**
 * Writes files whole or not at all: each first beside its place under another name, flushed to the disk,
 * and only when all of them are there are they renamed into place. What a link points to is replaced, the
 * link stays. A device or pipe is written directly, because it cannot be replaced.
 *
 * Throws an Error with a plain sentence that names the file; nothing is left behind then.
 */
export async function writeFiles(files: readonly FileToWrite[]): Promise<void> {
  const ready: { readonly temporary: string; readonly place: string; readonly path: string }[] = []
  try {
    const direct: FileToWrite[] = []
    for (const file of files) {
      await naming(file.path, async () => {
        const place = await placeOf(file.path)
        if (place === null) return void direct.push(file)
        const temporary = join(dirname(place), `.${basename(place)}.${randomBytes(6).toString('hex')}.part`)
        ready.push({ temporary, place, path: file.path })
        await writeAndFlush(temporary, 'wx', file.content)
      })
    }
    for (const { path, content } of direct) await naming(path, () => writeAndFlush(path, 'w', content))
    for (const { temporary, place, path } of ready) await naming(path, () => rename(temporary, place))
  } catch (error) {
    await Promise.all(ready.map(({ temporary }) => rm(temporary, { force: true }).catch(() => {})))
    throw error
  }
}

/** Where a file really is to be; null for something that is no regular file and not to be replaced. */
async function placeOf(path: string): Promise<string | null> {
  const found = await stat(path).catch(ignoreMissing)
  if (found === null) return path
  if (found.isDirectory()) throw Object.assign(new Error('it is a folder'), { code: 'EISDIR' })
  return found.isFile() ? realpath(path) : null
}

function ignoreMissing(error: NodeJS.ErrnoException): null {
  if (error.code === 'ENOENT') return null
  throw error
}

async function writeAndFlush(path: string, flags: 'wx' | 'w', content: string | Uint8Array): Promise<void> {
  const handle = await open(path, flags)
  try {
    await handle.writeFile(content)
    // A pipe or a device cannot be flushed, and need not be.
    if (flags === 'wx') await handle.sync()
  } finally {
    await handle.close()
  }
}

async function naming(path: string, action: () => Promise<unknown>): Promise<void> {
  try {
    await action()
  } catch (error) {
    throw new Error(`${path} cannot be written: ${plainReason(error)}`, { cause: error })
  }
}
