import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { panelLoads } from '../../../src/core/flow/panelLoads'
import { solvePanels } from '../../../src/core/flow/vortexPanels'
import { nacaSection } from '../../../src/core/shape/naca'
import { placePanels, type Panels } from '../../../src/core/shape/panels'
import { angles, edges, nacaCodes } from '../../support/naca'

/** Rounding in the solution of 81 equations. */
const ROUNDING = 1e-8
const panelsOf = (code: string, edge: 'closed' | 'open', count = 80): Panels =>
  placePanels(nacaSection(code, { edge }), count)

const mapped = ({ x, y }: Panels, place: (x: number, y: number) => [number, number]): Panels => ({
  x: x.map((value, i) => place(value, y[i])[0]),
  y: y.map((value, i) => place(x[i], value)[1]),
})

describe('vortex panels', () => {
  it('give a lift that is linear in the sine and cosine of the angle', () => {
    fc.assert(
      fc.property(nacaCodes, edges, angles, (code, edge, alpha) => {
        const flow = solvePanels(panelsOf(code, edge))
        const lift = (at: number): number => panelLoads(flow, at).liftCoefficient
        const expected = lift(0) * Math.cos(alpha) + lift(0.5 * Math.PI) * Math.sin(alpha)
        expect(Math.abs(lift(alpha) - expected)).toBeLessThan(ROUNDING)
      }),
      { numRuns: 40 },
    )
  })

  it('give a mirrored section mirrored results', () => {
    fc.assert(
      fc.property(nacaCodes, edges, angles, (code, edge, alpha) => {
        const panels = panelsOf(code, edge)
        const mirrored = { x: panels.x.toReversed(), y: panels.y.toReversed().map((y) => -y) }
        const loads = panelLoads(solvePanels(panels), alpha)
        const other = panelLoads(solvePanels(mirrored), -alpha)
        expect(Math.abs(loads.liftCoefficient + other.liftCoefficient)).toBeLessThan(ROUNDING)
        expect(Math.abs(loads.momentCoefficient + other.momentCoefficient)).toBeLessThan(ROUNDING)
        expect(Math.abs(loads.stagnation.x - other.stagnation.x)).toBeLessThan(1e-6)
        expect(Math.abs(loads.stagnation.y + other.stagnation.y)).toBeLessThan(1e-6)
      }),
      { numRuns: 40 },
    )
  })

  it('give the same lift from pressure and from circulation to 0.5 % or 0.002 at the default panels', () => {
    fc.assert(
      fc.property(nacaCodes, edges, angles, (code, edge, alpha) => {
        const loads = panelLoads(solvePanels(panelsOf(code, edge, 180)), alpha)
        const allowed = Math.max(0.005 * Math.abs(loads.liftCoefficient), 0.002)
        expect(Math.abs(loads.liftFromPressure - loads.liftCoefficient)).toBeLessThan(allowed)
      }),
      { numRuns: 60 },
    )
  })

  it('do not care how the section is turned or how large it is', () => {
    fc.assert(
      fc.property(
        nacaCodes,
        edges,
        angles,
        fc.double({ min: -3, max: 3, noNaN: true }),
        (code, edge, alpha, turn) => {
          const panels = panelsOf(code, edge)
          const [c, s] = [Math.cos(turn), Math.sin(turn)]
          const turned = mapped(panels, (x, y) => [c * x - s * y + 7, s * x + c * y - 2])
          const doubled = mapped(panels, (x, y) => [2 * x, 2 * y])
          const lift = panelLoads(solvePanels(panels), alpha).liftCoefficient
          expect(Math.abs(panelLoads(solvePanels(turned), alpha + turn).liftCoefficient - lift)).toBeLessThan(
            1e-6,
          )
          expect(Math.abs(panelLoads(solvePanels(doubled), alpha).liftCoefficient - 2 * lift)).toBeLessThan(
            1e-6,
          )
        },
      ),
      { numRuns: 40 },
    )
  })

  it('change the lift without a jump as a blunt edge closes', () => {
    const { x, y } = nacaSection('4412')
    const lift = (gap: number): number => {
      const opened = y.map((value, i) => value + Math.sign(0.5 * y.length - 0.5 - i) * 0.5 * gap * x[i])
      return panelLoads(solvePanels(placePanels({ x, y: opened })), 0.07).liftCoefficient
    }
    const closed = lift(0)
    for (const gap of [1e-7, 1e-6, 1e-5, 1e-4, 1e-3]) {
      expect(Math.abs(lift(gap) - closed)).toBeLessThan(1e-4 + gap)
    }
  })

  it('settle at second order on a blunt edge too', () => {
    const lift = (count: number): number =>
      panelLoads(solvePanels(panelsOf('2424', 'open', count)), 0.07).liftCoefficient
    const order = Math.log2((lift(180) - lift(90)) / (lift(360) - lift(180)))
    expect(order).toBeGreaterThan(1.7)
    expect(order).toBeLessThan(2.3)
  })

  it('agree with the exact lift of a circle and of an ellipse to 2e-4', () => {
    // 2 pi (1 + thickness) sin(alpha): Milne-Thomson, Theoretical Aerodynamics (1966), section 6.31.
    for (const thickness of [1, 0.3, 0.12]) {
      const turns = Array.from({ length: 201 }, (_, i) => (2 * Math.PI * i) / 200)
      const outline = {
        x: Float64Array.from(turns, (turn) => 0.5 + 0.5 * Math.cos(turn)),
        y: Float64Array.from(turns, (turn) => 0.5 * thickness * Math.sin(turn)),
      }
      const lift = panelLoads(solvePanels(placePanels(outline)), 0.1).liftCoefficient
      expect(Math.abs(lift - 2 * Math.PI * (1 + thickness) * Math.sin(0.1))).toBeLessThan(2e-4)
    }
  })

  it('count the vorticity along a slanted base in the lift', () => {
    const { x, y } = nacaSection('0018')
    const kept = [...x.keys()].filter((i) => x[i] < (i < 160 ? 0.94 : 0.95))
    const cut = { x: Float64Array.from(kept, (i) => x[i]), y: Float64Array.from(kept, (i) => y[i]) }
    const loads = panelLoads(solvePanels(placePanels(cut)), 0.1)
    // The base pressure is that of the edge only roughly: 1 % on a base of 4 % of the chord.
    expect(Math.abs(loads.liftFromPressure / loads.liftCoefficient - 1)).toBeLessThan(0.01)
  })

  it('report an outline without a solution instead of numbers that are none', () => {
    const flow = solvePanels({ x: new Float64Array(41), y: new Float64Array(41) })
    expect(flow.solved).toBe(false)
    const loads = panelLoads(flow, 0.1)
    expect(loads.reason).toBe('the panel equations have no solution for this outline')
    expect(Number.isFinite(loads.liftCoefficient)).toBe(true)
  })
})
