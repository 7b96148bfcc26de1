import { describe, expect, it } from 'vitest'
import { solvePanels } from '../../../src/core/flow/vortexPanels'
import { CRITICAL_DIFFERENCE, noseLimits, pressureDifference } from '../../../src/core/polar/noseSuction'
import { nacaSection } from '../../../src/core/shape/naca'
import { placePanels } from '../../../src/core/shape/panels'

const flowOf = (code: string): ReturnType<typeof solvePanels> =>
  solvePanels(placePanels(nacaSection(code), 180))

describe('the limit of a nose', () => {
  it('is the angle at which the pressures of trailing edge and suction peak differ by 14', () => {
    const flow = flowOf('0009')
    const { above, below } = noseLimits(flow)
    expect(pressureDifference(flow, above!)).toBeCloseTo(CRITICAL_DIFFERENCE, 6)
    expect(below!).toBeCloseTo(-above!, 4)
  })

  it('comes earlier on a thinner nose, and hardly ever on a thick one', () => {
    const [thin, common, thick] = ['0006', '0012', '0024'].map((code) => noseLimits(flowOf(code)).above)
    expect(thin!).toBeLessThan(0.7 * common!)
    expect(thick ?? Infinity).toBeGreaterThan(1.4 * common!)
  })

  it('lies higher where camber turns the nose into the flow', () => {
    const { above, below } = noseLimits(flowOf('4412'))
    const plain = noseLimits(flowOf('0012')).above!
    expect(above!).toBeGreaterThan(plain - 0.02)
    expect(-below!).toBeLessThan(plain)
  })
})
