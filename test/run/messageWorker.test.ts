import { describe, expect, it } from 'vitest'
import type { TaskResult } from '../../src/core'
import { transferables, type ResultMessage, type TaskMessage } from '../../src/run/messages'
import { messageWorker } from '../../src/run/messageWorker'
import { longTask, resultOf } from './fakes'

function fakePort(): {
  worker: ReturnType<typeof messageWorker>
  posted: TaskMessage[]
  answer: (message: ResultMessage) => void
  end: (reason: string) => void
  terminated: () => boolean
} {
  const posted: TaskMessage[] = []
  let answer: (message: ResultMessage) => void = () => {}
  let end: (reason: string) => void = () => {}
  let terminated = false
  const worker = messageWorker({
    post: (message) => posted.push(message),
    onMessage: (callback) => (answer = callback),
    onEnd: (callback) => (end = callback),
    terminate: () => (terminated = true),
  })
  return { worker, posted, answer: (m) => answer(m), end: (r) => end(r), terminated: () => terminated }
}

describe('a worker that speaks by messages', () => {
  it('gives each result to the one who asked for it, whatever the order', async () => {
    const { worker, posted, answer } = fakePort()
    const first = worker.run(longTask('a'))
    const second = worker.run(longTask('b'))
    answer({ id: posted[1]!.id, result: resultOf('b') })
    answer({ id: posted[0]!.id, result: resultOf('a') })
    expect(await first).toEqual(resultOf('a'))
    expect(await second).toEqual(resultOf('b'))
  })

  it('rejects with the fault that the worker names', async () => {
    const { worker, posted, answer } = fakePort()
    const asked = worker.run(longTask('a'))
    answer({ id: posted[0]!.id, fault: 'a fault of ours' })
    await expect(asked).rejects.toThrow('a fault of ours')
  })

  it('rejects what waits, and all that comes later, when the worker ends', async () => {
    const { worker, end } = fakePort()
    const asked = worker.run(longTask('a'))
    end('the worker stopped')
    await expect(asked).rejects.toThrow('the worker stopped')
    await expect(worker.run(longTask('b'))).rejects.toThrow('the worker stopped')
  })

  it('ends the worker and leaves nobody waiting when it is terminated', async () => {
    const { worker, terminated } = fakePort()
    const asked = worker.run(longTask('a'))
    worker.terminate()
    expect(terminated()).toBe(true)
    await expect(asked).rejects.toThrow()
  })
})

describe('what may be transferred', () => {
  it('is every buffer of a pressure once, and nothing of a polar', () => {
    const shared = new Float64Array(4)
    const pressure = {
      kind: 'pressure',
      pressure: { x: shared.subarray(0, 2), y: shared.subarray(2), pressureCoefficient: new Float64Array(2) },
    } as unknown as TaskResult
    expect(transferables(pressure)).toHaveLength(2)
    expect(transferables(resultOf('a'))).toEqual([])
  })
})
