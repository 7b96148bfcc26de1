import type { Measured } from './registry'

/** Time spent on warming up and on measuring, ms, and the fewest and most runs that count. */
const WARM_UP = 600
const MEASURE = 1500
const FEWEST_RUNS = 3
const MOST_RUNS = 300

/** The figures of one bench. `parts` are medians in ms. */
export interface Figures {
  readonly median_ms: number
  readonly runs: number
  readonly peak_MB: number
  readonly parts?: Readonly<Record<string, number>>
  readonly note?: string
}

/** Warms a bench up and measures it and its parts in this process. */
export async function measure(bench: Measured): Promise<Figures> {
  const whole = await times(bench.run)
  const peak = process.resourceUsage().maxRSS / 1024
  const parts: Record<string, number> = {}
  for (const [name, run] of Object.entries(bench.parts ?? {})) parts[name] = rounded(median(await times(run)))
  return {
    median_ms: rounded(median(whole)),
    runs: whole.length,
    peak_MB: rounded(peak),
    ...(bench.parts ? { parts } : {}),
    ...(bench.note === undefined ? {} : { note: bench.note }),
  }
}

async function times(run: () => void | Promise<void>): Promise<number[]> {
  const warm = performance.now() + WARM_UP
  do await run()
  while (performance.now() < warm)
  const taken: number[] = []
  const end = performance.now() + MEASURE
  while (taken.length < FEWEST_RUNS || (taken.length < MOST_RUNS && performance.now() < end)) {
    const start = performance.now()
    await run()
    taken.push(performance.now() - start)
  }
  return taken
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b)
  const middle = sorted.length >> 1
  return sorted.length % 2 === 1 ? sorted[middle] : 0.5 * (sorted[middle - 1] + sorted[middle])
}

function rounded(value: number): number {
  return Number(value.toPrecision(4))
}
