import { beforeEach, describe, expect, it, vi } from 'vitest'
import { ORIGIN, SCHEME } from '../../src/main/windowOptions'
import { CHANNELS } from '../../src/shared/channels'

/** What the program did to Electron, in order, and whether Electron lets it be the only one. */
const seen = vi.hoisted(() => ({
  calls: [] as string[],
  options: null as unknown,
  first: true,
  ready: () => {},
}))

vi.mock('electron', () => {
  const call =
    (name: string) =>
    (...given: unknown[]): void => {
      seen.calls.push(typeof given[0] === 'string' ? `${name} ${given[0]}` : name)
    }
  class BrowserWindow {
    webContents = { send: call('send'), print: call('print') }
    on = call('window.on')
    once = call('window.once')
    loadURL = async (url: string): Promise<void> => call('loadURL')(url)
    constructor(options: unknown) {
      call('new window')()
      seen.options = options
    }
  }
  return {
    BrowserWindow,
    app: {
      enableSandbox: call('enableSandbox'),
      on: call('app.on'),
      quit: call('quit'),
      getPath: (name: string) => `/user/${name}`,
      requestSingleInstanceLock: () => seen.first,
      whenReady: () => new Promise<void>((resolve) => (seen.ready = resolve)),
    },
    dialog: {},
    ipcMain: { handle: call('handle') },
    Menu: { buildFromTemplate: () => ({}), setApplicationMenu: call('setApplicationMenu') },
    protocol: { registerSchemesAsPrivileged: call('registerSchemes'), handle: call('protocol.handle') },
    session: {
      defaultSession: {
        setPermissionRequestHandler: call('permissionRequests'),
        setPermissionCheckHandler: call('permissionChecks'),
      },
    },
  }
})

async function startProgram(): Promise<void> {
  vi.resetModules()
  await import('../../src/main/index')
}

beforeEach(() => {
  seen.calls.length = 0
  seen.first = true
})

describe('the Electron program', () => {
  it('registers its scheme and the sandbox before Electron is ready, and opens nothing yet', async () => {
    await startProgram()
    expect(seen.calls).toContain('registerSchemes')
    expect(seen.calls).toContain('enableSandbox')
    expect(seen.calls).toContain('app.on web-contents-created')
    expect(seen.calls).not.toContain('new window')
  })

  it('guards the session and answers requests before the page is loaded', async () => {
    await startProgram()
    seen.ready()
    await vi.waitFor(() => expect(seen.calls).toContain(`loadURL ${ORIGIN}/`))
    const loaded = seen.calls.indexOf(`loadURL ${ORIGIN}/`)
    const before = [
      'permissionRequests',
      'permissionChecks',
      `protocol.handle ${SCHEME}`,
      'setApplicationMenu',
    ]
    for (const call of [...before, ...CHANNELS.map((channel) => `handle ${channel}`)]) {
      expect(seen.calls.indexOf(call)).toBeGreaterThanOrEqual(0)
      expect(seen.calls.indexOf(call)).toBeLessThan(loaded)
    }
    const { webPreferences } = seen.options as { webPreferences: Record<string, unknown> }
    expect(webPreferences['preload']).toMatch(/preload[/\\]index\.cjs$/)
    expect([webPreferences['sandbox'], webPreferences['contextIsolation']]).toEqual([true, true])
  })

  it('ends at once when it is already running', async () => {
    seen.first = false
    await startProgram()
    expect(seen.calls.at(-1)).toBe('quit')
    expect(seen.calls).not.toContain('new window')
  })
})
