import { describe, expect, it } from 'vitest'
import { openPool } from '../../src/run/pool'
import { handWorkers, longTask, resultOf } from './fakes'

const never = new AbortController().signal
const at = (priority: number, signal = never): { priority: number; signal: AbortSignal } => ({
  priority,
  signal,
})
const turn = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0))

describe('the pool', () => {
  it('starts no more workers than its size, and none before there is work', async () => {
    const { spawn, running, started } = handWorkers()
    const pool = openPool(spawn, 2)
    expect(started()).toBe(0)
    const all = ['a', 'b', 'c'].map((name) => pool.run(name, longTask(name), at(0)))
    expect(running.map(({ name }) => name)).toEqual(['a', 'b'])
    running[0]!.finish()
    await turn()
    expect(running.map(({ name }) => name)).toEqual(['a', 'b', 'c'])
    running.forEach((job) => job.finish())
    expect(await Promise.all(all)).toEqual(['a', 'b', 'c'].map(resultOf))
    expect(started()).toBe(2)
  })

  it('takes the lowest priority number first, and equal ones in the order they were asked', async () => {
    const { spawn, running } = handWorkers()
    const pool = openPool(spawn, 1)
    const asked: [string, number][] = [
      ['first', 5],
      ['late', 9],
      ['b', 1],
      ['c', 1],
    ]
    const all = asked.map(([name, priority]) => pool.run(name, longTask(name), at(priority)))
    for (let i = 0; i < asked.length; i++) {
      running[i]!.finish()
      await turn()
    }
    await Promise.all(all)
    expect(running.map(({ name }) => name)).toEqual(['first', 'b', 'c', 'late'])
  })

  it('computes a task once for all who ask for it, and ends it only when all of them give up', async () => {
    const { spawn, running } = handWorkers()
    const pool = openPool(spawn, 1)
    const older = new AbortController()
    const newer = new AbortController()
    const first = pool.run('a', longTask('a'), at(0, older.signal))
    const second = pool.run('a', longTask('a'), at(0, newer.signal))
    older.abort()
    await expect(first).rejects.toThrow()
    expect(running).toHaveLength(1)
    expect(running[0]!.ended).toBe(false)
    newer.abort()
    await expect(second).rejects.toThrow()
    expect(running[0]!.ended).toBe(true)
  })

  it('drops a queued task that is cancelled, and goes on with the next in a fresh worker', async () => {
    const { spawn, running, started } = handWorkers()
    const pool = openPool(spawn, 1)
    const cancel = new AbortController()
    const dropped = ['a', 'b'].map((name) => pool.run(name, longTask(name), at(0, cancel.signal)))
    const kept = pool.run('c', longTask('c'), at(0))
    cancel.abort()
    await Promise.all(dropped.map((one) => expect(one).rejects.toThrow()))
    expect(running.map(({ name }) => name)).toEqual(['a', 'c'])
    expect(started()).toBe(2)
    running[1]!.finish()
    expect(await kept).toEqual(resultOf('c'))
  })

  it('marks a task failed when its worker breaks, and does the rest', async () => {
    const { spawn, running } = handWorkers()
    const pool = openPool(spawn, 1)
    const broken = pool.run('a', longTask('a'), at(0))
    const next = pool.run('b', longTask('b'), at(0))
    running[0]!.break('out of memory')
    expect(await broken).toEqual({
      kind: 'failed',
      reason: 'the computation ended unexpectedly (out of memory)',
    })
    running[1]!.finish()
    expect(await next).toEqual(resultOf('b'))
  })

  it('marks tasks failed when no worker can be started', async () => {
    const pool = openPool(() => {
      throw new Error('no worker here')
    }, 2)
    const all = ['a', 'b', 'c'].map((name) => pool.run(name, longTask(name), at(0)))
    for (const result of await Promise.all(all)) {
      expect(result).toMatchObject({ kind: 'failed', reason: expect.stringContaining('no worker here') })
    }
  })

  it('ends its workers and rejects what is left when it is closed', async () => {
    const { spawn, running } = handWorkers()
    const pool = openPool(spawn, 1)
    const all = ['a', 'b'].map((name) => pool.run(name, longTask(name), at(0)))
    pool.close()
    await Promise.all(all.map((one) => expect(one).rejects.toThrow('the pool is closed')))
    expect(running.map(({ ended }) => ended)).toEqual([true])
    await expect(pool.run('c', longTask('c'), at(0))).rejects.toThrow('the pool is closed')
  })
})
