// @vitest-environment happy-dom
import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import { stateOf } from '../../../src/io/plots/plot'
import type { PaneProps } from '../../../src/renderer/compare/paneProps'
import PolarsPane from '../../../src/renderer/compare/PolarsPane.vue'
import PressurePane from '../../../src/renderer/compare/PressurePane.vue'
import ShapePane from '../../../src/renderer/compare/ShapePane.vue'
import { entryStyle } from '../../../src/renderer/style/palette'
import { comparisonOf, MAPPING, SLOWEST } from '../../support/comparisons'

const panel = comparisonOf()
const PANES = [
  ['ShapePane', ShapePane],
  ['PressurePane', PressurePane],
  ['PolarsPane', PolarsPane],
] as const

const props = (over: Partial<PaneProps> = {}): PaneProps => ({
  comparison: panel,
  styles: [entryStyle(0, 0), entryStyle(1, 1)],
  condition: MAPPING,
  hover: null,
  stale: false,
  ...over,
})

describe.each(PANES)('%s', (_, Pane) => {
  it('says that it computes, and what an empty shortlist needs', () => {
    expect(mount(Pane, { props: props({ comparison: null }) }).text()).toContain('Computing…')
    const empty = comparisonOf({ over: { shortlist: [] } })
    expect(mount(Pane, { props: props({ comparison: empty }) }).text()).toContain('Add a section')
  })

  it('is tagged while it shows the last good result', async () => {
    const pane = mount(Pane, { props: props() })
    expect(pane.text()).not.toContain('updating…')
    await pane.setProps({ stale: true })
    expect(pane.find('.stale').text()).toContain('updating…')
    expect(pane.text()).toContain('NACA 4412')
  })
})

describe('ShapePane', () => {
  it('draws every section at one scale with its figures and the spar', () => {
    const pane = mount(ShapePane, { props: props() })
    const boxes = pane.findAll('svg[role="img"]').map((svg) => svg.attributes('viewBox'))
    expect(boxes).toHaveLength(3)
    expect(new Set(boxes).size).toBe(1)
    expect(pane.text()).toContain('12.0 % thick, camber 4.0 %')
    expect(pane.findAll('line.spar')).toHaveLength(3)
  })

  it('lays the sections over each other on demand', async () => {
    const pane = mount(ShapePane, { props: props() })
    await pane.get('button').trigger('click')
    expect(pane.findAll('svg[role="img"]')).toHaveLength(1)
    expect(pane.findAll('svg[role="img"] path:not(.spot)')).toHaveLength(3)
    expect(pane.get('button').attributes('aria-pressed')).toBe('true')
  })

  it('marks the hovered place on its side of every section', async () => {
    const pane = mount(ShapePane, { props: props({ hover: stateOf(0, { xOverC: 0.3, side: 'upper' }) }) })
    expect(pane.findAll('.spot')).toHaveLength(3)
    await pane.setProps({ hover: stateOf(0, { xOverC: 0.3 }) })
    expect(pane.findAll('.spot')).toHaveLength(6)
    await pane.setProps({ hover: stateOf(0, { alpha: 0.1 }) })
    expect(pane.findAll('.spot')).toHaveLength(0)
  })

  it('walks along the chord and between sections by the arrow keys', async () => {
    const pane = mount(ShapePane, { props: props({ hover: stateOf(0, { xOverC: 0.5, side: 'lower' }) }) })
    await pane.get('.shapes').trigger('keydown', { key: 'ArrowRight' })
    await pane.get('.shapes').trigger('keydown', { key: 'ArrowDown' })
    expect(pane.emitted('update:hover')).toEqual([
      [stateOf(0, { xOverC: 0.52, side: 'lower' })],
      [stateOf(1, { xOverC: 0.5, side: 'lower' })],
    ])
  })
})

describe('PressurePane', () => {
  it('gives lift and angle of every curve, and the pressure at a hovered place', async () => {
    const pane = mount(PressurePane, { props: props() })
    expect(pane.get('[data-plot="pressure"]').attributes('data-curves')).toBe('2')
    expect(pane.findAll('.legend li')[0]!.text()).toMatch(/NACA 4412\s*c_l 0\.\d\d, −?\d\.\d°/)
    await pane.setProps({ hover: stateOf(0, { xOverC: 0.5, side: 'upper' }) })
    expect(pane.findAll('.legend li')[1]!.text()).toMatch(/C_p −0\.\d\d/)
    expect(pane.text()).toContain('x/c 0.50, upper side')
  })

  it('says why there is no pressure', () => {
    const thin = mount(PressurePane, { props: props({ comparison: comparisonOf({ method: 'thin' }) }) })
    expect(thin.text()).toContain('Thin-airfoil theory gives no surface pressure')
    const slowest = mount(PressurePane, { props: props({ condition: SLOWEST }) })
    expect(slowest.text()).toContain('the slowest speed needs the viscous method')
    const waiting = mount(PressurePane, { props: props({ comparison: comparisonOf({ computed: false }) }) })
    expect(waiting.text()).toContain('Computing…')
  })

  it('names an entry that is left out, with the reason, beside those that are drawn', () => {
    const shortlist = [{ section: 'naca:4412' }, { section: 'naca:63-415' }]
    const pane = mount(PressurePane, { props: props({ comparison: comparisonOf({ over: { shortlist } }) }) })
    expect(pane.get('[data-plot="pressure"]').attributes('data-curves')).toBe('1')
    expect(pane.get('.legend .warn').text()).toContain('not generated here; open a coordinate file')
  })
})

describe('PolarsPane', () => {
  it('draws lift and moment, and tells their figures to those who cannot see them', () => {
    const pane = mount(PolarsPane, { props: props() })
    expect(pane.findAll('[data-plot]').map((plot) => plot.attributes('data-plot'))).toEqual([
      'lift',
      'moment',
    ])
    expect(pane.get('table').text()).toMatch(/NACA 4412.*angle −12\.0°, c_l −\d\.\d\d/)
  })

  it('walks the points of a curve by the arrow keys and speaks them', async () => {
    const pane = mount(PolarsPane, { props: props() })
    const plot = pane.get('[data-plot="lift"]')
    await plot.trigger('keydown', { key: 'ArrowRight' })
    expect(pane.get('[aria-live]').text()).toMatch(
      /^NACA 4412: angle of attack, deg 4\.500, lift c_l \d\.\d+/,
    )
    expect(pane.emitted('update:hover')).toHaveLength(1)
    await plot.trigger('keydown', { key: 'ArrowDown' })
    expect(pane.get('[aria-live]').text()).toContain('NACA 2415')
  })

  it('zooms by the keyboard and shows all again', async () => {
    const pane = mount(PolarsPane, { props: props() })
    await pane.get('[data-plot="lift"]').trigger('keydown', { key: '+' })
    expect(pane.findAll('button')).toHaveLength(1)
    await pane.get('button').trigger('click')
    expect(pane.findAll('button')).toHaveLength(0)
  })

  it('reads the hovered angle out', () => {
    const pane = mount(PolarsPane, { props: props({ hover: stateOf(0, { alpha: 0 }) }) })
    expect(pane.get('.read-out').text()).toMatch(/^angle 0\.0°, c_l 0\.\d\d$/)
  })
})
