import { messageWorker } from '../../run/messageWorker'
import type { ResultMessage } from '../../run/messages'
import type { TaskWorker } from '../../run/taskWorker'

/** Starts a web worker that computes tasks. */
export function webWorker(): TaskWorker {
  const worker = new Worker(new URL('./task.worker.ts', import.meta.url), { type: 'module' })
  return messageWorker({
    post: (message) => worker.postMessage(message),
    onMessage: (callback) =>
      worker.addEventListener('message', (event: MessageEvent<ResultMessage>) => callback(event.data)),
    onEnd: (callback) => {
      worker.addEventListener('error', (event) => callback(event.message || 'the worker stopped'))
      worker.addEventListener('messageerror', () => callback('a message could not be read'))
    },
    terminate: () => worker.terminate(),
  })
}
