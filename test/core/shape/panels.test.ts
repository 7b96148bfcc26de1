import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { BadInput } from '../../../src/core/numerics/errors'
import { nacaSection } from '../../../src/core/shape/naca'
import { placePanels } from '../../../src/core/shape/panels'
import { edges, nacaCodes } from '../../support/naca'

describe('the panels of a section', () => {
  it('begin and end at the trailing edge of the section', () => {
    fc.assert(
      fc.property(nacaCodes, edges, fc.integer({ min: 40, max: 400 }), (code, edge, count) => {
        const section = nacaSection(code, { edge })
        const { x, y } = placePanels(section, count)
        const last = section.x.length - 1
        expect(x.length).toBe(count + 1)
        expect(Math.hypot(x[0] - section.x[0], y[0] - section.y[0])).toBeLessThan(1e-9)
        expect(Math.hypot(x[count] - section.x[last], y[count] - section.y[last])).toBeLessThan(1e-9)
      }),
      { numRuns: 40 },
    )
  })

  it('differ from their neighbours in length by less than a third at the default count', () => {
    fc.assert(
      fc.property(nacaCodes, edges, (code, edge) => {
        const { x, y } = placePanels(nacaSection(code, { edge }))
        const length = (i: number): number => Math.hypot(x[i + 1] - x[i], y[i + 1] - y[i])
        for (let i = 1; i < 180; i++) {
          const ratio = length(i) / length(i - 1)
          expect(Math.max(ratio, 1 / ratio)).toBeLessThan(4 / 3)
        }
      }),
      { numRuns: 60 },
    )
  })

  it('draw together where the nose is sharper', () => {
    const noseShare = (code: string): number =>
      placePanels(nacaSection(code)).x.filter((x) => x < 0.01).length
    expect(noseShare('0006')).toBeGreaterThan(noseShare('0018'))
  })

  it.each([39, 401, 100.5, NaN])('are refused when there would be %d of them', (count) => {
    expect(() => placePanels(nacaSection('0012'), count)).toThrow(BadInput)
  })
})
