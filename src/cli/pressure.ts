import type { Operating, PressureResult } from '../core'
import { pressureCsv } from '../io/csv'
import { numberIn, readArguments } from './arguments'
import { compute } from './compute'
import { Failure, STATUS } from './failure'
import { FLOW_HELP, FLOW_OPTIONS, readStates } from './flowOptions'
import { checkPlaces, writeOutputs } from './outputs'
import { readSections, SECTION_HELP, SECTION_OPTIONS } from './sections'
import type { Command } from './terminal'

const HELP = `Usage: pressure SECTION --alpha A | --lift CL [options]

Surface pressure of one section as CSV on standard output, from the upper trailing edge round the nose to
the lower one, with one --reynolds.

  --alpha A                 at this angle of attack, degrees
  --lift CL                 or at this lift coefficient
  --csv FILE                write to a file instead; - is standard output
${FLOW_HELP}${SECTION_HELP}
Exit status 1: the point did not converge; it is named and has no rows.
`

/** Surface pressure as CSV. */
export const pressure: Command = {
  help: HELP,
  run: async (args, terminal) => {
    const { values, positionals } = readArguments(args, {
      ...FLOW_OPTIONS,
      ...SECTION_OPTIONS,
      alpha: { type: 'string' },
      lift: { type: 'string' },
      csv: { type: 'string', default: '-' },
    })
    const at = readOperating(values.alpha, values.lift)
    const [state, ...more] = readStates(values)
    if (state === undefined || more.length > 0 || (values.reynolds ?? []).length > 1) {
      throw new Failure('pressure takes one --reynolds')
    }
    if (positionals.length > 1) throw new Failure('pressure takes one section')
    checkPlaces([values.csv], terminal)
    const [named] = readSections(positionals, values, terminal)
    const { name, section } = named!
    const [result] = await compute([{ name, task: { kind: 'pressure', section, state, at } }], terminal)
    if (result?.kind !== 'pressure') throw new Failure(`${name}: not computed`)
    await writeOutputs([{ to: values.csv, text: pressureCsv(name, result.pressure) }], terminal)
    return report(name, result.pressure, terminal.complain)
  },
}

function readOperating(alpha: string | undefined, lift: string | undefined): Operating {
  if ((alpha === undefined) === (lift === undefined)) {
    throw new Failure('give one of --alpha (degrees) and --lift')
  }
  if (lift !== undefined) return { lift: numberIn('--lift', lift, -10, 10) }
  return { alpha: (numberIn('--alpha', alpha!, -180, 180) * Math.PI) / 180 }
}

function report(name: string, result: PressureResult, complain: (line: string) => void): number {
  const { converged, reason } = result
  if (!converged) complain(`${name}: not converged, no rows: ${reason}`)
  else if (reason !== '') complain(`${name}: ${reason}`)
  return converged ? STATUS.done : STATUS.marked
}
