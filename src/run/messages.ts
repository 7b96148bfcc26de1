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
  const { layers, ...surface } = result.pressure
  const arrays = [surface, layers?.upper, layers?.lower].flatMap((fields) =>
    Object.values(fields ?? {}).filter((value) => value instanceof Float64Array),
  )
  return [...new Set(arrays.map((values) => values.buffer as ArrayBuffer))]
}
