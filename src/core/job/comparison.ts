import type { Measures } from '../shape/measures'
import type { Waviness } from '../shape/waviness'
import type { Section } from '../shape/section'
import type { ThinAirfoil } from '../flow/thinAirfoil'
import type { Polar, Method } from '../polar/polar'
import type { WingShape } from '../wing/planform'
import type { WingAtCondition } from '../wing/wing'
import type { Condition } from './job'
import type { PressureResult } from '../polar/state'

/** What is known of the shortlist on the wing at each condition: made from any subset of the results. */
export interface Comparison {
  readonly method: Method
  readonly wing: WingShape
  /** Distance of the shown station from the centreline, m. */
  readonly stationY: number
  readonly conditions: readonly Condition[]
  /** Density of the air at each condition, kg/m3. */
  readonly densities: readonly number[]
  readonly entries: readonly ComparedEntry[]
}

/** One entry of the shortlist, in the order of the brief. */
export interface ComparedEntry {
  /** As it stands in the section column of files. */
  readonly name: string
  readonly rootName: string
  readonly tipName: string
  /** Why nothing can be computed for it; null when it can. */
  readonly fault: string | null
  readonly root: SectionFacts | null
  /** The same object as `root` for a one-section wing. */
  readonly tip: SectionFacts | null
  readonly polars: readonly EntryPolar[]
  /** One for each condition of the brief, in its order. */
  readonly conditions: readonly EntryAtCondition[]
}

/** Facts of a section that need no flow solution. */
export interface SectionFacts {
  readonly section: Section
  readonly measures: Measures
  readonly thin: ThinAirfoil
  readonly waviness: Waviness
  /** Depth at the brief's spar place, chords, skin included. */
  readonly depthAtSpar: number
}

/** A polar that the comparison used. */
export interface EntryPolar {
  readonly at: 'root' | 'tip'
  readonly polar: Polar
}

/** One entry at one condition. */
export interface EntryAtCondition {
  /** `waiting` until the results that it needs are there; `marked` when `notes` say why a figure is missing. */
  readonly status: 'waiting' | 'known' | 'marked'
  readonly wing: WingAtCondition | null
  /** What is missing or doubtful, in plain sentences. */
  readonly notes: readonly string[]
  /** The section shown in the panes; null until the wing is known. */
  readonly pane: PaneState | null
}

/** The state at which the panes show a section: that of the chosen station. */
export interface PaneState {
  /** m from the centreline */
  readonly stationY: number
  /** The section there: between root and tip by straight lines. */
  readonly section: Section | null
  readonly liftCoefficient: number
  readonly reynolds: number
  readonly mach: number
  readonly surface: 'clean' | 'dirty'
  /** The polar at this state, interpolated on the lattice; null until known. */
  readonly polar: Polar | null
  /** null until computed */
  readonly pressure: PressureResult | null
}
