import { cos, sin } from '../numerics/elementary'
import type { SectionLine } from '../polar/liftLine'
import {
  coefficientsAt,
  localLift,
  rootAngleForLift,
  solveLiftingLine,
  type LiftingLine,
} from './liftingLine'
import { stationAt, type WingShape } from './planform'
import type { MomentStrip } from './trim'

/** A wing whose sections have straight lift curves, their properties linear in y between root and tip. */
export interface LinearWing {
  readonly shape: WingShape
  readonly root: SectionLine
  readonly tip: SectionLine
  /** The line at a distance y (m) where it is not linear in y: sections at their own Reynolds numbers. */
  readonly lineOf?: (y: number) => SectionLine
}

/** One station of the wing at a condition. */
export interface StationState {
  /** m */
  readonly y: number
  readonly chord: number
  /** rad, nose up positive against the root. */
  readonly twist: number
  readonly liftCoefficient: number
  readonly reynolds: number
  /** rad, positive for downwash. */
  readonly inducedAngle: number
}

/**
 * Stations reported on one half, spaced by the cosine rule: on straight-tapered wings the trapezoid sum of
 * c_l c gives C_L to 3e-4 and the root bending moment to 9e-4.
 */
const STATIONS = 41
/** Strips of one half for the pitching moment: its sums are then good to 1e-4. */
const STRIPS = 100
/** Places looked at between the neighbours of the greatest station. */
const PEAK_STEPS = 40

/** A property of the sections at y (m), linear between root and tip unless the wing has lines of its own. */
function propertyAt(
  { shape, root, tip, lineOf }: LinearWing,
  y: number,
  of: (line: SectionLine) => number,
): number {
  if (lineOf !== undefined) return of(lineOf(y))
  return of(root) + (y / tipOf(shape)) * (of(tip) - of(root))
}

/** Distance of the tip from the centreline, m: that of the stations, which may differ from the brief's by 0.1 %. */
export function tipOf({ stations }: WingShape): number {
  return stations[stations.length - 1].y
}

/**
 * The lifting line of a wing with linear sections. Sweep enters by simple sweep theory: the section slope
 * times the cosine of the quarter-chord sweep; sections are cut along the flow, so that their zero-lift
 * angles stay.
 */
export function linearLiftingLine(wing: LinearWing): LiftingLine {
  const { stations, area, sweepQuarterChord } = wing.shape
  const cosine = cos(sweepQuarterChord)
  const tip = tipOf(wing.shape)
  return solveLiftingLine({
    span: 2 * tip,
    area,
    chord: (y) => stationAt(stations, y).chord,
    slope: (y) => cosine * propertyAt(wing, y, (line) => line.slope),
    set: (y) => stationAt(stations, y).twist - propertyAt(wing, y, (line) => line.zeroLift),
    breaks: stations.map((station) => station.y),
  })
}

/** Stations of one half from the centreline to the tip at a root angle (rad); Reynolds number by chord (m). */
export function stationStates(
  { shape }: LinearWing,
  line: LiftingLine,
  alpha: number,
  reynoldsOf: (chord: number) => number,
): StationState[] {
  const coefficients = coefficientsAt(line, alpha)
  const tip = tipOf(shape)
  return Array.from({ length: STATIONS }, (_, k) => {
    const y = k === STATIONS - 1 ? tip : tip * sin((Math.PI * k) / (2 * (STATIONS - 1)))
    const { chord, twist } = stationAt(shape.stations, y)
    return { y, chord, twist, ...localLift(line, alpha, y, coefficients), reynolds: reynoldsOf(chord) }
  })
}

/** The largest local lift coefficient and its distance from the centreline (m), searched between stations. */
export function peakLift(
  line: LiftingLine,
  alpha: number,
  stations: readonly StationState[],
): { liftCoefficient: number; y: number } {
  const k = stations.reduce(
    (best, s, i) => (s.liftCoefficient > stations[best].liftCoefficient ? i : best),
    0,
  )
  const from = stations[Math.max(k - 1, 0)].y
  const to = stations[Math.min(k + 1, stations.length - 1)].y
  const coefficients = coefficientsAt(line, alpha)
  let peak = { liftCoefficient: stations[k].liftCoefficient, y: stations[k].y }
  for (let i = 1; i < PEAK_STEPS; i++) {
    const y = from + (i * (to - from)) / PEAK_STEPS
    const { liftCoefficient } = localLift(line, alpha, y, coefficients)
    if (liftCoefficient > peak.liftCoefficient) peak = { liftCoefficient, y }
  }
  return peak
}

/** Strips for the pitching moment, at the middle angles of the cosine rule. */
export function momentStrips(wing: LinearWing, line: LiftingLine): MomentStrip[] {
  const tip = tipOf(wing.shape)
  const atNone = rootAngleForLift(line, 0)
  const atOne = rootAngleForLift(line, 1)
  const none = coefficientsAt(line, atNone)
  const one = coefficientsAt(line, atOne)
  const step = Math.PI / (2 * STRIPS)
  return Array.from({ length: STRIPS }, (_, k) => {
    const theta = (k + 0.5) * step
    const y = tip * cos(theta)
    const basicLift = localLift(line, atNone, y, none).liftCoefficient
    return {
      y,
      width: tip * sin(theta) * step,
      chord: stationAt(wing.shape.stations, y).chord,
      momentAtZeroLift: propertyAt(wing, y, (of) => of.momentAtZeroLift),
      basicLift,
      additionalLift: localLift(line, atOne, y, one).liftCoefficient - basicLift,
    }
  })
}
