import type { BrowserWindowConstructorOptions } from 'electron'

/** The scheme under which Electron serves the window to itself. */
export const SCHEME = 'sectionwright'

/** The only origin that the window has. */
export const ORIGIN = `${SCHEME}://window`

/** What the window is made with: the page can reach nothing but the bridge of the preload. */
export function windowOptions(preload: string): BrowserWindowConstructorOptions {
  return {
    width: 1440,
    height: 900,
    minWidth: 900,
    minHeight: 600,
    show: false,
    title: 'Sectionwright',
    backgroundColor: '#ffffff',
    webPreferences: {
      preload,
      contextIsolation: true,
      sandbox: true,
      nodeIntegration: false,
      nodeIntegrationInWorker: false,
      nodeIntegrationInSubFrames: false,
      webSecurity: true,
      webviewTag: false,
      navigateOnDragDrop: false,
      spellcheck: false,
    },
  }
}

/** What the scheme may do: behave like a secure web origin, so that workers and modules load from it. */
export const SCHEME_PRIVILEGES = {
  scheme: SCHEME,
  privileges: { standard: true, secure: true, supportFetchAPI: true, codeCache: true },
} as const
