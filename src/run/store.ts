import type { TaskResult } from '../core'

/** Where results are kept under the name of their task. A store may forget; it never invents. */
export interface Store {
  get(key: string): Promise<TaskResult | null>
  put(key: string, result: TaskResult): Promise<void>
}

/** A store in memory that keeps the `capacity` results used last. */
export function memoryStore(capacity: number): Store {
  const kept = new Map<string, TaskResult>()
  return {
    get: async (key) => {
      const result = kept.get(key)
      if (result === undefined) return null
      // A Map lists its entries in the order of insertion: the one used last goes to the end.
      kept.delete(key)
      kept.set(key, result)
      return result
    },
    put: async (key, result) => {
      kept.delete(key)
      kept.set(key, result)
      const [oldest] = kept.keys()
      if (kept.size > capacity && oldest !== undefined) kept.delete(oldest)
    },
  }
}
