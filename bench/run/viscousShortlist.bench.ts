import { setMaxListeners } from 'node:events'
import { availableParallelism } from 'node:os'
import { resolve } from 'node:path'
import { pathToFileURL } from 'node:url'
import { threadPool } from '../../src/cli/threads'
import { nacaSection, taskKey, type Task } from '../../src/core'
import { runTasks } from '../../src/run/runTasks'
import { memoryStore } from '../../src/run/store'
import { POLAR_ALPHAS, viscousState } from '../core/polar/viscousState'
import type { Measured } from '../registry'

const CODES = ['0012', '2412', '2415', '4412', '4415', '23012']
const REYNOLDS = [2e5, 5e5, 1e6, 3e6, 9e6]

/** Six sections at five Reynolds numbers, 31 points each, on the worker threads of the command line. */
export function viscousShortlist(): Measured {
  const threads = threadPool(pathToFileURL(resolve('out/main/cliWorker.js')))
  const tasks = CODES.flatMap((code) =>
    REYNOLDS.map((reynolds): Task => {
      const [section, state] = [nacaSection(code), viscousState(reynolds)]
      return { kind: 'polar', section, state, alphas: POLAR_ALPHAS }
    }),
  ).map((task) => ({ key: taskKey(task), task }))
  const { signal } = new AbortController()
  setMaxListeners(0, signal)
  return {
    run: () =>
      runTasks(tasks, { pool: threads.pool, store: memoryStore(0), signal }, (_, result) => {
        if (result.kind === 'failed') throw new Error(result.reason)
      }),
    stop: threads.close,
    note: `all cores (${availableParallelism()} threads): 30 polars of 31 points; nothing cached`,
  }
}
