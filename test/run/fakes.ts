import type { Task, TaskResult } from '../../src/core'
import type { Spawn, TaskWorker } from '../../src/run/taskWorker'

/** A task with a name of its own that is long enough for the pool. */
export function longTask(name: string): Task {
  return { ...shortTask(name), state: { ...shortTask(name).state, method: 'viscous', reynolds: 1e6 } } as Task
}

export function shortTask(name: string): Task {
  const outline = new Float64Array([1, 0, 1])
  return {
    kind: 'polar',
    section: { name, x: outline, y: outline, meanLine: null, notes: [] },
    state: {
      ...{ method: 'panel', reynolds: null, mach: 0, surface: 'clean', amplification: null },
      ...{ tripUpper: 1, tripLower: 1, flap: 0, panels: 180 },
    },
    alphas: [0],
  }
}

export function resultOf(name: string): TaskResult {
  return { kind: 'failed', reason: name }
}

/** Workers whose tasks end when the test says so. */
export function handWorkers(): {
  spawn: Spawn
  running: { name: string; finish: () => void; break: (reason: string) => void; ended: boolean }[]
  started: () => number
} {
  const running: ReturnType<typeof handWorkers>['running'] = []
  let started = 0
  const spawn: Spawn = () => {
    started++
    const mine: (typeof running)[number][] = []
    const worker: TaskWorker = {
      run: (task) =>
        new Promise((resolve, reject) => {
          const name = task.section.name
          const job = {
            name,
            finish: () => resolve(resultOf(name)),
            break: (reason: string) => reject(new Error(reason)),
            ended: false,
          }
          mine.push(job)
          running.push(job)
        }),
      terminate: () => mine.forEach((job) => (job.ended = true)),
    }
    return worker
  }
  return { spawn, running, started: () => started }
}
