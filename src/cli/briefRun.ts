import { dirname, isAbsolute, join } from 'node:path'
import { assemble, BadInput, type Comparison } from '../core'
import { readBrief, type Brief, type BriefEntry } from '../io/brief'
import { decodeText } from '../io/coordinates'
import { jobFromBrief } from '../io/job'
import { FileProblem } from '../io/problem'
import { run } from '../run/run'
import { Failure, STATUS } from './failure'
import { fileReader } from './inputFiles'
import { readMethod } from './methods'
import type { Terminal } from './terminal'
import { withWorkers } from './work'

/** A brief computed to its end. */
export interface BriefResult {
  readonly comparison: Comparison
  /** 0, or 1 when something is marked; what, has been said on standard error. */
  readonly status: number
}

/** What stands in place of the brief's shortlist: SECTION arguments, relative to the caller's folder. */
export type Sections = readonly (
  { readonly section: string } | { readonly root: string; readonly tip: string }
)[]

/**
 * Reads a brief, computes it and names everything that is marked. Paths in the brief are relative to it.
 *
 * Throws Failure or FileProblem for a brief that is none and when no entry of the shortlist can be used.
 */
export async function runBrief(
  paths: readonly string[],
  given: { readonly method?: string | undefined },
  sections: Sections | null,
  terminal: Terminal,
): Promise<BriefResult> {
  const [path] = paths
  if (path === undefined || paths.length > 1) throw new Failure('give one brief (a file *.brief.json)')
  const method = readMethod(given.method)
  const read = fileReader(terminal.folder)
  const inBrief = (name: string): Uint8Array => read(isAbsolute(name) ? name : join(dirname(path), name))
  const brief = readBrief(decodeText(read(path), path), path)
  const { job, faults, warnings } = jobFromBrief(
    sections === null ? brief : withShortlist(brief, sections),
    path,
    sections === null ? inBrief : read,
    { method },
  )
  // A bad entry of a brief is marked and the rest computed; a bad argument ends the command.
  const bad = sections === null ? null : (job.entries.find(({ fault }) => fault !== null) ?? null)
  if (bad !== null) throw new Failure(`${bad.fault}`)
  const known = await withWorkers(terminal, (options) =>
    run(job, { ...options, onResult: (_known, { done, asked }) => terminal.progress(done, asked) }),
  ).catch((error: unknown) => {
    // A value of the brief that only the computation can judge, such as an altitude.
    if (error instanceof BadInput) throw new FileProblem(path, null, error.message, 'correct the brief')
    throw error
  })
  const comparison = assemble(job, known)
  for (const line of [...warnings, ...faults]) terminal.complain(line)
  const marked = reportMarks(comparison, terminal.complain)
  return { comparison, status: marked || faults.length > 0 ? STATUS.marked : STATUS.done }
}

const NOTHING = {
  ...{ section: null, root: null, tip: null, name: null, edge: null, chord_line: null },
  ...{ coordinates: null, root_coordinates: null, tip_coordinates: null },
  ...{ trip_upper: null, trip_lower: null, change: null, colour: null, mark: null },
} satisfies BriefEntry

function withShortlist(brief: Brief, sections: Sections): Brief {
  return { ...brief, shortlist: sections.map((entry) => ({ ...NOTHING, ...entry })) }
}

/** Says each note once with where it holds; whether a figure is missing that the method could give. */
function reportMarks({ method, entries, conditions }: Comparison, complain: (line: string) => void): boolean {
  let marked = false
  const places = new Map<string, string[]>()
  for (const entry of entries) {
    if (entry.fault !== null) continue
    entry.conditions.forEach(({ status, notes, pane }, i) => {
      const condition = conditions[i]!
      // Without a boundary layer there is no slowest speed: that is so by the method, and no mark.
      const expected = condition.speed === 'slowest' && method !== 'viscous'
      if (!expected && (status !== 'known' || pane?.pressure?.converged === false)) marked = true
      for (const note of notes) {
        places.set(note, [...(places.get(note) ?? []), `${entry.name} at "${condition.name}"`])
      }
    })
  }
  for (const [note, where] of places) complain(`${where.join(', ')}: ${note}`)
  return marked
}
