import { availableParallelism } from 'node:os'
import { Worker } from 'node:worker_threads'
import type { ResultMessage, TaskMessage } from '../run/messages'
import { messageWorker } from '../run/messageWorker'
import { openPool, type Pool } from '../run/pool'
import type { TaskWorker } from '../run/taskWorker'

/** More threads than this gain nothing: a shortlist has few sections. */
const MOST_THREADS = 8

/** A pool of worker threads, opened when first asked for. */
export function threadPool(worker: URL): { readonly pool: () => Pool; readonly close: () => void } {
  let opened: Pool | null = null
  return {
    pool: () => (opened ??= openPool(() => thread(worker), Math.min(availableParallelism(), MOST_THREADS))),
    close: () => opened?.close(),
  }
}

function thread(script: URL): TaskWorker {
  const worker = new Worker(script)
  return messageWorker({
    post: (message: TaskMessage) => worker.postMessage(message),
    onMessage: (callback) => worker.on('message', (message: ResultMessage) => callback(message)),
    onEnd: (callback) => {
      worker.on('error', (error) => callback(error instanceof Error ? error.message : String(error)))
      worker.on('messageerror', (error) => callback(error.message))
      worker.on('exit', () => callback('the worker stopped'))
    },
    terminate: () => void worker.terminate(),
  })
}
