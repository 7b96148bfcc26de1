/** How a polar was computed. */
export type Method = 'thin' | 'panel' | 'viscous'

/** Free transition, or transition forced near the leading edge. */
export type Surface = 'clean' | 'dirty'

/** One angle of a polar. Fields that the method cannot give are null. */
export interface PolarPoint {
  /** Angle of attack from the chord line, rad. */
  readonly alpha: number
  readonly liftCoefficient: number | null
  readonly dragCoefficient: number | null
  /** About the quarter chord, nose up positive. */
  readonly momentCoefficient: number | null
  /** x/c where the flow turns turbulent; 1 if laminar to the edge; null without a boundary layer. */
  readonly transitionUpper: number | null
  readonly transitionLower: number | null
  readonly converged: boolean
  /** Why the point failed or deserves a mark; empty when there is nothing to say. */
  readonly reason: string
}

/** An angle sweep of one section at one state. */
export interface Polar {
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
  readonly points: readonly PolarPoint[]
}
