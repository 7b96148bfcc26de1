import type { Method } from '../core'
import { wordOf } from './arguments'

/** The methods that the core has. */
const METHODS: readonly Method[] = ['thin', 'panel']

/** The most that the core can do. */
const DEFAULT_METHOD: Method = 'panel'

/** The method that is asked for. Throws Failure for one that there is not. */
export function readMethod(text: string | undefined): Method {
  return text === undefined ? DEFAULT_METHOD : wordOf('--method', text, METHODS)
}
