import type { Task, TaskResult } from '../core'
import { failed } from './failed'
import type { Spawn, TaskWorker } from './taskWorker'

/** Workers that share one queue. Runs that ask for the same task share its computation. */
export interface Pool {
  /**
   * Computes a task; the lowest priority number goes first, equal ones in the order they were asked. A task
   * whose worker breaks comes back failed. Rejects with the signal's reason when the asker gives up: a task
   * that nobody waits for any more leaves the queue, or its busy worker is ended.
   */
  run(key: string, task: Task, options: PoolOptions): Promise<TaskResult>
  /** Ends all workers; what was asked rejects. */
  close(): void
}

export interface PoolOptions {
  readonly priority: number
  readonly signal: AbortSignal
}

interface Waiter {
  readonly resolve: (result: TaskResult) => void
  readonly reject: (reason: unknown) => void
}

interface Item {
  readonly key: string
  readonly task: Task
  readonly order: number
  priority: number
  readonly waiters: Set<Waiter>
  worker: TaskWorker | null
}

/** A pool of at most `size` workers, started when there is work for them. */
export function openPool(spawn: Spawn, size: number): Pool {
  const items = new Map<string, Item>()
  const idle: TaskWorker[] = []
  let busy = 0
  let order = 0
  let closed = false

  const settle = (item: Item, worker: TaskWorker, result: TaskResult, reusable: boolean): void => {
    if (item.worker !== worker) return
    busy--
    items.delete(item.key)
    if (reusable) idle.push(worker)
    else worker.terminate()
    for (const waiter of item.waiters) waiter.resolve(result)
    startNext()
  }

  const start = (item: Item): void => {
    let worker: TaskWorker
    try {
      worker = idle.pop() ?? spawn()
    } catch (error) {
      items.delete(item.key)
      for (const waiter of item.waiters) waiter.resolve(failed(error))
      return
    }
    busy++
    item.worker = worker
    worker.run(item.task).then(
      (result) => settle(item, worker, result, true),
      (error: unknown) => settle(item, worker, failed(error), false),
    )
  }

  const startNext = (): void => {
    while (!closed && busy < size) {
      const item = firstQueued(items.values())
      if (item === null) return
      start(item)
    }
  }

  const drop = (item: Item): void => {
    items.delete(item.key)
    if (item.worker === null) return
    busy--
    item.worker.terminate()
    item.worker = null
    // One cancel drops many items, one after another: the next starts when all of them are gone.
    queueMicrotask(startNext)
  }

  return {
    run: (key, task, { priority, signal }) =>
      new Promise((resolve, reject) => {
        if (closed) return reject(new Error('the pool is closed'))
        if (signal.aborted) return reject(signal.reason)
        const item = items.get(key) ?? {
          key,
          task,
          order: order++,
          priority,
          waiters: new Set(),
          worker: null,
        }
        items.set(key, item)
        item.priority = Math.min(item.priority, priority)
        const giveUp = (): void => {
          item.waiters.delete(waiter)
          if (item.waiters.size === 0) drop(item)
          reject(signal.reason)
        }
        const waiter: Waiter = {
          resolve: (result) => {
            signal.removeEventListener('abort', giveUp)
            resolve(result)
          },
          reject,
        }
        item.waiters.add(waiter)
        signal.addEventListener('abort', giveUp, { once: true })
        startNext()
      }),
    close: () => {
      closed = true
      for (const item of [...items.values()]) {
        for (const waiter of item.waiters) waiter.reject(new Error('the pool is closed'))
        drop(item)
      }
      for (const worker of idle.splice(0)) worker.terminate()
    },
  }
}

function firstQueued(items: Iterable<Item>): Item | null {
  let first: Item | null = null
  for (const item of items) {
    if (item.worker !== null) continue
    if (
      first === null ||
      item.priority < first.priority ||
      (item.priority === first.priority && item.order < first.order)
    ) {
      first = item
    }
  }
  return first
}
