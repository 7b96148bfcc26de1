import {
  criticalAmplification,
  DEFAULT_PANELS,
  FEWEST_PANELS,
  GREATEST_MACH,
  GREATEST_REYNOLDS,
  LEAST_REYNOLDS,
  MOST_PANELS,
  type Method,
  type SectionState,
} from '../core'
import { numberIn, wordOf } from './arguments'
import { Failure } from './failure'
import { METHOD_HELP, readMethod } from './methods'

/** The options of every command that solves the flow round single sections. */
export const FLOW_OPTIONS = {
  method: { type: 'string' },
  reynolds: { type: 'string', multiple: true },
  mach: { type: 'string', default: '0' },
  turbulence: { type: 'string' },
  amplification: { type: 'string' },
  surface: { type: 'string', default: 'clean' },
  'trip-upper': { type: 'string' },
  'trip-lower': { type: 'string' },
  panels: { type: 'string', default: String(DEFAULT_PANELS) },
} as const

/** The options as they were given. */
export interface FlowArguments {
  readonly method?: string | undefined
  readonly reynolds?: readonly string[] | undefined
  readonly mach: string
  readonly turbulence?: string | undefined
  readonly amplification?: string | undefined
  readonly surface: string
  readonly 'trip-upper'?: string | undefined
  readonly 'trip-lower'?: string | undefined
  readonly panels: string
}

/** x/c at which a dirty surface trips the flow. */
const DIRTY = { upper: 0.05, lower: 0.1 }

/**
 * The states that the options name, one for each Reynolds number; one alone where the method takes none.
 *
 * Throws Failure that names the option and what it takes.
 */
export function readStates(given: FlowArguments): SectionState[] {
  const method = readMethod(given.method)
  const amplification = readAir(given)
  const reynolds = readReynolds(method, given.reynolds ?? [])
  const named = wordOf('--surface', given.surface, ['clean', 'dirty'])
  const usual = named === 'dirty' ? DIRTY : { upper: 1, lower: 1 }
  const trip = (option: '--trip-upper' | '--trip-lower', text: string | undefined, none: number): number =>
    text === undefined ? none : numberIn(option, text, 0, 1)
  const tripUpper = trip('--trip-upper', given['trip-upper'], usual.upper)
  const tripLower = trip('--trip-lower', given['trip-lower'], usual.lower)
  const panels = numberIn('--panels', given.panels, FEWEST_PANELS, MOST_PANELS)
  if (!Number.isInteger(panels)) throw new Failure(`--panels takes a whole number, not "${given.panels}"`)
  const state: SectionState = {
    method,
    reynolds: null,
    mach: numberIn('--mach', given.mach, 0, GREATEST_MACH),
    surface: tripUpper < 1 || tripLower < 1 ? 'dirty' : named,
    amplification: null,
    tripUpper,
    tripLower,
    flap: 0,
    panels,
  }
  if (method !== 'viscous') return [state]
  return reynolds.map((value) => ({ ...state, reynolds: value, amplification }))
}

/** Chord Reynolds numbers. A method without boundary layers takes any number and does not use it. */
function readReynolds(method: Method, given: readonly string[]): number[] {
  if (method !== 'viscous') return given.map((text) => numberIn('--reynolds', text, 0, Number.MAX_VALUE))
  if (given.length === 0) {
    throw new Failure(
      `--reynolds R is needed, ${LEAST_REYNOLDS} to ${GREATEST_REYNOLDS}: chord times speed over kinematic ` +
        'viscosity (or choose --method panel, which has no boundary layer)',
    )
  }
  return given.map((text) => numberIn('--reynolds', text, LEAST_REYNOLDS, GREATEST_REYNOLDS))
}

/** The critical amplification factor, from turbulence in per cent or as given; not both. */
function readAir({ turbulence, amplification }: FlowArguments): number {
  if (turbulence !== undefined && amplification !== undefined) {
    throw new Failure('--turbulence and --amplification say the same thing: give one of them')
  }
  if (amplification !== undefined) return numberIn('--amplification', amplification, 0, 14)
  return criticalAmplification(numberIn('--turbulence', turbulence ?? '0.07', 0.07, 2.98) / 100)
}

/** The part of the help that these options share. */
export const FLOW_HELP = `${METHOD_HELP}  --reynolds R              chord Reynolds number, ${LEAST_REYNOLDS} to ${GREATEST_REYNOLDS}; viscous needs it, the others ignore it
  --mach M                  free-stream Mach number, 0 to ${GREATEST_MACH} (default 0; thin is always incompressible)
  --turbulence PERCENT      free-stream turbulence, 0.07 to 2.98 (default 0.07, still air)
  --amplification N         or the critical amplification factor that it stands for, 0 to 14
  --surface clean|dirty     dirty: transition is forced at 0.05 chord above and 0.10 below (default clean)
  --trip-upper X            transition is forced at this chord fraction on one side, unless it comes earlier
  --trip-lower X            by itself; 1: none. Either one makes the surface dirty
  --panels N                panels round the section, ${FEWEST_PANELS} to ${MOST_PANELS} (default ${DEFAULT_PANELS})
`
