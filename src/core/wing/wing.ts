import { power } from '../numerics/elementary'
import { flightState, reynoldsNumber, whyUnflyable, type FlightInput } from '../flight/conditions'
import { BadInput } from '../numerics/errors'
import type { SectionLine } from '../polar/liftLine'
import { rootAngleForLift, wingLiftAt, wingLiftSlope } from './liftingLine'
import { linearLiftingLine, momentStrips, peakLift, stationStates, type StationState } from './linearSections'
import { meanAerodynamicChord, type WingShape } from './planform'
import { quickSlopes } from './quickFormulas'
import { tailLoad, wingMoment } from './trim'
import { wingNotes } from './wingNotes'

export type { StationState } from './linearSections'

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
  /** Where a quick formula is used outside its range. */
  readonly quickWarnings: readonly string[]
  readonly notes: readonly string[]
}

/** What a wing needs to be computed at a condition. */
export interface WingInput {
  readonly shape: WingShape
  readonly aircraft: {
    readonly tailArm: number | null
    readonly centreOfGravity: number | null
    /** Without a tail there is no tail load, whatever the arm. */
    readonly tailless: boolean
  }
  readonly condition: FlightInput
  /** Section properties at the root and at the tip, linear in y between them. */
  readonly root: SectionLine
  readonly tip: SectionLine
  /** A Reynolds number at the mean aerodynamic chord in place of that flown; null: as flown. */
  readonly fixedReynolds: number | null
}

const SMALLEST_LIFT_FOR_EFFICIENCY = 0.05

/**
 * The linear wing at a condition: lifting line with the sections' straight lift curves, trim, totals and
 * stations. Throws BadInput for a condition that cannot be flown.
 */
export function wingAt(input: WingInput): WingAtCondition {
  const { shape, condition } = input
  const fault = whyUnflyable(condition)
  if (fault !== null) throw new BadInput(fault)
  const flight = flightState(shape.area, condition)
  const meanChord = meanAerodynamicChord(shape.stations)
  const line = linearLiftingLine(input)
  const q = flight.dynamicPressure
  const tailArm = input.aircraft.tailless ? null : input.aircraft.tailArm
  const tail = tailLoad({
    dynamicPressure: q,
    load: flight.load,
    moment: wingMoment(momentStrips(input, line), shape.sweepQuarterChord),
    meanChord,
    sweepQuarterChord: shape.sweepQuarterChord,
    centreOfGravity: input.aircraft.centreOfGravity,
    tailArm,
  })
  const liftCoefficient = (flight.load - (tail ?? 0)) / (q * shape.area)
  const alpha = rootAngleForLift(line, liftCoefficient)
  const totals = wingLiftAt(line, alpha)
  const reynolds = input.fixedReynolds ?? reynoldsNumber(flight.air, condition.speed, meanChord.chord)
  const stations = stationStates(input, line, alpha, (chord) => (reynolds * chord) / meanChord.chord)
  const peak = peakLift(line, alpha, stations)
  const mach = condition.speed / flight.air.speedOfSound
  const aspectRatio = power(line.input.span, 2) / shape.area
  const quick = quickSlopes(input, mach)
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
    liftSlope: wingLiftSlope(line),
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
    helmboldSlope: quick.helmbold,
    handbookSlope: quick.handbook,
    quickWarnings: quick.warnings,
    notes: wingNotes({
      aspectRatio,
      mach,
      sweepQuarterChord: shape.sweepQuarterChord,
      peakLift: peak.liftCoefficient,
      leastReynolds: Math.min(...stations.map((station) => station.reynolds)),
      greatestReynolds: Math.max(...stations.map((station) => station.reynolds)),
      tailless: input.aircraft.tailless,
      lacksCentreOfGravity: tailArm !== null && input.aircraft.centreOfGravity === null,
      lacksTailArm: tailArm === null,
    }),
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
