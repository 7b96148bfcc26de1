import { describe, expect, it } from 'vitest'
import { stateOf } from '../../../src/io/plots/plot'
import { polarPlots } from '../../../src/io/plots/polarPlots'
import { pressurePlot } from '../../../src/io/plots/pressurePlot'
import { chartOf, wholeOf, type Look } from '../../../src/renderer/charts/drawing'
import { nearestPoint } from '../../../src/renderer/charts/nearestPoint'
import { moved, zoomed } from '../../../src/renderer/charts/zoom'
import { entryStyle } from '../../../src/renderer/style/palette'
import { comparisonOf, MAPPING } from '../../support/comparisons'

const comparison = comparisonOf()
const styles = [entryStyle(0, 0), entryStyle(1, 1)]
const ink = { colour: (name: string) => name, font: 'sans-serif' }
const [lift] = polarPlots(comparison, MAPPING)
const setsOf = (look: Partial<Look>) =>
  chartOf(lift!, styles, { hover: null, zoom: null, ...look }, ink).data.datasets

describe('chartOf', () => {
  it('draws each entry in its own colour and dash, with its mark, and the line of the lift', () => {
    const sets = setsOf({})
    expect(sets).toHaveLength(2 + 2 + 1)
    const curves = sets.filter((set) => set.label !== undefined)
    expect(curves.map((set) => set.borderColor)).toEqual(styles.map((style) => style.colour))
    expect(curves.map((set) => set.borderDash)).toEqual(styles.map((style) => [...style.dash]))
  })

  it('marks a hovered state on every curve, that of the hovered entry on top', () => {
    const sets = setsOf({ hover: stateOf(1, { alpha: 0 }) })
    expect(sets).toHaveLength(2 + 2 + 2 + 1)
    expect(sets[0]!.pointBorderColor).toBe(styles[1]!.colour)
    expect(sets[0]!.data[0]!.x).toBeCloseTo(0, 12)
  })

  it('turns the axis of pressure over', () => {
    const plot = pressurePlot(comparison, MAPPING)
    const { options } = chartOf(plot, styles, { hover: null, zoom: null }, ink)
    expect(options!.scales!['y']!.reverse).toBe(true)
  })

  it('ends the axis of pressure at 1, or above the stagnation value where that is greater', () => {
    const plot = pressurePlot(comparison, MAPPING)
    const greatest = Math.max(...plot.curves.flatMap(({ y }) => y))
    // Air speed of the test brief gives a Mach number above 0.07: more than 1 at the stagnation point.
    expect(greatest).toBeGreaterThan(1)
    expect(plot.y.to).toBeGreaterThan(greatest)
    expect(plot.y.to).toBeLessThan(1.1)
    expect(pressurePlot(comparisonOf({ computed: false }), MAPPING).y.to).toBe(1)
  })

  it('shows the part that is looked at', () => {
    const { options } = chartOf(lift!, styles, { hover: null, zoom: { x: [0, 2], y: [0, 1] } }, ink)
    expect(options!.scales!['x']).toMatchObject({ min: 0, max: 2 })
  })
})

describe('zoom', () => {
  const whole = { x: [0, 10], y: [-1, 1] } as const

  it('keeps the place under the pointer where it is', () => {
    expect(zoomed(whole, whole, { x: 2, y: 0 }, 2)).toEqual({ x: [1, 6], y: [-0.5, 0.5] })
  })

  it('ends at the whole', () => {
    const near = zoomed(whole, whole, { x: 2, y: 0 }, 2)!
    expect(zoomed(whole, near, { x: 2, y: 0 }, 0.4)).toBeNull()
  })

  it('does not go on for ever', () => {
    let seen: NonNullable<ReturnType<typeof zoomed>> = whole
    for (let k = 0; k < 200; k++) seen = zoomed(whole, seen, { x: 5, y: 0 }, 2)!
    expect(seen.x[1] - seen.x[0]).toBeGreaterThan(1e-3)
  })

  it('moves by shares of what is seen', () => {
    expect(moved(whole, 0.1, -0.5)).toEqual({ x: [1, 11], y: [-2, 0] })
  })

  it('begins with the ends of the axes', () => {
    expect(wholeOf(lift!).x).toEqual([-15, 20])
  })
})

describe('nearestPoint', () => {
  const pixel = (axis: 'x' | 'y', value: number): number => (axis === 'x' ? 10 * value : -100 * value)

  it('finds the point under the pointer', () => {
    const { x, y, states } = lift!.curves[1]!
    const found = nearestPoint(lift!, pixel, pixel('x', x[20]!), pixel('y', y[20]!))
    expect(found).toBe(states[20])
  })

  it('finds none out of reach', () => {
    expect(nearestPoint(lift!, pixel, 5000, 5000)).toBeNull()
  })
})
