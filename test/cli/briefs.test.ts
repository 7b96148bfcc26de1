import { mkdir, readdir, readFile, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { beforeAll, describe, expect, it } from 'vitest'
import { briefText } from '../support/briefs'
import { cells, command, LENS, temporaryFolder } from '../support/commandLine'

const folder = temporaryFolder()
const here = (args: readonly string[]): ReturnType<typeof command> => command(args, { folder: folder() })

async function writeBrief(name: string, over: Readonly<Record<string, unknown>> = {}): Promise<string> {
  await mkdir(join(folder(), 'briefs'), { recursive: true })
  await writeFile(join(folder(), 'briefs', name), briefText(over))
  return `briefs/${name}`
}

interface Wings {
  readonly wings: {
    readonly root: string
    readonly tip: string
    readonly conditions: (Record<string, number | string | null> & {
      readonly stations: Record<string, number>[]
    })[]
  }[]
}

const CONDITION_FIELDS = [
  ...['name', 'density_kg_m3', 'dynamic_pressure_Pa', 'wing_loading_kg_m2', 'lift_coefficient', 'reynolds'],
  ...['mach', 'alpha_deg', 'lift_slope_per_rad', 'span_efficiency', 'induced_drag_coefficient'],
  ...['induced_drag_N', 'tail_load_N', 'root_bending_moment_N_m', 'stations'],
]

let brief: string
beforeAll(async () => {
  brief = await writeBrief('small.brief.json')
  await writeFile(join(folder(), 'briefs', 'lens.txt'), LENS)
})

describe('wing', () => {
  it('prints each entry at each condition; a slowest speed is null with a note and no fault', async () => {
    const { status, out, err } = await here(['wing', brief, '--method', 'panel'])
    expect(status).toBe(0)
    expect(err).toContain('Slowest')
    const { wings } = JSON.parse(out) as Wings
    expect(wings.map(({ root, tip }) => [root, tip])).toEqual([
      ['naca:4412', 'naca:4412'],
      ['naca:2415', 'naca:2412'],
    ])
    for (const { conditions } of wings) {
      const [slowest, mapping] = conditions
      expect(slowest!.lift_coefficient).toBeNull()
      expect(slowest!.note).toContain('viscous')
      for (const field of CONDITION_FIELDS) expect(mapping).toHaveProperty(field)
      expect(mapping!.stations.length).toBeGreaterThanOrEqual(21)
      // Loading of 24 kg on 1.1 m2; the density of the standard atmosphere at 600 m.
      expect(mapping!.wing_loading_kg_m2).toBeCloseTo(24 / 1.1, 9)
      expect(mapping!.density_kg_m3).toBeCloseTo(1.156, 3)
    }
  })

  it('puts sections or a pair in place of the shortlist, relative to the caller', async () => {
    await writeFile(join(folder(), 'own.txt'), LENS)
    const { out, status } = await here([
      ...[
        'wing',
        brief,
        '--section',
        'own.txt',
        '--section',
        'naca:0012',
        '--root',
        'naca:2415',
        '--tip',
        'own.txt',
      ],
      ...['--method', 'panel'],
    ])
    expect(status).toBe(0)
    const { wings } = JSON.parse(out) as Wings
    expect(wings.map(({ root, tip }) => [root, tip])).toEqual([
      ['own.txt', 'own.txt'],
      ['naca:0012', 'naca:0012'],
      ['naca:2415', 'own.txt'],
    ])
  })

  it('writes one row a station with --csv', async () => {
    const { out, status } = await here(['wing', brief, '--csv', '-', '--method', 'thin'])
    expect(status).toBe(0)
    const [header, ...rows] = cells(out)
    expect(header!.join()).toBe(
      'root,tip,condition,y_m,chord_m,twist_deg,reynolds,lift_coefficient,max_lift_coefficient,induced_angle_deg,profile_drag_coefficient',
    )
    expect(rows[0]!.slice(0, 4)).toEqual(['naca:4412', 'naca:4412', 'Mapping', '0'])
    expect(rows.map((row) => row[8])).toEqual(rows.map(() => ''))
    expect(Number(rows.at(-1)![3])).toBe(1.8)
  })
})

describe('compare', () => {
  it('writes its files into a folder that it makes, and the same bytes each time', async () => {
    const first = await here(['compare', brief, '--out', 'out/one', '--method', 'panel'])
    const second = await here(['compare', brief, '--out', 'out/two', '--method', 'panel'])
    expect([first.status, first.out]).toEqual([0, ''])
    expect(second.status).toBe(0)
    const names = await readdir(join(folder(), 'out', 'one'))
    expect(names.sort()).toEqual(['polars.csv', 'pressures.csv', 'wing.csv'])
    for (const name of names) {
      const bytes = await readFile(join(folder(), 'out', 'one', name))
      expect(bytes.length).toBeGreaterThan(1000)
      expect(bytes.equals(await readFile(join(folder(), 'out', 'two', name)))).toBe(true)
    }
  })

  it('gives the same bytes from the cache as without', async () => {
    const env = { SECTIONWRIGHT_NO_CACHE: '', XDG_CACHE_HOME: join(folder(), 'cache') }
    for (const out of ['fresh', 'kept']) {
      const { status } = await command(['compare', brief, '--out', out, '--method', 'panel'], {
        folder: folder(),
        env,
      })
      expect(status).toBe(0)
    }
    expect((await readdir(join(folder(), 'cache', 'sectionwright'))).length).toBeGreaterThan(2)
    for (const name of ['polars.csv', 'pressures.csv', 'wing.csv']) {
      const [fresh, kept] = await Promise.all(
        ['fresh', 'kept'].map((out) => readFile(join(folder(), out, name))),
      )
      expect(kept!.equals(fresh!)).toBe(true)
    }
  })

  it('reads paths in a brief relative to the brief, and calls an entry by its name', async () => {
    const own = await writeBrief('lens.brief.json', { shortlist: [{ section: 'lens.txt', name: 'My lens' }] })
    const { status } = await here(['compare', own, '--out', 'lens', '--method', 'panel'])
    expect(status).toBe(0)
    const rows = cells(await readFile(join(folder(), 'lens', 'polars.csv'), 'utf8'))
    expect(rows[1]![0]).toBe('My lens')
    // -12 to 20 deg by half a degree, at the two Mach numbers of the lattice on either side of the flight's
    expect([...new Set(rows.slice(1).map((row) => row[3]))]).toEqual(['0', '0.15'])
    expect([rows[1]![5], rows[65]![5]]).toEqual(['-12', '20'])
    expect(rows).toHaveLength(1 + 2 * 65)
  })

  it('marks a bad entry and a condition that cannot be flown, computes the rest, and ends with 1', async () => {
    const marked = await writeBrief('marked.brief.json', {
      shortlist: [{ section: 'missing.txt' }, { section: 'naca:4412' }],
      conditions: [
        { name: 'Mapping', speed_m_s: 25, altitude_m: 600 },
        { name: 'Standing', speed_m_s: 0, altitude_m: 0 },
      ],
    })
    const { status, err } = await here(['compare', marked, '--out', 'marked', '--method', 'panel'])
    expect(status).toBe(1)
    expect(err).toContain('missing.txt')
    expect(err).toContain('Standing')
    const rows = cells(await readFile(join(folder(), 'marked', 'wing.csv'), 'utf8')).slice(1)
    expect(new Set(rows.map((row) => `${row[0]} ${row[2]}`))).toEqual(new Set(['naca:4412 Mapping']))
  })

  it('marks a limit on a figure that there is not, and ends with 1', async () => {
    const limited = await writeBrief('limited.brief.json', {
      limits: [{ figure: 'beauty', at_least: 3 }],
    })
    const { status, err } = await here(['wing', limited, '--method', 'panel'])
    expect(status).toBe(1)
    expect(err).toContain('beauty')
  })
})

describe('bad input of briefs', () => {
  const wing = { area_m2: 1.1, span_m: 3.6 }
  const bad: [why: string, over: Record<string, unknown> | string, says: string][] = [
    ['no JSON', '{ "format": ', 'bad.brief.json'],
    ['an empty file', '', 'bad.brief.json'],
    ['another format', { format: 'letter' }, 'format'],
    ['a later version', { version: 2 }, 'version'],
    ['an unknown field', { colour: 'red' }, 'colour'],
    ['zero area', { wing: { ...wing, area_m2: 0 } }, 'area_m2'],
    ['negative span', { wing: { ...wing, span_m: -3 } }, 'span_m'],
    ['no mass', { aircraft: {} }, 'mass_kg'],
    [
      'an altitude too low',
      { conditions: [{ name: 'Deep', speed_m_s: 20, altitude_m: -1001 }] },
      '"conditions.0.altitude_m"',
    ],
    [
      'an altitude too high',
      { conditions: [{ name: 'High', speed_m_s: 20, altitude_m: 20001 }] },
      '"conditions.0.altitude_m"',
    ],
    ['no usable entry', { shortlist: [{ section: 'missing.txt' }] }, 'missing.txt'],
    ['an empty shortlist', { shortlist: [] }, 'shortlist'],
  ]

  it.each(bad)('%s ends with 2, a message, and nothing written', async (_why, over, says) => {
    const path = join(folder(), 'briefs', 'bad.brief.json')
    await writeFile(path, typeof over === 'string' ? over : briefText(over))
    const before = await readdir(folder())
    const { status, out, err } = await here(['compare', 'briefs/bad.brief.json', '--out', 'never'])
    expect([status, out]).toEqual([2, ''])
    expect(err).toContain(says)
    expect(err).not.toContain('a fault of this program')
    expect(await readdir(folder())).toEqual(before)
  })

  const calls: [why: string, args: string[], says: string][] = [
    ['no brief', ['wing'], 'brief'],
    ['two briefs', ['wing', 'a.json', 'b.json'], 'one brief'],
    ['a missing brief', ['wing', 'missing.json'], 'missing.json'],
    ['no folder', ['compare', 'briefs/small.brief.json'], '--out'],
    [
      'a file for a folder',
      ['compare', 'briefs/small.brief.json', '--out', 'briefs/small.brief.json'],
      'it is a file',
    ],
    ['a folder below a file', ['compare', 'briefs/small.brief.json', '--out', 'briefs/lens.txt/x'], 'folder'],
    ['half a pair', ['wing', 'briefs/small.brief.json', '--root', 'naca:2412'], '--tip'],
    [
      'a method that there is not',
      ['wing', 'briefs/small.brief.json', '--method', 'exact'],
      'thin or panel or viscous',
    ],
    [
      'a bad section of several',
      ['wing', 'briefs/small.brief.json', '--section', 'naca:2412', '--section', 'missing.txt'],
      'missing.txt',
    ],
    ['a bad section', ['wing', 'briefs/small.brief.json', '--section', 'missing.txt'], 'missing.txt'],
  ]

  it.each(calls)('%s ends with 2 and a message', async (_why, args, says) => {
    const { status, out, err } = await here(args)
    expect([status, out]).toEqual([2, ''])
    expect(err).toContain(says)
    expect(err).not.toContain('a fault of this program')
  })
})
