/** One station of a wing: distance from the centreline, chord, and twist against the root chord. */
export interface WingStation {
  /** m */
  readonly y: number
  /** m */
  readonly chord: number
  /** rad, nose up positive. */
  readonly twist: number
}

/** A wing by its stations from y = 0 to the tip (at least two), straight between them. */
export interface WingShape {
  /** m2, both halves, centre part included. */
  readonly area: number
  /** m */
  readonly span: number
  readonly stations: readonly WingStation[]
  /** Sweep of the quarter-chord line, rad, aft positive. */
  readonly sweepQuarterChord: number
  /** Chord fraction of the main spar, for the depth available to it. */
  readonly sparAt: number
  /** m */
  readonly skinThickness: number
  readonly flap: {
    readonly chordFraction: number
    readonly fromSemispan: number
    readonly toSemispan: number
  } | null
}
