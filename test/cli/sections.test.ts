import { readdir, readFile, writeFile, mkdir } from 'node:fs/promises'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { withRepeats } from '../../src/cli/sections'
import { cells, command, started, temporaryFolder } from '../support/commandLine'

const folder = temporaryFolder()
const here = (args: readonly string[]): ReturnType<typeof command> => command(args, { folder: folder() })

const SHAPE_FIELDS = [
  ...['section', 'max_thickness', 'max_thickness_at', 'max_camber', 'max_camber_at', 'nose_radius'],
  ...['edge_gap', 'edge_angle_deg', 'area', 'zero_lift_deg', 'moment_coefficient', 'ideal_lift_coefficient'],
  'notes',
]

/** What holds of every method is shown by the quickest that has surface pressure. */
const PANEL = ['--method', 'panel']

const POLAR_HEADER =
  'section,method,reynolds,mach,surface,alpha_deg,lift_coefficient,drag_coefficient,moment_coefficient,' +
  'transition_upper,transition_lower,converged,amplification,trip_upper,trip_lower,flap_deg'

describe('shape', () => {
  it('prints one object a section, with the fields in their order and sections as typed', async () => {
    const { status, out } = await here(['shape', 'naca:2412', 'naca:23012', 'naca:2412', '--edge', 'open'])
    expect(status).toBe(0)
    const shapes = JSON.parse(out) as Record<string, unknown>[]
    expect(shapes.map((one) => one['section'])).toEqual(['naca:2412', 'naca:23012', 'naca:2412 (2)'])
    for (const one of shapes) expect(Object.keys(one)).toEqual(SHAPE_FIELDS)
    // The open edge of the published four-digit form is 0.0021 of the chord at 20 % thickness and scales.
    expect(shapes[0]!['edge_gap']).toBeCloseTo(0.00252, 5)
  })
})

describe('sweep', () => {
  it('writes RFC 4180 text: the contract columns, CRLF, final newline, no minus zero, empty for no value', async () => {
    const { status, out, err } = await here(['sweep', 'naca:0012', '--alpha', '-2:2:1', '--method', 'panel'])
    expect([status, err]).toEqual([0, ''])
    expect(out.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/)
    expect(out.endsWith('\r\n')).toBe(true)
    const [header, ...rows] = cells(out)
    expect(header!.join()).toBe(POLAR_HEADER)
    expect(rows.map((row) => row[5])).toEqual(['-2', '-1', '0', '1', '2'])
    for (const row of rows) {
      expect(row).toHaveLength(16)
      expect([row[0], row[1], row[2], row[3], row[4]]).toEqual(['naca:0012', 'panel', '', '0', 'clean'])
      expect([row[7], row[9], row[10], row[11], row[12], row[13], row[14], row[15]]).toEqual([
        ...['', '', '', 'true', '', '1', '1', '0'],
      ])
      for (const cell of row) expect(cell).not.toBe('-0')
      for (const number of [row[6]!, row[8]!]) expect(String(Number(number))).toBe(number)
    }
  })

  it('takes a negative range joined or apart, and gives the same', async () => {
    const apart = await here(['sweep', 'naca:2412', '--alpha', '-4:12:0.5', ...PANEL])
    const joined = await here(['sweep', '--alpha=-4:12:0.5', 'naca:2412', ...PANEL])
    expect(apart.status).toBe(0)
    expect(joined.out).toBe(apart.out)
    expect(cells(apart.out)).toHaveLength(34)
  })

  it('gives FROM + i STEP in degrees, without the noise of a conversion', async () => {
    const { out } = await here(['sweep', 'naca:2412', '--alpha', '-4:12:0.1', '--method', 'thin'])
    cells(out)
      .slice(1)
      .forEach((row, i) => expect(row[5]).toBe(String(Number((-4 + i * 0.1).toPrecision(12)))))
  })

  it('lists sections in the order given, a repeat as (2)', async () => {
    const { out } = await here(['sweep', 'naca:4412', 'naca:0012', 'naca:4412', '--alpha', '0:0:1', ...PANEL])
    expect(
      cells(out)
        .slice(1)
        .map((row) => row[0]),
    ).toEqual(['naca:4412', 'naca:0012', 'naca:4412 (2)'])
  })

  it('accepts what inviscid methods do not use, and says dirty when a trip is given', async () => {
    const extra = ['--reynolds', '1e6', '--reynolds', '3e6', '--amplification', '9', '--trip-upper', '0.3']
    const { status, out } = await here(['sweep', 'naca:2412', '--alpha', '0:0:1', ...PANEL, ...extra])
    expect(status).toBe(0)
    expect(cells(out)).toHaveLength(2)
    expect(cells(out)[1]!.slice(2, 5)).toEqual(['', '0', 'dirty'])
    expect(cells(out)[1]!.slice(12, 15)).toEqual(['', '0.3', '1'])
  })

  it('trips a dirty surface at 0.05 above and 0.10 below', async () => {
    const { out } = await here(['sweep', 'naca:2412', '--alpha', '0:0:1', ...PANEL, '--surface', 'dirty'])
    expect(cells(out)[1]!.slice(12, 15)).toEqual(['', '0.05', '0.1'])
  })

  it('treats thin as incompressible, and the panels at the Mach number of the row', async () => {
    const common = ['sweep', 'naca:2412', '--alpha', '2:2:1', '--mach', '0.3', '--method']
    expect(cells((await here([...common, 'thin'])).out)[1]![3]).toBe('0')
    expect(cells((await here([...common, 'panel'])).out)[1]![3]).toBe('0.3')
  })

  it('writes files and nothing on standard output, and - is standard output', async () => {
    const shown = await here(['sweep', 'naca:2412', '--alpha', '0:2:1', ...PANEL])
    const filed = await here([
      'sweep',
      'naca:2412',
      '--alpha',
      '0:2:1',
      ...PANEL,
      '--csv',
      'a.csv',
      '--json',
      'a.json',
    ])
    expect([filed.status, filed.out, filed.err]).toEqual([0, '', ''])
    expect(await readFile(join(folder(), 'a.csv'), 'utf8')).toBe(shown.out)
    const json = JSON.parse(await readFile(join(folder(), 'a.json'), 'utf8')) as {
      polars: { section: string; points: { alpha_deg: number; drag_coefficient: null }[] }[]
    }
    expect(json.polars[0]!.points.map((point) => [point.alpha_deg, point.drag_coefficient])).toEqual([
      ...[
        [0, null],
        [1, null],
        [2, null],
      ],
    ])
    const dash = await here(['sweep', 'naca:2412', '--alpha', '0:2:1', ...PANEL, '--csv', '-'])
    expect(dash.out).toBe(shown.out)
  })

  it('writes nothing and ends with 130 when it is interrupted', async () => {
    const before = await readdir(folder())
    const args = Array.from({ length: 60 }, (_, i) => `naca:24${12 + (i % 8)}`)
    const long = [...args, '--alpha', '0:50:0.01', ...PANEL, '--panels', '400', '--csv', 'never.csv']
    const child = started(['sweep', ...long], { folder: folder() })
    const ended = new Promise<unknown>((resolve) =>
      child.once('exit', (status, signal) => resolve(status ?? signal)),
    )
    setTimeout(() => child.kill('SIGINT'), 600)
    expect(await ended).toBe(130)
    expect(await readdir(folder())).toEqual(before)
  })
})

