import * as v from 'valibot'

const positive = v.pipe(v.number(), v.finite(), v.gtValue(0, 'must be more than 0'))
const notNegative = v.pipe(v.number(), v.finite(), v.minValue(0, 'must not be negative'))
const finite = v.pipe(v.number(), v.finite())
const within = (low: number, high: number) =>
  v.pipe(
    v.number(),
    v.minValue(low, `must lie between ${low} and ${high}`),
    v.maxValue(high, `must lie between ${low} and ${high}`),
  )
const fraction = within(0, 1)
const words = v.pipe(v.string(), v.trim(), v.nonEmpty('must not be empty'))
const maybe = <T extends v.GenericSchema>(schema: T) => v.optional(v.nullable(schema), null)
const outline = v.array(v.tuple([finite, finite]))

const flap = v.strictObject({
  chord_fraction: v.pipe(
    v.number(),
    v.gtValue(0, 'must be more than 0'),
    v.ltValue(1, 'must be less than 1'),
  ),
  from_semispan: v.optional(fraction, 0),
  to_semispan: v.optional(fraction, 1),
})

const wing = v.strictObject({
  area_m2: positive,
  span_m: positive,
  taper_ratio: v.optional(positive, 1),
  washout_deg: v.optional(within(-30, 30), 0),
  sweep_quarter_chord_deg: v.optional(within(-60, 60), 0),
  spar_at_chord_fraction: v.optional(fraction, 0.3),
  skin_thickness_mm: v.optional(notNegative, 0),
  flap: maybe(flap),
  stations: maybe(
    v.array(v.strictObject({ y_m: notNegative, chord_m: positive, twist_deg: v.optional(finite, 0) })),
  ),
})

const aircraft = v.strictObject({
  mass_kg: positive,
  drag_area_m2: v.optional(notNegative, 0),
  tail_arm_m: maybe(v.pipe(finite, v.notValue(0, 'must not be 0'))),
  centre_of_gravity_mac_fraction: maybe(within(-5, 5)),
  tailless: v.optional(v.boolean(), false),
  propeller_efficiency: maybe(
    v.pipe(v.number(), v.gtValue(0, 'must be more than 0'), v.maxValue(1, 'must be 1 at most')),
  ),
})

const air = v.strictObject({
  turbulence_percent: v.optional(within(0.07, 2.98), 0.07),
  amplification: maybe(within(0, 14)),
})

/** Speed, load factor and mass are judged later: a condition that cannot be flown is kept and marked. */
const condition = v.strictObject({
  name: words,
  speed_m_s: v.union([finite, v.literal('slowest')], 'must be a number or "slowest"'),
  altitude_m: v.optional(within(-1000, 20000), 0),
  isa_offset_K: v.optional(within(-80, 80), 0),
  load_factor: v.optional(finite, 1),
  mass_kg: maybe(finite),
  surface: v.optional(v.picklist(['clean', 'dirty'], 'must be "clean" or "dirty"'), 'clean'),
  flap_deg: v.optional(finite, 0),
  climb_rate_m_s: maybe(finite),
  reynolds: maybe(within(5e4, 2e7)),
})

const limit = v.strictObject({
  figure: words,
  at_most: maybe(finite),
  at_least: maybe(finite),
  condition: maybe(v.string()),
})

const ranking = v.strictObject({
  figure: words,
  condition: maybe(v.string()),
  best: v.optional(v.picklist(['least', 'most'], 'must be "least" or "most"'), 'least'),
})

const change = v.strictObject({
  thickness: maybe(positive),
  camber: maybe(finite),
  flap: maybe(v.strictObject({ chord_fraction: fraction, deflection_deg: finite })),
  trailing_edge_gap: maybe(notNegative),
})

const entry = v.strictObject({
  section: maybe(words),
  root: maybe(words),
  tip: maybe(words),
  name: maybe(words),
  edge: maybe(v.picklist(['closed', 'open'], 'must be "closed" or "open"')),
  chord_line: maybe(v.picklist(['file', 'longest'], 'must be "file" or "longest"')),
  coordinates: maybe(outline),
  root_coordinates: maybe(outline),
  tip_coordinates: maybe(outline),
  trip_upper: maybe(fraction),
  trip_lower: maybe(fraction),
  change: maybe(change),
  colour: maybe(v.pipe(v.number(), v.integer(), v.minValue(0))),
  mark: maybe(v.pipe(v.number(), v.integer(), v.minValue(0))),
})

/** Version 1 of the brief, strict: a field that it does not know is an error. */
export const briefSchema = v.strictObject({
  format: v.literal('sectionwright brief'),
  version: v.literal(1),
  name: words,
  wing,
  aircraft,
  air: v.optional(air, {}),
  conditions: v.array(condition),
  limits: v.optional(v.array(limit), []),
  rank_by: maybe(ranking),
  station_y_m: maybe(notNegative),
  shortlist: v.array(entry),
})
