/** An axis of a plot. */
export interface Axis {
  /** Plain words with the unit. */
  readonly label: string
  /** What a read-out calls the value. */
  readonly symbol: string
  /** What a read-out puts behind the value, with its space; empty for a bare number. */
  readonly unit: string
  /** Decimals of a read-out. */
  readonly decimals: number
  /** Larger values point down (pressure: suction up). */
  readonly reversed?: boolean
  readonly from?: number
  readonly to?: number
  /** Nearly equal values are not spread over more than this. */
  readonly leastSpan?: number
}

/** The state that a point of a curve stands for, so that other plots can mark the same. */
export interface PointState {
  /** Index of the entry. */
  readonly entry: number
  /** Angle of attack, rad; null where the plot knows only a place. */
  readonly alpha: number | null
  /** Chord fraction; null where the plot knows only an angle. */
  readonly xOverC: number | null
  /** Side of the section, where the place is on one. */
  readonly side: 'upper' | 'lower' | null
  /** Distance from the centreline of the wing, m; null where the plot shows a section. */
  readonly spanY: number | null
}

/** A curve of one entry. */
export interface Curve {
  readonly entry: number
  readonly name: string
  readonly x: readonly number[]
  readonly y: readonly number[]
  readonly states: readonly PointState[]
  /** Indices of points that no line joins to the one before: what lies between did not converge. */
  readonly breaks?: readonly number[]
  /** The side of the section that a curve of one side belongs to; the lower one is drawn thinner. */
  readonly side?: 'upper' | 'lower'
}

/** An angle at which an entry has no result. */
export interface PlotFailure {
  readonly entry: number
  readonly name: string
  /** rad */
  readonly alpha: number
  readonly reason: string
}

/** The greatest or least lift of an entry. */
export interface PlotEnd {
  readonly entry: number
  readonly x: number
  readonly y: number
  /** What limits the lift, in words. */
  readonly words: string
}

/** What happens to a layer at a place of the surface. */
export type LayerEventKind = 'transition' | 'laminar separation' | 'reattachment' | 'turbulent separation'

/** An event of a layer, drawn on a curve. */
export interface PlotEvent {
  readonly entry: number
  readonly kind: LayerEventKind
  readonly x: number
  readonly y: number
}

/** A single point that is marked on a curve: the shown condition. */
export interface PlotMark {
  readonly entry: number
  readonly x: number
  readonly y: number
}

/** A line across the plot at a value of one axis. */
export interface ReferenceLine {
  readonly axis: 'x' | 'y'
  readonly at: number
}

/** What is drawn, not how: made from a comparison, drawn by the window or into a file. */
export interface Plot {
  readonly key: string
  readonly title: string
  readonly x: Axis
  readonly y: Axis
  readonly curves: readonly Curve[]
  readonly marks: readonly PlotMark[]
  readonly lines: readonly ReferenceLine[]
  /** Failed angles; marked on the edge of a plot whose x axis is the angle in degrees. */
  readonly failures?: readonly PlotFailure[]
  readonly ends?: readonly PlotEnd[]
  readonly events?: readonly PlotEvent[]
}

export const DEGREES = 180 / Math.PI

/** A state of an entry of which only the given parts are known. */
export function stateOf(entry: number, known: Partial<Omit<PointState, 'entry'>>): PointState {
  return { entry, alpha: null, xOverC: null, side: null, spanY: null, ...known }
}
