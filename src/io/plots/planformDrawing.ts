import type { Comparison } from '../../core'
import { plotNumber } from './axisTicks'

/** A wing seen from above, as SVG paths in metres, x to the right wing tip and y aft. */
export interface PlanformDrawing {
  readonly viewBox: string
  readonly outline: string
  readonly quarterChord: string
  /** Both flaps; empty without. */
  readonly flap: string
  /** The chord at the shown station on both halves. */
  readonly station: string
  /** The chord at a hovered distance from the centreline; empty without. */
  readonly hovered: string
  /** The shown station in words. */
  readonly stationWords: string
  readonly summary: string
}

/** Room round the wing, spans. */
const ROOM = 0.03

/** The planform of a comparison's wing, with a hovered distance from the centreline (m) or none. */
export function planformDrawing(
  { wing, stationY }: Comparison,
  hoveredY: number | null = null,
): PlanformDrawing {
  const sweep = Math.tan(wing.sweepQuarterChord)
  const half = wing.span / 2
  const { stations, flap } = wing
  const chordAt = (y: number): number => {
    const k = Math.max(0, stations.findIndex((station) => station.y >= y) - 1)
    const [a, b] = [stations[k]!, stations[k + 1]!]
    return a.chord + ((y - a.y) / (b.y - a.y)) * (b.chord - a.chord)
  }
  const aft = (y: number, fraction: number): number => y * sweep + (fraction - 0.25) * chordAt(y)
  const point = (side: number, y: number, fraction: number): string =>
    `${(side * y).toFixed(4)} ${aft(y, fraction).toFixed(4)}`
  const bothSides = (draw: (side: number) => string): string => [-1, 1].map(draw).join('')
  const chordLine = (y: number): string => bothSides((side) => `M${point(side, y, 0)}L${point(side, y, 1)}`)

  const ys = stations.map((station) => station.y)
  const front = [...ys.toReversed().map((y) => point(-1, y, 0)), ...ys.map((y) => point(1, y, 0))]
  const back = [...ys.toReversed().map((y) => point(1, y, 1)), ...ys.map((y) => point(-1, y, 1))]
  const top = Math.min(...ys.map((y) => aft(y, 0)))
  const bottom = Math.max(...ys.map((y) => aft(y, 1)))
  const room = ROOM * wing.span
  const metres = (value: number, decimals: number): string => `${plotNumber(value, decimals)} m`
  return {
    viewBox: `${-half - room} ${top - room} ${wing.span + 2 * room} ${bottom - top + 2 * room}`,
    outline: `M${[...front, ...back].join('L')}Z`,
    quarterChord: bothSides((side) => `M0 0L${point(side, half, 0.25)}`),
    flap: flap === null ? '' : bothSides((side) => flapPath(flap, half, (y, at) => point(side, y, at))),
    station: chordLine(stationY),
    hovered: hoveredY === null ? '' : chordLine(hoveredY),
    stationWords: `station shown: y ${metres(stationY, 2)}, chord ${metres(chordAt(stationY), 3)}`,
    summary: `Planform: span ${metres(wing.span, 2)}, root chord ${metres(chordAt(0), 3)}, tip chord ${metres(chordAt(half), 3)}`,
  }
}

function flapPath(
  flap: NonNullable<Comparison['wing']['flap']>,
  half: number,
  point: (y: number, fraction: number) => string,
): string {
  const [from, to] = [flap.fromSemispan * half, flap.toSemispan * half]
  const hinge = 1 - flap.chordFraction
  return `M${[point(from, hinge), point(to, hinge), point(to, 1), point(from, 1)].join('L')}Z`
}
