import { atan, cos, power, sin, tan } from '../numerics/elementary'
import { flightState, reynoldsNumber, whyUnflyable, type FlightInput } from '../flight/conditions'
import { BadInput } from '../numerics/errors'
import type { SectionLine } from '../polar/liftLine'
import { handbookSlope } from './handbookSlope'
import { helmboldSlope } from './helmbold'
import {
  coefficientsAt,
  localLift,
  rootAngleForLift,
  solveLiftingLine,
  wingLiftAt,
  wingLiftSlope,
  type LiftingLine,
} from './liftingLine'
import { meanAerodynamicChord, stationAt, type WingShape } from './planform'
import { tailLoad, wingMoment, type MomentStrip } from './trim'
import { wingNotes } from './wingNotes'

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

/** A wing at one condition; SI and radians. */
export interface WingAtCondition {
  readonly temperature: number
  readonly pressure: number
  readonly density: number
  /** True airspeed. */
  readonly speed: number
  readonly dynamicPressure: number
  readonly equivalentAirspeed: number
  readonly wingLoadingMass: number
  readonly wingLoadingForce: number
  readonly wingLoadingShare: number
  readonly liftCoefficient: number
  /** At the mean aerodynamic chord. */
  readonly reynolds: number
  readonly mach: number
  /** Of the root chord. */
  readonly alpha: number
  readonly liftSlope: number
  /** C_L^2 / (pi A C_Di); null below |C_L| 0.05. */
  readonly spanEfficiency: number | null
  readonly inducedDragCoefficient: number
  readonly inducedDrag: number
  /** Up positive; null without a tail arm. */
  readonly tailLoad: number | null
  readonly rootBendingMoment: number
  readonly peakLiftCoefficient: number
  readonly peakLiftAt: number
  /** From the centreline to the tip. */
  readonly stations: readonly StationState[]
  /** Quick formulas beside the lifting line. */
  readonly helmboldSlope: number
  readonly handbookSlope: number
  readonly notes: readonly string[]
}

/** What a wing needs to be computed at a condition. */
export interface WingInput {
  readonly shape: WingShape
  readonly aircraft: { readonly tailArm: number | null; readonly centreOfGravity: number | null }
  readonly condition: FlightInput
  /** Section properties at the root and at the tip, linear in y between them. */
  readonly root: SectionLine
  readonly tip: SectionLine
  /** A Reynolds number at the mean aerodynamic chord in place of that flown; null: as flown. */
  readonly fixedReynolds: number | null
}

/** Stations reported on one half, spaced by the cosine rule: the trapezoid sum of c_l c gives C_L to 2e-4. */
const STATIONS = 41
const SMALLEST_LIFT_FOR_EFFICIENCY = 0.05

/**
 * The linear wing at a condition: lifting line with the sections' straight lift curves, trim, totals and
 * stations. Sweep enters by simple sweep theory: the section slope times the cosine of the quarter-chord
 * sweep. Throws BadInput for a condition that cannot be flown.
 */
export function wingAt(input: WingInput): WingAtCondition {
  const { shape, condition } = input
  const fault = whyUnflyable(condition)
  if (fault !== null) throw new BadInput(fault)
  const flight = flightState(shape.area, condition)
  const meanChord = meanAerodynamicChord(shape.stations)
  const line = lineOf(input)
  const slope = wingLiftSlope(line)
  const q = flight.dynamicPressure
  const tail = tailLoad({
    dynamicPressure: q,
    load: flight.load,
    moment: wingMoment(strips(input, line), shape.sweepQuarterChord),
    meanChord,
    sweepQuarterChord: shape.sweepQuarterChord,
    ...input.aircraft,
  })
  const liftCoefficient = (flight.load - (tail ?? 0)) / (q * shape.area)
  const alpha = rootAngleForLift(line, liftCoefficient)
  const totals = wingLiftAt(line, alpha)
  const flown = reynoldsNumber(flight.air, condition.speed, meanChord.chord)
  const reynolds = input.fixedReynolds ?? flown
  const stations = stationStates(input, line, alpha, (chord) => (reynolds * chord) / meanChord.chord)
  const peak = stations.reduce((best, station) =>
    station.liftCoefficient > best.liftCoefficient ? station : best,
  )
  const mach = condition.speed / flight.air.speedOfSound
  const aspectRatio = power(shape.span, 2) / shape.area
  const quick = quickSlopes(input, aspectRatio, mach)
  return {
    temperature: flight.air.temperature,
    pressure: flight.air.pressure,
    density: flight.air.density,
    speed: condition.speed,
    dynamicPressure: q,
    equivalentAirspeed: flight.equivalentAirspeed,
    wingLoadingMass: flight.wingLoadingMass,
    wingLoadingForce: flight.wingLoadingForce,
    wingLoadingShare: flight.wingLoadingShare,
    liftCoefficient,
    reynolds,
    mach,
    alpha,
    liftSlope: slope,
    spanEfficiency:
      Math.abs(liftCoefficient) < SMALLEST_LIFT_FOR_EFFICIENCY
        ? null
        : power(liftCoefficient, 2) / (Math.PI * aspectRatio * totals.inducedDragCoefficient),
    inducedDragCoefficient: totals.inducedDragCoefficient,
    inducedDrag: totals.inducedDragCoefficient * q * shape.area,
    tailLoad: tail,
    rootBendingMoment: totals.rootMomentOverPressure * q,
    peakLiftCoefficient: peak.liftCoefficient,
    peakLiftAt: peak.y,
    stations,
    helmboldSlope: quick.helmbold.slope,
    handbookSlope: quick.handbook.slope,
    notes: wingNotes({
      aspectRatio,
      mach,
      sweepQuarterChord: shape.sweepQuarterChord,
      reynoldsAtTip: stations[stations.length - 1].reynolds,
      lacksCentreOfGravity: input.aircraft.tailArm !== null && input.aircraft.centreOfGravity === null,
      lacksTailArm: input.aircraft.tailArm === null,
    }),
  }
}

