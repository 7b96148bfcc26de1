import { BadInput } from '../numerics/errors'
import type { Polar } from '../polar/polar'
import type { Operating, PressureResult, SectionState } from '../polar/state'
import { pressureAt, sweep } from '../polar/sweep'
import type { Section } from '../shape/section'

/** One piece of work for a worker: plain data. */
export type Task =
  | {
      readonly kind: 'polar'
      readonly section: Section
      readonly state: SectionState
      readonly alphas: readonly number[]
      /** Ends the viscous sweep each way once the stall is sure. */
      readonly toTheStall?: boolean
    }
  | {
      readonly kind: 'pressure'
      readonly section: Section
      readonly state: SectionState
      readonly at: Operating
    }

/** What came of a task. A failed one says why in a plain sentence. */
export type TaskResult =
  | { readonly kind: 'polar'; readonly polar: Polar }
  | { readonly kind: 'pressure'; readonly pressure: PressureResult }
  | { readonly kind: 'failed'; readonly reason: string }

/** Runs one task to its end. Input that makes no sense comes back as a failed result, not as an exception. */
export function runTask(task: Task): TaskResult {
  try {
    return task.kind === 'polar'
      ? { kind: 'polar', polar: sweep(task.section, task.state, task.alphas, task) }
      : { kind: 'pressure', pressure: pressureAt(task.section, task.state, task.at) }
  } catch (error) {
    if (error instanceof BadInput) return { kind: 'failed', reason: error.message }
    throw error
  }
}
