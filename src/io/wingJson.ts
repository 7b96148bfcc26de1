import type { Comparison, ComparedEntry, EntryAtCondition } from '../core'
import { degrees } from './csv'

/** The wing JSON: every entry at every condition; fields without a value are null, with a note. */
export function wingJson(comparison: Comparison): string {
  const wings = comparison.entries.map((entry) => ({
    root: entry.rootName,
    tip: entry.tipName,
    conditions: entry.conditions.map((state, i) => conditionFields(comparison, entry, state, i)),
  }))
  return `${JSON.stringify({ wings }, (_, value: unknown) => (value === 0 ? 0 : value), 2)}\n`
}

const NEEDS_VISCOUS = 'stall, profile drag and what follows from them need the viscous method'

function conditionFields(comparison: Comparison, entry: ComparedEntry, state: EntryAtCondition, i: number) {
  const { wing } = state
  const slowest = comparison.conditions[i]!.speed === 'slowest'
  const lacks = comparison.method !== 'viscous' && !slowest && wing !== null ? [NEEDS_VISCOUS] : []
  const notes = [...state.notes, ...lacks]
  return {
    name: comparison.conditions[i]!.name,
    density_kg_m3: comparison.densities[i]!,
    dynamic_pressure_Pa: wing?.dynamicPressure ?? null,
    wing_loading_kg_m2: wing?.wingLoadingMass ?? comparison.conditions[i]!.mass / comparison.wing.area,
    lift_coefficient: wing?.liftCoefficient ?? null,
    reynolds: wing?.reynolds ?? null,
    mach: wing?.mach ?? null,
    alpha_deg: wing === null ? null : degrees(wing.alpha),
    lift_slope_per_rad: wing?.liftSlope ?? null,
    span_efficiency: wing?.spanEfficiency ?? null,
    induced_drag_coefficient: wing?.inducedDragCoefficient ?? null,
    induced_drag_N: wing?.inducedDrag ?? null,
    ...performanceFields(state, slowest),
    tail_load_N: wing?.tailLoad ?? null,
    root_bending_moment_N_m: wing?.rootBendingMoment ?? null,
    stations: (wing?.stations ?? []).map((station) => ({
      y_m: station.y,
      chord_m: station.chord,
      twist_deg: degrees(station.twist),
      lift_coefficient: station.liftCoefficient,
      reynolds: station.reynolds,
      max_lift_coefficient: station.maxLiftCoefficient,
      induced_angle_deg: degrees(station.inducedAngle),
      profile_drag_coefficient: station.profileDragCoefficient,
    })),
    ...(notes.length > 0 ? { note: notes.join('; ') } : {}),
    ...(entry.fault === null ? {} : { fault: entry.fault }),
  }
}

/** What viscous polars give; the slowest speed stands where it was asked for. */
function performanceFields({ wing }: EntryAtCondition, slowest: boolean) {
  return {
    max_lift_coefficient: wing?.maxLiftCoefficient ?? null,
    slowest_speed_m_s: slowest ? (wing?.speed ?? null) : null,
    slowest_equivalent_speed_m_s: slowest ? (wing?.equivalentAirspeed ?? null) : null,
    stall_at_semispan: wing?.stallAtSemispan ?? null,
    tip_margin: wing?.tipMargin ?? null,
    profile_drag_coefficient: wing?.profileDragCoefficient ?? null,
    drag_N: wing?.drag ?? null,
    power_W: wing?.power ?? null,
    glide_ratio: wing?.glideRatio ?? null,
    sink_m_s: wing?.sink ?? null,
  }
}
