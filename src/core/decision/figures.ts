/** What a figure is known for: the section alone, the wing as a whole, or the wing at one condition. */
export type FigureScope = 'section' | 'wing' | 'condition'

/** A figure that a decision can use. */
export interface Figure {
  readonly key: string
  readonly label: string
  readonly unit: string
  readonly best: 'least' | 'most'
  readonly scope: FigureScope
}

const figure = (
  key: string,
  label: string,
  unit: string,
  best: 'least' | 'most',
  scope: FigureScope,
): Figure => ({ key, label, unit, best, scope })

/** The figures of version 1 of the brief, by their keys: what a limit or a ranking may name. */
export const FIGURES: readonly Figure[] = [
  figure('slowest_speed_m_s', 'Slowest speed', 'm/s', 'least', 'condition'),
  figure('slowest_equivalent_speed_m_s', 'Slowest equivalent airspeed', 'm/s', 'least', 'condition'),
  figure('slowest_speed_1g_clean_m_s', 'Slowest speed, 1 g, clean', 'm/s', 'least', 'wing'),
  figure('max_lift_coefficient', 'Wing maximum lift coefficient', '', 'most', 'condition'),
  figure('negative_max_lift_coefficient', 'Wing negative maximum lift coefficient', '', 'least', 'condition'),
  figure('lift_coefficient', 'Wing lift coefficient', '', 'least', 'condition'),
  figure('alpha_deg', 'Angle of the root chord', 'deg', 'least', 'condition'),
  figure('stall_margin', 'Stall margin', '', 'most', 'condition'),
  figure('stall_at_semispan', 'Place of first stall', 'semispan', 'least', 'condition'),
  figure('tip_margin', 'Tip margin at first stall', '', 'most', 'condition'),
  figure('lift_lost_past_stall', 'Lift lost 2 deg past stall', '', 'least', 'condition'),
  figure('profile_drag_coefficient', 'Profile drag coefficient', '', 'least', 'condition'),
  figure('induced_drag_coefficient', 'Induced drag coefficient', '', 'least', 'condition'),
  figure('induced_drag_N', 'Induced drag', 'N', 'least', 'condition'),
  figure('span_efficiency', 'Span efficiency', '', 'most', 'condition'),
  figure('drag_N', 'Drag', 'N', 'least', 'condition'),
  figure('power_W', 'Thrust power', 'W', 'least', 'condition'),
  figure('shaft_power_W', 'Shaft power', 'W', 'least', 'condition'),
  figure('climb_power_W', 'Power with the climb rate', 'W', 'least', 'condition'),
  figure('glide_ratio', 'Glide ratio', '', 'most', 'condition'),
  figure('sink_m_s', 'Sink', 'm/s', 'least', 'condition'),
  figure('best_glide_ratio', 'Best glide ratio', '', 'most', 'wing'),
  figure('best_glide_speed_m_s', 'Best-glide speed', 'm/s', 'most', 'wing'),
  figure('least_sink_m_s', 'Least sink', 'm/s', 'least', 'wing'),
  figure('least_sink_speed_m_s', 'Least-sink speed', 'm/s', 'least', 'wing'),
  figure('moment_coefficient', 'Section moment coefficient', '', 'most', 'condition'),
  figure('nose_down_moment_coefficient', 'Nose-down moment coefficient', '', 'least', 'condition'),
  figure('tail_load_N', 'Tail load', 'N', 'most', 'condition'),
  figure('low_drag_margin', 'Distance to the end of the low-drag range', '', 'most', 'condition'),
  figure('low_drag_from_lift_coefficient', 'Low-drag range from', '', 'least', 'condition'),
  figure('low_drag_to_lift_coefficient', 'Low-drag range to', '', 'most', 'condition'),
  figure('drag_gained_dirty_percent', 'Drag gained when dirty', '%', 'least', 'condition'),
  figure('lift_lost_dirty_percent', 'Lift lost when dirty', '%', 'least', 'condition'),
  figure('root_bending_moment_N_m', 'Root bending moment', 'N m', 'least', 'condition'),
  figure('root_torsion_N_m', 'Root torsion about the quarter chord', 'N m', 'least', 'condition'),
  figure('spar_cap_force_N', 'Spar cap force at the root', 'N', 'least', 'condition'),
  figure('spar_depth_root_mm', 'Spar depth at the root, net of skin', 'mm', 'most', 'section'),
  figure('spar_depth_tip_mm', 'Spar depth at the tip, net of skin', 'mm', 'most', 'section'),
  figure('section_area_m2', 'Enclosed section area at the root', 'm2', 'most', 'section'),
  figure('max_thickness_percent', 'Thickness', '%', 'most', 'section'),
]
