import { taskKey, type Task, type TaskResult } from '../core'
import { runTasks } from '../run/runTasks'
import { Failure } from './failure'
import type { Terminal } from './terminal'
import { withWorkers } from './work'

/** A task and the section's name as the user typed it. */
export interface AskedTask {
  readonly name: string
  readonly task: Task
}

/**
 * Computes tasks, equal ones once, and gives their results in the order asked. The first that cannot be
 * computed ends the rest.
 *
 * Throws Failure that names the section and says why; rejects with the signal's reason when interrupted.
 */
export async function compute(asked: readonly AskedTask[], terminal: Terminal): Promise<TaskResult[]> {
  const named = asked.map(({ name, task }) => ({ name, task, key: taskKey(task) }))
  const tasks = new Map(named.map((one) => [one.key, one]))
  const known = new Map<string, TaskResult>()
  await withWorkers(terminal, (options) => {
    terminal.progress(0, tasks.size)
    return runTasks([...tasks.values()], options, (key, result) => {
      if (result.kind === 'failed') throw new Failure(`${tasks.get(key)!.name}: ${result.reason}`)
      known.set(key, result)
      terminal.progress(known.size, tasks.size)
    })
  })
  return named.map(({ key }) => known.get(key)!)
}
