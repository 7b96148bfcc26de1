import { fc, test } from '@fast-check/vitest'
import { describe, expect, it } from 'vitest'
import { panelLoads } from '../../../src/core/flow/panelLoads'
import { solvePanels } from '../../../src/core/flow/vortexPanels'
import { BadInput } from '../../../src/core/numerics/errors'
import { nacaSection } from '../../../src/core/shape/naca'
import { sectionFromPoints } from '../../../src/core/shape/normalise'
import { placePanels } from '../../../src/core/shape/panels'
import type { Section } from '../../../src/core/shape/section'

type Point = [number, number]
const pointsOf = ({ x, y }: Section): Point[] => Array.from(x, (value, i) => [value, y[i]])
const liftOf = (section: Section): number =>
  panelLoads(solvePanels(placePanels(section)), 0.07).liftCoefficient
const read = (points: Point[], chordLine: 'file' | 'longest' | null = 'longest') =>
  sectionFromPoints({ kind: 'loop', points }, { name: 'test', chordLine })

const codes = fc
  .tuple(fc.constantFrom('24', '44', '00', '63', '230', '231'), fc.integer({ min: 8, max: 21 }))
  .map(([line, thickness]) => `${line}${String(thickness).padStart(2, '0')}`)

describe('a section from points', () => {
  test.prop(
    [
      codes,
      fc.constantFrom('closed' as const, 'open' as const),
      fc.double({ min: 0.01, max: 1000, noNaN: true }),
      fc.double({ min: -1.4, max: 1.4, noNaN: true }),
      fc.tuple(fc.double({ min: -5, max: 5, noNaN: true }), fc.double({ min: -5, max: 5, noNaN: true })),
      fc.boolean(),
      fc.integer({ min: 0, max: 300 }),
    ],
    { numRuns: 60 },
  )(
    'keeps its lift to 1e-6 when it is scaled, turned, shifted, reversed and begun elsewhere',
    (code, edge, size, angle, [dx, dy], reverse, start) => {
      const first = read(pointsOf(nacaSection(code, { edge }))).section
      const [c, s] = [Math.cos(angle), Math.sin(angle)]
      let points = pointsOf(first).map(([x, y]): Point => [
        dx + size * (c * x - s * y),
        dy + size * (s * x + c * y),
      ])
      if (edge === 'closed') points.pop()
      points = [...points.slice(start), ...points.slice(0, start)]
      if (reverse) points.reverse()
      const { section, understood } = read(points)
      expect(Math.abs(liftOf(section) - liftOf(first))).toBeLessThan(1e-6)
      expect(Math.abs(understood.chord / size - 1)).toBeLessThan(1e-9)
    },
  )

  const turned = (deg: number): Point[] => {
    const { section } = read(pointsOf(nacaSection('2412')))
    const [c, s] = [Math.cos((deg * Math.PI) / 180), Math.sin((deg * Math.PI) / 180)]
    return pointsOf(section).map(([x, y]) => [c * x + s * y, c * y - s * x])
  }

  it('keeps an axis 0.9 deg off its longest chord, reports the angle, and turns one 1.1 deg off', () => {
    const kept = read(turned(0.9), null).understood
    expect(kept.turned).toBe(false)
    expect((kept.longestChordAngle * 180) / Math.PI).toBeCloseTo(0.9, 6)
    expect(read(turned(1.1), null).understood.turned).toBe(true)
    expect(read(turned(8), 'file').understood.turned).toBe(false)
    expect(read(turned(0.2), 'longest').understood.turned).toBe(true)
  })

  it('keeps its own axis with the foremost point at x = 0 and the middle of the edge at (1, 0)', () => {
    const { section } = read(turned(0.9), 'file')
    expect(Math.min(...section.x)).toBeGreaterThan(-1e-12)
    expect(Math.min(...section.x)).toBeLessThan(1e-4)
    expect(section.x[0]).toBeCloseTo(1, 12)
    expect(section.y[0]).toBeCloseTo(0, 12)
  })

  it.each([
    ['too few points', pointsOf(nacaSection('2412')).filter((_, i) => i % 50 === 0), /at least 10/],
    [
      'a coordinate that is no number',
      pointsOf(nacaSection('2412')).map(([x, y], i): Point => [x, i === 7 ? NaN : y]),
      /not a finite/,
    ],
    ['a flat plate', pointsOf(nacaSection('2412')).map(([x]): Point => [x, 0.1 * x]), /encloses no area/],
    ['too many points', Array.from({ length: 5001 }, (_, i): Point => [i, 0]), /at most 5000/],
  ])('refuses %s', (_, points, words) => {
    expect(() => read(points)).toThrow(BadInput)
    expect(() => read(points)).toThrow(words)
  })
})
