/** A small brief that can be flown, as text; `over` replaces whole parts. */
export function briefText(over: Readonly<Record<string, unknown>> = {}): string {
  return JSON.stringify({
    format: 'sectionwright brief',
    version: 1,
    name: 'A small test aircraft',
    wing: { area_m2: 1.1, span_m: 3.6, taper_ratio: 0.6, washout_deg: 2 },
    aircraft: { mass_kg: 24, tail_arm_m: 1.4 },
    conditions: [
      { name: 'Slowest', speed_m_s: 'slowest', altitude_m: 0 },
      { name: 'Mapping', speed_m_s: 25, altitude_m: 600 },
    ],
    shortlist: [{ section: 'naca:4412' }, { root: 'naca:2415', tip: 'naca:2412' }],
    ...over,
  })
}
