import { spawn } from 'node:child_process'
import { fileURLToPath } from 'node:url'
import { start, type StartParts } from './startWindow'
import { browserCommand, hasDisplay, launch } from './browser'
import { electronFolder, findElectron, runDownload } from './electron'
import { serveWindow } from './server'

const HELP = `Usage: npm start [-- --browser] [-- --port N]

Opens the Sectionwright window: in Electron if it can be had, else in your browser, served from this
computer to this computer only. Ctrl-C ends it.

  --browser   do not try Electron
  --port N    serve on this port (default: any free one)
  --help      this text
`

const parts: StartParts = {
  say: (line) => process.stdout.write(`${line}\n`),
  complain: (line) => process.stderr.write(`${line}\n`),
  help: HELP,
  hasDisplay: hasDisplay(process.platform, process.env),
  findElectron: (signal) =>
    findElectron(
      {
        folder: electronFolder(import.meta.url),
        nodeMajor: Number(process.versions.node.split('.')[0]),
        download: (script, limitMs, stopped) => {
          process.stderr.write(`Fetching Electron once, for at most ${limitMs / 1000} s …\n`)
          return runDownload(script, limitMs, stopped)
        },
      },
      signal,
    ),
  runElectron,
  serve: (port) => serveWindow(fileURLToPath(new URL('../renderer', import.meta.url)), port),
  openBrowser: async (address) => {
    const command = browserCommand(process.platform, process.env, address)
    return command !== null && (await launch(command))
  },
}

/** Runs the app in Electron until its window is closed; the status, or null when it could not start. */
function runElectron(program: string, signal: AbortSignal): Promise<number | null> {
  const app = fileURLToPath(new URL('../..', import.meta.url))
  return new Promise((resolve) => {
    const started = Date.now()
    // Set by some editors for their own Electron; with it, ours would start as plain Node.
    const env = { ...process.env }
    delete env['ELECTRON_RUN_AS_NODE']
    const child = spawn(program, [app], { stdio: ['ignore', 'inherit', 'ignore'], env })
    signal.addEventListener('abort', () => child.kill(), { once: true })
    child.once('error', () => resolve(null))
    child.once('exit', (status) => {
      // A program that cannot start on this system (libraries, display) ends with a fault within seconds.
      const neverStarted = status !== 0 && !signal.aborted && Date.now() - started < 5000
      resolve(neverStarted ? null : (status ?? 0))
    })
  })
}

const stop = new AbortController()
for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => stop.abort())
process.exitCode = await start(process.argv.slice(2), parts, stop.signal)
