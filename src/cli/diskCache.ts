import { createHash, randomBytes } from 'node:crypto'
import { readdir, readFile, rename, rm, stat, utimes, writeFile } from 'node:fs/promises'
import { homedir } from 'node:os'
import { join } from 'node:path'
import { deserialize, serialize } from 'node:v8'
import type { TaskResult } from '../core'
import { makeFolder } from '../files/makeFolder'
import type { Store } from '../run/store'

/** A store in a folder, with `tidy` to be called when the work is done. */
export interface DiskCache extends Store {
  /** Removes what was used least recently until the rest fits the bound. */
  tidy(): Promise<void>
}

const END = '.result'
const CHECKSUM_BYTES = 32
/** Part files older than this were left by a run that was killed. */
const STALE_PART_MS = 3_600_000

/** The program's own folder in the user's cache folder. */
export function cacheFolder(platform: NodeJS.Platform, env: NodeJS.ProcessEnv): string {
  if (env['XDG_CACHE_HOME']) return join(env['XDG_CACHE_HOME'], 'sectionwright')
  if (platform === 'darwin') return join(homedir(), 'Library', 'Caches', 'sectionwright')
  if (platform === 'win32' && env['LOCALAPPDATA']) return join(env['LOCALAPPDATA'], 'sectionwright', 'cache')
  return join(homedir(), '.cache', 'sectionwright')
}

/**
 * Results kept between runs, each in a file named by the hash of its task and of the core that computed
 * it. A cache never stands in the way: what cannot be read, or is damaged, is not there; what cannot be
 * written is not kept.
 */
export function diskCache(folder: string, coreHash: string, mostBytes: number): DiskCache {
  let written = false
  const pathOf = (key: string): string =>
    join(folder, createHash('sha256').update(`${coreHash} ${key}`).digest('hex').slice(0, 40) + END)
  return {
    get: async (key) => {
      const path = pathOf(key)
      try {
        const result = unpack(await readFile(path))
        // The time of last change stands for the time of last use.
        const now = new Date()
        await utimes(path, now, now)
        return result
      } catch {
        return null
      }
    },
    put: async (key, result) => {
      written = true
      const part = join(folder, `${randomBytes(8).toString('hex')}.part`)
      try {
        await makeFolder(folder)
        await writeFile(part, pack(result))
        await rename(part, pathOf(key))
      } catch {
        await rm(part, { force: true }).catch(() => {})
      }
    },
    tidy: async () => {
      if (written) await tidyFolder(folder, mostBytes).catch(() => {})
    },
  }
}

function pack(result: TaskResult): Buffer {
  const body = serialize(result)
  return Buffer.concat([createHash('sha256').update(body).digest(), body])
}

function unpack(bytes: Buffer): TaskResult {
  const body = bytes.subarray(CHECKSUM_BYTES)
  const checksum = createHash('sha256').update(body).digest()
  if (!checksum.equals(bytes.subarray(0, CHECKSUM_BYTES))) throw new Error('damaged')
  return deserialize(body) as TaskResult
}

async function tidyFolder(folder: string, mostBytes: number): Promise<void> {
  const names = await readdir(folder)
  const entries = await Promise.all(
    names.map(async (name) => {
      const { size, mtimeMs } = await stat(join(folder, name))
      return { name, size, mtimeMs }
    }),
  )
  const now = Date.now()
  const stale = entries.filter(({ name, mtimeMs }) => name.endsWith('.part') && now - mtimeMs > STALE_PART_MS)
  let room = mostBytes
  const excess = entries
    .filter(({ name }) => name.endsWith(END))
    .sort((a, b) => b.mtimeMs - a.mtimeMs)
    .filter(({ size }) => (room -= size) < 0)
  await Promise.all([...stale, ...excess].map(({ name }) => rm(join(folder, name), { force: true })))
}
