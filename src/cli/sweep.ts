import { taskKey, type Task, type TaskResult } from '../core'
import { polarCsv, polarJson, type NamedPolar } from '../io/csv'
import { runTasks } from '../run/runTasks'
import { angleRange, MOST_ANGLES, readArguments } from './arguments'
import { Failure, STATUS } from './failure'
import { FLOW_HELP, FLOW_OPTIONS, readStates } from './flowOptions'
import { checkPlaces, writeOutputs, type Output } from './outputs'
import { readSections, SECTION_HELP, SECTION_OPTIONS } from './sections'
import type { Command, Terminal } from './terminal'
import { withWorkers } from './work'

const HELP = `Usage: sweep SECTION… --alpha FROM:TO:STEP [options]

Polars of sections over angles of attack in degrees, as CSV on standard output.

  --alpha FROM:TO:STEP      the angles: FROM, FROM + STEP and so on up to TO (at most ${MOST_ANGLES})
  --csv FILE, --json FILE   write to files instead; - is standard output
${FLOW_HELP}${SECTION_HELP}
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
    const polars = await computePolars(asked, terminal)
    const outputs: Output[] = []
    if (csv !== undefined || json === undefined) outputs.push({ to: csv ?? '-', text: polarCsv(polars) })
    if (json !== undefined) outputs.push({ to: json, text: polarJson(polars) })
    await writeOutputs(outputs, terminal)
    return reportPoints(polars, terminal)
  },
}

async function computePolars(
  asked: readonly { readonly name: string; readonly task: Task }[],
  terminal: Terminal,
): Promise<NamedPolar[]> {
  const tasks = new Map(asked.map(({ task }) => [taskKey(task), task]))
  const known = new Map<string, TaskResult>()
  await withWorkers(terminal, (options) =>
    runTasks(
      [...tasks].map(([key, task]) => ({ key, task })),
      options,
      (key, result) => {
        known.set(key, result)
        terminal.progress(known.size, tasks.size)
      },
    ),
  )
  return asked.map(({ name, task }) => {
    const result = known.get(taskKey(task))
    if (result?.kind === 'polar') return { section: name, polar: result.polar }
    throw new Failure(`${name}: ${result?.kind === 'failed' ? result.reason : 'not computed'}`)
  })
}

/** Names every point that failed or is marked, those of one reason together, and gives the status. */
function reportPoints(polars: readonly NamedPolar[], terminal: Terminal): number {
  let status: number = STATUS.done
  for (const { section, polar } of polars) {
    const byReason = new Map<string, string[]>()
    for (const { alpha, converged, reason } of polar.points) {
      if (!converged) status = STATUS.marked
      if (converged && reason === '') continue
      const text = reason === '' ? 'did not converge' : reason
      const angle = Number(((alpha * 180) / Math.PI).toPrecision(10))
      byReason.set(text, [...(byReason.get(text) ?? []), String(angle)])
    }
    for (const [reason, angles] of byReason) {
      terminal.complain(`${section}, ${angles.join(', ')} deg: ${reason}`)
    }
  }
  return status
}
