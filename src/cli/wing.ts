import { wingCsv } from '../io/csv'
import { wingJson } from '../io/wingJson'
import { readArguments } from './arguments'
import { runBrief, type Sections } from './briefRun'
import { Failure } from './failure'
import { METHOD_HELP } from './methods'
import { checkPlaces, writeOutputs } from './outputs'
import type { Command } from './terminal'

const HELP = `Usage: wing BRIEF [options]

The wing of a brief at each of its conditions, for each entry of its shortlist, as JSON on standard output.

  --section SECTION         in place of the shortlist: a wing of this section (may be repeated)
  --root A --tip B          in place of the shortlist: a wing from section A at the root to B at the tip
${METHOD_HELP}  --csv FILE                one row a station instead of JSON; - is standard output

Exit status 1: something is marked (a condition that cannot be flown, an entry that cannot be used); it is
named, the rest is computed.
`

/** The wing at each condition as JSON or CSV. */
export const wing: Command = {
  help: HELP,
  run: async (args, terminal) => {
    const { values, positionals } = readArguments(args, {
      section: { type: 'string', multiple: true },
      root: { type: 'string' },
      tip: { type: 'string' },
      method: { type: 'string' },
      csv: { type: 'string' },
    })
    const { csv } = values
    if (csv !== undefined) checkPlaces([csv], terminal)
    const { comparison, status } = await runBrief(positionals, values, readSections(values), terminal)
    const output =
      csv === undefined ? { to: '-', text: wingJson(comparison) } : { to: csv, text: wingCsv(comparison) }
    await writeOutputs([output], terminal)
    return status
  },
}

/** What the options put in place of the shortlist; null when they leave it. */
function readSections(given: {
  readonly section?: readonly string[] | undefined
  readonly root?: string | undefined
  readonly tip?: string | undefined
}): Sections | null {
  const { section = [], root, tip } = given
  if ((root === undefined) !== (tip === undefined)) throw new Failure('--root and --tip go together')
  const pair = root !== undefined && tip !== undefined ? [{ root, tip }] : []
  const sections = [...section.map((text) => ({ section: text })), ...pair]
  return sections.length === 0 ? null : sections
}
