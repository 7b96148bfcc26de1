import type { Comparison } from '../../core'

/** A wing seen from above, as SVG paths in metres, x to the right wing tip and y aft. */
export interface PlanformDrawing {
  readonly viewBox: string
  readonly outline: string
  readonly quarterChord: string
  /** Both flaps; empty without. */
  readonly flap: string
  /** The chord at the shown station on both halves. */
  readonly station: string
  readonly summary: string
}

/** The planform of a comparison's wing. */
export function planformDrawing({ wing, stationY }: Comparison): PlanformDrawing {
  const sweep = Math.tan(wing.sweepQuarterChord)
  const half = wing.span / 2
  const chordAt = (y: number): number => {
    const k = Math.max(0, wing.stations.findIndex((station) => station.y >= y) - 1)
    const [a, b] = [wing.stations[k]!, wing.stations[k + 1]!]
    return a.chord + ((y - a.y) / (b.y - a.y)) * (b.chord - a.chord)
  }
  const at = (y: number, fraction: number): number => y * sweep + (fraction - 0.25) * chordAt(y)
  const ys = wing.stations.map((station) => station.y)
  const point = (side: number, y: number, fraction: number): string =>
    `${(side * y).toFixed(4)} ${at(y, fraction).toFixed(4)}`
  const front = [...ys.toReversed().map((y) => point(-1, y, 0)), ...ys.map((y) => point(1, y, 0))]
  const back = [...ys.toReversed().map((y) => point(1, y, 1)), ...ys.map((y) => point(-1, y, 1))]
  const bothSides = (draw: (side: number) => string): string => [-1, 1].map(draw).join('')
  const { flap } = wing
  const top = Math.min(...ys.map((y) => at(y, 0)))
  const bottom = Math.max(...ys.map((y) => at(y, 1)))
  const margin = 0.03 * wing.span
  return {
    viewBox: `${-half - margin} ${top - margin} ${wing.span + 2 * margin} ${bottom - top + 2 * margin}`,
    outline: `M${[...front, ...back].join('L')}Z`,
    quarterChord: bothSides((side) => `M0 0L${point(side, half, 0.25)}`),
    flap:
      flap === null
        ? ''
        : bothSides((side) => {
            const [from, to] = [flap.fromSemispan * half, flap.toSemispan * half]
            const hinge = 1 - flap.chordFraction
            return `M${[point(side, from, hinge), point(side, to, hinge), point(side, to, 1), point(side, from, 1)].join('L')}Z`
          }),
    station: bothSides((side) => `M${point(side, stationY, 0)}L${point(side, stationY, 1)}`),
    summary: `Planform: span ${wing.span} m, root chord ${ys.length > 0 ? wing.stations[0]!.chord.toFixed(3) : ''} m, tip chord ${wing.stations.at(-1)!.chord.toFixed(3)} m`,
  }
}
