import { LAMINAR, RATES_LENGTH } from './stationRates'

/** One boundary layer or wake: stations along the flow. Arrays are written in place by the march. */
export interface Layer {
  readonly count: number
  /** Distance along the surface, chords, increasing. */
  readonly x: Float64Array
  readonly kind: Uint8Array
  /** Laminar: amplification exponent N. Turbulent: root of the shear stress coefficient. */
  readonly q: Float64Array
  /** Momentum thickness, chords. */
  readonly t: Float64Array
  /** Mass defect u d: edge speed times displacement thickness. */
  readonly m: Float64Array
  /** Edge speed over the speed of the stream. */
  readonly u: Float64Array
  /** Rates of each station in its own kind; see stationRates. */
  readonly rates: readonly Float64Array[]
  /** Where the transition lies. */
  readonly transition: Transition
}

/** The interval that holds the transition: it ends at station `at`, which is `count` when there is none. */
export interface Transition {
  at: number
  /** Share of the interval before the transition. */
  share: number
  forced: boolean
}

/** What turns the layer turbulent. */
export interface TransitionLaw {
  /** Critical amplification exponent N. */
  readonly amplification: number
  /** Distance along the surface at which transition is forced; Infinity when free. */
  readonly forcedAt: number
}

/** A layer of `count` stations with everything zero and laminar. */
export function emptyLayer(count: number): Layer {
  const array = (): Float64Array => new Float64Array(count)
  return {
    count,
    x: array(),
    kind: new Uint8Array(count).fill(LAMINAR),
    q: array(),
    t: array(),
    m: array(),
    u: array(),
    rates: Array.from({ length: count }, () => new Float64Array(RATES_LENGTH)),
    transition: { at: count, share: 1, forced: false },
  }
}
