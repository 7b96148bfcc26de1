import { CORE_HASH } from '../shared/coreHash'
import type { RunOptions } from '../run/runTasks'
import { memoryStore } from '../run/store'
import { cacheFolder, diskCache } from './diskCache'
import type { Terminal } from './terminal'
import { threadPool } from './threads'

/** The cache on the disk keeps no more than this. */
const MOST_CACHE_BYTES = 100_000_000
const MOST_IN_MEMORY = 1000

/** Does some work with a pool and a cache, and puts both away afterwards, however the work ends. */
export async function withWorkers<T>(
  terminal: Terminal,
  work: (options: RunOptions) => Promise<T>,
): Promise<T> {
  const threads = threadPool(terminal.worker)
  const unwanted = Boolean(terminal.env['SECTIONWRIGHT_NO_CACHE'])
  const disk =
    CORE_HASH === null || unwanted
      ? null
      : diskCache(cacheFolder(process.platform, terminal.env), CORE_HASH, MOST_CACHE_BYTES)
  try {
    return await work({
      pool: threads.pool,
      store: disk ?? memoryStore(MOST_IN_MEMORY),
      signal: terminal.signal,
    })
  } finally {
    threads.close()
    await disk?.tidy()
  }
}
