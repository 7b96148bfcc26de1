import { describe, expect, it } from 'vitest'
import { parseNumber } from '../../src/renderer/brief/parseNumber'
import { sortedIndices, shown } from '../../src/renderer/shortlist/columns'
import { BLANK_BRIEF, BLANK_ENTRY } from '../../src/renderer/state/blanks'
import { createDocument } from '../../src/renderer/state/document'
import { createHistory } from '../../src/renderer/state/history'

describe('the history', () => {
  it('takes changes back and makes them again, by name', () => {
    const history = createHistory(1)
    history.change('double', 2)
    history.change('triple', 6)
    expect(history.undoName.value).toBe('triple')
    history.undo()
    expect(history.value.value).toBe(2)
    expect(history.redoName.value).toBe('triple')
    history.redo()
    expect(history.value.value).toBe(6)
    history.undo()
    history.undo()
    history.undo()
    expect(history.value.value).toBe(1)
    expect(history.undoName.value).toBeNull()
  })

  it('joins the typing in one field, and forgets what was undone when something new is done', () => {
    const history = createHistory('')
    for (const text of ['2', '25', '25.5']) history.change('type', text, 'mass')
    history.change('type', 'x', 'span')
    history.undo()
    expect(history.value.value).toBe('25.5')
    history.undo()
    expect(history.value.value).toBe('')
    history.change('type', '7', 'mass')
    expect(history.redoName.value).toBeNull()
  })
})

describe('the document', () => {
  it('renames a condition together with the limits and the ranking that name it', () => {
    const document = createDocument({
      ...BLANK_BRIEF,
      limits: [{ figure: 'drag_N', at_most: 1, at_least: null, condition: 'Cruise' }],
      rank_by: { figure: 'drag_N', condition: 'Cruise', best: 'least' },
    })
    document.setCondition(0, { name: 'Fast cruise' }, 'name')
    expect(document.brief.value.limits[0]!.condition).toBe('Fast cruise')
    expect(document.brief.value.rank_by!.condition).toBe('Fast cruise')
    document.undo()
    expect(document.brief.value.limits[0]!.condition).toBe('Cruise')
  })

  it('moves, removes and brings back entries, and knows what is saved', () => {
    const document = createDocument(BLANK_BRIEF)
    document.addEntries([
      { ...BLANK_ENTRY, section: 'naca:2412' },
      { ...BLANK_ENTRY, section: 'naca:4412' },
    ])
    expect(document.unsaved.value).toBe(true)
    document.markSaved()
    expect(document.unsaved.value).toBe(false)
    document.moveEntry(0, 1)
    expect(document.brief.value.shortlist.map((entry) => entry.section)).toEqual(['naca:4412', 'naca:2412'])
    document.removeEntry(0)
    document.undo()
    document.undo()
    expect(document.unsaved.value).toBe(false)
    document.moveEntry(0, -1)
    expect(document.unsaved.value).toBe(false)
  })
})

describe('a number field', () => {
  const plain = { mayBeEmpty: false }
  it.each([
    ['2.5', 2.5],
    ['2,5', 2.5],
    [' -3 ', -3],
    ['−3', -3],
    ['1e3', 1000],
  ])('reads "%s"', (text, value) => expect(parseNumber(text, plain)).toEqual({ value, fault: null }))

  it.each([
    ['', plain, 'give a number'],
    ['ten', plain, '"ten" is not a number'],
    ['1,2,3', plain, 'is not a number'],
    ['0', { ...plain, above: 0 }, 'more than 0'],
    ['31', { ...plain, most: 30 }, '30 or less'],
    ['-1', { ...plain, least: 0 }, '0 or more'],
  ])('says what to type instead of "%s"', (text, rule, words) => {
    expect(parseNumber(text, rule).fault).toContain(words)
  })

  it('may be empty where that means something', () => {
    expect(parseNumber(' ', { mayBeEmpty: true })).toEqual({ value: null, fault: null })
  })
})

describe('the table', () => {
  it('sorts with missing figures last, either way, and keeps equals in order', () => {
    expect(sortedIndices([3, null, 1, 3], false)).toEqual([2, 0, 3, 1])
    expect(sortedIndices([3, null, 1, 3], true)).toEqual([0, 3, 2, 1])
  })

  it('shows a true minus, and none before a zero', () => {
    expect(shown(-1.25, 2)).toBe('−1.25')
    expect(shown(-0.001, 2)).toBe('0.00')
    expect(shown(null, 2)).toBe('–')
  })
})
