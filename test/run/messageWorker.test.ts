import { describe, expect, it } from 'vitest'
import { nacaSection, runTask, type Task, type TaskResult } from '../../src/core'
import { transferables, type ResultMessage, type TaskMessage } from '../../src/run/messages'
import { messageWorker } from '../../src/run/messageWorker'
import { sectionState } from '../support/states'
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

/** A viscous pressure on few panels: quick, and with boundary layers. */
const task = {
  kind: 'pressure',
  section: nacaSection('2412'),
  state: sectionState({ method: 'viscous', reynolds: 1e6, amplification: 9, panels: 60 }),
} satisfies Partial<Task>

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

  it('is every array of the boundary layers too, so that none is copied', () => {
    const result = runTask({ ...task, at: { alpha: 0.03 } })
    if (result.kind !== 'pressure' || result.pressure.layers === null) throw new Error('no layers')
    const { layers, x, y, pressureCoefficient } = result.pressure
    const sides = [layers.upper, layers.lower].flatMap((side) => [
      ...[side.x, side.momentumThickness, side.shapeFactor, side.frictionCoefficient, side.amplification],
    ])
    const buffers = [x, y, pressureCoefficient, ...sides].map((values) => values.buffer)
    expect(new Set(transferables(result))).toEqual(new Set(buffers))
    const sent = structuredClone(result, { transfer: transferables(result) })
    expect(x).toHaveLength(0)
    for (const values of sides) expect(values).toHaveLength(0)
    expect(sent.pressure.layers!.upper.x.length).toBeGreaterThan(10)
  })
})
