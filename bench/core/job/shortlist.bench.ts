import { readFileSync } from 'node:fs'
import { assemble, nextTasks, runTask, taskKey, type TaskResult } from '../../../src/core'
import { readBrief } from '../../../src/io/brief'
import { jobFromBrief } from '../../../src/io/job'
import type { Measured } from '../../registry'

/** Six NACA sections on the sample drone at five conditions, from the brief to the comparison, one thread. */
export function shortlistOfSix(): Measured {
  const file = 'sample-data/shoreline-drone.brief.json'
  const sample = readBrief(readFileSync(file, 'utf8'), file)
  const [first] = sample.shortlist
  const codes = ['4412', '2415', '2412', '23012', '4415', '0012']
  const brief = { ...sample, shortlist: codes.map((code) => ({ ...first!, section: `naca:${code}` })) }
  const prepare = () => jobFromBrief(brief, file, () => new Uint8Array(), { method: 'panel' }).job
  const compute = () => {
    const job = prepare()
    const known = new Map<string, TaskResult>()
    for (let tasks = nextTasks(job, known); tasks.length > 0; tasks = nextTasks(job, known)) {
      for (const task of tasks) known.set(taskKey(task), runTask(task))
    }
    return { job, known }
  }
  const { job, known } = compute()
  return {
    run: () => {
      const done = compute()
      assemble(done.job, done.known)
    },
    parts: { plan: () => void nextTasks(job, known), assemble: () => void assemble(job, known) },
  }
}
