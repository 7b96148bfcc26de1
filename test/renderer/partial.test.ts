import { describe, expect, it } from 'vitest'
import { entryProgress, progressWords, shownMeanwhile } from '../../src/renderer/state/partial'
import { comparisonOf } from '../support/comparisons'

const whole = comparisonOf()
const begun = comparisonOf({ computed: false })

describe('a comparison that is still computed', () => {
  it('counts the conditions that each section waits for', () => {
    // The slowest condition needs no result to be marked.
    expect(entryProgress(begun)).toEqual([
      { done: 1, of: 2 },
      { done: 1, of: 2 },
    ])
    expect(entryProgress(whole).every(({ done, of }) => done === of)).toBe(true)
  })

  it('says how far a section is, and nothing when it is done', () => {
    expect(progressWords({ done: 0, of: 2 })).toBe('waiting…')
    expect(progressWords({ done: 1, of: 2 })).toBe('1 of 2 conditions done')
    expect(progressWords({ done: 2, of: 2 })).toBe('')
  })

  it('lends sections from the last good one until their own results are there', () => {
    const half = { ...begun, entries: [whole.entries[0]!, begun.entries[1]!] }
    const older = { ...whole, entries: whole.entries.map((entry) => ({ ...entry })) }
    const shown = shownMeanwhile(older, half)
    expect(shown.entries[0]).toBe(half.entries[0])
    expect(shown.entries[1]).toBe(older.entries[1])
  })

  it('lends nothing from other conditions or another method', () => {
    expect(shownMeanwhile({ ...whole, method: 'thin' }, begun)).toBe(begun)
    expect(shownMeanwhile({ ...whole, conditions: whole.conditions.slice(1) }, begun)).toBe(begun)
    expect(shownMeanwhile(null, begun)).toBe(begun)
  })
})
