import { describe, expect, it } from 'vitest'
import { linearLiftingLine, type LinearWing } from '../../../src/core/wing/linearSections'
import { wingLiftSlope } from '../../../src/core/wing/liftingLine'
import { taperedStations } from '../../../src/core/wing/planform'
import { quickSlopes } from '../../../src/core/wing/quickFormulas'

const SECTION = { slope: 2 * Math.PI, zeroLift: 0, momentAtZeroLift: 0 }

function wing(span: number, taper = 0.45, sweepQuarterChord = 0): LinearWing {
  const rest = { sparAt: 0.3, skinThickness: 0, flap: null }
  const stations = taperedStations(10, span, taper, 0)
  return { shape: { area: 10, span, stations, sweepQuarterChord, ...rest }, root: SECTION, tip: SECTION }
}

describe('quick formulas beside the lifting line', () => {
  it('agree with it within 5 % on an unswept wing of aspect ratio 6, and say nothing', () => {
    const given = wing(Math.sqrt(60))
    const ours = wingLiftSlope(linearLiftingLine(given))
    const quick = quickSlopes(given, 0)
    // 5 %: the formulas leave the taper out, the lifting line the finite chord (common practice).
    expect(Math.abs(quick.helmbold / ours - 1)).toBeLessThan(0.05)
    expect(Math.abs(quick.handbook / ours - 1)).toBeLessThan(0.05)
    expect(quick.warnings).toEqual([])
  })

  it('read lower than it at aspect ratio 2, where the lifting line reads high', () => {
    const given = wing(Math.sqrt(20))
    expect(quickSlopes(given, 0).helmbold).toBeLessThan(wingLiftSlope(linearLiftingLine(given)))
  })

  it('are equal to each other for sections of 2 pi without half-chord sweep at Mach 0', () => {
    const quick = quickSlopes(wing(8, 1), 0)
    expect(quick.handbook).toBeCloseTo(quick.helmbold, 12)
  })

  it.each([
    ['a high aspect ratio', wing(15), 0, 'low aspect ratio'],
    ['sweep', wing(8, 0.45, 0.3), 0, 'sweep'],
    ['a Mach number that is felt', wing(8), 0.4, 'Mach'],
    ['a Mach number of the drag rise', wing(8), 0.8, 'drag rise'],
  ])('warn in plain words of %s', (_, given, mach, words) => {
    expect(quickSlopes(given, mach).warnings.join()).toContain(words)
  })
})
