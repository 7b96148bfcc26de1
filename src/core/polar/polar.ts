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

/** The end of a polar's usable lift. */
export interface LiftLimit {
  /** rad */
  readonly alpha: number
  readonly liftCoefficient: number
  /** `layers`: the layers separate and lift falls behind it; `nose`: the suction peak of a thin nose. */
  readonly by: 'layers' | 'nose'
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
  /** One for each angle asked for. */
  readonly points: readonly PolarPoint[]
  /** Converged points that the viscous sweep added where the polar bends, by angle; never exported. */
  readonly between: readonly PolarPoint[]
  /** Greatest and least section lift; null where the polar does not reach them or the method has none. */
  readonly maxLift: LiftLimit | null
  readonly minLift: LiftLimit | null
}

/** What a polar without boundary layers has to say of its ends. */
export const NO_LIMITS = { between: [], maxLift: null, minLift: null } as const

/** The reason of an angle that a sweep to the stall left out: nobody needs it, and nothing failed there. */
export const PAST_STALL = 'past the stall or the last angles with a solution: not computed'
