import { app, BrowserWindow, dialog, ipcMain, Menu, protocol, session } from 'electron'
import { readFile, rm, stat } from 'node:fs/promises'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { writeFiles } from '../files/writeFiles'
import { MENU_CHANNEL } from '../shared/channels'
import { briefFile, type FileParts } from './files'
import { guardContents, guardSession } from './guardContents'
import { requestHandlers } from './handlers'
import { answerRequests } from './ipc'
import { menuTemplate } from './menu'
import { recovery } from './recovery'
import { windowFrame } from './window'
import { answerWindowFile } from './windowFiles'
import { ORIGIN, SCHEME, SCHEME_PRIVILEGES, windowOptions } from './windowOptions'

const here = (path: string): string => fileURLToPath(new URL(path, import.meta.url))

async function openWindow(): Promise<void> {
  const window = new BrowserWindow(windowOptions(here('../preload/index.cjs')))
  const files: FileParts = {
    dialog: {
      open: (options) => dialog.showOpenDialog(window, options),
      save: (options) => dialog.showSaveDialog(window, options),
    },
    sizeOf: async (path) => (await stat(path)).size,
    read: async (path) => new Uint8Array(await readFile(path)),
    write: writeFiles,
  }
  const unsaved = recovery({
    path: join(app.getPath('userData'), 'unsaved.brief.json'),
    readText: (path) => readFile(path, 'utf8'),
    write: writeFiles,
    remove: (path) => rm(path, { force: true }),
  })
  answerRequests(ipcMain, requestHandlers(files, briefFile(files), unsaved, windowFrame(window, dialog)))
  const send = (command: string): void => window.webContents.send(MENU_CHANNEL, command)
  Menu.setApplicationMenu(Menu.buildFromTemplate(menuTemplate(process.platform, send)))
  window.once('ready-to-show', () => window.show())
  await window.loadURL(`${ORIGIN}/`)
}

protocol.registerSchemesAsPrivileged([SCHEME_PRIVILEGES])
app.enableSandbox()
app.on('web-contents-created', (_event, contents) => guardContents(contents))
app.on('window-all-closed', () => app.quit())

// A second start would fight over the kept document, so it ends at once. The wait for Electron is not at the
// top level: Electron is ready only when this module has been run to its end.
if (app.requestSingleInstanceLock()) void app.whenReady().then(startApp)
else app.quit()

async function startApp(): Promise<void> {
  guardSession(session.defaultSession)
  protocol.handle(SCHEME, (request) => answerWindowFile(here('../renderer'), request))
  await openWindow()
}
