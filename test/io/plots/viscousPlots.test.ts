import { describe, expect, it } from 'vitest'
import {
  PAST_STALL,
  type Comparison,
  type Polar,
  type PolarPoint,
  type PressureResult,
} from '../../../src/core'
import { layerEvents } from '../../../src/io/plots/layerEvents'
import { layerPlots } from '../../../src/io/plots/layerPlots'
import { polarPlots } from '../../../src/io/plots/polarPlots'
import { failureWords, limitWords, polarFailures, polarRuns } from '../../../src/io/plots/polarRuns'
import { pressurePlot } from '../../../src/io/plots/pressurePlot'
import { comparisonOf, MAPPING } from '../../support/comparisons'
import { inventedLayers, withPane } from '../../support/viscousPanes'

const DEGREE = Math.PI / 180
const panel = comparisonOf()

/** A polar with invented drag and transition; angles in `failed` (deg) have no result. */
function viscous(
  polar: Polar,
  failed: readonly number[],
  between: readonly PolarPoint[] = [],
  reason = 'the residual stays at 3e-3',
): Polar {
  const points = polar.points.map((point): PolarPoint => {
    const deg = Math.round((2 * point.alpha) / DEGREE) / 2
    if (failed.includes(deg)) {
      return {
        ...{ alpha: point.alpha, converged: false, reason },
        ...{ liftCoefficient: null, dragCoefficient: null, momentCoefficient: null },
        ...{ transitionUpper: null, transitionLower: null },
      }
    }
    const dragCoefficient = 0.008 + 0.01 * point.alpha ** 2
    return { ...point, dragCoefficient, transitionUpper: 0.5 - point.alpha, transitionLower: 1 }
  })
  const maxLift = { alpha: 15 * DEGREE, liftCoefficient: 1.4, by: 'nose' } as const
  return { ...polar, points, between, maxLift }
}

const shown = (failed: readonly number[], between: readonly PolarPoint[] = []): Comparison =>
  withPane(panel, (pane) => ({ ...pane, polar: viscous(pane.polar!, failed, between) }))
const plotOf = (comparison: Comparison, key: string) =>
  polarPlots(comparison, MAPPING).find((plot) => plot.key === key)!

describe('polars with drag', () => {
  it('are five plots, each axis named', () => {
    const plots = polarPlots(shown([]), MAPPING)
    expect(plots.map((plot) => plot.key)).toEqual(['lift', 'drag', 'moment', 'glide', 'transition'])
    for (const { x, y } of plots) expect([x.label, y.label].every((label) => label.length > 3)).toBe(true)
  })

  it('show transition on both sides of every entry', () => {
    const { curves } = plotOf(shown([]), 'transition')
    expect(curves.map(({ entry, side }) => [entry, side])).toEqual([
      [0, 'upper'],
      [0, 'lower'],
      [1, 'upper'],
      [1, 'lower'],
    ])
    expect(new Set(curves[1]!.y)).toEqual(new Set([1]))
  })

  it('are broken where angles failed, once for neighbours, and nowhere else', () => {
    expect(plotOf(shown([]), 'drag').curves[0]!.breaks).toEqual([])
    for (const plot of polarPlots(shown([4, 4.5, 9]), MAPPING)) {
      const { breaks, states, x } = plot.curves[0]!
      expect(x).toHaveLength(62)
      // Curves run by angle: the first point behind each gap.
      const behind = breaks!.map((i) => Math.round((2 * states[i]!.alpha!) / DEGREE) / 2)
      expect(behind).toEqual([5, 9.5])
    }
  })

  it('never mark the condition on a line across a gap', () => {
    const lift = panel.entries[0]!.conditions[MAPPING]!.pane!.liftCoefficient
    const { points } = panel.entries[0]!.conditions[MAPPING]!.pane!.polar!
    const k = points.findIndex((point) => point.liftCoefficient! > lift)
    const gap = [k - 1, k].map((i) => Math.round((2 * points[i]!.alpha) / DEGREE) / 2)
    expect(plotOf(shown(gap), 'lift').marks.some(({ entry }) => entry === 0)).toBe(false)
    expect(plotOf(shown([]), 'lift').marks.some(({ entry }) => entry === 0)).toBe(true)
  })

  it('take refinement points into the curve at their angle', () => {
    const { points } = panel.entries[0]!.conditions[MAPPING]!.pane!.polar!
    const added = { ...points[40]!, alpha: 8.2 * DEGREE, dragCoefficient: 0.01 }
    const { x } = plotOf(shown([], [added]), 'lift').curves[0]!
    expect(x).toHaveLength(66)
    expect(x).toEqual([...x].sort((a, b) => a - b))
    // A failed angle next to it still breaks the curve.
    const runs = polarRuns(viscous(panel.entries[0]!.conditions[MAPPING]!.pane!.polar!, [8], [added]))
    expect(runs.map((run) => run[0]!.alpha / DEGREE).at(1)).toBeCloseTo(8.2, 9)
  })

  it('name failed angles with their reason, grouped', () => {
    const comparison = shown([4, 4.5])
    expect(plotOf(comparison, 'lift').failures).toHaveLength(4)
    expect(failureWords(polarFailures(comparison, MAPPING))[0]).toBe(
      'NACA 4412: no result at 4.0°, 4.5° (the residual stays at 3e-3)',
    )
  })

  it('end past stall without calling it a failure, while a real failure stays named', () => {
    const past = withPane(panel, (pane) => ({
      ...pane,
      polar: viscous(pane.polar!, [19.5, 20], [], PAST_STALL),
    }))
    expect(polarFailures(past, MAPPING)).toEqual([])
    expect(polarFailures(shown([19.5, 20]), MAPPING)).toHaveLength(4)
    const { states } = plotOf(past, 'lift').curves[0]!
    expect(Math.max(...states.map(({ alpha }) => alpha!)) / DEGREE).toBeCloseTo(19, 9)
  })

  it('tell a lift that separation ends from one that the nose ends, and the least from the greatest', () => {
    const limit = { alpha: -12 * DEGREE, liftCoefficient: -0.9, by: 'layers' } as const
    expect(limitWords(limit, false)).toMatch(/^least lift .*limited by separation of the boundary layers$/)
    expect(limitWords({ ...limit, by: 'nose' }, true)).toMatch(/^greatest lift .*suction peak of the nose$/)
  })

  it('mark the greatest lift and say what limits it', () => {
    const [end] = plotOf(shown([]), 'lift').ends!
    expect([end!.x, end!.y]).toEqual([expect.closeTo(15, 9), 1.4])
    expect(end!.words).toContain('limited by the suction peak of the nose')
  })
})

