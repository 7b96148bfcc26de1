import { describe, expect, it } from 'vitest'
import { readFileSync } from 'node:fs'
import { measure } from '../../../src/core'
import { readSection } from '../../../src/io/coordinates'
import { FileProblem } from '../../../src/io/problem'

/** The plain file of the corpus: 61 points, 13.09 % thick. */
const POINTS = readFileSync('test/corpus/files/plain.txt', 'utf8')
  .trim()
  .split('\n')
  .slice(1)
  .map((line) => line.trim().split(/\s+/) as [string, string])
const UPPER = POINTS.slice(0, 31).reverse()
const LOWER = POINTS.slice(30)
const comma = (number: string): string => number.replace('.', ',')

const refusal = (text: string): FileProblem => {
  try {
    readSection(text, 'a.csv')
  } catch (error) {
    if (error instanceof FileProblem) return error
    throw error
  }
  throw new Error('it was read')
}

describe('decimal commas', () => {
  it.each([
    ['behind a number for each point', POINTS.map(([x, y], i) => `${i + 1}; ${comma(x)}; ${comma(y)}`)],
    ['before a further column', ['x;y;n', ...POINTS.map(([x, y], i) => `${comma(x)};${comma(y)};${i}`)]],
    [
      'in a table of both sides',
      ['x;y_upper;y_lower', ...UPPER.map(([x, y], i) => [x, y, LOWER[i]![1]].map(comma).join(';'))],
    ],
  ])('%s are read as such', (_, lines) => {
    const { section, understood } = readSection(lines.join('\n'), 'a.csv')
    expect(understood).toContain('decimal commas')
    expect(Math.abs(measure(section).maxThickness - 0.1309)).toBeLessThan(1e-4)
  })
})

describe('a text that cannot be read', () => {
  const table = (change: (line: string) => string): string =>
    [
      'x,y_upper,y_lower',
      ...UPPER.map(([x, y], i) => (i === 9 ? change : (s: string) => s)([x, y, LOWER[i]![1]].join())),
    ].join('\n')

  it.each([
    ['a missing cell at the end of a row of both sides', table((line) => line.replace(/,[^,]*$/, ''))],
    ['an empty cell within a row of both sides', table((line) => line.replace(/,[^,]*,/, ',,'))],
  ])('names the line of %s', (_, text) => {
    expect(refusal(text).line).toBe(11)
    expect(refusal(text).message).toContain('a column is missing')
  })

  it('names the line of a number beyond what can be held', () => {
    const { line, message } = refusal(
      POINTS.map(([x, y], i) => (i === 4 ? '1e999 0' : `${x} ${y}`)).join('\n'),
    )
    expect(line).toBe(5)
    expect(message).toContain('"1e999" is too large a number')
  })

  it('of 700 000 points is refused by their count', () => {
    expect(refusal('1 0\n0.5 0.1\n'.repeat(350_000)).message).toContain('give at most 5000')
  })
})
