import { nextTasks, taskKey, type Job, type TaskResult } from '../core'
import { runTasks, type RunOptions } from './runTasks'

/** How far a run is: results that are there, of those asked for so far. */
export interface Progress {
  readonly done: number
  readonly asked: number
}

/** Everything computed so far, by the name of its task. */
export type Known = ReadonlyMap<string, TaskResult>

/**
 * Computes all that a job needs. With long tasks each entry is a part of its own, so that its figures come
 * as soon as they can; short ones are done at one go. The core names the tasks that it can name with what is known of the part; when all of
 * them are done it is asked again, until it names none. Earlier parts go first. What a part asks for depends
 * only on its own results, so neither the number of workers nor the order in which they finish decides what
 * is computed. `onResult` is called after each result with all that is known; the map grows in place.
 *
 * Rejects with the signal's reason when cancelled; `onResult` is not called after that.
 */
export async function run(
  job: Job,
  options: RunOptions & { readonly onResult?: (known: Known, progress: Progress) => void },
): Promise<Known> {
  const known = new Map<string, TaskResult>()
  const running = new Map<string, Awaited>()
  const runPart = async (part: Job, place: number): Promise<void> => {
    for (;;) {
      const named = new Map(nextTasks(part, known).map((task) => [taskKey(task), task]))
      const missing = [...named].filter(([key]) => !known.has(key))
      if (missing.length === 0) return
      const ours = missing.filter(([key]) => !running.has(key)).map(([key, task]) => ({ key, task }))
      for (const { key } of ours) running.set(key, awaited())
      const theirs = missing.map(([key]) => running.get(key)!.done)
      const computed = runTasks(ours, { priority: () => place, ...options }, (key, result) => {
        known.set(key, result)
        running.get(key)!.resolve()
        options.onResult?.(known, { done: known.size, asked: running.size })
      })
      await Promise.all([computed, ...theirs])
    }
  }
  const parts = job.method === 'viscous' ? job.entries.map((entry) => ({ ...job, entries: [entry] })) : [job]
  await Promise.all(parts.map(runPart))
  return known
}

/** A task that is under way, for parts that need it too. */
interface Awaited {
  readonly done: Promise<void>
  readonly resolve: () => void
}

function awaited(): Awaited {
  let resolve = (): void => {}
  const done = new Promise<void>((settle) => (resolve = settle))
  return { done, resolve }
}
