import { mkdir, readdir, readFile, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { cells, command, LENS, started, temporaryFolder } from '../support/commandLine'

const folder = temporaryFolder()
const here = (args: readonly string[]): ReturnType<typeof command> => command(args, { folder: folder() })

/** Rows of a polar or pressure CSV without its header. */
const rowsOf = (csv: string): string[][] => cells(csv).slice(1)

/** Columns of the polar CSV by their place in a row. */
const COLUMN = { lift: 6, drag: 7, moment: 8, upper: 9, lower: 10, converged: 11, amplification: 12 }

describe('sweep with boundary layers', () => {
  it('is the default and fills every column', async () => {
    const { status, out, err } = await here([
      ...['sweep', 'naca:2412', '--alpha', '0:4:2', '--reynolds', '1e6', '--mach', '0.1'],
    ])
    expect([status, err]).toEqual([0, ''])
    const rows = rowsOf(out)
    expect(rows.map((row) => row[5])).toEqual(['0', '2', '4'])
    for (const row of rows) {
      expect(row.slice(0, 5)).toEqual(['naca:2412', 'viscous', '1000000', '0.1', 'clean'])
      for (const cell of row.slice(COLUMN.lift, COLUMN.converged)) expect(Number(cell)).not.toBeNaN()
      expect(row.every((cell) => cell !== '')).toBe(true)
      expect(row[COLUMN.converged]).toBe('true')
      expect(row.slice(13)).toEqual(['1', '1', '0'])
      // A smooth section at this Reynolds number: more than a laminar plate's friction, less than a bluff body's.
      expect(Number(row[COLUMN.drag])).toBeGreaterThan(0.00266)
      expect(Number(row[COLUMN.drag])).toBeLessThan(0.02)
    }
    // Mack's relation at 0.07 per cent: -8.43 - 2.4 ln 0.0007.
    expect(Number(rows[0]![COLUMN.amplification])).toBeCloseTo(9.0046, 4)
    const places = (column: number): number[] => rows.map((row) => Number(row[column]))
    expect([...places(COLUMN.upper)].sort((a, b) => b - a)).toEqual(places(COLUMN.upper))
    expect([...places(COLUMN.lower)].sort((a, b) => a - b)).toEqual(places(COLUMN.lower))
  })

  it('moves transition forward with more turbulence, and takes N in its place', async () => {
    const transition = async (...air: string[]): Promise<{ upper: number; n: number }> => {
      const { out } = await here(['sweep', 'naca:0012', '--alpha', '0:0:1', '--reynolds', '3e6', ...air])
      const [row] = rowsOf(out)
      return { upper: Number(row![COLUMN.upper]), n: Number(row![COLUMN.amplification]) }
    }
    const [still, rough, given] = await Promise.all([
      transition(),
      transition('--turbulence', '1'),
      transition('--amplification', '4'),
    ])
    expect(rough.upper).toBeLessThan(still.upper)
    expect(given.n).toBe(4)
    expect(given.upper).toBeLessThan(still.upper)
  })

  it('forces transition where a trip says, which makes the row dirty', async () => {
    const common = ['sweep', 'naca:0012', '--alpha', '0:0:1', '--reynolds', '3e6']
    const dirty = rowsOf((await here([...common, '--surface', 'dirty'])).out)[0]!
    expect([dirty[4], dirty[13], dirty[14]]).toEqual(['dirty', '0.05', '0.1'])
    // The trip lies inside an interval of the panels: the place is met to a panel's length.
    expect(Number(dirty[COLUMN.upper])).toBeCloseTo(0.05, 2)
    expect(Number(dirty[COLUMN.lower])).toBeCloseTo(0.1, 2)
    const oneSide = rowsOf((await here([...common, '--trip-lower', '0.3'])).out)[0]!
    expect([oneSide[4], oneSide[13], oneSide[14]]).toEqual(['dirty', '1', '0.3'])
    expect(Number(oneSide[COLUMN.drag])).toBeLessThan(Number(dirty[COLUMN.drag]))
  })

  it('warns once of a trip behind laminar separation, and keeps the points', async () => {
    const { status, out, err } = await here([
      ...['sweep', 'naca:2412', '--alpha', '0:3:1', '--reynolds', '2e5', '--trip-upper', '0.95'],
    ])
    expect(status).toBe(0)
    expect(err).toMatch(/^naca:2412, 0 to 3 deg: .*upper side.*behind laminar separation\n$/)
    expect(rowsOf(out).map((row) => row[COLUMN.converged])).toEqual(['true', 'true', 'true', 'true'])
  })

  it('leaves the results of a failed point empty, names those of a kind in one line, and ends with 1', async () => {
    // No section at right angles to the stream has attached layers.
    const args = ['sweep', 'naca:0012', '--alpha', '0:90:30', '--reynolds', '1e6', '--json', 'failed.json']
    const { status, out, err } = await here([...args, '--csv', '-'])
    expect(status).toBe(1)
    expect(err).toMatch(/^naca:0012, [\d, to]*90 deg: not converged, left empty: [^\n]+\n$/)
    const failed = rowsOf(out).at(-1)!
    expect(failed.slice(0, 6)).toEqual(['naca:0012', 'viscous', '1000000', '0', 'clean', '90'])
    expect(failed.slice(COLUMN.lift, COLUMN.converged + 1)).toEqual(['', '', '', '', '', 'false'])
    const { polars } = JSON.parse(await readFile(join(folder(), 'failed.json'), 'utf8')) as {
      polars: { reynolds: number; points: Record<string, unknown>[] }[]
    }
    expect(polars[0]!.reynolds).toBe(1e6)
    expect(polars[0]!.points.at(-1)).toMatchObject({
      ...{ alpha_deg: 90, lift_coefficient: null, drag_coefficient: null, moment_coefficient: null },
      ...{ transition_upper: null, transition_lower: null, converged: false, trip_upper: 1 },
    })
  })

  it('gives each section a polar at each Reynolds number, in the order given, from workers or from the cache', async () => {
    const args = ['sweep', 'naca:2412', 'naca:0012', '--alpha', '0:2:2', '--reynolds', '3e6']
    const env = { SECTIONWRIGHT_NO_CACHE: '', XDG_CACHE_HOME: join(folder(), 'cache') }
    const run = (): ReturnType<typeof command> =>
      command([...args, '--reynolds', '5e5'], { folder: folder(), env })
    const first = await run()
    expect([first.status, first.err]).toEqual([0, ''])
    expect(rowsOf(first.out).map((row) => [row[0], row[2], row[5]].join(' '))).toEqual([
      ...['naca:2412 3000000 0', 'naca:2412 3000000 2', 'naca:2412 500000 0', 'naca:2412 500000 2'],
      ...['naca:0012 3000000 0', 'naca:0012 3000000 2', 'naca:0012 500000 0', 'naca:0012 500000 2'],
    ])
    expect(await readdir(join(folder(), 'cache', 'sectionwright'))).toHaveLength(4)
    expect((await run()).out).toBe(first.out)
    const alone = await here(['sweep', 'naca:0012', '--alpha', '0:2:2', '--reynolds', '5e5'])
    expect(rowsOf(alone.out)).toEqual(rowsOf(first.out).slice(6))
  })

  it('says nothing of its own work, however many polars wait for a worker', async () => {
    const many = Array.from({ length: 14 }, (_, i) => ['--reynolds', String(1e6 + 1e5 * i)]).flat()
    const { status, out, err } = await here([
      ...['sweep', 'naca:0012', '--alpha', '0:0:1', '--panels', '60', ...many],
    ])
    expect([status, err]).toEqual([0, ''])
    expect(rowsOf(out)).toHaveLength(14)
  })

  it('writes nothing and ends busy workers with 130 when it is interrupted', async () => {
    const before = await readdir(folder())
    const args = ['sweep', 'naca:2412', 'naca:4412', '--alpha', '-8:12:0.01', '--reynolds', '1e6']
    const child = started([...args, '--csv', 'never.csv'], { folder: folder() })
    const ended = new Promise<unknown>((resolve) =>
      child.once('exit', (status, signal) => resolve(status ?? signal)),
    )
    await new Promise((resolve) => setTimeout(resolve, 900))
    expect(child.exitCode).toBeNull()
    const asked = performance.now()
    child.kill('SIGINT')
    expect(await ended).toBe(130)
    // Each of the two polars takes far longer than this: busy workers were not waited for.
    expect(performance.now() - asked).toBeLessThan(2000)
    expect(await readdir(folder())).toEqual(before)
  })
})

describe('pressure with boundary layers', () => {
  it('gives the lift asked for: the angle found gives it in a sweep', async () => {
    const { status, out, err } = await here(['pressure', 'naca:4412', '--lift', '0.6', '--reynolds', '1e6'])
    expect([status, err]).toEqual([0, ''])
    const rows = rowsOf(out)
    expect(rows).toHaveLength(181)
    expect(rows[0]![1]).toBe('viscous')
    const alpha = rows[0]![2]!
    const swept = await here(['sweep', 'naca:4412', '--alpha', `${alpha}:${alpha}:1`, '--reynolds', '1e6'])
    // The search ends at 1e-5 of lift; the angle is printed with twelve digits.
    expect(Number(rowsOf(swept.out)[0]![COLUMN.lift])).toBeCloseTo(0.6, 4)
  })

  it('has no rows and ends with 1 where no flow gives that lift', async () => {
    const { status, out, err } = await here(['pressure', 'naca:0012', '--lift', '4', '--reynolds', '1e6'])
    expect([status, rowsOf(out)]).toEqual([1, []])
    expect(err).toMatch(/^naca:0012: not converged, no rows: .+\n$/)
  })
})

/** A symmetric lens of parabolic arcs whose edge is cut open by `gap` chords; `reversed` runs the other way. */
function wedge(gap: number, reversed: boolean): string {
  const rows = Array.from({ length: 81 }, (_, i) => {
    const x = Math.abs(1 - i / 40) ** 2
    return `${x.toFixed(6)} ${(Math.sign(40 - i) * (0.2 * Math.sqrt(x) * (1 - x) + (gap / 2) * x)).toFixed(7)}`
  })
  return ['Wedge', ...(reversed ? rows.reverse() : rows), ''].join('\n')
}

describe('odd outlines', () => {
  it('computes a reversed loop as the same section', async () => {
    for (const [name, reversed] of [
      ['forward.txt', false],
      ['back.txt', true],
    ] as const) {
      await writeFile(join(folder(), name), wedge(0.01, reversed))
    }
    const { status, out } = await here([
      ...['sweep', 'forward.txt', 'back.txt', '--alpha', '0:2:2', '--reynolds', '1e6'],
    ])
    expect(status).toBe(0)
    const rows = rowsOf(out)
    expect(rows.slice(2).map((row) => row.slice(1))).toEqual(rows.slice(0, 2).map((row) => row.slice(1)))
  })

  it('refuses an edge open by a fifth of the chord, without writing the others', async () => {
    const own = join(folder(), 'gap')
    await mkdir(own)
    await writeFile(join(own, 'open.txt'), wedge(0.22, false))
    const args = ['sweep', 'naca:0012', 'open.txt', '--alpha', '0:2:2', '--reynolds', '1e6', '--csv', 'x.csv']
    const { status, out, err } = await command(args, { folder: own })
    expect([status, out]).toEqual([2, ''])
    expect(err).toMatch(/open\.txt: the trailing edge is 22 % of the chord thick/)
    expect(err).not.toContain('a fault of this program')
    expect(await readdir(own)).toEqual(['open.txt'])
  })

  it('never writes NaN for a sharp nose, whatever converges', async () => {
    await writeFile(join(folder(), 'lens.txt'), LENS)
    const { status, out, err } = await here(['sweep', 'lens.txt', '--alpha', '0:8:4', '--reynolds', '1e6'])
    expect([0, 1]).toContain(status)
    expect(`${out}${err}`).not.toMatch(/NaN|Infinity|a fault of this program/)
    expect(rowsOf(out)).toHaveLength(3)
  })
})

describe('bad input of the viscous method', () => {
  const cases: [why: string, args: string[], says: string][] = [
    ['no Reynolds number', [], '--reynolds R is needed'],
    ['a small Reynolds number', ['--reynolds', '49999'], '50000 to 20000000'],
    ['a huge Reynolds number', ['--reynolds', '1e9'], '50000 to 20000000'],
    ['one bad Reynolds number of two', ['--reynolds', '1e6', '--reynolds', '3e7'], '"3e7"'],
    ['a Reynolds number that is no number', ['--reynolds', 'NaN'], '"NaN"'],
    ['a turbulence that is no number', ['--reynolds', '1e6', '--turbulence', 'NaN'], '--turbulence'],
    ['a Mach number that is no number', ['--reynolds', '1e6', '--mach', 'NaN'], '--mach'],
    ['a trip before the nose', ['--reynolds', '1e6', '--trip-upper', '-0.1'], '--trip-upper'],
    ['a negative N', ['--reynolds', '1e6', '--amplification', '-1'], '0 to 14'],
  ]

  it.each(cases)('%s ends with 2 and a message', async (_why, args, says) => {
    const { status, out, err } = await here(['sweep', 'naca:2412', '--alpha', '0:2:1', ...args])
    expect([status, out]).toEqual([2, ''])
    expect(err).toContain(says)
    expect(err).not.toContain('a fault of this program')
  })

  it('accepts any Reynolds number where it is not used', async () => {
    const args = ['sweep', 'naca:2412', '--alpha', '0:2:1', '--reynolds', '1e9', '--method']
    for (const method of ['thin', 'panel']) expect((await here([...args, method])).status).toBe(0)
  })
})
