import type { RawOutline } from '../../core'
import { FileProblem } from '../problem'
import type { Row, Rows } from './rows'

/** The outline in a file's rows and what was assumed to find it. */
export interface FoundOutline {
  readonly raw: RawOutline
  readonly assumed: readonly string[]
  readonly warnings: readonly string[]
}

type Point = readonly [number, number]

/** A step in x of more than this share of the whole range between neighbours begins a second list. */
const LIST_STEP = 0.5

/** Finds the outline: one loop, or an upper and a lower list. Throws a FileProblem when there is none. */
export function findOutline(rows: Rows, file: string): FoundOutline {
  const assumed: string[] = []
  const warnings: string[] = []
  const blocks = withoutCounts(rows, assumed)
  const all = blocks.flat()
  if (all.length === 0) {
    throw new FileProblem(
      file,
      null,
      'there are no coordinates',
      'give x and y of the outline, a point a line',
    )
  }
  const short = all.find((row) => row.values.length < 2)
  if (short !== undefined) {
    throw new FileProblem(file, short.line, 'one number alone is no point', 'give x and y on each line')
  }
  const three = threeColumns(rows, all, file)
  if (three !== null) {
    assumed.push('read as a table of x, upper y and lower y')
    return { raw: three, assumed, warnings }
  }
  const [ix, iy] = columns(rows, all, assumed, warnings)
  refuseMissing(all, Math.max(ix, iy), file)
  const lists = blocks.map((block) => block.map((row): Point => [row.values[ix]!, row.values[iy]!]))
  return { raw: loopOrSides(lists, assumed, warnings), assumed, warnings }
}

function refuseMissing(all: readonly Row[], lastColumn: number, file: string): void {
  const missing = all.find((row) => row.values.length <= lastColumn)
  if (missing === undefined) return
  throw new FileProblem(file, missing.line, 'a column is missing', 'give as many numbers as the other lines')
}

/** Takes out the lines that only count the points of the lists. */
function withoutCounts(rows: Rows, assumed: string[]): Row[][] {
  const total = rows.blocks.reduce((sum, block) => sum + block.length, 0)
  const [first, ...rest] = rows.blocks
  if (first === undefined) return []
  const [a, b] = first[0]!.values
  const whole = (value: number | undefined): value is number =>
    value !== undefined && value > 2 && value % 1 === 0
  if (first[0]!.values.length === 2 && whole(a) && whole(b) && a + b === total - 1) {
    assumed.push(`two lists of ${a} and ${b} points, as the count says`)
    const all = [...first.slice(1), ...rest.flat()]
    return [all.slice(0, a), all.slice(a)]
  }
  const isCount = (row: Row): boolean => row.values.length === 1 && whole(row.values[0])
  if (!rows.blocks.some((block) => block.some(isCount))) return rows.blocks.map((block) => [...block])
  assumed.push('the number before a list was read as its count of points')
  return rows.blocks.flatMap((block) => splitAt(block, isCount)).filter((block) => block.length > 0)
}

/** The pieces of a block between the rows that part it. */
function splitAt(block: readonly Row[], parts: (row: Row) => boolean): Row[][] {
  const pieces: Row[][] = [[]]
  for (const row of block) {
    if (parts(row)) pieces.push([])
    else pieces.at(-1)!.push(row)
  }
  return pieces
}

function threeColumns(rows: Rows, all: readonly Row[], file: string): RawOutline | null {
  const upperAt = rows.header?.findIndex((word) => /^y.*(up|top)/.test(word)) ?? -1
  const lowerAt = rows.header?.findIndex((word) => /^y.*(low|bot)/.test(word)) ?? -1
  const xAt = rows.header?.findIndex((word) => /^x/.test(word)) ?? -1
  if (upperAt < 0 || lowerAt < 0 || xAt < 0) return null
  refuseMissing(all, Math.max(upperAt, lowerAt, xAt), file)
  const side = (at: number): Point[] => all.map((row): Point => [row.values[xAt]!, row.values[at]!])
  return { kind: 'sides', upper: side(upperAt), lower: side(lowerAt) }
}

function columns(rows: Rows, all: readonly Row[], assumed: string[], warnings: string[]): [number, number] {
  if (rows.header !== null) {
    const x = rows.header.findIndex((word) => /^x/.test(word))
    const y = rows.header.findIndex((word) => /^[yz]/.test(word))
    if (y >= 0) {
      assumed.push(`columns "${rows.header[x]}" and "${rows.header[y]}" of the table`)
      return [x, y]
    }
  }
  const width = all.reduce((least, row) => Math.min(least, row.values.length), Infinity)
  if (width < 3) return [0, 1]
  const start = all[0]!.values[0]!
  if (all.every((row, i) => row.values[0] === start + i)) {
    assumed.push('the first column numbers the points')
    return [1, 2]
  }
  warnings.push(`there are ${width} columns; the first two were taken as x and y`)
  return [0, 1]
}

function loopOrSides(lists: readonly Point[][], assumed: string[], warnings: string[]): RawOutline {
  if (lists.length === 2 && lists.every((list) => isMonotonic(list))) {
    assumed.push('two lists: one side each')
    return { kind: 'sides', upper: lists[0]!, lower: lists[1]! }
  }
  if (lists.length > 2) warnings.push(`${lists.length} groups of lines were read as one loop`)
  const points = lists.flat()
  const split = secondList(points)
  if (split !== null) {
    assumed.push('two lists in one: one side each')
    return { kind: 'sides', upper: points.slice(0, split), lower: points.slice(split) }
  }
  return { kind: 'loop', points }
}

function isMonotonic(list: readonly Point[]): boolean {
  const steps = list.slice(1).map(([x], i) => x - list[i]![0])
  const range = Math.abs(list[list.length - 1]![0] - list[0]![0])
  const against = steps.filter((step) => step * (list[list.length - 1]![0] - list[0]![0]) < 0)
  return list.length > 3 && against.reduce((sum, step) => sum + Math.abs(step), 0) < 0.05 * range
}

function secondList(points: readonly Point[]): number | null {
  const xs = points.map(([x]) => x)
  const range = xs.reduce((a, b) => Math.max(a, b), -Infinity) - xs.reduce((a, b) => Math.min(a, b), Infinity)
  const at = points.findIndex(([x], i) => i > 2 && Math.abs(x - points[i - 1]![0]) > LIST_STEP * range)
  if (at < 4 || points.length - at < 4) return null
  return isMonotonic(points.slice(0, at)) && isMonotonic(points.slice(at)) ? at : null
}
