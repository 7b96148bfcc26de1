import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { alphaForLift, panelLoads } from '../../../src/core/flow/panelLoads'
import { solvePanels } from '../../../src/core/flow/vortexPanels'
import { BadInput } from '../../../src/core/numerics/errors'
import { nacaSection } from '../../../src/core/shape/naca'
import { placePanels } from '../../../src/core/shape/panels'

const flow = solvePanels(placePanels(nacaSection('2412')))
const DEG = Math.PI / 180

describe('the loads on panels', () => {
  it('are asked for at the angle that gives a lift, at any Mach number of the range', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -0.6, max: 1.2, noNaN: true }),
        fc.double({ min: 0, max: 0.5, noNaN: true }),
        (lift, mach) => {
          const alpha = alphaForLift(flow, lift, mach)
          expect(alpha).not.toBeNull()
          expect(panelLoads(flow, alpha ?? NaN, mach).liftCoefficient).toBeCloseTo(lift, 8)
        },
      ),
    )
  })

  it('have no angle for a lift beyond the potential flow', () => {
    expect(alphaForLift(flow, 9)).toBeNull()
    expect(alphaForLift(flow, 9, 0.3)).toBeNull()
  })

  it('grow with the Mach number nearly by the rule of Prandtl and Glauert when the section is thin', () => {
    const thin = solvePanels(placePanels(nacaSection('0004')))
    const slope = (mach: number): number => panelLoads(thin, 0.5 * DEG, mach).liftCoefficient
    // Thickness adds to the first-order rule; at 4 % it stays within 2 %.
    expect(slope(0.4) / slope(0) / (1 / Math.sqrt(1 - 0.16))).toBeGreaterThan(0.99)
    expect(slope(0.4) / slope(0) / (1 / Math.sqrt(1 - 0.16))).toBeLessThan(1.02)
  })

  it('are marked when the flow turns sonic and stay finite beyond', () => {
    expect(panelLoads(flow, 2 * DEG, 0.4).reason).toBe('')
    const beyond = panelLoads(flow, 20 * DEG, 0.5)
    expect(beyond.reason).toBe('the flow turns sonic on the surface')
    expect(beyond.pressureCoefficient.every(Number.isFinite)).toBe(true)
  })

  it('refuse a Mach number outside 0 to 0.5', () => {
    for (const mach of [-0.1, 0.51, NaN]) expect(() => panelLoads(flow, 0, mach)).toThrow(BadInput)
  })

  it('put the stagnation point on the nose of a symmetric section at no incidence, and below it when lifting', () => {
    const symmetric = solvePanels(placePanels(nacaSection('0012')))
    const level = panelLoads(symmetric, 0).stagnation
    expect(Math.hypot(level.x, level.y)).toBeLessThan(1e-6)
    expect(panelLoads(symmetric, 6 * DEG).stagnation.y).toBeLessThan(-0.005)
  })

  it('find no drag in potential flow', () => {
    const { along, across } = flow.weights
    for (const alpha of [-2 * DEG, 0, 4 * DEG, 8 * DEG]) {
      const { pressureCoefficient } = panelLoads(flow, alpha)
      let drag = 0
      pressureCoefficient.forEach(
        (cp, i) => (drag += cp * (along[i] * Math.cos(alpha) + across[i] * Math.sin(alpha))),
      )
      // Left by 180 panels of second order.
      expect(Math.abs(drag)).toBeLessThan(5e-4)
    }
  })
})
