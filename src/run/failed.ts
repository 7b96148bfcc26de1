import type { TaskResult } from '../core'

/** The result of a task whose computation broke, here or in a worker: marked, so that nobody waits for it. */
export function failed(error: unknown): TaskResult {
  const message = error instanceof Error ? error.message : String(error)
  return { kind: 'failed', reason: `the computation ended unexpectedly (${message})` }
}
