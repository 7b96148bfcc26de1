import type { Brief, BriefCondition, BriefEntry } from '../../io/briefTypes'

/** An entry of the shortlist with nothing given. */
export const BLANK_ENTRY: BriefEntry = {
  ...{ section: null, root: null, tip: null, name: null, edge: null, chord_line: null },
  ...{ coordinates: null, root_coordinates: null, tip_coordinates: null },
  ...{ trip_upper: null, trip_lower: null, change: null, colour: null, mark: null },
}

/** A condition of level flight at sea level. */
export function blankCondition(name: string): BriefCondition {
  return {
    ...{ name, speed_m_s: 25, altitude_m: 0, isa_offset_K: 0, load_factor: 1, mass_kg: null },
    ...{ surface: 'clean', flap_deg: 0, climb_rate_m_s: null, reynolds: null },
  }
}

/** A brief to begin with: a small drone without a section. */
export const BLANK_BRIEF: Brief = {
  ...{ format: 'sectionwright brief', version: 1, name: 'New brief' },
  wing: {
    ...{ area_m2: 1, span_m: 3, taper_ratio: 1, washout_deg: 0, sweep_quarter_chord_deg: 0 },
    ...{ spar_at_chord_fraction: 0.3, skin_thickness_mm: 0, flap: null, stations: null },
  },
  aircraft: {
    ...{ mass_kg: 10, drag_area_m2: 0, tail_arm_m: null, centre_of_gravity_mac_fraction: null },
    ...{ tailless: false, propeller_efficiency: null },
  },
  air: { turbulence_percent: 0.07, amplification: null },
  conditions: [blankCondition('Cruise')],
  ...{ limits: [], rank_by: null, station_y_m: null, shortlist: [] },
}
