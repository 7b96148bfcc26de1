import type { Section } from '../shape/section'
import type { Method, Polar, Surface } from '../polar/polar'

/** The state at which one section is computed. Plain data: it crosses to a worker and names a cached result. */
export interface SectionState {
  readonly method: Method
  /** null unless viscous */
  readonly reynolds: number | null
  readonly mach: number
  readonly surface: Surface
  readonly amplification: number | null
  readonly tripUpper: number
  readonly tripLower: number
  /** rad */
  readonly flap: number
  readonly panels: number
}

/** One piece of work for a worker. */
export type Task =
  | { readonly kind: 'polar'; readonly section: Section; readonly state: SectionState; readonly alphas: readonly number[] }
  | { readonly kind: 'pressure'; readonly section: Section; readonly state: SectionState; readonly at: { readonly alpha: number } | { readonly lift: number } }

/** Surface pressure of one section at one angle, from the upper trailing edge round to the lower one. */
export interface PressureResult {
  readonly method: Method
  /** rad */
  readonly alpha: number
  readonly liftCoefficient: number
  readonly momentCoefficient: number
  readonly x: Float64Array
  readonly y: Float64Array
  readonly pressureCoefficient: Float64Array
  readonly converged: boolean
  readonly reason: string
}

/** What came of a task. */
export type TaskResult =
  | { readonly kind: 'polar'; readonly polar: Polar }
  | { readonly kind: 'pressure'; readonly pressure: PressureResult }
