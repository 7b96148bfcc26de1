import { runTask, type Task, type TaskResult } from '../core'
import { failed } from './failed'
import type { Pool } from './pool'
import type { Store } from './store'

/** How tasks are run. */
export interface RunOptions {
  /** Opened only when there is work for it: starting a worker costs more than a short task. */
  readonly pool: () => Pool
  readonly store: Store
  readonly signal: AbortSignal
  /** Lower goes first; the same for all when absent. */
  readonly priority?: (task: Task) => number
}

/** A task under its canonical name. */
export interface NamedTask {
  readonly key: string
  readonly task: Task
}

/** Work on this thread gives way to messages after so many milliseconds, so that cancelling is prompt. */
const BREATH_MS = 16

/**
 * Runs tasks and calls back with each result as it comes. Results in the store are not computed again.
 * Short tasks run here, one after another; long ones go to the pool. Failed results are not kept.
 *
 * Rejects with the signal's reason when cancelled; no result is called back after that.
 */
export async function runTasks(
  tasks: readonly NamedTask[],
  options: RunOptions,
  onResult: (key: string, result: TaskResult) => void,
): Promise<void> {
  const { store, signal } = options
  const priority = options.priority ?? (() => 0)
  const inOrder = tasks
    .map((named) => ({ ...named, priority: priority(named.task) }))
    .sort((a, b) => a.priority - b.priority)
  const found = await Promise.all(inOrder.map(({ key }) => store.get(key)))
  signal.throwIfAborted()
  found.forEach((result, i) => {
    if (result !== null) onResult(inOrder[i]!.key, result)
  })

  const arrived = (key: string, result: TaskResult): Promise<void> | undefined => {
    signal.throwIfAborted()
    onResult(key, result)
    return result.kind === 'failed' ? undefined : store.put(key, result)
  }
  const missing = inOrder.filter((_, i) => found[i] === null)
  const long = missing
    .filter(({ task }) => !isShort(task))
    .map(async ({ key, task, priority }) =>
      arrived(key, await options.pool().run(key, task, { priority, signal })),
    )
  const short = runHere(
    missing.filter(({ task }) => isShort(task)),
    signal,
    arrived,
  )
  await Promise.all([short, ...long])
}

async function runHere(
  tasks: readonly NamedTask[],
  signal: AbortSignal,
  arrived: (key: string, result: TaskResult) => Promise<void> | undefined,
): Promise<void> {
  const keeping: (Promise<void> | undefined)[] = []
  let lastBreath = performance.now()
  for (const { key, task } of tasks) {
    if (performance.now() - lastBreath > BREATH_MS) {
      await new Promise((resolve) => setTimeout(resolve, 0))
      lastBreath = performance.now()
    }
    signal.throwIfAborted()
    keeping.push(arrived(key, runSafely(task)))
  }
  await Promise.all(keeping)
}

function runSafely(task: Task): TaskResult {
  try {
    return runTask(task)
  } catch (error) {
    return failed(error)
  }
}

/** Whether a task takes a few milliseconds, less than it costs to start a worker and send it there. */
export function isShort(task: Task): boolean {
  return task.state.method !== 'viscous'
}
