import { compareCold, compareWarm } from './cli/compare.bench'
import { shortlistOfSix } from './core/job/shortlist.bench'
import { angleSweep, angleSweepFromText } from './core/polar/angleSweep.bench'
import { viscousPolar } from './core/polar/viscousPolar.bench'
import { liftingLine } from './core/wing/liftingLine.bench'
import { windowStart } from './renderer/windowStart.bench'
import { viscousShortlist } from './run/viscousShortlist.bench'

/** What is timed: `run` as a whole and, if given, its parts on their own. Times are medians. */
export interface Measured {
  readonly run: () => void | Promise<void>
  readonly parts?: Readonly<Record<string, () => void | Promise<void>>>
  readonly note?: string
  /** Puts away what the bench started. */
  readonly stop?: () => void | Promise<void>
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
  { name: 'viscous_polar_31_re1e6', make: () => viscousPolar(1e6) },
  { name: 'viscous_polar_31_re6e6', make: () => viscousPolar(6e6) },
  { name: 'viscous_shortlist_6x5', make: viscousShortlist },
  { name: 'lifting_line', make: liftingLine },
  { name: 'shortlist_of_six', make: shortlistOfSix },
  { name: 'compare_cold', make: compareCold },
  { name: 'compare_warm', make: compareWarm },
  { name: 'window_start', make: windowStart },
]
