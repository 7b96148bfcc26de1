/** A state that the pointer or the keyboard rests on in one pane, marked in all others. */
export interface HoverState {
  /** Index of the entry. */
  readonly entry: number
  /** Angle of attack, rad; null where a pane knows only a place. */
  readonly alpha: number | null
  /** Chord fraction; null where a pane knows only an angle. */
  readonly xOverC: number | null
}
