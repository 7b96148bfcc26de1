import { FileProblem } from '../problem'

/** A row of numbers and the line (from 1) it stands on. */
export interface Row {
  readonly line: number
  readonly values: readonly number[]
}

/** The text of a coordinate file as blocks of number rows: a blank or a wordy line begins a new block. */
export interface Rows {
  readonly title: string | null
  /** Words of the header row of a table, in lower case; null without one. */
  readonly header: readonly string[] | null
  readonly blocks: readonly (readonly Row[])[]
  readonly decimalComma: boolean
}

const COMMENT = /^\s*(#|!|%|\/\/)/
/** Old programs end a text with this character. */
const END_OF_TEXT = String.fromCharCode(26)
const NUMBER = /^[-+]?(\d+\.?\d*|\.\d+)([ed][-+]?\d+)?$/i
/** A line of numbers parted by spaces or semicolons, at least two of which have a decimal comma. */
const COMMA_NUMBERS = /^\s*(\d+[\s;]+)?[-+]?\d*,\d+(e[-+]?\d+)?([\s;]+[-+]?\d*,?\d+(e[-+]?\d+)?)+[\s;]*$/i

/** Reads the rows of a text. Throws a FileProblem that names the line of anything that is neither. */
export function readRows(text: string, file: string): Rows {
  const lines = text.replace(/^\uFEFF/, '').split(/\r\n|\r|\n/)
  const decimalComma = lines.some((line) => COMMA_NUMBERS.test(line))
  let title: string | null = null
  let header: readonly string[] | null = null
  const blocks: Row[][] = []
  let block: Row[] = []
  const endBlock = (): void => {
    if (block.length > 0) blocks.push(block)
    block = []
  }
  lines.forEach((raw, i) => {
    if (COMMENT.test(raw)) return
    const line = raw.replace(/\s(#|!|%|\/\/).*$/, '').replaceAll(END_OF_TEXT, '')
    if (line.trim() === '') return endBlock()
    const cells = cellsOf(line, decimalComma)
    const values = cells.map((cell) => valueOf(cell, decimalComma))
    if (values.every((value) => value !== null)) {
      const large = values.findIndex((value) => !Number.isFinite(value))
      if (large >= 0) {
        throw new FileProblem(file, i + 1, `"${cells[large]}" is too large a number`, 'correct the number')
      }
      block.push({ line: i + 1, values })
      return
    }
    refuseNotNumbers(cells, file, i + 1)
    const started = blocks.length > 0 || block.length > 0
    if (!started && isHeader(cells)) header = cells.map((cell) => cell.toLowerCase())
    else if (!started) title ??= line.trim()
    else if (isLabel(cells)) endBlock()
    else {
      throw new FileProblem(
        file,
        i + 1,
        `"${line.trim().slice(0, 40)}" is not a pair of numbers`,
        'correct the line or put # before it',
      )
    }
  })
  endBlock()
  return { title, header, blocks, decimalComma }
}

function cellsOf(line: string, decimalComma: boolean): string[] {
  return line
    .trim()
    .split(decimalComma ? /\s*;\s*|\s+/ : /\s*[;,]\s*|\s+/)
    .map((cell) => cell.replace(/^"(.*)"$/, '$1'))
    .filter((cell) => cell !== '')
}

function valueOf(cell: string, decimalComma: boolean): number | null {
  const plain = decimalComma ? cell.replace(',', '.') : cell
  return NUMBER.test(plain) ? Number(plain.replace(/d/i, 'e')) : null
}

function refuseNotNumbers(cells: readonly string[], file: string, line: number): void {
  const bad = cells.find((cell) => /^[-+]?(nan|inf|infinity|n\/a|null)$/i.test(cell))
  if (bad !== undefined && cells.length <= 4) {
    throw new FileProblem(file, line, `"${bad}" is not a coordinate`, 'give the number or delete the line')
  }
}

/** The header of a table: short words, one of which is x. */
function isHeader(cells: readonly string[]): boolean {
  return cells.length >= 2 && cells.some((cell) => /^x([/_(\s]|$)/i.test(cell))
}

/** A label between two lists: words without digits. */
function isLabel(cells: readonly string[]): boolean {
  return cells.every((cell) => !/\d/.test(cell))
}
