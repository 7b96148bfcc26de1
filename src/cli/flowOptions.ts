import {
  criticalAmplification,
  DEFAULT_PANELS,
  FEWEST_PANELS,
  GREATEST_MACH,
  MOST_PANELS,
  type SectionState,
} from '../core'
import { numberIn, wordOf } from './arguments'
import { Failure } from './failure'
import { readMethod } from './methods'

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
  const reynolds = (given.reynolds ?? []).map((text) => numberIn('--reynolds', text, 1, 1e9))
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
  if (reynolds.length === 0) throw new Failure('--method viscous needs --reynolds R')
  return reynolds.map((value) => ({ ...state, reynolds: value, amplification }))
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
export const FLOW_HELP = `  --method thin|panel       thin-airfoil theory, or vortex panels (default: panel)
  --mach M                  free-stream Mach number, 0 to ${GREATEST_MACH} (default 0; thin is always incompressible)
  --surface clean|dirty     dirty: the flow is turbulent from 0.05 chord above and 0.10 below (default clean)
  --trip-upper X            transition forced at this chord fraction on one side; 1: none
  --trip-lower X
  --panels N                panels round the section, ${FEWEST_PANELS} to ${MOST_PANELS} (default ${DEFAULT_PANELS})
  --reynolds R              Reynolds number; not used by thin and panel
  --turbulence PERCENT      free-stream turbulence, 0.07 to 2.98; not used by thin and panel
  --amplification N         critical amplification factor instead, 0 to 14; not used by thin and panel
`
