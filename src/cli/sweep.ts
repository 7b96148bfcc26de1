import type { Task } from '../core'
import { polarCsv, polarJson, type NamedPolar } from '../io/csv'
import { angleRange, MOST_ANGLES, readArguments } from './arguments'
import { compute } from './compute'
import { Failure } from './failure'
import { FLOW_HELP, FLOW_OPTIONS, readStates } from './flowOptions'
import { checkPlaces, writeOutputs, type Output } from './outputs'
import { reportPoints } from './reportPoints'
import { readSections, SECTION_HELP, SECTION_OPTIONS } from './sections'
import type { Command } from './terminal'

const HELP = `Usage: sweep SECTION… --alpha FROM:TO:STEP [options]

Polars of sections over angles of attack in degrees, as CSV on standard output. --reynolds may be repeated:
each section gets a polar at each Reynolds number. Polars are computed on all cores.

  --alpha FROM:TO:STEP      the angles: FROM, FROM + STEP and so on up to TO (at most ${MOST_ANGLES})
  --csv FILE, --json FILE   write to files instead; - is standard output
${FLOW_HELP}${SECTION_HELP}
A dirty surface moves transition only: its maximum lift is an upper bound. Rain, insects, grit or ice can
cost far more.

Exit status 1: some points did not converge; they are named and their results left empty.
`

/** Polars as CSV or JSON. */
export const sweep: Command = {
  help: HELP,
  run: async (args, terminal) => {
    const { values, positionals } = readArguments(args, {
      ...FLOW_OPTIONS,
      ...SECTION_OPTIONS,
      alpha: { type: 'string' },
      csv: { type: 'string' },
      json: { type: 'string' },
    })
    if (values.alpha === undefined) throw new Failure('--alpha FROM:TO:STEP is needed')
    const alphas = angleRange('--alpha', values.alpha).map((angle) => (angle * Math.PI) / 180)
    const states = readStates(values)
    const { csv, json } = values
    checkPlaces(
      [csv, json].filter((place) => place !== undefined),
      terminal,
    )
    const sections = readSections(positionals, values, terminal)

    const asked = sections.flatMap(({ name, section }) =>
      states.map((state) => ({ name, task: { kind: 'polar', section, state, alphas } satisfies Task })),
    )
    const results = await compute(asked, terminal)
    const polars = results.flatMap((result, i): NamedPolar[] =>
      result.kind === 'polar' ? [{ section: asked[i]!.name, polar: result.polar }] : [],
    )
    const outputs: Output[] = []
    if (csv !== undefined || json === undefined) outputs.push({ to: csv ?? '-', text: polarCsv(polars) })
    if (json !== undefined) outputs.push({ to: json, text: polarJson(polars) })
    await writeOutputs(outputs, terminal)
    return reportPoints(polars, terminal.complain)
  },
}
