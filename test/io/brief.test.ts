import { describe, expect, it } from 'vitest'
import { readBrief, writeBrief } from '../../src/io/brief'
import { jobFromBrief } from '../../src/io/job'
import { FileProblem } from '../../src/io/problem'
import { briefText } from '../support/briefs'

const read = (over: object = {}) => readBrief(briefText(over as Record<string, unknown>), 'b.json')
const job = (over: object = {}) =>
  jobFromBrief(read(over), 'b.json', () => new Uint8Array(), { method: 'panel' })

describe('a brief', () => {
  it('has the defaults of its version', () => {
    const brief = read()
    expect(brief.wing.spar_at_chord_fraction).toBe(0.3)
    expect(brief.air.turbulence_percent).toBe(0.07)
    expect(brief.conditions[1]).toMatchObject({
      load_factor: 1,
      surface: 'clean',
      isa_offset_K: 0,
      mass_kg: null,
    })
    expect(brief.rank_by).toBeNull()
  })

  it('comes back the same from the text that it is written to', () => {
    const brief = read({
      limits: [{ figure: 'drag_N', at_most: 10, condition: 'Mapping' }],
      air: { amplification: 7 },
      shortlist: [
        {
          section: 'my rib.txt',
          coordinates: [
            [1, 0],
            [0.5, 0.1],
            [0, 0],
            [0.5, -0.1],
            [1, 0],
          ],
          colour: 3,
        },
      ],
    })
    const text = writeBrief(brief)
    expect(readBrief(text, 'again.json')).toEqual(brief)
    expect(text).toContain('[0.5, 0.1]')
    expect(text).not.toContain('null')
  })

  it('keeps a name that looks like a pair of numbers to the letter', () => {
    expect(readBrief(writeBrief(read({ name: 'Mix [ 1, 2 ]' })), 'again.json').name).toBe('Mix [ 1, 2 ]')
  })

  it.each([
    ['an unknown field', { colour: 'red' }, '"colour"'],
    ['an unknown field within', { wing: { area_m2: 1, span_m: 3, chord_m: 1 } }, '"wing.chord_m"'],
    ['a missing mass', { aircraft: {} }, '"aircraft.mass_kg" is missing'],
    ['a zero area', { wing: { area_m2: 0, span_m: 3 } }, '"wing.area_m2"'],
    ['a negative span', { wing: { area_m2: 1, span_m: -3 } }, '"wing.span_m"'],
    [
      'an altitude too high',
      { conditions: [{ name: 'x', speed_m_s: 20, altitude_m: 20001 }] },
      '"conditions.0.altitude_m"',
    ],
    ['a later version', { version: 2 }, 'version 2'],
    ['another format', { format: 'recipe' }, 'no brief'],
    [
      'both turbulence and amplification',
      { air: { turbulence_percent: 0.1, amplification: 9 } },
      'both given',
    ],
    ['a word for a speed', { conditions: [{ name: 'x', speed_m_s: 'fast' }] }, '"conditions.0.speed_m_s"'],
  ])('with %s is refused and the place named', (_, over, words) => {
    expect(() => read(over)).toThrow(FileProblem)
    expect(() => read(over)).toThrow(words)
  })

  it('that is no JSON is refused with its line', () => {
    expect(() => readBrief('{\n"format": ,\n}', 'b.json')).toThrow(/b\.json.*not JSON/)
  })
})

describe('the job of a brief', () => {
  it('takes radians, metres and the mass of the aircraft', () => {
    const { job: made } = job({
      conditions: [
        { name: 'x', speed_m_s: 20, mass_kg: 30 },
        { name: 'y', speed_m_s: 20 },
      ],
    })
    expect(made.wing.stations[1]!.twist).toBeCloseTo((-2 * Math.PI) / 180, 12)
    expect(made.conditions.map((condition) => condition.mass)).toEqual([30, 24])
    // Mack's relation at 0.07 per cent: -8.43 - 2.4 ln 0.0007 = 9.00.
    expect(made.amplification).toBeCloseTo(9.0, 1)
  })

  it('gives a repeated name a number', () => {
    const { job: made } = job({ shortlist: [{ section: 'naca:2412' }, { section: 'naca:2412' }] })
    expect(made.entries.map((entry) => entry.name)).toEqual(['naca:2412', 'naca:2412 (2)'])
  })

  it('gives no two entries one name, even when one is called like a numbered repeat', () => {
    const shortlist = [
      { section: 'naca:2412' },
      { section: 'naca:2412' },
      { section: 'naca:2415', name: 'naca:2412 (2)' },
    ]
    const names = job({ shortlist }).job.entries.map((entry) => entry.name)
    expect(new Set(names).size).toBe(3)
    expect(names.slice(0, 2)).toEqual(['naca:2412', 'naca:2412 (2)'])
  })

  it('names the fault of one entry and of one limit, and keeps the rest', () => {
    const { job: made, faults } = job({
      shortlist: [{ section: 'naca:2412' }, { section: 'naca:2012' }, { root: 'naca:2412' }],
      limits: [
        { figure: 'beauty', at_least: 1 },
        { figure: 'drag_N', at_most: 1, condition: 'nowhere' },
        { figure: 'drag_N' },
      ],
    })
    expect(made.entries.map((entry) => entry.fault === null)).toEqual([true, false, false])
    expect(faults.join('\n')).toMatch(/2012/)
    expect(faults.join('\n')).toMatch(/no such figure/)
    expect(faults.join('\n')).toMatch(/no condition "nowhere"/)
    expect(faults.join('\n')).toMatch(/either at_most or at_least/)
    expect(faults).toHaveLength(5)
  })

  it('is refused when no entry can be used', () => {
    expect(() => job({ shortlist: [{ section: 'naca:2012' }] })).toThrow(
      /no entry of the shortlist can be used/,
    )
    expect(() => job({ shortlist: [] })).toThrow(/the shortlist is empty/)
  })

  it('is refused when stations and wing disagree', () => {
    const stations = [
      { y_m: 0, chord_m: 0.4 },
      { y_m: 1.8, chord_m: 0.4 },
    ]
    expect(() => job({ wing: { area_m2: 1.1, span_m: 3.6, stations } })).toThrow(/area/)
    expect(() => job({ wing: { area_m2: 1.44, span_m: 3.6, stations } })).not.toThrow()
  })
})
