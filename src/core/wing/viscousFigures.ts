import type { LiftingLine } from './liftingLine'
import type { StationState } from './linearSections'
import { wingProfileDrag } from './profileDrag'
import { firstStall, tipMargin, type FirstStall, type StallStation } from './stall'
import { dragOfStation, maxLiftOfStation, type WingSections } from './viscousStations'

/** What viscous polars add to a station; null where they have nothing to give. */
export interface StationFigures {
  readonly profileDragCoefficient: number | null
  /** Greatest section lift at the local Reynolds number. */
  readonly maxLiftCoefficient: number | null
}

/** A station with what the polars add. */
export type WingStationState = StationState & StationFigures

/** What viscous polars add to a wing. */
export interface ViscousFigures {
  readonly profileDragCoefficient: number | null
  readonly maxLiftCoefficient: number | null
  readonly stallAtSemispan: number | null
  readonly tipMargin: number | null
  /** Why figures are missing. */
  readonly missing: readonly string[]
}

export const NO_STATION_FIGURES: StationFigures = { profileDragCoefficient: null, maxLiftCoefficient: null }
export const NO_VISCOUS_FIGURES: ViscousFigures = {
  ...NO_STATION_FIGURES,
  stallAtSemispan: null,
  tipMargin: null,
  missing: [],
}

/** Sweep (rad, aft) beyond which the tip margin is not judged: the outboard shift of lift is not modelled. */
const JUDGED_SWEEP = (5 * Math.PI) / 180

/** Greatest section lift of each station; null when one of them has none. */
export function stallStations(
  sections: WingSections,
  stations: readonly StationState[],
): StallStation[] | null {
  const end = stations[stations.length - 1].y
  const all: StallStation[] = []
  for (const { y, reynolds } of stations) {
    const maxLiftCoefficient = maxLiftOfStation(sections, y / end, reynolds)
    if (maxLiftCoefficient === null) return null
    all.push({ y, maxLiftCoefficient })
  }
  return all
}

/** Profile drag and stall of a wing whose lifting line is solved and whose stations carry the lift needed. */
export function viscousFigures(
  sections: WingSections,
  line: LiftingLine,
  stations: readonly StationState[],
  liftCoefficient: number,
): ViscousFigures & { readonly stations: readonly WingStationState[] } {
  const end = stations[stations.length - 1].y
  const drags = stations.map((station) => dragOfStation(sections, station.y / end, station))
  const all = stations.map((station, k) => ({
    ...station,
    profileDragCoefficient: drags[k].value,
    maxLiftCoefficient: maxLiftOfStation(sections, station.y / end, station.reynolds),
  }))
  const stalls = stallStations(sections, stations)
  const stall = stalls === null ? null : firstStall(line, stalls)
  const missing = [...missingDrag(drags.map(({ reason }) => reason)), ...missingStall(stall, liftCoefficient)]
  return {
    stations: all,
    profileDragCoefficient: wingProfileDrag(all, line.input.area),
    maxLiftCoefficient: stall?.liftCoefficient ?? null,
    stallAtSemispan: stall === null ? null : stall.y / end,
    tipMargin:
      stall === null || stalls === null || sections.sweep > JUDGED_SWEEP
        ? null
        : tipMargin(line, stall, stalls),
    missing,
  }
}

function missingDrag(reasons: readonly string[]): string[] {
  const words = [...new Set(reasons.filter((reason) => reason !== ''))]
  return words.length === 0 ? [] : [`no profile drag at some stations: ${words.join('; ')}`]
}

/** More lift than the greatest by no more than this is rounding of a speed solved for. */
const LIFT_ROUNDING = 1e-6

function missingStall(stall: FirstStall | null, needed: number): string[] {
  if (stall === null) {
    return ['no maximum lift: a polar does not reach its maximum, or the flight is outside the polars']
  }
  if (needed <= stall.liftCoefficient * (1 + LIFT_ROUNDING)) return []
  return [
    `cannot be flown: the wing needs C_L ${needed.toFixed(2)}, its maximum is ${stall.liftCoefficient.toFixed(2)}`,
  ]
}
