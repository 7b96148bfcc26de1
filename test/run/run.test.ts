import { beforeEach, describe, expect, it, vi } from 'vitest'
import type { Job, Task, TaskResult } from '../../src/core'
import { openPool } from '../../src/run/pool'
import { run, type Progress } from '../../src/run/run'
import { memoryStore, type Store } from '../../src/run/store'
import type { TaskWorker } from '../../src/run/taskWorker'
import { longTask, shortTask } from './fakes'

/** The core as the run sees it: two rounds, the second known only when the first is done. */
const core = vi.hoisted(() => ({
  rounds: [] as Task[][],
  computed: [] as string[],
  result: (name: string): unknown => ({ kind: 'polar', polar: { name } }),
}))

vi.mock('../../src/core', () => ({
  taskKey: (task: Task) => task.section.name,
  nextTasks: (_job: Job, known: ReadonlyMap<string, TaskResult>) => {
    const round = core.rounds.find((tasks) => tasks.some((task) => !known.has(task.section.name)))
    return round ?? []
  },
  runTask: (task: Task) => {
    core.computed.push(task.section.name)
    if (task.section.name.startsWith('bad')) throw new Error('a fault of ours')
    return core.result(task.section.name)
  },
}))

const job = { method: 'panel' } as unknown as Job

/** A worker that answers after a while of its own, so that tasks end in another order than they began. */
function slowWorker(delay: (name: string) => number): TaskWorker {
  return {
    run: (task) =>
      new Promise((resolve) => {
        const name = task.section.name
        setTimeout(() => resolve(core.result(name) as TaskResult), delay(name))
      }),
    terminate: () => {},
  }
}

function options(
  workers = 1,
  delay: (name: string) => number = () => 0,
): { pool: () => ReturnType<typeof openPool>; store: Store; signal: AbortSignal } {
  const pool = openPool(() => slowWorker(delay), workers)
  return { pool: () => pool, store: memoryStore(99), signal: new AbortController().signal }
}

beforeEach(() => {
  core.rounds = [[shortTask('a'), shortTask('b')], [shortTask('c')]]
  core.computed = []
})

describe('a run', () => {
  it('asks again until nothing more is needed, and reports how far it is', async () => {
    const seen: Progress[] = []
    const known = await run(job, { ...options(), onResult: (_known, progress) => seen.push(progress) })
    expect([...known.keys()].sort()).toEqual(['a', 'b', 'c'])
    expect(seen.map(({ done, asked }) => [done, asked])).toEqual([
      [1, 2],
      [2, 2],
      [3, 3],
    ])
  })

  it('shares a task that several entries of a long job need', async () => {
    const viscous = { method: 'viscous', entries: [{}, {}, {}] } as unknown as Job
    core.rounds = [[longTask('a'), longTask('b')], [longTask('c')]]
    const ran: string[] = []
    const known = await run(
      viscous,
      options(2, (name) => (ran.push(name), name === 'a' ? 20 : 1)),
    )
    expect(ran.sort()).toEqual(['a', 'b', 'c'])
    expect(known.size).toBe(3)
  })

  it('computes a task that is named twice once', async () => {
    core.rounds = [[shortTask('a'), shortTask('a')]]
    await run(job, options())
    expect(core.computed).toEqual(['a'])
  })

  it('does not compute what the store knows', async () => {
    const given = options()
    await run(job, given)
    core.computed = []
    const again = await run(job, given)
    expect(core.computed).toEqual([])
    expect(again.size).toBe(3)
  })

  it('runs the lower priority number first', async () => {
    await run(job, { ...options(), priority: (task) => (task.section.name === 'b' ? 0 : 1) })
    expect(core.computed).toEqual(['b', 'a', 'c'])
  })

  it('knows the same whatever the number of workers and the order in which they finish', async () => {
    const names = ['a', 'b', 'c', 'd', 'e']
    core.rounds = [names.map(longTask), [longTask('f'), shortTask('g')]]
    const sorted = async (workers: number, delay: (name: string) => number): Promise<unknown> =>
      [...(await run(job, options(workers, delay)))].sort(([a], [b]) => (a < b ? -1 : 1))
    const alone = await sorted(1, () => 0)
    expect(await sorted(3, (name) => 10 - names.indexOf(name) * 2)).toEqual(alone)
    expect(await sorted(8, () => 1)).toEqual(alone)
  })

  it('opens no pool for short tasks', async () => {
    const pool = vi.fn(options().pool)
    await run(job, { ...options(), pool })
    expect(pool).not.toHaveBeenCalled()
  })

  it('marks a task whose computation breaks and does the rest, but keeps no failure in the store', async () => {
    core.rounds = [[shortTask('bad'), shortTask('a')]]
    const given = options()
    const known = await run(job, given)
    expect(known.get('bad')).toEqual({
      kind: 'failed',
      reason: 'the computation ended unexpectedly (a fault of ours)',
    })
    expect(known.has('a')).toBe(true)
    expect(await given.store.get('bad')).toBeNull()
  })

  it('rejects when cancelled and says nothing after that', async () => {
    const cancel = new AbortController()
    core.rounds = [['a', 'b', 'c'].map(longTask)]
    let calls = 0
    const running = run(job, {
      ...options(1, () => 5),
      signal: cancel.signal,
      onResult: () => {
        calls++
        cancel.abort()
      },
    })
    await expect(running).rejects.toThrow()
    await new Promise((resolve) => setTimeout(resolve, 40))
    expect(calls).toBe(1)
  })
})
