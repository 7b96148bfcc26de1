import type { Comparison, Method } from '../../core'
import type { Brief, BriefEntry } from '../../io/briefTypes'

/** Methods that the window offers, the one that it begins with first. */
export const METHODS: readonly { readonly method: Method; readonly words: string }[] = [
  { method: 'viscous', words: 'with boundary layers' },
  { method: 'panel', words: 'panels, without boundary layers' },
  { method: 'thin', words: 'thin-airfoil theory' },
]

/** What the window asks of the desk worker. */
export type DeskRequest =
  | { readonly kind: 'compute'; readonly version: number; readonly brief: Brief; readonly method: Method }
  | { readonly kind: 'cancel' }
  | { readonly kind: 'ask'; readonly id: number; readonly question: Question }

/** Questions with one answer each. */
export type Question =
  | { readonly kind: 'read sections'; readonly files: readonly { name: string; bytes: Uint8Array }[] }
  | { readonly kind: 'read codes'; readonly text: string }
  | { readonly kind: 'read brief'; readonly name: string; readonly bytes: Uint8Array }
  | { readonly kind: 'brief text'; readonly brief: Brief }
  | { readonly kind: 'export'; readonly brief: Brief; readonly method: Method }

/** The report of one text read as a section; `entry` is null when it could not be. */
export interface Reading {
  readonly name: string
  readonly entry: BriefEntry | null
  readonly understood: readonly string[]
  readonly warnings: readonly string[]
  /** Why it could not be read: file, line and cure. */
  readonly fault: string | null
}

export interface Answers {
  'read sections': readonly Reading[]
  'read codes': readonly Reading[]
  'read brief': Brief
  'brief text': string
  export: readonly { readonly name: string; readonly text: string }[]
}

/** What comes back from the desk. */
export type DeskMessage =
  | {
      readonly kind: 'comparison'
      readonly version: number
      readonly comparison: Comparison
      readonly faults: readonly string[]
      readonly warnings: readonly string[]
      readonly done: number
      readonly asked: number
      readonly finished: boolean
    }
  | { readonly kind: 'cancelled'; readonly version: number }
  | { readonly kind: 'failed'; readonly version: number; readonly message: string }
  | { readonly kind: 'answer'; readonly id: number; readonly answer: unknown }
  | { readonly kind: 'refused'; readonly id: number; readonly message: string }
