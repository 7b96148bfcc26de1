import type { IpcMain, IpcMainInvokeEvent } from 'electron'
import { CHANNELS, type Answer, type Channel, type ChannelMap } from '../shared/channels'
import { checkedArguments } from './arguments'
import { ORIGIN } from './windowOptions'

/** One function for every request of the window. */
export type Handlers = {
  readonly [K in Channel]: (...asks: ChannelMap[K]['asks']) => Promise<ChannelMap[K]['gives']>
}

/**
 * Answers the requests of the window: the only place that touches ipcMain. A request from anything but the
 * main frame of our own page is refused; arguments are checked; errors go back as plain sentences.
 */
export function answerRequests(ipcMain: Pick<IpcMain, 'handle'>, handlers: Handlers): void {
  for (const channel of CHANNELS) {
    ipcMain.handle(channel, (event, ...given: unknown[]) => answer(channel, handlers, event, given))
  }
}

async function answer<K extends Channel>(
  channel: K,
  handlers: Handlers,
  event: IpcMainInvokeEvent,
  given: readonly unknown[],
): Promise<Answer<ChannelMap[K]['gives']>> {
  try {
    if (!isOurs(event)) throw new Error('The request did not come from the window.')
    return { ok: true, value: await handlers[channel](...checkedArguments(channel, given)) }
  } catch (error) {
    return { ok: false, message: error instanceof Error ? error.message : String(error) }
  }
}

function isOurs({ senderFrame }: IpcMainInvokeEvent): boolean {
  if (senderFrame === null || senderFrame.parent !== null) return false
  return senderFrame.url === ORIGIN || senderFrame.url.startsWith(`${ORIGIN}/`)
}
