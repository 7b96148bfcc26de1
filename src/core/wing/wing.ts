import { power } from '../numerics/elementary'
import { whyUnflyable } from '../flight/conditions'
import { BadInput } from '../numerics/errors'
import { rootAngleForLift, wingLiftAt, wingLiftSlope } from './liftingLine'
import { peakLift, stationStates } from './linearSections'
import { performance } from './performance'
import { quickSlopes } from './quickFormulas'
import {
  NO_STATION_FIGURES,
  NO_VISCOUS_FIGURES,
  viscousFigures,
  type WingStationState,
} from './viscousFigures'
import { prepareWing } from './preparedWing'
import type { WingInput } from './wingInput'
import { wingNotes } from './wingNotes'

export type { WingInput } from './wingInput'
export type { WingStationState as StationState } from './viscousFigures'

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
  /** Null without viscous polars or where a point it rests on is not there; `missing` says why. */
  readonly profileDragCoefficient: number | null
  /** Largest C_L before a station reaches its section's maximum, at this condition's Reynolds number. */
  readonly maxLiftCoefficient: number | null
  /** Place of first stall as a share of the semispan. */
  readonly stallAtSemispan: number | null
  /** Smallest maximum less local lift over the outer 40 % at first stall. */
  readonly tipMargin: number | null
  readonly drag: number | null
  readonly power: number | null
  /** At load factor 1 only. */
  readonly glideRatio: number | null
  readonly sink: number | null
  readonly peakLiftCoefficient: number
  readonly peakLiftAt: number
  /** From the centreline to the tip. */
  readonly stations: readonly WingStationState[]
  /** Quick formulas beside the lifting line. */
  readonly helmboldSlope: number
  readonly handbookSlope: number
  /** Where a quick formula is used outside its range. */
  readonly quickWarnings: readonly string[]
  readonly notes: readonly string[]
  /** Figures that the method gives but that are missing here, and why; they mark the condition. */
  readonly missing: readonly string[]
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
  const wing = prepareWing(input)
  const { flight, line, mach, reynolds, tail: balance } = wing
  const q = flight.dynamicPressure
  const tail = balance === null ? null : balance.perPressure * q + balance.constant
  const liftCoefficient = (flight.load - (tail ?? 0)) / (q * shape.area)
  const alpha = rootAngleForLift(line, liftCoefficient)
  const totals = wingLiftAt(line, alpha)
  const plain = stationStates(wing.linear, line, alpha, wing.reynoldsOf)
  const viscous =
    wing.sections === null
      ? { ...NO_VISCOUS_FIGURES, stations: plain.map((station) => ({ ...station, ...NO_STATION_FIGURES })) }
      : viscousFigures(wing.sections, line, plain, liftCoefficient)
  const { stations } = viscous
  const peak = peakLift(line, alpha, stations)
  const aspectRatio = power(line.input.span, 2) / shape.area
  const quick = quickSlopes(wing.linear, mach)
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
    profileDragCoefficient: viscous.profileDragCoefficient,
    maxLiftCoefficient: viscous.maxLiftCoefficient,
    stallAtSemispan: viscous.stallAtSemispan,
    tipMargin: viscous.tipMargin,
    ...performance({
      dynamicPressure: q,
      area: shape.area,
      profileDragCoefficient: viscous.profileDragCoefficient,
      inducedDragCoefficient: totals.inducedDragCoefficient,
      dragArea: input.aircraft.dragArea ?? 0,
      speed: condition.speed,
      weight: flight.load / condition.loadFactor,
      loadFactor: condition.loadFactor,
    }),
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
      lacksCentreOfGravity: wing.tailArm !== null && input.aircraft.centreOfGravity === null,
      lacksTailArm: wing.tailArm === null,
    }),
    missing: viscous.missing,
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
