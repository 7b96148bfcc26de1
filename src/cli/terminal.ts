import { resolve } from 'node:path'

/** What a command knows of the world round it. */
export interface Terminal {
  /** Writes to standard output and waits until it has gone. */
  readonly print: (text: string) => Promise<void>
  /** Writes one line to standard error. */
  readonly complain: (line: string) => void
  /** Shows how far the work is; does nothing unless standard error is a terminal. */
  readonly progress: (done: number, asked: number) => void
  /** Relative paths start here. */
  readonly folder: string
  readonly env: NodeJS.ProcessEnv
  /** Aborted by Ctrl-C. */
  readonly signal: AbortSignal
  /** The built worker beside the built command line. */
  readonly worker: URL
}

/** One command: its help, and what runs it and gives the exit status. */
export interface Command {
  readonly help: string
  readonly run: (args: readonly string[], terminal: Terminal) => Promise<number>
}

/**
 * The folder from which the user called. npm moves to the project's folder and says in INIT_CWD where it
 * came from; that holds only when npm runs this command itself, not for scripts that npm runs otherwise.
 */
export function callersFolder(env: NodeJS.ProcessEnv, cwd: string): string {
  const from = env['npm_lifecycle_event'] === 'cli' ? env['INIT_CWD'] : undefined
  return from === undefined || from === '' ? cwd : resolve(from)
}
