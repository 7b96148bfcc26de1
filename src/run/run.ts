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
 * Computes all that a job needs. The core names the tasks that it can name with what is known; when all of
 * them are done it is asked again, until it names none. (Asking earlier would let the order in which
 * workers finish decide what is computed.) `onResult` is called after each result with all that is known;
 * the map grows in place.
 *
 * Rejects with the signal's reason when cancelled; `onResult` is not called after that.
 */
export async function run(
  job: Job,
  options: RunOptions & { readonly onResult?: (known: Known, progress: Progress) => void },
): Promise<Known> {
  const known = new Map<string, TaskResult>()
  let asked = 0
  for (;;) {
    const named = new Map(nextTasks(job, known).map((task) => [taskKey(task), task]))
    const tasks = [...named].filter(([key]) => !known.has(key)).map(([key, task]) => ({ key, task }))
    if (tasks.length === 0) return known
    asked += tasks.length
    await runTasks(tasks, options, (key, result) => {
      known.set(key, result)
      options.onResult?.(known, { done: known.size, asked })
    })
  }
}
