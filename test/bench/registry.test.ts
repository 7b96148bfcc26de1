import { describe, expect, it } from 'vitest'
import { benches } from '../../bench/registry'

/** Names that others call. */
const FIXED = [
  ...['angle_sweep_41', 'angle_sweep_41_from_text', 'viscous_polar_31_re1e6', 'viscous_polar_31_re6e6'],
  ...['lifting_line', 'compare_cold', 'compare_warm', 'window_start'],
]

describe('the benches', () => {
  it('have names of their own, the fixed ones among them', () => {
    const names = benches.map((bench) => bench.name)
    expect(new Set(names).size).toBe(names.length)
    expect(names).toEqual(expect.arrayContaining([...FIXED]))
  })

  it.each(['angle_sweep_41', 'angle_sweep_41_from_text', 'viscous_polar_31_re1e6'])(
    '%s runs here, as a whole and in parts',
    async (name) => {
      const made = await benches.find((bench) => bench.name === name)?.make()
      if (made === undefined || !('run' in made)) throw new Error(name)
      for (const run of [made.run, ...Object.values(made.parts ?? {})]) await run()
      expect(Object.keys(made.parts ?? {}).length).toBeGreaterThan(2)
    },
  )
})
