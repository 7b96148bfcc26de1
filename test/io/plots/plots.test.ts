import { describe, expect, it } from 'vitest'
import type { Comparison } from '../../../src/core'
import { planformDrawing } from '../../../src/io/plots/planformDrawing'
import { stateOf } from '../../../src/io/plots/plot'
import { hoveredReadOut, pointOfState } from '../../../src/io/plots/pointOfState'
import { polarPlots } from '../../../src/io/plots/polarPlots'
import { pressurePlot } from '../../../src/io/plots/pressurePlot'
import { outlineAt, shapeOutlines } from '../../../src/io/plots/shapeOutline'
import { spanPlots } from '../../../src/io/plots/spanPlots'
import { comparisonOf, MAPPING, SLOWEST } from '../../support/comparisons'

const panel = comparisonOf()

describe('the pressure plot', () => {
  const plot = pressurePlot(panel, MAPPING)

  it('shows every entry with suction upward and knows the side of each point', () => {
    expect(plot.curves.map((curve) => curve.name)).toEqual(['NACA 4412', 'NACA 2415 > NACA 2412'])
    expect(plot.y.reversed).toBe(true)
    const { states, y } = plot.curves[0]!
    expect([states[0]!.side, states.at(-1)!.side]).toEqual(['upper', 'lower'])
    const mean = (side: string): number => {
      const values = y.filter((_, i) => states[i]!.side === side)
      return values.reduce((sum, value) => sum + value, 0) / values.length
    }
    expect(mean('upper')).toBeLessThan(mean('lower'))
  })

  it('is empty where no pressure is known', () => {
    expect(pressurePlot(panel, SLOWEST).curves).toEqual([])
    expect(pressurePlot(comparisonOf({ method: 'thin' }), MAPPING).curves).toEqual([])
    expect(pressurePlot(comparisonOf({ computed: false }), MAPPING).curves).toEqual([])
  })
})

describe('the polar plots', () => {
  const plots = polarPlots(panel, MAPPING)

  it('are two without drag, and four with it', () => {
    expect(plots.map((plot) => plot.key)).toEqual(['lift', 'moment'])
    expect(polarPlots(withDrag(panel), MAPPING).map((plot) => plot.key)).toEqual([
      'lift',
      'drag',
      'moment',
      'glide',
    ])
  })

  it('mark each entry at the lift that the wing needs, on its curve, with a line at that lift', () => {
    const [lift, moment] = plots
    panel.entries.forEach((entry, i) => {
      const needed = entry.conditions[MAPPING]!.pane!.liftCoefficient
      expect(lift!.marks[i]!.y).toBeCloseTo(needed, 12)
      expect(moment!.marks[i]!.x).toBeCloseTo(needed, 12)
      const { x, y } = lift!.curves[i]!
      const k = x.findIndex((value) => value >= lift!.marks[i]!.x)
      expect(y[k - 1]).toBeLessThanOrEqual(needed)
      expect(y[k]).toBeGreaterThanOrEqual(needed)
    })
    expect(lift!.lines.map((line) => line.axis)).toEqual(['y'])
    expect(moment!.lines.map((line) => line.axis)).toEqual(['x'])
  })

  it('show angles in degrees while states keep radians', () => {
    const { x, states } = plots[0]!.curves[0]!
    expect(x[0]).toBeCloseTo(-12, 10)
    expect(states[0]!.alpha).toBeCloseTo((-12 * Math.PI) / 180, 12)
  })

  it('leave out points that did not converge', () => {
    const failed = changedPolars(panel, (point, i) => (i === 3 ? { ...point, converged: false } : point))
    expect(polarPlots(failed, MAPPING)[0]!.curves[0]!.x).toHaveLength(64)
  })
})

describe('a hovered state', () => {
  const pressure = pressurePlot(panel, MAPPING)
  const [lift] = polarPlots(panel, MAPPING)

  it('marks the same place and side in every pressure curve', () => {
    for (const side of ['upper', 'lower'] as const) {
      for (const { states } of pressure.curves) {
        const found = states[pointOfState(states, stateOf(0, { xOverC: 0.4, side }))]!
        expect(found.side).toBe(side)
        // Panels near the middle of the chord are 0.02 to 0.03 long.
        expect(Math.abs(found.xOverC! - 0.4)).toBeLessThan(0.03)
      }
    }
  })

  it('marks the same angle in every polar, but only its own entry when it comes from a pressure', () => {
    const alpha = (4.1 * Math.PI) / 180
    for (const { states, x } of lift!.curves)
      expect(x[pointOfState(states, stateOf(0, { alpha }))]).toBeCloseTo(4, 9)
    const placed = stateOf(1, { alpha, xOverC: 0.5 })
    expect(lift!.curves.map(({ states }) => pointOfState(states, placed))).toEqual([-1, expect.any(Number)])
    expect(pointOfState(lift!.curves[1]!.states, placed)).toBeGreaterThan(0)
  })

  it('is read out with symbols and units, and not where a plot cannot show it', () => {
    expect(hoveredReadOut(lift!, stateOf(0, { alpha: 0 }))).toMatch(/^angle 0\.0°, c_l 0\.\d\d$/)
    expect(hoveredReadOut(lift!, stateOf(0, { spanY: 1 }))).toBeNull()
    expect(hoveredReadOut(lift!, stateOf(9, { alpha: 0 }))).toBeNull()
    expect(hoveredReadOut(lift!, null)).toBeNull()
  })
})

