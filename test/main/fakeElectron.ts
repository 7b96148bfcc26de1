import type { IpcMain } from 'electron'

type Listener = (event: unknown, ...given: unknown[]) => unknown

/** Where a request seems to come from. */
export interface Sender {
  readonly url: string
  readonly parent?: object | null
}

/** An ipcMain that a test can speak to as the window would. */
export function fakeIpcMain(): {
  ipcMain: Pick<IpcMain, 'handle'>
  channels: () => string[]
  ask: (channel: string, sender: Sender | null, ...given: unknown[]) => Promise<unknown>
} {
  const handlers = new Map<string, Listener>()
  return {
    ipcMain: {
      handle: (channel, listener) => {
        // As in Electron: a second handler for a channel is an error.
        if (handlers.has(channel)) throw new Error(`Attempted to register a second handler for '${channel}'`)
        handlers.set(channel, listener as Listener)
      },
    },
    channels: () => [...handlers.keys()],
    ask: async (channel, sender, ...given) => {
      const senderFrame = sender === null ? null : { parent: null, ...sender }
      // As in Electron: arguments are cloned, so that nothing but plain data arrives.
      return handlers.get(channel)!({ senderFrame }, ...structuredClone(given))
    },
  }
}

/** Something with events, of which a test can emit one and see whether it was prevented. */
export function fakeEmitter(): {
  on: (event: string, listener: Listener) => unknown
  emit: (event: string) => boolean
} {
  const listeners = new Map<string, Listener[]>()
  return {
    on: (event, listener) => listeners.set(event, [...(listeners.get(event) ?? []), listener]),
    emit: (event) => {
      let prevented = false
      for (const listener of listeners.get(event) ?? [])
        listener({ preventDefault: () => (prevented = true) })
      return prevented
    },
  }
}
