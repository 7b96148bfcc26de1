import type { TaskResult } from '../core'
import type { ResultMessage, TaskMessage } from './messages'
import type { TaskWorker } from './taskWorker'

/** The asker's end of a worker, in words that web workers and worker threads share. */
export interface WorkerPort {
  post(message: TaskMessage): void
  onMessage(callback: (message: ResultMessage) => void): void
  /** Calls back when the worker broke or ended by itself. */
  onEnd(callback: (reason: string) => void): void
  terminate(): void
}

/** A TaskWorker that speaks to its worker by messages. A worker that breaks rejects what it was asked. */
export function messageWorker(port: WorkerPort): TaskWorker {
  const waiting = new Map<number, { resolve: (result: TaskResult) => void; reject: (error: Error) => void }>()
  let next = 0
  let ended: string | null = null

  port.onMessage((message) => {
    const asked = waiting.get(message.id)
    waiting.delete(message.id)
    if ('result' in message) asked?.resolve(message.result)
    else asked?.reject(new Error(message.fault))
  })
  const end = (reason: string): void => {
    ended ??= reason
    for (const { reject } of waiting.values()) reject(new Error(ended))
    waiting.clear()
  }
  port.onEnd(end)

  return {
    run: (task) =>
      new Promise((resolve, reject) => {
        if (ended !== null) return reject(new Error(ended))
        const id = next++
        waiting.set(id, { resolve, reject })
        port.post({ id, task })
      }),
    terminate: () => {
      port.terminate()
      end('the worker was ended')
    },
  }
}
