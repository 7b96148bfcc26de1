import { describe, expect, it } from 'vitest'
import { FRICTION } from '../../../src/core/flow/boundaryLayer/stationRates'
import { arcLength, layersAt, type Layers } from '../../../src/core/flow/couplingState'
import { panelLoads } from '../../../src/core/flow/panelLoads'
import { viscousLoads, type ViscousLoads } from '../../../src/core/flow/viscousLoads'
import { solvePanels } from '../../../src/core/flow/vortexPanels'
import { WAKE_STATIONS } from '../../../src/core/flow/wake'
import { pressureAt } from '../../../src/core/polar/sweep'
import { nacaSection } from '../../../src/core/shape/naca'
import { placePanels } from '../../../src/core/shape/panels'
import { viscousState } from '../../published/report/polars'

const flow = solvePanels(placePanels(nacaSection('2412'), 180))
const STAGNATION = 89
const stream = { reynolds: 1e6, mach: 0 }

/** Layers whose edge speed at each node, wall stress and wake end are given. */
function layersWith(
  speed: (node: number) => number,
  stress: number,
  wakeEnd = { t: 0.002, H: 1.1, u: 0.99 },
): Layers {
  const setting = { stream, amplification: 9, tripUpper: 1, tripLower: 1 }
  const wakeS = Float64Array.from({ length: WAKE_STATIONS + 1 }, (_, i) => 1 + i / WAKE_STATIONS)
  const layers = layersAt(flow, arcLength(flow), STAGNATION, wakeS, setting)
  const { upper, lower, wake } = layers
  upper.u.forEach((_, i) => (upper.u[i] = speed(STAGNATION - i)))
  lower.u.forEach((_, i) => (lower.u[i] = speed(STAGNATION + 1 + i)))
  for (const { t, u, rates } of [upper, lower]) {
    t.fill(0.001)
    // Wall stress over the dynamic pressure is 2 u t times the friction rate.
    rates.forEach((rate, i) => (rate[FRICTION] = stress / (2 * u[i]! * t[i]!)))
  }
  const end = wake.count - 1
  wake.t[end] = wakeEnd.t
  wake.u[end] = wakeEnd.u
  wake.m[end] = wakeEnd.t * wakeEnd.H * wakeEnd.u
  return layers
}

const loadsOf = (layers: Layers, alpha: number): ViscousLoads =>
  viscousLoads(
    flow,
    { layers, alpha, converged: true } as unknown as Parameters<typeof viscousLoads>[1],
    stream,
  )

describe('the loads of a section with its layers', () => {
  it('are those of the potential flow when the edge speeds are', () => {
    const alpha = 0.06
    const inviscid = panelLoads(flow, alpha)
    const loads = loadsOf(
      layersWith((node) => Math.sqrt(1 - inviscid.pressureCoefficient[node]!), 0),
      alpha,
    )
    expect(loads.frictionDrag).toBe(0)
    expect(loads.liftCoefficient).toBeCloseTo(inviscid.liftCoefficient, 2)
    expect(loads.momentCoefficient).toBeCloseTo(inviscid.momentCoefficient, 2)
    expect(Math.abs(loads.pressureDrag)).toBeLessThan(0.001)
  })

  it('vanish under a constant pressure, which pushes a closed outline nowhere', () => {
    const loads = loadsOf(
      layersWith(() => 0.5, 0),
      0.1,
    )
    expect(loads.pressureCoefficient[20]).toBeCloseTo(0.75, 12)
    // What is left is the end correction of the quadrature, of fourth order in 1/180.
    expect(Math.abs(loads.liftCoefficient)).toBeLessThan(1e-5)
    expect(Math.abs(loads.pressureDrag)).toBeLessThan(1e-5)
    expect(Math.abs(loads.momentCoefficient)).toBeLessThan(1e-5)
  })

  it('count a constant wall stress over the projection of each side on the stream', () => {
    const stress = 0.004
    const { x, y } = flow.panels
    const alpha = 0.05
    const run = (from: number, to: number): number =>
      (x[to]! - x[from]!) * Math.cos(alpha) + (y[to]! - y[from]!) * Math.sin(alpha)
    const expected = stress * (run(STAGNATION, 0) + run(STAGNATION + 1, x.length - 1))
    const { frictionDrag } = loadsOf(
      layersWith((node) => 0.8 + 0.001 * node, stress),
      alpha,
    )
    expect(frictionDrag).toBeCloseTo(expected, 12)
    expect(frictionDrag).toBeGreaterThan(1.98 * stress)
  })

  it('take the drag from the end of the wake as Squire and Young do', () => {
    const wakeEnd = { t: 0.003, H: 1.2, u: 0.95 }
    const { dragCoefficient } = loadsOf(
      layersWith(() => 1, 0.003, wakeEnd),
      0,
    )
    expect(dragCoefficient).toBeCloseTo(2 * 0.003 * Math.pow(0.95, 3.1), 12)
    const far = loadsOf(
      layersWith(() => 1, 0.003, { t: 0.003, H: 1, u: 1 }),
      0,
    )
    expect(far.dragCoefficient).toBeCloseTo(0.006, 12)
  })

  it('are sonic where the pressure falls below the critical one, and never at rest', () => {
    const layers = layersWith((node) => (node === 60 ? 2 : 1), 0)
    const at = (mach: number): boolean =>
      viscousLoads(flow, { layers, alpha: 0 } as unknown as Parameters<typeof viscousLoads>[1], {
        reynolds: 1e6,
        mach,
      }).sonic
    expect([0.1, 0.3, 0.5].map(at)).toEqual([false, false, true])
  })
})

describe('a thin laminar section at zero lift', () => {
  it('has the friction of a flat plate of Blasius on both sides, but for a share of the order of its thickness', () => {
    // At 1e5 and below no solution is found here: both layers separate laminar at the edge, without transition.
    const reynolds = 2e5
    const plate = (2 * 1.328) / Math.sqrt(reynolds)
    const misses = [0.04, 0.06, 0.08].map((thickness) => {
      const section = nacaSection(`000${100 * thickness}`)
      const { converged, layers } = pressureAt(section, viscousState(reynolds), { alpha: 0 })
      expect(converged).toBe(true)
      expect(layers!.upper.transition).toBe(1)
      const miss = Math.abs(layers!.frictionDrag / plate - 1)
      expect(miss / thickness).toBeLessThan(2)
      return miss
    })
    expect(misses[0]).toBeLessThan(misses[1]!)
    expect(misses[1]).toBeLessThan(misses[2]!)
  })
})
