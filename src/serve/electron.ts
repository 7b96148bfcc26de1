import { spawn } from 'node:child_process'
import { existsSync, readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { dirname, join } from 'node:path'

/** The Electron program of the installed package, or why there is none, in words that end a sentence. */
export type ElectronFound = { readonly program: string } | { readonly missing: string }

/** How long Electron's download may take before the browser is used instead. */
export const DOWNLOAD_LIMIT_MS = 20_000

/** What finding Electron needs from outside. */
export interface ElectronLookup {
  /** The folder of the electron package, or null when it is not installed. */
  readonly folder: string | null
  readonly nodeMajor: number
  /** Runs the package's own download; resolves to whether it ended well within the limit. */
  readonly download: (
    script: string,
    limitMs: number,
    signal: AbortSignal,
  ) => Promise<'done' | 'failed' | 'too slow'>
}

/**
 * Finds the Electron program and lets the package fetch it on first use. Never throws: what is missing is
 * said in words.
 */
export async function findElectron(lookup: ElectronLookup, signal: AbortSignal): Promise<ElectronFound> {
  const { folder } = lookup
  if (folder === null) return { missing: 'the electron package is not installed' }
  const before = installedProgram(folder)
  if (before !== null) return { program: before }
  if (lookup.nodeMajor < 22)
    return { missing: `its own download needs Node 22, and this is Node ${lookup.nodeMajor}` }
  const outcome = await lookup.download(join(folder, 'install.js'), DOWNLOAD_LIMIT_MS, signal)
  if (outcome === 'too slow')
    return { missing: `its download took more than ${DOWNLOAD_LIMIT_MS / 1000} seconds` }
  const after = outcome === 'done' ? installedProgram(folder) : null
  return after === null ? { missing: 'its download failed' } : { program: after }
}

/** The program that the package has unpacked, or null. */
function installedProgram(folder: string): string | null {
  try {
    const name = readFileSync(join(folder, 'path.txt'), 'utf8').trim()
    const program = join(process.env['ELECTRON_OVERRIDE_DIST_PATH'] ?? join(folder, 'dist'), name)
    return name !== '' && existsSync(program) ? program : null
  } catch {
    return null
  }
}

/** Where the electron package is, seen from a file of ours; null when it is not installed. */
export function electronFolder(from: string): string | null {
  try {
    return dirname(createRequire(from).resolve('electron/package.json'))
  } catch {
    return null
  }
}

/** Runs the download script of the package in its own process and ends it when it takes too long. */
export function runDownload(
  script: string,
  limitMs: number,
  signal: AbortSignal,
): Promise<'done' | 'failed' | 'too slow'> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [script], { stdio: 'ignore' })
    const stop = (): boolean => child.kill('SIGKILL')
    const timer = setTimeout(() => {
      stop()
      resolve('too slow')
    }, limitMs)
    signal.addEventListener('abort', stop, { once: true })
    const end = (outcome: 'done' | 'failed'): void => {
      clearTimeout(timer)
      signal.removeEventListener('abort', stop)
      resolve(outcome)
    }
    child.once('error', () => end('failed'))
    child.once('exit', (status) => end(status === 0 ? 'done' : 'failed'))
  })
}
