// @vitest-environment happy-dom
import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import { markWords } from '../../../src/renderer/charts/plotMarks'
import { chartOf } from '../../../src/renderer/charts/drawing'
import { polarPlots } from '../../../src/io/plots/polarPlots'
import PolarsPane from '../../../src/renderer/compare/PolarsPane.vue'
import PressurePane from '../../../src/renderer/compare/PressurePane.vue'
import ShapePane from '../../../src/renderer/compare/ShapePane.vue'
import { entryStyle } from '../../../src/renderer/style/palette'
import { comparisonOf, MAPPING } from '../../support/comparisons'
import { inventedLayers, withPane } from '../../support/viscousPanes'

const FAILED = 40
/** The small test brief as the viscous method might leave it, with one failed angle. */
const comparison = withPane(comparisonOf(), (pane) => ({
  ...pane,
  pressure: { ...pane.pressure!, layers: inventedLayers() },
  polar: {
    ...pane.polar!,
    points: pane.polar!.points.map((point, i) =>
      i === FAILED
        ? { ...point, liftCoefficient: null, converged: false, reason: 'the residual stays at 3e-3' }
        : { ...point, dragCoefficient: 0.008, transitionUpper: 0.4, transitionLower: 0.9 },
    ),
  },
}))
const props = {
  ...{ comparison, condition: MAPPING, hover: null, stale: false },
  styles: [entryStyle(0, 0), entryStyle(1, 1)],
}

describe('PolarsPane with drag', () => {
  it('shows the plots that are not hidden, and asks for the others by a button', async () => {
    const pane = mount(PolarsPane, { props: { ...props, hidden: ['transition'] } })
    const keys = () => pane.findAll('[data-plot]').map((plot) => plot.attributes('data-plot'))
    expect(keys()).toEqual(['lift', 'drag', 'moment', 'glide'])
    const button = pane.findAll('.choice button').find((found) => found.text() === 'Transition')!
    expect(button.attributes('aria-pressed')).toBe('false')
    await button.trigger('click')
    expect(pane.emitted('update:hidden')).toEqual([[[]]])
    await pane.setProps({ hidden: ['lift', 'drag', 'moment', 'glide'] })
    expect(keys()).toEqual(['transition'])
  })

  it('names failed angles and their reason in its notes', () => {
    const pane = mount(PolarsPane, { props })
    expect(pane.get('.pane-notes').text()).toContain(
      'NACA 4412: no result at 8.0° (the residual stays at 3e-3)',
    )
  })
})

describe('a failed angle in a chart', () => {
  const [lift] = polarPlots(comparison, MAPPING)

  it('lies as a hole in the line, and as a cross on the edge of the plot', () => {
    const ink = { colour: (name: string) => name, font: 'sans-serif' }
    const { datasets } = chartOf(lift!, props.styles, { hover: null, zoom: null }, ink).data
    const curve = datasets.find((set) => set.label === 'NACA 4412')!
    expect(Number.isNaN(curve.data[FAILED]!.y)).toBe(true)
    expect(curve.data.filter(({ y }) => Number.isNaN(y))).toHaveLength(1)
    const crosses = datasets.filter((set) => set.pointStyle === 'crossRot')
    expect(crosses.map((set) => set.data[0]!.x)).toEqual([expect.closeTo(8, 9), expect.closeTo(8, 9)])
  })

  it('tells its reason to the pointer that is near, and to no other', () => {
    const pixel = (_: 'x' | 'y', value: number): number => 100 * value
    expect(markWords(lift!, pixel, [-1, 2], 801, -99)).toEqual([
      'NACA 4412 at 8.0°: the residual stays at 3e-3',
      'NACA 2415 > NACA 2412 at 8.0°: the residual stays at 3e-3',
    ])
    expect(markWords(lift!, pixel, [-1, 2], 840, -99)).toEqual([])
  })
})

describe('the marks of the layers', () => {
  it('stand on every outline, with a key in words', () => {
    const pane = mount(ShapePane, { props })
    // Four events on each of three outlines: a section, and root and tip of a pair.
    expect(pane.findAll('svg[role="img"] .event')).toHaveLength(12)
    expect(pane.get('.event-key').text()).toMatch(/transition.*laminar separation.*reattachment/)
  })

  it('are left out, with their key, where there are no layers', () => {
    const pane = mount(ShapePane, { props: { ...props, comparison: comparisonOf() } })
    expect(pane.findAll('.event')).toHaveLength(0)
    expect(pane.find('.event-key').exists()).toBe(false)
  })
})

describe('the boundary layers', () => {
  it('take the place of the pressure on demand', async () => {
    const pane = mount(PressurePane, { props })
    expect(pane.find('[data-plot="pressure"]').exists()).toBe(true)
    await pane.get('header button').trigger('click')
    expect(pane.emitted('update:layersShown')).toEqual([[true]])
    await pane.setProps({ layersShown: true })
    const keys = pane.findAll('[data-plot]').map((plot) => plot.attributes('data-plot'))
    expect(keys).toEqual(['shape factor', 'momentum thickness', 'friction', 'amplification'])
  })

  it('are not offered without them', () => {
    const pane = mount(PressurePane, {
      props: { ...props, comparison: comparisonOf(), layersShown: true },
    })
    expect(pane.find('header button').exists()).toBe(false)
    expect(pane.find('[data-plot="pressure"]').exists()).toBe(true)
  })
})
