import {
  assemble,
  nextTasks,
  runTask,
  taskKey,
  type Comparison,
  type Method,
  type TaskResult,
} from '../../src/core'
import { readBrief } from '../../src/io/brief'
import { jobFromBrief } from '../../src/io/job'
import { briefText } from './briefs'

/** The comparison of the small test brief, computed to its end or, with `computed` false, not begun. */
export function comparisonOf(
  options: {
    readonly method?: Method
    readonly computed?: boolean
    readonly over?: Readonly<Record<string, unknown>>
  } = {},
): Comparison {
  const brief = readBrief(briefText(options.over), 'test')
  const readBytes = (): Uint8Array => new Uint8Array()
  const { job } = jobFromBrief(brief, 'test', readBytes, {
    method: options.method ?? 'panel',
    allowEmpty: true,
  })
  const known = new Map<string, TaskResult>()
  for (let tasks = nextTasks(job, known); options.computed !== false && tasks.length > 0;) {
    for (const task of tasks) known.set(taskKey(task), runTask(task))
    tasks = nextTasks(job, known)
  }
  return assemble(job, known)
}

/** Indices of the conditions of the small test brief. */
export const SLOWEST = 0
export const MAPPING = 1
