import type { SurfaceLayers } from '../flow/surfaceLayers'
import type { Method, Surface } from './polar'

/** The state at which one section is computed. Plain data: it crosses to a worker and names a cached result. */
export interface SectionState {
  readonly method: Method
  /** Chord Reynolds number; null unless viscous. */
  readonly reynolds: number | null
  readonly mach: number
  readonly surface: Surface
  /** Critical amplification factor N; null unless viscous. */
  readonly amplification: number | null
  /** x/c of forced transition, 1 when free. */
  readonly tripUpper: number
  readonly tripLower: number
  /** Plain flap deflection, rad, trailing edge down positive. */
  readonly flap: number
  readonly panels: number
}

/** Where on its polar a section is asked for: at an angle (rad) or at a lift coefficient. */
export type Operating = { readonly alpha: number } | { readonly lift: number }

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
  /** Both boundary layers; null without the viscous method or when not converged. */
  readonly layers: SurfaceLayers | null
  readonly converged: boolean
  readonly reason: string
}
