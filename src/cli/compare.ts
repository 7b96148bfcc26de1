import { rmdir } from 'node:fs/promises'
import { join, resolve } from 'node:path'
import { makeFolder } from '../files/makeFolder'
import { plainReason } from '../files/plainReason'
import { compareFiles } from '../io/csv'
import { readArguments } from './arguments'
import { runBrief } from './briefRun'
import { Failure } from './failure'
import { METHOD_HELP } from './methods'
import { writeOutputs } from './outputs'
import type { Command } from './terminal'

const HELP = `Usage: compare BRIEF --out DIR [options]

The whole job of a brief: every entry of its shortlist on its wing at each condition. Writes polars.csv,
pressures.csv and wing.csv into DIR, which is made if it is not there. All are written, or none.

  --out DIR                 where the files go
${METHOD_HELP}
Exit status 1: something is marked (a condition that cannot be flown, an entry that cannot be used); it is
named, the rest is computed and written.
`

/** The whole job, into a folder. */
export const compare: Command = {
  help: HELP,
  run: async (args, terminal) => {
    const { values, positionals } = readArguments(args, {
      out: { type: 'string' },
      method: { type: 'string' },
    })
    const { out } = values
    if (out === undefined || out === '' || out === '-') throw new Failure('--out DIR is needed: a folder')
    const { comparison, status } = await runBrief(positionals, values, null, terminal)
    const folder = resolve(terminal.folder, out)
    const made = await makeOut(folder, out)
    try {
      const files = compareFiles(comparison)
      await writeOutputs(
        files.map(({ name, text }) => ({ to: join(folder, name), text })),
        terminal,
      )
    } catch (error) {
      if (made) await rmdir(folder).catch(() => {})
      throw error
    }
    return status
  },
}

/** Makes the folder; whether it was not there before. */
async function makeOut(folder: string, named: string): Promise<boolean> {
  try {
    return await makeFolder(folder)
  } catch (error) {
    const reason = (error as NodeJS.ErrnoException).code === 'EEXIST' ? 'it is a file' : plainReason(error)
    throw new Failure(`the folder ${named} cannot be made: ${reason}`)
  }
}
