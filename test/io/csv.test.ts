import { describe, expect, it } from 'vitest'
import type { Polar, PolarPoint } from '../../src/core'
import { NO_LIMITS } from '../../src/core/polar/polar'
import { degrees, polarCsv, polarJson, wingCsv } from '../../src/io/csv'
import { wingJson } from '../../src/io/wingJson'
import { comparisonOf, MAPPING, SLOWEST } from '../support/comparisons'

const point = (change: Partial<PolarPoint> = {}): PolarPoint => ({
  alpha: -0,
  liftCoefficient: 0.1 + 0.2,
  dragCoefficient: null,
  momentCoefficient: -0,
  transitionUpper: null,
  transitionLower: null,
  converged: true,
  reason: '',
  ...change,
})

const polar = (points: PolarPoint[]): Polar => ({
  method: 'panel',
  reynolds: null,
  mach: 0,
  surface: 'clean',
  amplification: null,
  tripUpper: 1,
  tripLower: 1,
  flap: 0,
  ...NO_LIMITS,
  points,
})

describe('the polar CSV', () => {
  const line = (section: string, points: PolarPoint[]): string =>
    polarCsv([{ section, polar: polar(points) }]).split('\r\n')[1]!

  it('writes shortest numbers that come back to the bit, no minus zero, and empty cells for no value', () => {
    expect(line('naca:0012', [point()])).toBe(
      'naca:0012,panel,,0,clean,0,0.30000000000000004,,0,,,true,,1,1,0',
    )
  })

  it('keeps section to angle of a failed row and leaves its results empty', () => {
    const failed = point({ alpha: Math.PI / 60, converged: false, transitionUpper: 0.5 })
    expect(line('a', [failed])).toBe('a,panel,,0,clean,3,,,,,,false,,1,1,0')
  })

  it.each([
    ['a, b', '"a, b"'],
    ['the "best"', '"the ""best"""'],
    ['two\nlines', '"two\nlines"'],
  ])('quotes %j by RFC 4180', (name, cell) => {
    expect(polarCsv([{ section: name, polar: polar([point()]) }])).toContain(`\r\n${cell},panel,`)
  })

  it('ends with a line end, and without polars is the header alone', () => {
    expect(polarCsv([])).toMatch(/^section,method,.*,flap_deg\r\n$/)
  })

  it('gives whole degrees back whole', () => {
    for (let deg = -12; deg <= 20; deg += 0.5) expect(degrees((deg * Math.PI) / 180)).toBe(deg)
  })

  it('as JSON holds the same with null for empty and no minus zero', () => {
    const text = polarJson([{ section: 'a', polar: polar([point()]) }])
    expect(text).not.toMatch(/-0[,\s]/)
    expect(JSON.parse(text).polars[0].points[0]).toMatchObject({ alpha_deg: 0, drag_coefficient: null })
  })
})

describe('the wing files', () => {
  const comparison = comparisonOf()

  it('JSON has null and a note where a condition has no figures, and figures elsewhere', () => {
    const [first, pair] = JSON.parse(wingJson(comparison)).wings
    expect(first.conditions[SLOWEST]).toMatchObject({ lift_coefficient: null, stations: [] })
    expect(first.conditions[SLOWEST].note).toContain('viscous')
    expect(first.conditions[MAPPING].lift_coefficient).toBeGreaterThan(0.4)
    expect([pair.root, pair.tip]).toEqual(['naca:2415', 'naca:2412'])
  })

  it('CSV has a row for each station of the JSON, with the same figures', () => {
    const { wings } = JSON.parse(wingJson(comparison))
    const rows = wingCsv(comparison).trimEnd().split('\r\n').slice(1)
    const stations = wings.flatMap((wing: { conditions: { stations: object[] }[] }) =>
      wing.conditions.flatMap((condition) => condition.stations),
    )
    expect(rows).toHaveLength(stations.length)
    const [root] = wings[0].conditions[MAPPING].stations
    expect(rows[0]!.split(',').slice(3, 8).map(Number)).toEqual([
      root.y_m,
      root.chord_m,
      root.twist_deg,
      root.reynolds,
      root.lift_coefficient,
    ])
  })
})