describe('the span plots', () => {
  it('run from the centreline to the tip, with the shown station as a line', () => {
    const [lift, induced] = spanPlots(panel, MAPPING)
    const { x, y, states } = lift!.curves[0]!
    expect([x[0], x.at(-1)]).toEqual([0, 1.8])
    expect(y[0]).toBeCloseTo(panel.entries[0]!.conditions[MAPPING]!.wing!.stations[0]!.liftCoefficient, 12)
    expect(states[5]!.spanY).toBe(x[5])
    expect(lift!.lines).toEqual([{ axis: 'x', at: panel.stationY }])
    const angle = panel.entries[0]!.conditions[MAPPING]!.wing!.stations[7]!.inducedAngle
    expect(induced!.curves[0]!.y[7]).toBeCloseTo((angle * 180) / Math.PI, 12)
  })
})

describe('the outlines', () => {
  const shapes = shapeOutlines(panel)

  it('show root and tip of a pair, named, with measured figures', () => {
    expect(shapes.map((shape) => [shape.entry, shape.name])).toEqual([
      [0, 'NACA 4412'],
      [1, 'NACA 2415 > NACA 2412, root'],
      [1, 'NACA 2415 > NACA 2412, tip'],
    ])
    expect(shapes[0]!.caption).toBe('12.0 % thick, camber 4.0 %')
    expect(shapes[0]!.spar).toMatch(/^spar depth \d\d\.\d mm$/)
  })

  it('give the height on either side, and none off the section', () => {
    const { wing } = panel
    const shape = shapes[0]!
    const depth = outlineAt(shape, wing.sparAt, 'upper')! - outlineAt(shape, wing.sparAt, 'lower')!
    // Straight lines between the points of the outline cut at most this much of the chord.
    expect(Math.abs(depth - panel.entries[0]!.root!.depthAtSpar)).toBeLessThan(5e-4)
    expect(outlineAt(shape, 1.4, 'upper')).toBeNull()
  })
})

describe('the planform', () => {
  it('is as wide as the span and marks stations on both halves', () => {
    const drawing = planformDrawing(panel, 1)
    const xs = [...drawing.outline.matchAll(/[ML](-?[\d.]+) /g)].map(([, x]) => Number(x))
    expect([Math.min(...xs), Math.max(...xs)]).toEqual([-1.8, 1.8])
    expect(drawing.hovered).toMatch(/^M-1\.0000 .*M1\.0000 /)
    expect(drawing.flap).toBe('')
    expect(drawing.stationWords).toBe('station shown: y 0.82 m, chord 0.312 m')
  })

  it('outlines the flaps of a wing that has them', () => {
    const wing = { area_m2: 1.1, span_m: 3.6, taper_ratio: 0.6 }
    const flap = { chord_fraction: 0.25, from_semispan: 0.1, to_semispan: 0.6 }
    const drawing = planformDrawing(comparisonOf({ computed: false, over: { wing: { ...wing, flap } } }))
    expect(drawing.flap).toMatch(/^M-0\.1800 .*M0\.1800 .*L1\.0800 /)
  })
})

type Point = NonNullable<Comparison['entries'][0]['conditions'][0]['pane']>['polar'] & object

function changedPolars(
  comparison: Comparison,
  change: (point: Point['points'][number], i: number) => Point['points'][number],
): Comparison {
  return {
    ...comparison,
    entries: comparison.entries.map((entry) => ({
      ...entry,
      conditions: entry.conditions.map((state) => {
        const polar = state.pane?.polar
        if (!state.pane || !polar) return state
        return { ...state, pane: { ...state.pane, polar: { ...polar, points: polar.points.map(change) } } }
      }),
    })),
  }
}

function withDrag(comparison: Comparison): Comparison {
  return changedPolars(comparison, (point) => ({
    ...point,
    dragCoefficient: 0.008 + 0.01 * point.alpha ** 2,
  }))
}
