import { setMaxListeners } from 'node:events'
import { BadInput } from '../core'
import { FileProblem } from '../io/problem'
import { Failure, STATUS } from './failure'
import { callersFolder, type Command, type Terminal } from './terminal'

/** Every command, loaded only when it is asked for. */
const COMMANDS: Readonly<Record<string, { summary: string; load: () => Promise<Command> }>> = {
  shape: {
    summary: 'measure sections: thickness, camber, nose, edge, thin-airfoil values',
    load: async () => (await import('./shape')).shape,
  },
  sweep: {
    summary: 'polars of sections over a range of angles',
    load: async () => (await import('./sweep')).sweep,
  },
  pressure: {
    summary: 'surface pressure of a section at an angle or a lift coefficient',
    load: async () => (await import('./pressure')).pressure,
  },
  wing: {
    summary: 'the wing of a brief at each of its conditions',
    load: async () => (await import('./wing')).wing,
  },
  compare: {
    summary: "the whole job: every section of a brief's shortlist on its wing",
    load: async () => (await import('./compare')).compare,
  },
}

const USAGE = `Usage: npm run -s cli -- COMMAND …

${Object.entries(COMMANDS)
  .map(([name, { summary }]) => `  ${name.padEnd(10)}${summary}`)
  .join('\n')}

COMMAND --help says more. A section is naca: and 4 or 5 digits (naca:2412), or a coordinate file.
`

/** Runs one command line and gives its exit status. */
async function main(argv: readonly string[], terminal: Terminal): Promise<number> {
  const [name, ...args] = argv
  if (name === '--help' || name === '-h' || name === 'help') {
    await terminal.print(USAGE)
    return STATUS.done
  }
  const found = name !== undefined && Object.hasOwn(COMMANDS, name) ? COMMANDS[name] : undefined
  if (found === undefined) {
    terminal.complain(name === undefined ? USAGE : `There is no command "${name}".\n\n${USAGE}`)
    return STATUS.refused
  }
  const command = await found.load()
  if (args.includes('--help')) {
    await terminal.print(command.help)
    return STATUS.done
  }
  return command.run(args, terminal)
}

function statusOf(error: unknown, name: string, terminal: Terminal): number {
  if (terminal.signal.aborted) return STATUS.interrupted
  // The reader of a pipe has gone: there is nobody left to tell.
  if ((error as NodeJS.ErrnoException).code === 'EPIPE') return STATUS.done
  const expected = [Failure, FileProblem, BadInput].some((kind) => error instanceof kind)
  terminal.complain(
    expected
      ? `${name}: ${(error as Error).message}`
      : `${name}: a fault of this program\n${(error as Error).stack}`,
  )
  return STATUS.refused
}

const interrupt = new AbortController()
// Every task that waits listens for Ctrl-C; that many listeners are no leak.
setMaxListeners(0, interrupt.signal)
process.once('SIGINT', () => interrupt.abort())

// A reader that has gone is met where the text is written; here it must only not end the program.
process.stdout.on('error', () => {})

/** Whether a line of progress stands on the terminal, to be wiped before the next message. */
let progressShown = false
function wipeProgress(): void {
  if (progressShown) process.stderr.write('\r\x1b[K')
  progressShown = false
}

const terminal: Terminal = {
  print: (text) =>
    new Promise((resolve, reject) => {
      process.stdout.write(text, (error) => (error ? reject(error) : resolve()))
    }),
  complain: (line) => {
    wipeProgress()
    process.stderr.write(line.endsWith('\n') ? line : `${line}\n`)
  },
  progress: (done, asked) => {
    if (!process.stderr.isTTY) return
    wipeProgress()
    if (done >= asked) return
    process.stderr.write(`${done} of ${asked} computed`)
    progressShown = true
  },
  folder: callersFolder(process.env, process.cwd()),
  env: process.env,
  signal: interrupt.signal,
  worker: new URL('./cliWorker.js', import.meta.url),
}

const argv = process.argv.slice(2)
process.exitCode = await main(argv, terminal).catch((error: unknown) =>
  statusOf(error, argv[0] ?? '', terminal),
)
wipeProgress()
