import { BadInput } from '../numerics/errors'

/** One station of a wing: distance from the centreline, chord, and twist against the root chord. */
export interface WingStation {
  /** m */
  readonly y: number
  /** m */
  readonly chord: number
  /** rad, nose up positive. */
  readonly twist: number
}

/** A wing by its stations from y = 0 to the tip (at least two), straight between them. */
export interface WingShape {
  /** m2, both halves, centre part included. */
  readonly area: number
  /** m */
  readonly span: number
  readonly stations: readonly WingStation[]
  /** Sweep of the quarter-chord line, rad, aft positive. */
  readonly sweepQuarterChord: number
  /** Chord fraction of the main spar, for the depth available to it. */
  readonly sparAt: number
  /** m */
  readonly skinThickness: number
  readonly flap: {
    readonly chordFraction: number
    readonly fromSemispan: number
    readonly toSemispan: number
  } | null
}

/** Area and span of the stations may differ from those given by this share. */
const AGREEMENT = 1e-3

/**
 * Stations of a straight-tapered wing: area m2, span m, taper ratio tip to root, washout in rad (positive
 * with the tip set lower, linear in y). Throws BadInput for values that give no wing.
 */
export function taperedStations(area: number, span: number, taper: number, washout: number): WingStation[] {
  if (!isLength(area)) throw new BadInput(`wing area ${area} m2: give more than 0`)
  if (!isLength(span)) throw new BadInput(`span ${span} m: give more than 0`)
  if (!isLength(taper)) {
    throw new BadInput(`taper ratio ${taper}: give more than 0; a tip chord of zero has no section`)
  }
  if (!Number.isFinite(washout)) throw new BadInput(`washout ${washout}: give an angle`)
  const root = (2 * area) / (span * (1 + taper))
  return [
    { y: 0, chord: root, twist: 0 },
    { y: span / 2, chord: taper * root, twist: -washout },
  ]
}

function isLength(value: number): boolean {
  return value > 0 && Number.isFinite(value)
}

/**
 * Checks stations from the centreline outward against area (m2) and span (m), both to 0.1 %. Throws
 * BadInput that names the station or the figure at fault.
 */
export function checkStations(stations: readonly WingStation[], area: number, span: number): void {
  if (stations.length < 2) throw new BadInput('wing stations: give at least two, the root and the tip')
  if (stations[0].y !== 0) throw new BadInput(`wing station 1: y ${stations[0].y} m; the first lies at 0`)
  stations.forEach((station, i) => {
    if (!isLength(station.chord)) {
      throw new BadInput(`wing station ${i + 1}: chord ${station.chord} m; give more than 0`)
    }
    if (!Number.isFinite(station.twist))
      throw new BadInput(`wing station ${i + 1}: give the twist as an angle`)
    if (i > 0 && !(station.y > stations[i - 1].y)) {
      throw new BadInput(`wing station ${i + 1}: y ${station.y} m does not lie outside the one before it`)
    }
  })
  const theirSpan = 2 * stations[stations.length - 1].y
  const theirArea = 2 * overSemispan(stations, (chord) => chord)
  const differs = (a: number, b: number): boolean => !(Math.abs(a - b) <= AGREEMENT * Math.abs(b))
  if (differs(theirSpan, span)) {
    throw new BadInput(`wing stations give a span of ${theirSpan.toPrecision(5)} m, the wing ${span} m`)
  }
  if (differs(theirArea, area)) {
    throw new BadInput(`wing stations give an area of ${theirArea.toPrecision(5)} m2, the wing ${area} m2`)
  }
}

/** Chord (m) and twist (rad) at a distance from the centreline (m), linear between stations. */
export function stationAt(stations: readonly WingStation[], y: number): WingStation {
  const k = Math.max(
    stations.findLastIndex((station, i) => i < stations.length - 1 && station.y <= y),
    0,
  )
  const a = stations[k]
  const b = stations[k + 1]
  const t = (y - a.y) / (b.y - a.y)
  return { y, chord: a.chord + t * (b.chord - a.chord), twist: a.twist + t * (b.twist - a.twist) }
}

/** The mean aerodynamic chord: its length and its distance from the centreline, m. */
export interface MeanChord {
  readonly chord: number
  readonly y: number
}

/** The mean aerodynamic chord, integral of c^2 over that of c, and the place of its centroid. */
export function meanAerodynamicChord(stations: readonly WingStation[]): MeanChord {
  const area = overSemispan(stations, (chord) => chord)
  return {
    chord: overSemispan(stations, (chord) => chord * chord) / area,
    y: overSemispan(stations, (chord, y) => chord * y) / area,
  }
}

/** Integral over the semispan of a polynomial of chord and y of degree 3 at most: Simpson's rule is exact. */
export function overSemispan(
  stations: readonly WingStation[],
  f: (chord: number, y: number) => number,
): number {
  let sum = 0
  for (let k = 0; k + 1 < stations.length; k++) {
    const a = stations[k]
    const b = stations[k + 1]
    const middle = f(0.5 * (a.chord + b.chord), 0.5 * (a.y + b.y))
    sum += ((b.y - a.y) / 6) * (f(a.chord, a.y) + 4 * middle + f(b.chord, b.y))
  }
  return sum
}
