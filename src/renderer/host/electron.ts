import { valueOf, type Bridge, type Channel, type ChannelMap } from '../../shared/channels'
import type { Host } from '../../shared/host'

/** The host that answers through Electron's preload. */
export function electronHost(bridge: Bridge): Host {
  const call = async <K extends Channel>(channel: K, ...asks: ChannelMap[K]['asks']) =>
    valueOf(await bridge.call(channel, ...asks))
  return {
    kind: 'electron',
    openFiles: () => call('openFiles'),
    openBrief: () => call('openBrief'),
    saveBrief: (text, suggestedName, { as }) => call('saveBrief', text, suggestedName, as),
    forgetBrief: async () => void (await call('forgetBrief')),
    saveFile: (suggestedName, content) => call('saveFile', suggestedName, content),
    saveFiles: (files) => call('saveFiles', files),
    recover: () => call('recover'),
    keepForRecovery: async (text) => void (await call('keepForRecovery', text)),
    print: async () => void (await call('print')),
    showDocument: async ({ title, unsaved }) => void (await call('showDocument', title, unsaved)),
    onMenu: (callback) => bridge.onMenu(callback),
  }
}
