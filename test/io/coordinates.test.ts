/** The corpus: every file gives the right section, or an error with file, line and cure. */
import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { measure, panelLoads, placePanels, solvePanels } from '../../src/core'
import { decodeText, readSection, refuseLarge, writeCoordinates } from '../../src/io/coordinates'
import { FileProblem } from '../../src/io/problem'

const FOLDER = 'test/corpus/files'
const read = (file: string) => readSection(decodeText(readFileSync(`${FOLDER}/${file}`), file), file)
const liftOf = (section: ReturnType<typeof read>['section']) =>
  panelLoads(solvePanels(placePanels(section)), (4 * Math.PI) / 180).liftCoefficient

/** The shape by its formula: half thickness plus half the edge, at the thickest place; camber at mid-chord. */
const THICKNESS = 0.1309
const CAMBER = 0.03
/** Six printed decimals. */
const PRINTED = 2e-6
/** Lift of the plain file. The others are the same points, so they agree to the printed digits. */
const LIFT = liftOf(read('plain.txt').section)

/** Files of the one shape, and words that the reading report must hold. */
const SAME: [file: string, words?: string][] = [
  ['plain.txt', '61 points'],
  ['no-title.txt'],
  ['tabs.txt'],
  ['commas.csv'],
  ['comma-space.txt'],
  ['semicolons.txt'],
  ['decimal-commas-semicolon.txt', 'decimal commas'],
  ['decimal-commas-spaces.txt', 'decimal commas'],
  ['crlf.txt'],
  ['cr.txt'],
  ['byte-order-mark.txt'],
  ['latin-1.txt'],
  ['end-of-text.txt'],
  ['no-final-newline.txt'],
  ['indented.txt'],
  ['blank-lines-around.txt'],
  ['comments.txt'],
  ['reversed.txt', 'the order was reversed'],
  ['begins-on-belly.txt', 'did not begin at its trailing edge'],
  ['begins-on-belly-reversed.txt', 'the order was reversed'],
  ['repeated-points.txt', '6 repeated points left out'],
  ['per-cent.txt', 'scaled from a chord of 100'],
  ['shifted.txt'],
  ['two-lists-blank.txt', 'two lists'],
  ['two-lists-joined.txt', 'two lists in one'],
  ['two-lists-lower-first.txt', 'the first list lies below'],
  ['two-lists-edge-to-nose.txt', 'two lists'],
  ['two-lists-counts.txt', 'two lists of 31 and 31 points'],
  ['two-lists-counts-each.txt', 'count of points'],
  ['two-lists-labels.txt', 'two lists'],
  ['header.csv', 'columns "x" and "y"'],
  ['header-swapped.csv', 'columns "x/c" and "y/c"'],
  ['header-extra.csv', 'columns "x" and "y"'],
  ['header-sides.csv', 'x, upper y and lower y'],
  ['numbered.txt', 'the first column numbers the points'],
  ['three-columns.txt'],
  ['exponents.txt'],
  ['fortran-exponents.txt'],
]

/** Files that cannot be used: line, what is wrong, and the cure. */
const BROKEN: [file: string, line: number | null, what: string, cure: string][] = [
  ['empty.txt', null, 'the file is empty', 'give x and y'],
  ['blank.txt', null, 'the file is empty', 'give x and y'],
  ['title-only.txt', null, 'no coordinates', 'give x and y'],
  ['binary.dat', null, 'not a text file', 'plain text'],
  ['one-point.txt', null, '1 different point', 'check the points'],
  ['nan.txt', 3, '"NaN" is not a coordinate', 'give the number or delete the line'],
  ['infinite.txt', 3, '"inf" is not a coordinate', 'give the number or delete the line'],
  ['words.txt', 7, 'is not a pair of numbers', 'put # before it'],
  ['one-number.txt', 7, 'one number alone is no point', 'give x and y'],
  ['missing-column.csv', 11, 'a column is missing', 'as many numbers'],
  ['crossing.txt', null, 'the outline crosses itself', 'check the points'],
  ['flat.txt', null, 'encloses no area', 'check the points'],
  ['wide-edge.txt', null, '24 % of the chord thick', 'less than 20 %'],
  ['huge-count.txt', null, 'at most 5000', 'every other one'],
]

