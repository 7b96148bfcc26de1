import { parseArgs } from 'node:util'
import type { ElectronFound } from './electron'
import type { Served } from './server'

/** What starting the window needs from outside, so that a test can stand in for it. */
export interface StartParts {
  readonly say: (line: string) => void
  readonly complain: (line: string) => void
  readonly help: string
  readonly hasDisplay: boolean
  readonly findElectron: (signal: AbortSignal) => Promise<ElectronFound>
  /** Ends with the window; null when Electron could not start. */
  readonly runElectron: (program: string, signal: AbortSignal) => Promise<number | null>
  readonly serve: (port: number) => Promise<Served>
  readonly openBrowser: (address: string) => Promise<boolean>
}

const SAME_BY_COMMAND = 'npm run -s cli -- compare sample-data/shoreline-drone.brief.json --out comparison'

/**
 * Opens the window: Electron first, else served on this machine with the browser opened on it. Says in one
 * line which. Ends with the window, or when `signal` says so.
 *
 * @returns the exit status
 */
export async function start(
  argv: readonly string[],
  parts: StartParts,
  signal: AbortSignal,
): Promise<number> {
  const asked = readArguments(argv)
  if (typeof asked === 'string') {
    parts.complain(`${asked}\n\n${parts.help}`)
    return 2
  }
  if (asked.help) {
    parts.say(parts.help)
    return 0
  }
  const why = asked.browser ? 'as asked' : await tryElectron(parts, signal)
  if (why === null || signal.aborted) return 0
  return serveUntilStopped(asked.port, why, parts, signal)
}

/** Runs Electron to its end and gives null; or says why that cannot be. */
async function tryElectron(parts: StartParts, signal: AbortSignal): Promise<string | null> {
  if (!parts.hasDisplay) return 'there is no display for Electron'
  const found = await parts.findElectron(signal)
  if (signal.aborted) return null
  if ('missing' in found) return `Electron is not here: ${found.missing}`
  parts.say('Sectionwright opens in its own window (Electron).')
  const status = await parts.runElectron(found.program, signal)
  return status === null ? 'Electron could not start on this system' : null
}

async function serveUntilStopped(
  port: number,
  why: string,
  parts: StartParts,
  signal: AbortSignal,
): Promise<number> {
  let served: Served
  try {
    served = await parts.serve(port)
  } catch (error) {
    parts.complain(`The window cannot be served: ${error instanceof Error ? error.message : String(error)}`)
    return 2
  }
  const opened = await parts.openBrowser(served.address)
  const where = opened ? 'opens in your browser' : 'is ready for a browser on this computer'
  parts.say(`Sectionwright ${where} at ${served.address} (${why}). Ctrl-C ends it.`)
  if (!opened) parts.say(`The same job without a browser: ${SAME_BY_COMMAND}`)
  if (!signal.aborted)
    await new Promise((resolve) => signal.addEventListener('abort', resolve, { once: true }))
  await served.close()
  return 0
}

function readArguments(argv: readonly string[]): { help: boolean; browser: boolean; port: number } | string {
  try {
    const { values } = parseArgs({
      args: [...argv],
      options: {
        help: { type: 'boolean', default: false },
        browser: { type: 'boolean', default: false },
        port: { type: 'string', default: '0' },
      },
    })
    if (!/^\d{1,5}$/.test(values.port) || Number(values.port) > 65535) {
      return `--port takes a whole number from 0 to 65535, not "${values.port}"`
    }
    return { help: values.help, browser: values.browser, port: Number(values.port) }
  } catch (error) {
    return error instanceof Error ? error.message : String(error)
  }
}
