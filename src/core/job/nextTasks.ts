import type { Job } from './job'
import { follow, whyNotComputed, wingOf, type Known } from './plan'
import { pressureTask } from './shownStation'
import type { Task } from './task'
import { taskKey } from './taskKey'

/**
 * The tasks that a job still needs, given what is known, each once. Asked again after results arrive,
 * since the slowest speed depends on the polars, pressures on the wing and the wing on its polars; none are
 * left when the job is done.
 */
export function nextTasks(job: Job, known: Known): Task[] {
  const wanted = new Map<string, Task>()
  for (const entry of job.entries) {
    if (entry.fault !== null || entry.root === null || entry.tip === null) continue
    for (const condition of job.conditions) {
      if (whyNotComputed(job, condition) !== null) continue
      const planned = follow(job, entry, condition, known)
      for (const task of planned.tasks) wanted.set(taskKey(task), task)
      const wing = wingOf(planned)
      const pressure = wing === null ? null : pressureTask(job, entry, condition, planned, wing)
      if (pressure !== null) wanted.set(taskKey(pressure), pressure)
    }
  }
  return [...wanted].filter(([key]) => !known.has(key)).map(([, task]) => task)
}