describe('the axis of pressure', () => {
  it('holds a stagnation value above 1, and ends at 1 below it', () => {
    const scaled = (highest: number): Comparison =>
      withPane(panel, (pane) => {
        const pressure = pane.pressure!
        const most = Math.max(...pressure.pressureCoefficient)
        const pressureCoefficient = pressure.pressureCoefficient.map((value) => (value * highest) / most)
        return { ...pane, pressure: { ...pressure, pressureCoefficient } }
      })
    expect(pressurePlot(scaled(1.0225), MAPPING).y.to).toBeGreaterThan(1.0225)
    expect(pressurePlot(scaled(0.98), MAPPING).y.to).toBe(1)
  })
})

describe('boundary layers', () => {
  const comparison = withPane(panel, (pane) => ({
    ...pane,
    pressure: { ...(pane.pressure as PressureResult), layers: inventedLayers() },
  }))

  it('are four plots of both sides, and none without layers', () => {
    const plots = layerPlots(comparison, MAPPING)
    expect(plots).toHaveLength(4)
    for (const { curves } of plots) expect(curves).toHaveLength(4)
    expect(layerPlots(panel, MAPPING).every(({ curves }) => curves.length === 0)).toBe(true)
  })

  it('end amplification at transition', () => {
    const plot = layerPlots(comparison, MAPPING).find(({ key }) => key === 'amplification')!
    expect(Math.max(...plot.curves[0]!.x)).toBeLessThanOrEqual(inventedLayers().upper.transition)
    expect(plot.curves[0]!.y.every(Number.isFinite)).toBe(true)
  })

  it('mark events on the pressure of their side', () => {
    const { pressure } = comparison.entries[0]!.conditions[MAPPING]!.pane!
    expect(layerEvents(pressure).map(({ kind, side }) => `${kind}, ${side}`)).toEqual([
      'transition, upper',
      'laminar separation, upper',
      'reattachment, upper',
      'turbulent separation, lower',
    ])
    const { events, curves } = pressurePlot(comparison, MAPPING)
    expect(events).toHaveLength(8)
    const { x, y, states } = curves[0]!
    const place = events![0]!
    const near = x.flatMap((at, i) =>
      states[i]!.side === 'upper' && Math.abs(at - place.x) < 0.05 ? [y[i]!] : [],
    )
    expect(place.y).toBeGreaterThanOrEqual(Math.min(...near))
    expect(place.y).toBeLessThanOrEqual(Math.max(...near))
  })
})
