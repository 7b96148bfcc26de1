import { execFile, spawn, type ChildProcess } from 'node:child_process'
import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll } from 'vitest'
import { checkBuilt } from './build'

const CLI = 'out/main/cli.js'
const PROGRAM = join(process.cwd(), CLI)

/** A coordinate file of a symmetric lens of parabolic arcs, 12 % thick. */
export const LENS = [
  'Lens',
  ...Array.from({ length: 41 }, (_, i) => {
    const x = Math.abs(1 - i / 20)
    return `${x.toFixed(3)} ${(Math.sign(20 - i) * 0.24 * x * (1 - x)).toFixed(6)}`
  }),
  '',
].join('\n')

/** What came of a command line. */
export interface Ended {
  readonly status: number
  readonly out: string
  readonly err: string
}

/** Options of a command line that is run. */
export interface Around {
  readonly folder?: string
  readonly env?: NodeJS.ProcessEnv
}

/** The environment of a command: no cache between tests, nothing of the npm that runs them. */
function environment(given: NodeJS.ProcessEnv = {}): NodeJS.ProcessEnv {
  const plain: NodeJS.ProcessEnv = { ...process.env, SECTIONWRIGHT_NO_CACHE: '1' }
  delete plain['npm_lifecycle_event']
  delete plain['INIT_CWD']
  return { ...plain, ...given }
}

/** Runs the built command line to its end. */
export function command(args: readonly string[], around: Around = {}): Promise<Ended> {
  checkBuilt(CLI)
  return new Promise((resolve) => {
    const options = {
      ...{ cwd: around.folder, env: environment(around.env), maxBuffer: 1e9 },
    }
    execFile(process.execPath, [PROGRAM, ...args], options, (error, out, err) => {
      const status = error === null ? 0 : typeof error.code === 'number' ? error.code : -1
      resolve({ status, out, err })
    })
  })
}

/** Starts the built command line and leaves it to the test. */
export function started(args: readonly string[], around: Around = {}): ChildProcess {
  checkBuilt(CLI)
  return spawn(process.execPath, [PROGRAM, ...args], {
    cwd: around.folder,
    env: environment(around.env),
    stdio: 'ignore',
  })
}

/** A folder that is there for the tests of a file and gone after them. */
export function temporaryFolder(): () => string {
  let folder = ''
  beforeAll(async () => {
    folder = await mkdtemp(join(tmpdir(), 'sectionwright-'))
  })
  afterAll(() => rm(folder, { recursive: true, force: true }))
  return () => folder
}

/** Cells of a CSV text without quoted ones. */
export function cells(csv: string): string[][] {
  return csv
    .replace(/\r\n$/, '')
    .split('\r\n')
    .map((line) => line.split(','))
}
