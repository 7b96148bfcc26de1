import { describe, expect, it, vi } from 'vitest'
import { answerRequests, type Handlers } from '../../src/main/ipc'
import { ORIGIN } from '../../src/main/windowOptions'
import { CHANNELS, valueOf, type Answer, type Channel } from '../../src/shared/channels'
import { fakeIpcMain } from './fakeElectron'

const OURS = { url: `${ORIGIN}/index.html` }

function answering(over: Partial<Handlers> = {}): ReturnType<typeof fakeIpcMain> & { calls: unknown[][] } {
  const fake = fakeIpcMain()
  const calls: unknown[][] = []
  const plain = Object.fromEntries(
    CHANNELS.map((channel) => [
      channel,
      async (...asks: unknown[]) => (calls.push([channel, ...asks]), null),
    ]),
  ) as unknown as Handlers
  answerRequests(fake.ipcMain, { ...plain, ...over })
  return { ...fake, calls }
}

describe('requests of the window', () => {
  it('are all answered, each once', () => {
    expect(answering().channels().sort()).toEqual([...CHANNELS].sort())
  })

  it('reach their handler with their arguments', async () => {
    const { ask, calls } = answering()
    expect(await ask('saveBrief', OURS, '{}', 'a.brief.json', true)).toEqual({ ok: true, value: null })
    await ask('saveFile', OURS, 'a.bin', new Uint8Array([1, 2]))
    await ask('saveFiles', OURS, [{ name: 'polars.csv', text: 'x' }])
    await ask('keepForRecovery', OURS, null)
    expect(calls).toEqual([
      ['saveBrief', '{}', 'a.brief.json', true],
      ['saveFile', 'a.bin', new Uint8Array([1, 2])],
      ['saveFiles', [{ name: 'polars.csv', text: 'x' }]],
      ['keepForRecovery', null],
    ])
  })

  it.each([
    ['no frame', null],
    ['a frame inside the page', { url: `${ORIGIN}/`, parent: {} }],
    ['another page', { url: 'https://example.org/' }],
    ['a page whose name only begins like ours', { url: `${ORIGIN}.example.org/` }],
    ['a file', { url: 'file:///index.html' }],
  ])('are refused from %s', async (_whence, sender) => {
    const { ask, calls } = answering()
    const answer = (await ask('recover', sender)) as Answer<unknown>
    expect(answer.ok).toBe(false)
    expect(calls).toEqual([])
  })

  const wrong: [Channel, unknown[]][] = [
    ['saveBrief', []],
    ['saveBrief', ['{}', 'a.json']],
    ['saveBrief', ['{}', 'a.json', true, 'more']],
    ['saveBrief', ['{}', '../a.json', true]],
    ['saveBrief', ['{}', 'folder/a.json', true]],
    ['saveBrief', ['{}', 'C:\\a.json', true]],
    ['saveBrief', ['{}', '..', true]],
    ['saveBrief', [7, 'a.json', true]],
    ['saveFile', ['', 'x']],
    ['saveFile', ['a\0b', 'x']],
    ['saveFile', ['a.csv', { toString: 'x' }]],
    ['saveFiles', [[]]],
    ['saveFiles', [[{ name: '/etc/passwd', text: 'x' }]]],
    ['saveFiles', [[{ name: 'a', text: 'x', path: '/etc/passwd' }]]],
    ['keepForRecovery', [undefined]],
    ['showDocument', ['title', 'yes']],
  ]

  it.each(wrong)('for %s with %j are refused', async (channel, given) => {
    const { ask, calls } = answering()
    expect(await ask(channel, OURS, ...given)).toEqual({
      ok: false,
      message: `The window asked for "${channel}" in a way that makes no sense.`,
    })
    expect(calls).toEqual([])
  })

  it('carry the plain sentence of a failure back, and the window throws it', async () => {
    const print = vi.fn(async () => {
      throw new Error('Printing did not work: no printer')
    })
    const { ask } = answering({ print })
    const answer = (await ask('print', OURS)) as Answer<null>
    expect(() => valueOf(answer)).toThrow('Printing did not work: no printer')
    expect(valueOf({ ok: true, value: 7 })).toBe(7)
  })
})
