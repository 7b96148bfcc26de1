import { beforeEach, describe, expect, it, vi } from 'vitest'
import { MENU_CHANNEL, type Bridge, type Channel } from '../../src/shared/channels'

const seen = vi.hoisted(() => ({
  exposed: {} as Record<string, unknown>,
  invoked: [] as unknown[][],
  listeners: new Map<string, Set<(event: unknown, ...given: unknown[]) => void>>(),
}))

vi.mock('electron', () => ({
  contextBridge: { exposeInMainWorld: (name: string, value: unknown) => (seen.exposed[name] = value) },
  ipcRenderer: {
    invoke: async (...given: unknown[]) => (seen.invoked.push(given), { ok: true, value: null }),
    on: (channel: string, listener: () => void) =>
      seen.listeners.set(channel, (seen.listeners.get(channel) ?? new Set()).add(listener)),
    removeListener: (channel: string, listener: () => void) => seen.listeners.get(channel)?.delete(listener),
  },
}))

let bridge: Bridge

beforeEach(async () => {
  vi.resetModules()
  seen.invoked.length = 0
  seen.listeners.clear()
  await import('../../src/main/preload')
  bridge = seen.exposed['sectionwright'] as Bridge
})

describe('the preload', () => {
  it('hands the page two functions and nothing of Electron', () => {
    expect(Object.keys(seen.exposed)).toEqual(['sectionwright'])
    expect(Object.keys(bridge).sort()).toEqual(['call', 'onMenu'])
  })

  it('passes the requests of the map on, and no other', async () => {
    await bridge.call('saveBrief', '{}', 'a.brief.json', false)
    expect(seen.invoked).toEqual([['saveBrief', '{}', 'a.brief.json', false]])
    expect(await bridge.call('quit' as Channel)).toEqual({
      ok: false,
      message: 'There is no request "quit".',
    })
    expect(seen.invoked).toHaveLength(1)
  })

  it('passes menu commands on without the event, unknown ones not, and none after it is told to stop', () => {
    const picked: unknown[][] = []
    const stop = bridge.onMenu((...given) => picked.push(given))
    const send = (command: unknown): void =>
      seen.listeners.get(MENU_CHANNEL)?.forEach((listener) => listener({ sender: 'secret' }, command))
    send('save')
    send('format disk')
    stop()
    send('undo')
    expect(picked).toEqual([['save']])
  })
})
