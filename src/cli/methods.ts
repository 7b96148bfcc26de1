import type { Method } from '../core'
import { wordOf } from './arguments'

/** The methods that the core has. */
const METHODS: readonly Method[] = ['thin', 'panel', 'viscous']

/** The most that the core can do. */
const DEFAULT_METHOD: Method = 'viscous'

/** The method that is asked for. Throws Failure for one that there is not. */
export function readMethod(text: string | undefined): Method {
  return text === undefined ? DEFAULT_METHOD : wordOf('--method', text, METHODS)
}

/** The part of the help that every command with methods shares. */
export const METHOD_HELP = `  --method thin|panel|viscous
                            thin-airfoil theory; vortex panels; or panels with boundary layers and wake,
                            which give drag, transition and stall (default: viscous)
`
