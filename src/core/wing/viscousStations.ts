import { atLift } from '../polar/polarCurve'
import { lineAt, maxLiftAt, polarAt, type PolarFamily } from '../polar/polarFamily'
import type { SectionLine } from '../polar/liftLine'
import type { StationState } from './linearSections'
import { sweptLift } from './stall'

/** Viscous polars of the sections at root and tip; between them section properties are linear in y. */
export interface WingFamilies {
  readonly root: PolarFamily
  readonly tip: PolarFamily
}

/** A wing's families at one flight state. */
export interface WingSections {
  readonly families: WingFamilies
  readonly mach: number
  /** rad */
  readonly sweep: number
}

const mixed = (a: number | null, b: number | null, share: number): number | null =>
  a === null || b === null ? null : a + share * (b - a)

/** The straight lift line at a share of the semispan and a local Reynolds number; null where a polar has none. */
export function lineOfStation(
  { families, mach }: WingSections,
  share: number,
  reynolds: number,
): SectionLine | null {
  const a = lineAt(families.root, reynolds, mach)
  if (families.tip === families.root || a === null) return a
  const b = lineAt(families.tip, reynolds, mach)
  if (b === null) return null
  return {
    slope: a.slope + share * (b.slope - a.slope),
    zeroLift: a.zeroLift + share * (b.zeroLift - a.zeroLift),
    momentAtZeroLift: a.momentAtZeroLift + share * (b.momentAtZeroLift - a.momentAtZeroLift),
  }
}

/** Maximum section lift at a share of the semispan and a local Reynolds number, swept; null where unknown. */
export function maxLiftOfStation(sections: WingSections, share: number, reynolds: number): number | null {
  const { families, mach, sweep } = sections
  const a = maxLiftAt(families.root, reynolds, mach)
  const b = families.tip === families.root ? a : maxLiftAt(families.tip, reynolds, mach)
  const both = mixed(a, b, share)
  return both === null ? null : sweptLift(both, sweep)
}

/** Section drag at a station's lift, or why there is none. */
export interface StationDrag {
  readonly value: number | null
  readonly reason: string
}

/**
 * Section drag at a share of the semispan from the polars at the local Reynolds number and lift. Between two
 * sections one may be asked for a little more than its own maximum while the station is not past its own:
 * it counts with the drag at its maximum.
 */
export function dragOfStation(sections: WingSections, share: number, station: StationState): StationDrag {
  const { families } = sections
  if (families.tip === families.root) return dragOf(families.root, sections, station, Infinity)
  const most = maxLiftOfStation(sections, share, station.reynolds)
  const within = most !== null && station.liftCoefficient <= most
  const limit = (family: PolarFamily): number =>
    within ? (maxLiftAt(family, station.reynolds, sections.mach) ?? Infinity) : Infinity
  const a = dragOf(families.root, sections, station, limit(families.root))
  const b = dragOf(families.tip, sections, station, limit(families.tip))
  return { value: mixed(a.value, b.value, share), reason: a.reason || b.reason }
}

function dragOf(
  family: PolarFamily,
  { mach, sweep }: WingSections,
  station: StationState,
  most: number,
): StationDrag {
  const found = polarAt(family, station.reynolds, mach)
  if (found === null) return { value: null, reason: 'a polar is not computed' }
  if (found.outside) return { value: null, reason: 'the Reynolds or Mach number is outside the polars' }
  const looked = atLift(found.polar, Math.min(station.liftCoefficient / sweptLift(1, sweep), most))
  if (looked.kind === 'failed') {
    return { value: null, reason: `a point of the polar did not converge (${looked.reason})` }
  }
  if (looked.kind === 'outside')
    return { value: null, reason: 'the local lift is beyond the stall of the section' }
  return { value: looked.point.dragCoefficient, reason: '' }
}
