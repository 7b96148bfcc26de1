import type { ComparedEntry, Comparison } from '../../core'

/** A column of figures of the shortlist at the shown condition. */
export interface Column {
  readonly key: string
  readonly title: string
  readonly unit: string
  /** Explains the figure in a sentence. */
  readonly help: string
  readonly digits: number
  readonly value: (entry: ComparedEntry, comparison: Comparison, condition: number) => number | null
}

const RADIAN = 180 / Math.PI

/** The figures that exist so far, in the order of the table. */
export const COLUMNS: readonly Column[] = [
  {
    ...{ key: 'thickness', title: 'Thickness', unit: '%', digits: 1 },
    help: 'Largest thickness of the root section, of its chord',
    value: (entry) => scaled(entry.root?.measures.maxThickness, 100),
  },
  {
    ...{ key: 'sparDepth', title: 'Spar depth, root', unit: 'mm', digits: 1 },
    help: 'Depth at the spar at the root, less the skin on both sides',
    value: (entry, { wing }) => {
      const depth = entry.root?.depthAtSpar
      return depth === undefined ? null : 1000 * (depth * wing.stations[0]!.chord - 2 * wing.skinThickness)
    },
  },
  {
    ...{ key: 'lift', title: 'Wing C_L', unit: '', digits: 3 },
    help: 'Lift coefficient of the wing that the condition needs, tail load included',
    value: (entry, _, i) => entry.conditions[i]?.wing?.liftCoefficient ?? null,
  },
  {
    ...{ key: 'alpha', title: 'Angle', unit: 'deg', digits: 2 },
    help: 'Angle of attack of the root chord',
    value: (entry, _, i) => scaled(entry.conditions[i]?.wing?.alpha, RADIAN),
  },
  {
    ...{ key: 'local', title: 'Local c_l', unit: '', digits: 3 },
    help: 'Section lift coefficient at the shown station',
    value: (entry, _, i) => entry.conditions[i]?.pane?.liftCoefficient ?? null,
  },
  {
    ...{ key: 'moment', title: 'Moment c_m ¼', unit: '', digits: 4 },
    help: 'Section moment about the quarter chord at the shown station, nose up positive',
    value: (entry, _, i) => entry.conditions[i]?.pane?.pressure?.momentCoefficient ?? null,
  },
  {
    ...{ key: 'induced', title: 'Induced drag', unit: 'N', digits: 2 },
    help: 'Induced drag of the wing',
    value: (entry, _, i) => entry.conditions[i]?.wing?.inducedDrag ?? null,
  },
  {
    ...{ key: 'drag', title: 'Drag', unit: 'N', digits: 2 },
    help: 'Profile and induced drag of the wing and the drag area of the rest; needs boundary layers',
    value: (entry, _, i) => entry.conditions[i]?.wing?.drag ?? null,
  },
  {
    ...{ key: 'maxLift', title: 'Max C_L', unit: '', digits: 3 },
    help: 'Lift coefficient of the wing when the first station stalls; needs boundary layers',
    value: (entry, _, i) => entry.conditions[i]?.wing?.maxLiftCoefficient ?? null,
  },
  {
    ...{ key: 'speed', title: 'Speed', unit: 'm/s', digits: 2 },
    help: 'True airspeed at the condition; at "slowest" that at which the wing just carries its load',
    value: (entry, _, i) => entry.conditions[i]?.wing?.speed ?? null,
  },
  {
    ...{ key: 'bending', title: 'Root bending', unit: 'N m', digits: 0 },
    help: 'Bending moment of one half wing at the root, air load only',
    value: (entry, _, i) => entry.conditions[i]?.wing?.rootBendingMoment ?? null,
  },
  {
    ...{ key: 'tail', title: 'Tail load', unit: 'N', digits: 1 },
    help: 'Load on the tail that balances the wing, up positive; needs a tail arm',
    value: (entry, _, i) => entry.conditions[i]?.wing?.tailLoad ?? null,
  },
]

const scaled = (value: number | undefined, by: number): number | null =>
  value === undefined ? null : value * by

/** A figure as it is shown, with a true minus sign; a dash where there is none. */
export function shown(value: number | null, digits: number): string {
  if (value === null) return '–'
  const text = Math.abs(value).toFixed(digits)
  return value < 0 && Number(text) !== 0 ? `−${text}` : text
}

/** Indices of the entries in the order of a column, those without the figure last. */
export function sortedIndices(values: readonly (number | null)[], descending: boolean): number[] {
  const sign = descending ? -1 : 1
  return values
    .map((_, i) => i)
    .sort((a, b) => {
      const [x, y] = [values[a] ?? null, values[b] ?? null]
      if (x === null || y === null) return (x === null ? 1 : 0) - (y === null ? 1 : 0) || a - b
      return sign * (x - y) || a - b
    })
}
