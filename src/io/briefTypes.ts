/**
 * The brief as it stands in a file (`*.brief.json`, version 1) with every default filled in. Units are in
 * the names. Null means "not given"; it is written back as an absent field.
 */
export interface Brief {
  readonly format: 'sectionwright brief'
  readonly version: 1
  readonly name: string
  readonly wing: BriefWing
  readonly aircraft: BriefAircraft
  readonly air: BriefAir
  readonly conditions: readonly BriefCondition[]
  readonly limits: readonly BriefLimit[]
  readonly rank_by: BriefRanking | null
  /** Distance from the centreline of the station shown in the panes; null: that of the mean aerodynamic chord. */
  readonly station_y_m: number | null
  readonly shortlist: readonly BriefEntry[]
}

export interface BriefWing {
  readonly area_m2: number
  readonly span_m: number
  readonly taper_ratio: number
  readonly washout_deg: number
  readonly sweep_quarter_chord_deg: number
  readonly spar_at_chord_fraction: number
  readonly skin_thickness_mm: number
  readonly flap: {
    readonly chord_fraction: number
    readonly from_semispan: number
    readonly to_semispan: number
  } | null
  /** In place of taper and washout; twist nose up positive. */
  readonly stations: readonly BriefStation[] | null
}

export interface BriefStation {
  readonly y_m: number
  readonly chord_m: number
  readonly twist_deg: number
}

export interface BriefAircraft {
  readonly mass_kg: number
  readonly drag_area_m2: number
  readonly tail_arm_m: number | null
  /** Aft of the leading edge of the mean aerodynamic chord, as a fraction of that chord. */
  readonly centre_of_gravity_mac_fraction: number | null
  readonly tailless: boolean
  readonly propeller_efficiency: number | null
}

/** Free-stream turbulence, or the critical amplification factor that overrides what follows from it. */
export interface BriefAir {
  readonly turbulence_percent: number
  readonly amplification: number | null
}

export interface BriefCondition {
  readonly name: string
  readonly speed_m_s: number | 'slowest'
  readonly altitude_m: number
  readonly isa_offset_K: number
  readonly load_factor: number
  /** null: the aircraft's */
  readonly mass_kg: number | null
  readonly surface: 'clean' | 'dirty'
  readonly flap_deg: number
  readonly climb_rate_m_s: number | null
  /** A fixed Reynolds number at the mean aerodynamic chord; null: as flown. */
  readonly reynolds: number | null
}

export interface BriefLimit {
  readonly figure: string
  readonly at_most: number | null
  readonly at_least: number | null
  /** null: judged wherever the figure exists, the worst counts */
  readonly condition: string | null
}

export interface BriefRanking {
  readonly figure: string
  readonly condition: string | null
  readonly best: 'least' | 'most'
}

/** A change to a section: made from its parent when the brief is read. */
export interface BriefChange {
  readonly thickness: number | null
  readonly camber: number | null
  readonly flap: { readonly chord_fraction: number; readonly deflection_deg: number } | null
  readonly trailing_edge_gap: number | null
}

/** One entry of the shortlist: `section`, or a `root` and `tip` pair. */
export interface BriefEntry {
  readonly section: string | null
  readonly root: string | null
  readonly tip: string | null
  readonly name: string | null
  readonly edge: 'closed' | 'open' | null
  readonly chord_line: 'file' | 'longest' | null
  /** Outline as understood, chord 1, upper trailing edge round to the lower one: the file is then not needed. */
  readonly coordinates: readonly (readonly [number, number])[] | null
  readonly root_coordinates: readonly (readonly [number, number])[] | null
  readonly tip_coordinates: readonly (readonly [number, number])[] | null
  readonly trip_upper: number | null
  readonly trip_lower: number | null
  readonly change: BriefChange | null
  /** Index into the palette; null: the next free one. */
  readonly colour: number | null
  /** Index into the marks (dash and point shape); null: follows the colour. */
  readonly mark: number | null
}
