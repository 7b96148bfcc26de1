import { log } from '../numerics/elementary'
import { GREATEST_REYNOLDS, LEAST_REYNOLDS } from './viscousState'

const RATIO = 1.5

/** The Reynolds numbers at which polars are computed: 5e4 times 1.5^k, the last 2e7; between them they are interpolated. */
export const REYNOLDS_LATTICE: readonly number[] = latticeValues()

function latticeValues(): number[] {
  const values: number[] = []
  for (let value = LEAST_REYNOLDS; value < GREATEST_REYNOLDS; value *= RATIO) values.push(value)
  return [...values, GREATEST_REYNOLDS]
}

/** The lattice values that bracket a Reynolds number, and how far it lies between them in its logarithm. */
export interface ReynoldsBracket {
  readonly low: number
  readonly high: number
  /** 0 at `low`, 1 at `high`. */
  readonly fraction: number
  /** Whether it lies beyond the lattice, whose end then stands in for it. */
  readonly outside: boolean
}

/** The bracket of a Reynolds number. */
export function reynoldsBracket(reynolds: number): ReynoldsBracket {
  const held = Math.min(Math.max(reynolds, LEAST_REYNOLDS), GREATEST_REYNOLDS)
  const outside = held !== reynolds
  const low = REYNOLDS_LATTICE.findLast((value) => value <= held)!
  if (low === held) return { low, high: low, fraction: 0, outside }
  const high = REYNOLDS_LATTICE.find((value) => value > held)!
  return { low, high, fraction: log(held / low) / log(high / low), outside }
}

/** The lattice values that all Reynolds numbers from `least` to `greatest` need, ascending. */
export function reynoldsNodes(least: number, greatest: number): number[] {
  const { low } = reynoldsBracket(least)
  const { high } = reynoldsBracket(greatest)
  return REYNOLDS_LATTICE.filter((value) => value >= low && value <= high)
}
