import { describe, expect, it } from 'vitest'
import { openDesk } from '../../src/renderer/state/desk'
import { BLANK_BRIEF } from '../../src/renderer/state/blanks'
import type { DeskMessage, DeskRequest } from '../../src/renderer/worker/protocol'
import { comparisonOf } from '../support/comparisons'

/** A desk whose worker is played by the test. */
function playedDesk() {
  const asked: DeskRequest[] = []
  let hear: (event: { data: DeskMessage }) => void = () => {}
  const worker = {
    postMessage: (request: DeskRequest) => asked.push(request),
    addEventListener: (_: string, listener: typeof hear) => (hear = listener),
  }
  const desk = openDesk(worker as unknown as Worker)
  return { desk, asked, say: (data: DeskMessage) => hear({ data }) }
}

const whole = comparisonOf()
const message = (version: number, finished: boolean): DeskMessage => ({
  ...{ kind: 'comparison', version, comparison: whole, faults: [], warnings: [] },
  ...{ done: finished ? 4 : 2, asked: 4, finished },
})

describe('a cancelled computation', () => {
  it('stops at once, keeps the last good result marked stale, and ignores what comes late', () => {
    const { desk, asked, say } = playedDesk()
    desk.compute(BLANK_BRIEF, 'panel')
    say(message(1, true))
    expect([desk.results.busy, desk.results.stale]).toEqual([false, false])
    desk.compute(BLANK_BRIEF, 'thin')
    desk.cancel()
    expect(asked.map(({ kind }) => kind)).toEqual(['compute', 'compute', 'cancel'])
    const cancelled = { busy: false, stale: true, cancelled: true, comparison: whole }
    expect(desk.results).toMatchObject(cancelled)
    say({ ...message(2, true), comparison: comparisonOf({ computed: false }) } as DeskMessage)
    expect(desk.results).toMatchObject(cancelled)
  })

  it('shows partial results while it runs, and the next run whole', () => {
    const { desk, say } = playedDesk()
    desk.compute(BLANK_BRIEF, 'panel')
    say(message(1, false))
    expect(desk.results).toMatchObject({ busy: true, stale: true, comparison: whole, done: 2, asked: 4 })
    desk.cancel()
    desk.compute(BLANK_BRIEF, 'panel')
    expect(desk.results.cancelled).toBe(false)
    say(message(3, true))
    expect(desk.results).toMatchObject({ busy: false, stale: false })
  })
})
