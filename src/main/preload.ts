import { contextBridge, ipcRenderer } from 'electron'
import { CHANNELS, MENU_CHANNEL, type Bridge } from '../shared/channels'
import { MENU_COMMANDS, type MenuCommand } from '../shared/host'

const bridge: Bridge = {
  call: (channel, ...asks) =>
    CHANNELS.includes(channel)
      ? ipcRenderer.invoke(channel, ...asks)
      : Promise.resolve({ ok: false, message: `There is no request "${channel}".` }),
  onMenu: (callback) => {
    const listener = (_event: unknown, command: unknown): void => {
      if (MENU_COMMANDS.includes(command as MenuCommand)) callback(command as MenuCommand)
    }
    ipcRenderer.on(MENU_CHANNEL, listener)
    return () => ipcRenderer.removeListener(MENU_CHANNEL, listener)
  },
}

contextBridge.exposeInMainWorld('sectionwright', bridge)
