// @vitest-environment happy-dom
import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import { stateOf } from '../../../src/io/plots/plot'
import { entryStyle } from '../../../src/renderer/style/palette'
import WingView from '../../../src/renderer/wing/WingView.vue'
import { comparisonOf, MAPPING, SLOWEST } from '../../support/comparisons'

const comparison = comparisonOf()
const styles = [entryStyle(0, 0), entryStyle(1, 1)]
const props = { comparison, styles, condition: MAPPING, hover: null, stale: false }

describe('WingView', () => {
  it('draws the planform, the lift and the induced angle of every entry', () => {
    const view = mount(WingView, { props })
    expect(view.get('svg.planform').attributes('aria-label')).toContain('span 3.60 m')
    expect(view.findAll('[data-plot]').map((plot) => plot.attributes('data-curves'))).toEqual(['2', '2'])
  })

  it('lists the totals of the wing under each entry, with units', () => {
    const view = mount(WingView, { props })
    const table = view.get('table.totals')
    expect(table.findAll('thead th').map((cell) => cell.text())).toEqual([
      'Figure',
      'NACA 4412',
      'NACA 2415 > NACA 2412',
    ])
    const row = table.findAll('tbody tr').find((found) => found.text().startsWith('Induced drag, N'))!
    const drag = comparison.entries[0]!.conditions[MAPPING]!.wing!.inducedDrag
    expect(row.findAll('td')[0]!.text()).toBe(drag.toFixed(2))
    const inner = table.findAll('th.inner').map((cell) => cell.text())
    expect(inner).toContain('by Helmbold, 1/rad')
    expect(inner).toContain('by the handbook, 1/rad')
  })

  it('tells a doubt that holds for all entries once', () => {
    const view = mount(WingView, { props })
    const notes = view.findAll('.notes li').map((note) => note.text())
    expect(notes.filter((note) => note.startsWith('no centre of gravity given'))).toHaveLength(1)
  })

  it('marks a hovered place on the planform and reads it out', async () => {
    const view = mount(WingView, { props: { ...props, hover: stateOf(0, { spanY: 1 }) } })
    expect(view.get('.wing-hovered').attributes('d')).toMatch(/^M-1\.0000/)
    expect(view.text()).toMatch(/y \d\.\d\d m, c_l 0\.\d\d\d/)
    await view.setProps({ hover: null })
    expect(view.get('.wing-hovered').attributes('d')).toBe('')
  })

  it('says why the slowest condition has no figures', () => {
    const view = mount(WingView, { props: { ...props, condition: SLOWEST } })
    expect(view.text()).toContain('the slowest speed needs the viscous method')
    expect(view.find('table.totals').exists()).toBe(false)
  })
})
