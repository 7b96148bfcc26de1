import { describe, expect, it } from 'vitest'
import { reportPoints, spans } from '../../src/cli/reportPoints'
import type { Polar, PolarPoint } from '../../src/core'

const point = (alphaDeg: number, converged: boolean, reason: string): PolarPoint => ({
  ...{ alpha: (alphaDeg * Math.PI) / 180, liftCoefficient: null, dragCoefficient: null, converged, reason },
  ...{ momentCoefficient: null, transitionUpper: null, transitionLower: null },
})

const polar = (reynolds: number, points: readonly PolarPoint[]): Polar => ({
  ...{ method: 'viscous', reynolds, mach: 0, surface: 'clean', amplification: 9 },
  ...{ tripUpper: 1, tripLower: 1, flap: 0, points, between: [], maxLift: null, minLift: null },
})

function said(polars: readonly Polar[]): { lines: string[]; status: number } {
  const lines: string[] = []
  const status = reportPoints(
    polars.map((one) => ({ section: 'rib', polar: one })),
    (line) => lines.push(line),
  )
  return { lines, status }
}

describe('spans', () => {
  it.each([
    [[0], '-4'],
    [[0, 1], '-4, -3.5'],
    [[0, 1, 2], '-4 to -3'],
    [[0, 2, 3, 4, 6], '-4, -3 to -2, -1'],
  ])('words the places %j', (at, words) => {
    expect(spans([-4, -3.5, -3, -2.5, -2, -1.5, -1], at)).toBe(words)
  })
})

describe('the report of marked points', () => {
  it('says nothing of points without a mark', () => {
    expect(said([polar(1e6, [point(0, true, '')])])).toEqual({ lines: [], status: 0 })
  })

  it('takes reasons that differ in numbers only for one, and shows those of the first', () => {
    const points = [0.1, 0.2, 0.3, 0.4].map((angle) => point(angle, false, `left ${angle}e-2 after 40`))
    expect(said([polar(1e6, points)])).toEqual({
      lines: ['rib, 0.1 to 0.4 deg: not converged, left empty: left 0.1e-2 after 40'],
      status: 1,
    })
  })

  it('parts the notes of a converged point, which do not change the status', () => {
    const points = [point(0, true, 'one; two'), point(1, true, 'two')]
    expect(said([polar(1e6, points)])).toEqual({
      lines: ['rib, 0 deg: one', 'rib, 0, 1 deg: two'],
      status: 0,
    })
  })

  it('names the Reynolds number where there are several', () => {
    const marked = [point(0, false, '')]
    expect(said([polar(2e5, marked), polar(1e6, [])]).lines).toEqual([
      'rib at Reynolds number 200000, 0 deg: not converged, left empty: no reason is known',
    ])
  })
})
