import * as v from 'valibot'
import { briefSchema } from './briefSchema'
import type { Brief } from './briefTypes'
import { FileProblem } from './problem'

export type * from './briefTypes'

/**
 * Reads a brief. Throws a FileProblem when the text is no JSON, no brief, of a later version, or holds an
 * unknown field or a value out of range; the field is named by its place.
 */
export function readBrief(text: string, file: string): Brief {
  const data = parseJson(text, file)
  if (typeof data !== 'object' || data === null || (data as Brief).format !== 'sectionwright brief') {
    throw new FileProblem(file, null, 'this is no brief', 'its "format" must be "sectionwright brief"')
  }
  const { version } = data as Brief
  if (typeof version === 'number' && version > 1) {
    throw new FileProblem(
      file,
      null,
      `the brief is of version ${version}, this program reads version 1`,
      'open it with a newer program; the file is left as it is',
    )
  }
  const result = v.safeParse(briefSchema, data)
  if (!result.success) throw problemOf(result.issues[0], file)
  refuseBothAirs(data as { air?: object }, file)
  return result.output
}

function parseJson(text: string, file: string): unknown {
  try {
    return JSON.parse(text.replace(/^\uFEFF/, ''))
  } catch (error) {
    const words = error instanceof Error ? error.message : String(error)
    const at = Number(/position (\d+)/.exec(words)?.[1] ?? Number.NaN)
    const line = Number.isNaN(at) ? null : text.slice(0, at).split('\n').length
    throw new FileProblem(file, line, 'this is not JSON', `mend it there (${words})`)
  }
}

function problemOf(issue: v.BaseIssue<unknown>, file: string): FileProblem {
  const place = v.getDotPath(issue) ?? 'the brief'
  if (issue.type === 'strict_object' && issue.expected === 'never') {
    return new FileProblem(file, null, `unknown field "${place}"`, 'check its spelling or delete it')
  }
  if (issue.received === 'undefined') {
    return new FileProblem(file, null, `"${place}" is missing`, 'give it')
  }
  const wanted =
    issue.kind === 'validation' || /^must/.test(issue.message) ? issue.message : `must be ${issue.expected}`
  return new FileProblem(file, null, `"${place}" is ${issue.received}`, `it ${wanted}`)
}

function refuseBothAirs({ air }: { air?: object }, file: string): void {
  if (
    air !== undefined &&
    'turbulence_percent' in air &&
    'amplification' in air &&
    air.amplification !== null
  ) {
    throw new FileProblem(
      file,
      null,
      'turbulence and amplification are both given',
      'keep one: the turbulence sets the amplification',
    )
  }
}

/** A brief as the text of its file: null fields are left out, and what turbulence is overridden too. */
export function writeBrief(brief: Brief): string {
  const air = brief.air.amplification === null ? brief.air : { amplification: brief.air.amplification }
  const text = JSON.stringify(
    { ...brief, air },
    (_, value: unknown) => (value === null ? undefined : value),
    2,
  )
  // Pairs of numbers (embedded outlines) go on one line each.
  return `${text.replace(/\[\n\s+(-?[\d.e-]+),\n\s+(-?[\d.e-]+)\n\s+\]/g, '[$1, $2]')}\n`
}