/** A property of the sections at y, linear between root and tip. */
function between(input: WingInput, y: number, of: (line: SectionLine) => number): number {
  const t = (2 * y) / input.shape.span
  return of(input.root) + t * (of(input.tip) - of(input.root))
}

function lineOf(input: WingInput): LiftingLine {
  const { stations, span, area, sweepQuarterChord } = input.shape
  const cosine = cos(sweepQuarterChord)
  return solveLiftingLine({
    span,
    area,
    chord: (y) => stationAt(stations, y).chord,
    slope: (y) => cosine * between(input, y, (line) => line.slope),
    set: (y) => stationAt(stations, y).twist - between(input, y, (line) => line.zeroLift),
    breaks: stations.map((station) => station.y),
  })
}

function stationStates(
  input: WingInput,
  line: LiftingLine,
  alpha: number,
  reynoldsOf: (chord: number) => number,
): StationState[] {
  const { stations, span } = input.shape
  const coefficients = coefficientsAt(line, alpha)
  return Array.from({ length: STATIONS }, (_, k) => {
    const y = k === STATIONS - 1 ? 0.5 * span : 0.5 * span * sin((Math.PI * k) / (2 * (STATIONS - 1)))
    const { chord, twist } = stationAt(stations, y)
    return { y, chord, twist, ...localLift(line, alpha, y, coefficients), reynolds: reynoldsOf(chord) }
  })
}

/** Strips for the moment, at the middle angles of the cosine rule. */
function strips(input: WingInput, line: LiftingLine): MomentStrip[] {
  const count = 100
  const { stations, span } = input.shape
  const atNone = rootAngleForLift(line, 0)
  const atOne = rootAngleForLift(line, 1)
  const none = coefficientsAt(line, atNone)
  const one = coefficientsAt(line, atOne)
  return Array.from({ length: count }, (_, k) => {
    const step = Math.PI / (2 * count)
    const theta = (k + 0.5) * step
    const y = 0.5 * span * cos(theta)
    const basicLift = localLift(line, atNone, y, none).liftCoefficient
    return {
      y,
      width: 0.5 * span * sin(theta) * step,
      chord: stationAt(stations, y).chord,
      momentAtZeroLift: between(input, y, (of) => of.momentAtZeroLift),
      basicLift,
      additionalLift: localLift(line, atOne, y, one).liftCoefficient - basicLift,
    }
  })
}

function quickSlopes(input: WingInput, aspectRatio: number, mach: number) {
  const meanSlope = 0.5 * (input.root.slope + input.tip.slope) * Math.sqrt(1 - power(Math.min(mach, 0.95), 2))
  const { stations, span, sweepQuarterChord } = input.shape
  const tapering = (stations[0].chord - stations[stations.length - 1].chord) / (0.5 * span)
  const sweepHalfChord = atan(tan(sweepQuarterChord) - 0.25 * tapering)
  return {
    helmbold: helmboldSlope(aspectRatio),
    handbook: handbookSlope({ aspectRatio, mach, kappa: meanSlope / (2 * Math.PI), sweepHalfChord }),
  }
}

/** Local lift coefficient at a distance y (m), linear between the stations. */
export function localLiftAt(wing: WingAtCondition, y: number): number {
  const k = Math.max(
    wing.stations.findLastIndex((station, i) => i < wing.stations.length - 1 && station.y <= y),
    0,
  )
  const a = wing.stations[k]
  const b = wing.stations[k + 1]
  return a.liftCoefficient + ((y - a.y) / (b.y - a.y)) * (b.liftCoefficient - a.liftCoefficient)
}
