import { describe, expect, it } from 'vitest'
import { measure } from '../../../src/core/shape/measures'
import { sectionFromPoints } from '../../../src/core/shape/normalise'

/** Stations at which sections are commonly tabulated, and so few that a thin nose is a sharp corner. */
const STATIONS = [0, 0.0125, 0.025, 0.05, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95, 1]
const TENTHS = Array.from({ length: 11 }, (_, i) => i / 10)

/** A parabolic mean line with 4-digit thickness and a straight wedge that opens the edge by `gap`. */
function outline(xs: number[], thickness: number, gap: number): [number, number][] {
  const half = (x: number): number =>
    5 *
      thickness *
      (0.2969 * Math.sqrt(x) - 0.126 * x - 0.3516 * x ** 2 + 0.2843 * x ** 3 - 0.1036 * x ** 4) +
    0.5 * gap * x
  const camber = (x: number): number => 0.12 * x * (1 - x)
  return [
    ...xs.toReversed().map((x): [number, number] => [x, camber(x) + half(x)]),
    ...xs.slice(1).map((x): [number, number] => [x, camber(x) - half(x)]),
  ]
}

describe('the trailing edge of a loop', () => {
  it.each([
    ['common stations, 4 % thick', STATIONS, 0.04, 0.002],
    ['tenths, 12 % thick', TENTHS, 0.12, 0.01],
    ['tenths, 6 % thick', TENTHS, 0.06, 0.004],
  ] as const)(
    'is the open one and not the corner of a nose drawn by few points: %s',
    (_, xs, thickness, gap) => {
      const points = outline([...xs], thickness, gap)
      for (const begin of [0, 3, xs.length + 4]) {
        const moved = [...points.slice(begin), ...points.slice(0, begin)]
        const { section, understood } = sectionFromPoints(
          { kind: 'loop', points: moved },
          { name: 'thin', chordLine: null },
        )
        expect(understood.turned).toBe(false)
        expect(understood.restarted).toBe(begin !== 0)
        // The chord from the foremost point of the spline may be longer by that of a coarse nose: 1 %.
        expect(Math.abs(understood.edgeGap / gap - 1)).toBeLessThan(0.01)
        expect(measure(section).maxCamber).toBeGreaterThan(0.02)
      }
    },
  )

  it.each([20, -20])('of two lists spaced unlike and turned by %d deg keeps its upper side above', (deg) => {
    const [c, s] = [Math.cos((deg * Math.PI) / 180), Math.sin((deg * Math.PI) / 180)]
    const turned = (points: [number, number][]): [number, number][] =>
      points.map(([x, y]) => [c * x + s * y, c * y - s * x])
    const all = outline(TENTHS, 0.12, 0.002)
    const fine = outline(STATIONS, 0.12, 0.002)
    const raw = {
      kind: 'sides',
      upper: turned(all.slice(0, 11).reverse()),
      lower: turned(fine.slice(14)),
    } as const
    const { section, understood } = sectionFromPoints(raw, { name: 'sides', chordLine: null })
    expect(understood.exchanged).toBe(false)
    expect(measure(section).maxCamber).toBeGreaterThan(0.02)
  })
})