describe('a file of the corpus', () => {
  it.each(SAME)('%s gives the same section as the plain one', (file, words) => {
    const { section, understood } = read(file)
    const { maxThickness, maxCamber, edgeGap } = measure(section)
    expect(Math.abs(maxThickness - THICKNESS)).toBeLessThan(1e-4)
    expect(Math.abs(maxCamber - CAMBER)).toBeLessThan(1e-5)
    expect(Math.abs(edgeGap - 0.003)).toBeLessThan(PRINTED)
    expect(Math.abs(liftOf(section) - LIFT)).toBeLessThan(1e-5)
    if (words !== undefined) expect(understood.join('; ')).toContain(words)
  })

  it.each(BROKEN)('%s is refused with its name, line %s and the cure', (file, line, what, cure) => {
    let problem: unknown
    try {
      read(file)
    } catch (error) {
      problem = error
    }
    expect(problem).toBeInstanceOf(FileProblem)
    const { message, file: named, line: at } = problem as FileProblem
    expect(named).toBe(file)
    expect(at).toBe(line)
    expect(message).toContain(what)
    expect(message).toContain(cure)
    if (line !== null) expect(message).toContain(`${file}, line ${line}: `)
  })

  it('has a place in one of these tables or in a test below', () => {
    const alone = [
      'four-decimals.txt',
      'closed.txt',
      'closed-repeated-start.txt',
      'begins-at-nose.txt',
      'millimetres.txt',
    ]
    alone.push(
      'turned-half.txt',
      'turned-four.txt',
      'turned-minus-twelve-mm.txt',
      'few-points.txt',
      'thick-edge.txt',
    )
    const listed = [...SAME.map(([file]) => file), ...BROKEN.map(([file]) => file), ...alone].sort()
    expect(readdirSync(FOLDER).sort()).toEqual(listed)
    expect(listed.length).toBeGreaterThanOrEqual(40)
  })
})

describe('reading', () => {
  it('keeps a title in Latin-1', () => expect(read('latin-1.txt').section.name).toBe('Möwe Nº 7'))

  it('takes the name of the file when there is no title', () =>
    expect(read('no-title.txt').section.name).toBe('no-title'))

  it.each(['closed.txt', 'closed-repeated-start.txt', 'begins-at-nose.txt'])(
    '%s has a closed edge',
    (file) => {
      const { section, understood } = read(file)
      expect(measure(section).edgeGap).toBeLessThan(1e-9)
      expect(Math.abs(liftOf(section) - liftOf(read('closed.txt').section))).toBeLessThan(1e-9)
      expect(understood).toContain('closed trailing edge')
    },
  )

  it('scales millimetres and says so', () => {
    const { section, understood } = read('millimetres.txt')
    expect(understood.join()).toContain('scaled from a chord of 247.5')
    // Half a thousandth of a millimetre over the chord.
    expect(Math.abs(measure(section).maxThickness - THICKNESS)).toBeLessThan(1e-4)
  })

  it('keeps an axis half a degree off and reports the angle', () => {
    const { understood, section } = read('turned-half.txt')
    expect(understood.join()).toContain('0.51 deg off the axis of the file, which is kept')
    expect(section.y[30]).not.toBeCloseTo(0, 3)
  })

  it.each([
    ['turned-four.txt', '-4.01'],
    ['turned-minus-twelve-mm.txt', '11.99'],
  ])('turns %s onto its longest chord and says by how much', (file, angle) => {
    const { understood, section } = read(file)
    expect(understood.join()).toContain(`turned by ${angle} deg`)
    const longest = readSection(readFileSync(`${FOLDER}/plain.txt`, 'utf8'), 'plain.txt', {
      chordLine: 'longest',
    })
    expect(Math.abs(liftOf(section) - liftOf(longest.section))).toBeLessThan(1e-4)
  })

  it('keeps the axis of a turned file when told to', () => {
    const text = readFileSync(`${FOLDER}/turned-four.txt`, 'utf8')
    const { understood } = readSection(text, 'turned-four.txt', { chordLine: 'file' })
    expect(understood.join()).toContain('which is kept')
  })

  it('warns of few points, of a thick edge, and of columns that it cannot name', () => {
    expect(read('few-points.txt').warnings.join()).toContain('only 21 points')
    expect(read('thick-edge.txt').warnings.join()).toContain('the trailing edge is 5.0 % thick')
    expect(read('three-columns.txt').warnings.join()).toContain('there are 3 columns')
  })

  it('does not call four printed decimals wavy, and calls a traced rib wavy', () => {
    expect(read('four-decimals.txt').warnings).toEqual([])
    const rib = readSection(readFileSync('sample-data/rib-scan-7.txt', 'utf8'), 'rib-scan-7.txt')
    expect(rib.warnings.join()).toMatch(/wavy or kinked/)
  })

  it('refuses more than 5 MB by the size alone', () => {
    expect(() => refuseLarge(5 * 1024 * 1024 + 1, 'big.txt')).toThrow(/big\.txt: 5\.0 MB is too large/)
    expect(() => refuseLarge(5 * 1024 * 1024, 'big.txt')).not.toThrow()
  })

  it('reads what it wrote to the last bit', () => {
    const { section } = read('plain.txt')
    const again = readSection(writeCoordinates(section), 'again.txt').section
    expect(Math.abs(liftOf(again) - liftOf(section))).toBeLessThan(1e-12)
    expect(again.name).toBe(section.name)
  })
})
