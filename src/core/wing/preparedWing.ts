import { flightState, reynoldsNumber, type FlightState } from '../flight/conditions'
import { BadInput } from '../numerics/errors'
import type { LiftingLine } from './liftingLine'
import { linearLiftingLine, momentStrips, tipOf, type LinearWing } from './linearSections'
import { meanAerodynamicChord, stationAt } from './planform'
import { tailLoadLine, wingMoment, type TailLoadLine } from './trim'
import { lineOfStation, type WingSections } from './viscousStations'
import type { WingInput } from './wingInput'

/** A wing at a speed before its lift is chosen: what the trim and the stall both need. */
export interface PreparedWing {
  readonly flight: FlightState
  readonly mach: number
  /** At the mean aerodynamic chord. */
  readonly reynolds: number
  readonly reynoldsOf: (chord: number) => number
  readonly linear: LinearWing
  readonly line: LiftingLine
  /** Null without viscous polars. */
  readonly sections: WingSections | null
  /** m; null without a tail. */
  readonly tailArm: number | null
  readonly tail: TailLoadLine | null
}

/** Prepares a wing at its condition's speed. Throws BadInput when a polar has no lift line. */
export function prepareWing(input: WingInput): PreparedWing {
  const { shape, condition, families } = input
  const flight = flightState(shape.area, condition)
  const mach = condition.speed / flight.air.speedOfSound
  const meanChord = meanAerodynamicChord(shape.stations)
  const reynolds = input.fixedReynolds ?? reynoldsNumber(flight.air, condition.speed, meanChord.chord)
  const reynoldsOf = (chord: number): number => (reynolds * chord) / meanChord.chord
  const sections: WingSections | null =
    families === undefined ? null : { families, mach, sweep: shape.sweepQuarterChord }
  const linear = sections === null ? input : withOwnLines(input, sections, reynoldsOf)
  const line = linearLiftingLine(linear)
  const tailArm = input.aircraft.tailless ? null : input.aircraft.tailArm
  const tail = tailLoadLine({
    load: flight.load,
    moment: wingMoment(momentStrips(linear, line), shape.sweepQuarterChord),
    meanChord,
    sweepQuarterChord: shape.sweepQuarterChord,
    centreOfGravity: input.aircraft.centreOfGravity,
    tailArm,
  })
  return { flight, mach, reynolds, reynoldsOf, linear, line, sections, tailArm, tail }
}

/** The wing with the lift line of each station's own Reynolds number. */
function withOwnLines(
  { shape, root, tip }: WingInput,
  sections: WingSections,
  reynoldsOf: (chord: number) => number,
): LinearWing {
  const end = tipOf(shape)
  const lineOf = (y: number) => {
    const line = lineOfStation(sections, y / end, reynoldsOf(stationAt(shape.stations, y).chord))
    if (line === null) throw new BadInput('a polar has no zero-lift angle with converged points')
    return line
  }
  return { shape, root, tip, lineOf }
}
