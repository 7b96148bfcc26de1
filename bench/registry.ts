import { angleSweep, angleSweepFromText } from './core/polar/angleSweep.bench'

/** What is timed: `run` as a whole and, if given, its parts on their own. Times are medians. */
export interface Measured {
  readonly run: () => void | Promise<void>
  readonly parts?: Readonly<Record<string, () => void | Promise<void>>>
  readonly note?: string
}

/** Why a bench cannot run on this machine. */
export interface NotHere {
  readonly note: string
}

/** One bench: `make` sets it up, untimed, in the process that measures it. */
export interface Bench {
  readonly name: string
  readonly make: () => Measured | NotHere | Promise<Measured | NotHere>
}

/** All benches, in the order in which they run. */
export const benches: readonly Bench[] = [
  { name: 'angle_sweep_41', make: angleSweep },
  { name: 'angle_sweep_41_from_text', make: angleSweepFromText },
]
