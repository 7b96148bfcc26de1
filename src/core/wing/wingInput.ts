import type { FlightInput } from '../flight/conditions'
import type { SectionLine } from '../polar/liftLine'
import type { WingShape } from './planform'
import type { WingFamilies } from './viscousStations'

/** What a wing needs to be computed at a condition. */
export interface WingInput {
  readonly shape: WingShape
  readonly aircraft: {
    readonly tailArm: number | null
    readonly centreOfGravity: number | null
    /** Without a tail there is no tail load, whatever the arm. */
    readonly tailless: boolean
    /** Of everything but the wing, m2. */
    readonly dragArea?: number
  }
  readonly condition: FlightInput
  /** Section properties at the root and at the tip, linear in y between them. */
  readonly root: SectionLine
  readonly tip: SectionLine
  /** A Reynolds number at the mean aerodynamic chord in place of that flown; null: as flown. */
  readonly fixedReynolds: number | null
  /** Viscous polars: each station then has the lift line, drag and stall of its own Reynolds number. */
  readonly families?: WingFamilies
}
