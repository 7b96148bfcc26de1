import type { Section } from '../shape/section'
import type { Method, Surface } from '../polar/polar'
import type { WingShape } from '../wing/planform'

/** The aircraft round the wing. Null fields are not known, and what needs them is null with a note. */
export interface Aircraft {
  /** Mass unless a condition gives its own, kg. */
  readonly mass: number
  /** Drag area of everything but the wing, m2. */
  readonly dragArea: number
  /** Distance from the wing's aerodynamic centre to the tail's, m, aft positive; null: no tail load is given. */
  readonly tailArm: number | null
  /** Centre of gravity aft of the leading edge of the mean aerodynamic chord, in that chord; null: at x_ac. */
  readonly centreOfGravity: number | null
  /** Without a tail the wing must balance itself. */
  readonly tailless: boolean
  readonly propellerEfficiency: number | null
}

/** One flight state, SI and radians. */
export interface Condition {
  readonly name: string
  /** True airspeed in m/s, or the slowest speed at which the wing can carry its load. */
  readonly speed: number | 'slowest'
  /** Geopotential pressure altitude, m. */
  readonly altitude: number
  /** Added to the standard temperature, K; pressure keeps its standard value. */
  readonly isaOffset: number
  readonly loadFactor: number
  /** kg */
  readonly mass: number
  readonly surface: Surface
  /** rad, trailing edge down positive. */
  readonly flap: number
  /** m/s */
  readonly climbRate: number | null
  /** A fixed Reynolds number at the mean aerodynamic chord; null: as flown. */
  readonly reynolds: number | null
}

/** One entry of the shortlist, read and ready; `fault` says why it cannot be computed. */
export interface JobEntry {
  readonly name: string
  /** What the root and the tip are called in files: for a one-section wing, twice the name. */
  readonly rootName: string
  readonly tipName: string
  readonly root: Section | null
  readonly tip: Section | null
  /** x/c of forced transition, 1: none; null: as the condition's surface says. */
  readonly tripUpper: number | null
  readonly tripLower: number | null
  readonly fault: string | null
}

/** Everything that the computation needs: the brief in SI units, with its sections read. */
export interface Job {
  readonly method: Method
  readonly wing: WingShape
  readonly aircraft: Aircraft
  /** Critical amplification factor N of the air. */
  readonly amplification: number
  readonly conditions: readonly Condition[]
  readonly entries: readonly JobEntry[]
  /** Spanwise place whose section is shown in the panes: y in m; null: the mean aerodynamic chord's. */
  readonly station: number | null
  /** Panels round a section. */
  readonly panels: number
}
