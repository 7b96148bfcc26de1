import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { Measured } from '../registry'

const BRIEF = 'sample-data/two-seat-trainer.brief.json'
/** `compare` ends with 1 here: the condition "slowest" is marked. */
const GOOD = [0, 1]

function compare(cache: string): void {
  const out = mkdtempSync(join(tmpdir(), 'sectionwright-bench-'))
  const { status, stderr } = spawnSync(
    process.execPath,
    ['out/main/cli.js', 'compare', BRIEF, '--out', out],
    {
      env: { ...process.env, XDG_CACHE_HOME: cache },
    },
  )
  rmSync(out, { recursive: true, force: true })
  if (!GOOD.includes(status ?? -1)) throw new Error(String(stderr))
}

/** The whole `compare` as a process, with an empty cache each time. */
export function compareCold(): Measured {
  return {
    run: () => {
      const cache = mkdtempSync(join(tmpdir(), 'sectionwright-cache-'))
      compare(cache)
      rmSync(cache, { recursive: true, force: true })
    },
    note: 'whole process, all cores: polars, pressures and wings of five entries at five conditions',
  }
}

/** The same again from the cache. */
export function compareWarm(): Measured {
  const cache = join(tmpdir(), 'sectionwright-bench-cache')
  compare(cache)
  return { run: () => compare(cache), note: 'whole process, results from the cache' }
}
