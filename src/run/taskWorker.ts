import type { Task, TaskResult } from '../core'

/** Something that computes one task at a time: a web worker, a worker thread, or a fake in a test. */
export interface TaskWorker {
  /** Rejects when the worker broke; it is then thrown away. */
  run(task: Task): Promise<TaskResult>
  /** Ends the worker at once, whatever it is doing. */
  terminate(): void
}

/** Starts a worker. */
export type Spawn = () => TaskWorker
