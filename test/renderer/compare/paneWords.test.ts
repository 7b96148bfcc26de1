import { describe, expect, it } from 'vitest'
import type { Comparison } from '../../../src/core'
import { paneWords } from '../../../src/renderer/compare/paneWords'
import { comparisonOf, MAPPING, SLOWEST } from '../../support/comparisons'

/** Nothing computed, with a fault or none for each entry. */
function faulted(...faults: (string | null)[]): Comparison {
  const waiting = comparisonOf({ computed: false })
  return { ...waiting, entries: waiting.entries.map((entry, i) => ({ ...entry, fault: faults[i] ?? null })) }
}

describe('paneWords', () => {
  it('names each entry with its own fault where nothing can be drawn', () => {
    const words = paneWords(faulted('the outline crosses itself', 'too few points'), MAPPING, 0)
    expect(words).toContain('NACA 4412: the outline crosses itself')
    expect(words).toContain('NACA 2415 > NACA 2412: too few points')
  })

  it('says that it computes while one entry is faulty and another still waits', () => {
    expect(paneWords(faulted('the outline crosses itself', null), MAPPING, 0)).toBe('Computing…')
  })

  it('tells a reason that holds for all entries once, without their names', () => {
    const words = paneWords(comparisonOf(), SLOWEST, 0)
    expect(words).toMatch(/^Nothing to show at this condition: the slowest speed needs the viscous method/)
    expect(words).not.toContain('NACA')
  })
})
