/** An unexpected warning or error on the console fails the test that caused it. */
import { afterEach, beforeEach, vi } from 'vitest'

const calls: string[] = []

beforeEach(() => {
  calls.length = 0
  for (const level of ['warn', 'error'] as const) {
    vi.spyOn(console, level).mockImplementation((...words) => {
      calls.push(`console.${level}: ${words.map(String).join(' ')}`)
    })
  }
})

afterEach(() => {
  vi.restoreAllMocks()
  if (calls.length > 0) throw new Error(`unexpected output\n${calls.join('\n')}`)
})