describe('pressure', () => {
  it('runs from the upper trailing edge round to the lower one, at an angle or at a lift', async () => {
    const { status, out, err } = await here(['pressure', 'naca:2412', '--alpha', '2', ...PANEL])
    expect([status, err]).toEqual([0, ''])
    const [header, ...rows] = cells(out)
    expect(header!.join()).toBe('section,method,alpha_deg,x_over_c,y_over_c,pressure_coefficient')
    expect(Number(rows[0]![3])).toBeCloseTo(1, 9)
    expect(Number(rows.at(-1)![3])).toBeCloseTo(1, 9)
    expect(Number(rows[20]![4])).toBeGreaterThan(Number(rows.at(-21)![4]))
    const atLift = await here(['pressure', 'naca:2412', '--lift', '-0.2', '--csv', '-', ...PANEL])
    expect(Number(cells(atLift.out)[1]![2])).toBeLessThan(-3)
  })
})

describe('a repeated name', () => {
  it('gets a number, the first stays as typed', () => {
    expect(withRepeats(['a', 'b', 'a', 'a'])).toEqual(['a', 'b', 'a (2)', 'a (3)'])
  })
})

describe('bad input of sections', () => {
  const GOOD = ['--alpha', '0:4:1', '--reynolds', '1e6']
  const cases: [why: string, args: string[], says: string][] = [
    ['no section', ['sweep', ...GOOD], 'no section'],
    ['no angles', ['sweep', 'naca:2412', '--reynolds', '1e6'], '--alpha'],
    ['a missing file', ['shape', 'missing.txt'], 'missing.txt'],
    ['a folder', ['shape', 'a-folder'], 'a-folder'],
    ['an empty file', ['shape', 'empty.txt'], 'empty.txt'],
    ['a binary file', ['shape', 'binary.txt'], 'binary.txt'],
    ['words', ['shape', 'words.txt'], 'words.txt'],
    ['one point', ['shape', 'one-point.txt'], 'one-point.txt'],
    ['not a number', ['shape', 'nan.txt'], 'nan.txt'],
    ['a self-crossing outline', ['shape', 'crossing.txt'], 'crossing.txt'],
    ['a text over 5 MB', ['shape', 'large.txt'], 'large.txt'],
    ['another family', ['shape', 'naca:64-215'], 'not generated here; open a coordinate file'],
    [
      'one bad section of several',
      ['sweep', 'naca:2412', 'missing.txt', ...GOOD, '--csv', 'x.csv'],
      'missing.txt',
    ],
    ['an unknown option', ['sweep', 'naca:2412', ...GOOD, '--angle', '3'], '--angle'],
    ['an option without value', ['sweep', 'naca:2412', '--alpha'], '--alpha'],
    ['a malformed range', ['sweep', 'naca:2412', '--alpha', '0:4'], 'FROM:TO:STEP'],
    ['a range the wrong way', ['sweep', 'naca:2412', '--alpha', '4:0:1'], 'no angles'],
    ['too many angles', ['sweep', 'naca:2412', '--alpha', '0:100:0.001'], 'at most'],
    [
      'both airs',
      ['sweep', 'naca:2412', ...GOOD, '--turbulence', '0.1', '--amplification', '9'],
      'one of them',
    ],
    ['much turbulence', ['sweep', 'naca:2412', ...GOOD, '--turbulence', '3'], '0.07 to 2.98'],
    ['little turbulence', ['sweep', 'naca:2412', ...GOOD, '--turbulence', '0.06'], '0.07 to 2.98'],
    ['a large N', ['sweep', 'naca:2412', ...GOOD, '--amplification', '15'], '0 to 14'],
    ['few panels', ['sweep', 'naca:2412', ...GOOD, '--panels', '39'], '40 to 400'],
    ['many panels', ['sweep', 'naca:2412', ...GOOD, '--panels', '401'], '40 to 400'],
    ['half a panel', ['sweep', 'naca:2412', ...GOOD, '--panels', '99.5'], 'whole number'],
    ['a high Mach number', ['sweep', 'naca:2412', ...GOOD, '--mach', '0.51'], '0 to 0.5'],
    ['a negative Mach number', ['sweep', 'naca:2412', ...GOOD, '--mach', '-0.1'], '0 to 0.5'],
    ['a trip off the chord', ['sweep', 'naca:2412', ...GOOD, '--trip-lower', '1.2'], '0 to 1'],
    ['an unknown surface', ['sweep', 'naca:2412', ...GOOD, '--surface', 'wet'], 'clean or dirty'],
    ['an unknown edge', ['sweep', 'naca:2412', ...GOOD, '--edge', 'round'], 'closed or open'],
    [
      'a Reynolds number that is none',
      ['sweep', 'naca:2412', '--alpha', '0:4:1', '--reynolds', 'many'],
      '--reynolds',
    ],
    ['two outputs in one place', ['sweep', 'naca:2412', ...GOOD, '--csv', 'x', '--json', './x'], 'x'],
    [
      'two outputs on standard output',
      ['sweep', 'naca:2412', ...GOOD, '--csv', '-', '--json', '-'],
      'standard output',
    ],
    ['an unwritable folder', ['sweep', 'naca:2412', ...GOOD, '--csv', 'no/such/folder/x.csv'], 'x.csv'],
    ['a folder in place of a file', ['sweep', 'naca:2412', ...GOOD, '--csv', 'a-folder'], 'it is a folder'],
    ['no state', ['pressure', 'naca:2412'], '--alpha'],
    ['two states', ['pressure', 'naca:2412', '--alpha', '2', '--lift', '0.3'], '--lift'],
    ['two sections', ['pressure', 'naca:2412', 'naca:0012', '--alpha', '2', ...PANEL], 'one section'],
    ['no pressure by this method', ['pressure', 'naca:2412', '--alpha', '2', '--method', 'thin'], 'pressure'],
    [
      'two Reynolds numbers',
      ['pressure', 'naca:2412', '--alpha', '2', '--reynolds', '1e6', '--reynolds', '2e6'],
      'one',
    ],
  ]

  it.each(cases)('%s ends with 2, a message, and nothing written', async (_why, args, says) => {
    const own = join(folder(), 'bad')
    await mkdir(join(own, 'a-folder'), { recursive: true })
    const files: Record<string, string | Uint8Array> = {
      'empty.txt': '',
      'binary.txt': Uint8Array.from([0, 1, 2, 255, 254, 0]),
      'words.txt': 'nothing but words\nand more words\n',
      'one-point.txt': 'Point\n0.5 0.1\n',
      'nan.txt': 'Bad\n1 0\n0.5 NaN\n0 0\n0.5 -0.05\n1 0\n',
      'crossing.txt': 'Crossing\n1 0\n0.7 0.05\n0.3 -0.05\n0 0\n0.3 0.05\n0.7 -0.05\n1 0\n',
      'large.txt': '0'.repeat(5 * 1024 * 1024 + 1),
    }
    for (const [name, text] of Object.entries(files)) await writeFile(join(own, name), text)
    const before = await readdir(own, { recursive: true })
    const { status, out, err } = await command(args, { folder: own })
    expect([status, out]).toEqual([2, ''])
    expect(err).toContain(says)
    expect(err).not.toContain('a fault of this program')
    expect(await readdir(own, { recursive: true })).toEqual(before)
  })
})
