import Papa from 'papaparse'
import { toTheStalls, type Comparison, type Polar, type PressureResult } from '../core'

/** A cell: text, number, truth, or empty for null. */
type Cell = string | number | boolean | null

/** Rows as RFC 4180 text: CRLF, final newline, shortest round-trip numbers, no minus zero. */
function csvText(columns: readonly string[], rows: readonly (readonly Cell[])[]): string {
  const cells = rows.map((row) => row.map((cell) => (typeof cell === 'number' ? plainZero(cell) : cell)))
  return Papa.unparse([[...columns], ...cells], { newline: '\r\n' }) + '\r\n'
}

const plainZero = (value: number): number => (value === 0 ? 0 : value)

/** Radians as degrees, rounded where the conversion adds noise behind the twelfth digit. */
export const degrees = (angle: number): number => plainZero(Number(((angle * 180) / Math.PI).toPrecision(12)))

export const POLAR_COLUMNS = [
  ...[
    'section',
    'method',
    'reynolds',
    'mach',
    'surface',
    'alpha_deg',
    'lift_coefficient',
    'drag_coefficient',
  ],
  ...['moment_coefficient', 'transition_upper', 'transition_lower', 'converged', 'amplification'],
  ...['trip_upper', 'trip_lower', 'flap_deg'],
] as const

/** A polar under the name that stands in its section column. */
export interface NamedPolar {
  readonly section: string
  readonly polar: Polar
}

/** The polar CSV: one row an angle, in order; a failed row leaves its results empty. */
export function polarCsv(polars: readonly NamedPolar[]): string {
  const rows = polars.flatMap(({ section, polar }) =>
    polar.points.map((point): Cell[] => [
      ...[section, polar.method, polar.reynolds, polar.mach, polar.surface, degrees(point.alpha)],
      ...(point.converged
        ? [point.liftCoefficient, point.dragCoefficient, point.momentCoefficient]
        : [null, null, null]),
      ...(point.converged ? [point.transitionUpper, point.transitionLower] : [null, null]),
      ...[point.converged, polar.amplification, polar.tripUpper, polar.tripLower, degrees(polar.flap)],
    ]),
  )
  return csvText(POLAR_COLUMNS, rows)
}

/** The same polars as JSON text. */
export function polarJson(polars: readonly NamedPolar[]): string {
  const value = polars.map(({ section, polar }) => ({
    section,
    method: polar.method,
    reynolds: polar.reynolds,
    mach: polar.mach,
    surface: polar.surface,
    points: polar.points.map((point) => ({
      alpha_deg: degrees(point.alpha),
      lift_coefficient: point.converged ? point.liftCoefficient : null,
      drag_coefficient: point.converged ? point.dragCoefficient : null,
      moment_coefficient: point.converged ? point.momentCoefficient : null,
      transition_upper: point.converged ? point.transitionUpper : null,
      transition_lower: point.converged ? point.transitionLower : null,
      converged: point.converged,
      amplification: polar.amplification,
      trip_upper: polar.tripUpper,
      trip_lower: polar.tripLower,
      flap_deg: degrees(polar.flap),
    })),
  }))
  return `${JSON.stringify({ polars: value }, (_, cell: unknown) => (cell === 0 ? 0 : cell), 2)}\n`
}

const PRESSURE_COLUMNS = [
  'section',
  'method',
  'alpha_deg',
  'x_over_c',
  'y_over_c',
  'pressure_coefficient',
] as const

function pressureRows(section: string, pressure: PressureResult): Cell[][] {
  return Array.from(pressure.x, (x, i): Cell[] => [
    ...[section, pressure.method, degrees(pressure.alpha), x],
    ...[pressure.y[i] ?? null, pressure.pressureCoefficient[i] ?? null],
  ])
}

/** The pressure CSV of one section at one angle, from the upper trailing edge round to the lower one. */
export function pressureCsv(section: string, pressure: PressureResult): string {
  return csvText(PRESSURE_COLUMNS, pressureRows(section, pressure))
}

function comparedPressures(comparison: Comparison): string {
  const rows = comparison.entries.flatMap((entry) =>
    entry.conditions.flatMap(({ pane }, i): Cell[][] => {
      if (pane === null || pane.pressure === null || !pane.pressure.converged) return []
      const reynolds = comparison.method === 'viscous' ? pane.reynolds : null
      const state: Cell[] = [comparison.conditions[i]!.name, pane.stationY, reynolds, pane.mach, pane.surface]
      return pressureRows(entry.name, pane.pressure).map((row) => [...state, ...row])
    }),
  )
  return csvText(['condition', 'station_y_m', 'reynolds', 'mach', 'surface', ...PRESSURE_COLUMNS], rows)
}

const WING_COLUMNS = [
  ...['root', 'tip', 'condition', 'y_m', 'chord_m', 'twist_deg', 'reynolds', 'lift_coefficient'],
  ...['max_lift_coefficient', 'induced_angle_deg', 'profile_drag_coefficient'],
] as const

/** The wing CSV: one row a station of every entry at every condition that could be computed. */
export function wingCsv(comparison: Comparison): string {
  const rows = comparison.entries.flatMap((entry) =>
    entry.conditions.flatMap(({ wing }, i) =>
      (wing?.stations ?? []).map((station): Cell[] => [
        ...[entry.rootName, entry.tipName, comparison.conditions[i]!.name],
        ...[station.y, station.chord, degrees(station.twist), station.reynolds, station.liftCoefficient],
        ...[station.maxLiftCoefficient, degrees(station.inducedAngle), station.profileDragCoefficient],
      ]),
    ),
  )
  return csvText(WING_COLUMNS, rows)
}

/** The files of a whole comparison, as `compare` writes them and the window exports them. */
export function compareFiles(comparison: Comparison): { readonly name: string; readonly text: string }[] {
  const polars = comparison.entries.flatMap((entry) =>
    entry.polars.map(({ at, polar }) => ({
      section: at === 'root' ? entry.rootName : entry.tipName,
      polar: toTheStalls(polar),
    })),
  )
  return [
    { name: 'polars.csv', text: polarCsv(polars) },
    { name: 'pressures.csv', text: comparedPressures(comparison) },
    { name: 'wing.csv', text: wingCsv(comparison) },
  ]
}
