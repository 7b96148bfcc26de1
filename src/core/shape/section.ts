/**
 * A section: the outline of an airfoil with chord 1, x aft, y up.
 *
 * The outline runs from the upper trailing edge forward over the upper surface, round the nose and
 * back along the lower surface to the lower trailing edge. A closed edge repeats the point.
 */
export interface Section {
  /** What the user calls it: a NACA designation or the title of the file. */
  readonly name: string
  /** Abscissae of the outline in chords, n points. */
  readonly x: Float64Array
  /** Ordinates of the outline in chords, n points. */
  readonly y: Float64Array
  /** The mean line where it is known in closed form (generated sections), else null. */
  readonly meanLine: MeanLine | null
  /** What was understood or assumed when the section was read, in plain sentences. */
  readonly notes: readonly string[]
}

/**
 * Mean lines of the 4- and 5-digit families, as polynomials in x on two pieces: ahead of `joint` and
 * behind it. `front[k]` and `rear[k]` multiply x^k, so the slope has a closed-form Fourier series.
 */
export interface MeanLine {
  readonly joint: number
  readonly front: readonly number[]
  readonly rear: readonly number[]
}

/** How the trailing edge of a generated section ends: closed (thickness 0) or open (the published form). */
export type Edge = 'closed' | 'open'

/** Which line a section read from a file is measured from; null: the rule of the reader decides. */
export type ChordLine = 'file' | 'longest'
