import { describe, expect, it } from 'vitest'
import { BadInput } from '../../../src/core/numerics/errors'
import {
  checkStations,
  meanAerodynamicChord,
  stationAt,
  taperedStations,
} from '../../../src/core/wing/planform'

const stations = taperedStations(10, 10, 0.5, 0.04)

describe('a straight-tapered wing', () => {
  it('has the area, the span, the taper and the washout asked for', () => {
    // Root chord 2 x 10 / (10 x 1.5) = 1.3333 m.
    expect(stations).toEqual([
      { y: 0, chord: expect.closeTo(4 / 3, 12), twist: 0 },
      { y: 5, chord: expect.closeTo(2 / 3, 12), twist: -0.04 },
    ])
    expect(() => checkStations(stations, 10, 10)).not.toThrow()
  })

  it.each([
    ['area', 0, 10, 0.5, 0],
    ['area', Number.NaN, 10, 0.5, 0],
    ['span', 10, -1, 0.5, 0],
    ['span', 10, Infinity, 0.5, 0],
    ['tip chord of zero', 10, 10, 0, 0],
    ['washout', 10, 10, 0.5, Number.NaN],
  ])('is refused by its %s', (word, area, span, taper, washout) => {
    expect(() => taperedStations(area, span, taper, washout)).toThrow(BadInput)
    expect(() => taperedStations(area, span, taper, washout)).toThrow(word)
  })
})

describe('the mean aerodynamic chord', () => {
  it.each([1, 0.6, 0.2])('of taper %d follows the closed forms of the straight taper', (taper) => {
    // c = 2/3 c_root (1 + t + t^2)/(1 + t), y = b/6 (1 + 2 t)/(1 + t), e.g. Torenbeek, Synthesis of Subsonic
    // Airplane Design (1982), appendix A.
    const tapered = taperedStations(10, 10, taper, 0)
    const mean = meanAerodynamicChord(tapered)
    const root = tapered[0].chord
    expect(mean.chord).toBeCloseTo(((2 / 3) * root * (1 + taper + taper ** 2)) / (1 + taper), 12)
    expect(mean.y).toBeCloseTo(((10 / 6) * (1 + 2 * taper)) / (1 + taper), 12)
  })

  it('of a wing with a kink does not change when a station is put on a straight stretch', () => {
    const kinked = [
      { y: 0, chord: 1.2, twist: 0 },
      { y: 2, chord: 1.2, twist: 0 },
      { y: 5, chord: 0.6, twist: -0.03 },
    ]
    const more = [kinked[0], kinked[1], stationAt(kinked, 3.3), kinked[2]]
    expect(meanAerodynamicChord(more).chord).toBeCloseTo(meanAerodynamicChord(kinked).chord, 12)
    expect(meanAerodynamicChord(more).y).toBeCloseTo(meanAerodynamicChord(kinked).y, 12)
  })
})

describe('stations', () => {
  it('give chord and twist linearly between them', () => {
    expect(stationAt(stations, 2.5).chord).toBeCloseTo(1, 12)
    expect(stationAt(stations, 2.5).twist).toBeCloseTo(-0.02, 12)
  })

  it.each([
    ['an area that differs by 1 %', 10.1, 10, /area/],
    ['a span that differs', 10, 11, /span/],
    ['an area that is no number', Number.NaN, 10, /area/],
  ])('refuse %s', (_, area, span, words) => {
    expect(() => checkStations(stations, area, span)).toThrow(words)
  })

  it('agree with area and span within 0.1 %', () => {
    expect(() => checkStations(stations, 10.009, 10.009)).not.toThrow()
    expect(() => checkStations(stations, 10.011, 10)).toThrow(/area/)
  })

  it.each([
    ['a single one', [stations[0]], /at least two/],
    ['a first one off the centreline', [{ ...stations[0], y: 1 }, stations[1]], /station 1/],
    ['a chord of zero', [stations[0], { ...stations[1], chord: 0 }], /station 2.*chord/],
    ['a chord that is no number', [stations[0], { ...stations[1], chord: Number.NaN }], /station 2.*chord/],
    ['a twist that is no number', [stations[0], { ...stations[1], twist: Number.NaN }], /station 2.*twist/],
    ['an order that goes back', [stations[0], { ...stations[1], y: 0 }], /station 2/],
  ])('refuse %s', (_, given, words) => {
    expect(() => checkStations(given, 10, 10)).toThrow(words)
  })
})
