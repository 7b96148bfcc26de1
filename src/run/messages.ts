import type { Task, TaskResult } from '../core'

/** What goes to a worker. */
export interface TaskMessage {
  readonly id: number
  readonly task: Task
}

/** What comes back: a result, or the message of a fault of ours. */
export type ResultMessage =
  { readonly id: number; readonly result: TaskResult } | { readonly id: number; readonly fault: string }

/** The buffers of a result that may leave the worker by transfer, each once. */
export function transferables(result: TaskResult): ArrayBuffer[] {
  if (result.kind !== 'pressure') return []
  const { x, y, pressureCoefficient } = result.pressure
  return [...new Set([x, y, pressureCoefficient].map((values) => values.buffer as ArrayBuffer))]
}
