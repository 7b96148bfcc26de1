import { machBracket } from './machLattice'
import { liftLine, type SectionLine } from './liftLine'
import type { LiftLimit, Polar, PolarPoint } from './polar'
import { atAngle } from './polarCurve'
import { reynoldsBracket } from './reynoldsLattice'

/** The viscous polars of one section on the lattice of Reynolds and Mach numbers, in any order. */
export type PolarFamily = readonly Polar[]

/** A polar between those of a family. */
export interface FamilyPolar {
  readonly polar: Polar
  /** Whether the lattice ends before the Reynolds or Mach number asked for; its end then stands in. */
  readonly outside: boolean
}

/** One polar of the lattice and its share in the state asked for. */
interface Share {
  readonly polar: Polar
  readonly weight: number
}

/** Greatest Mach number of the lattice. */
const GREATEST_MACH = 0.5

/** Polars of a family round a state, weights adding up to 1; null when one of them is not at hand. */
function sharesOf(family: PolarFamily, reynolds: number, mach: number): Share[] | null {
  const r = reynoldsBracket(reynolds)
  const m = machBracket('viscous', mach)
  const shares: Share[] = []
  for (const [re, inReynolds] of [
    [r.low, 1 - r.fraction],
    [r.high, r.fraction],
  ] as const) {
    for (const [ma, inMach] of [
      [m.low, 1 - m.fraction],
      [m.high, m.fraction],
    ] as const) {
      const weight = inReynolds * inMach
      if (weight === 0) continue
      const polar = family.find((one) => one.reynolds === re && one.mach === ma)
      if (polar === undefined) return null
      shares.push({ polar, weight })
    }
  }
  return shares
}

function isOutside(reynolds: number, mach: number): boolean {
  return reynoldsBracket(reynolds).outside || mach > GREATEST_MACH
}

/**
 * The polar of a family at a chord Reynolds number and a Mach number: at each angle linear in the logarithm
 * of the Reynolds number and in 1/sqrt(1 - M^2). A point that failed in one of the polars fails. Maximum
 * and minimum lift are interpolated in angle and lift, and their points stand in `between`, so that the
 * curve reaches them. Exact on the lattice. Null when a polar of the lattice is not at hand.
 */
export function polarAt(family: PolarFamily, reynolds: number, mach: number): FamilyPolar | null {
  const shares = sharesOf(family, reynolds, mach)
  if (shares === null) return null
  const outside = isOutside(reynolds, mach)
  const [{ polar: first }] = shares
  if (shares.length === 1) return { polar: first, outside }
  const maxLift = limitBetween(shares, (polar) => polar.maxLift)
  const minLift = limitBetween(shares, (polar) => polar.minLift)
  const points = first.points.map((_, i) => pointBetween(shares, (polar) => polar.points[i]))
  const ends = [
    [maxLift, (polar: Polar) => polar.maxLift],
    [minLift, (polar: Polar) => polar.minLift],
  ] as const
  const between = ends.flatMap(([limit, of]) => (limit === null ? [] : limitPoint(shares, limit, of, points)))
  return { polar: { ...first, reynolds, mach, points, between, maxLift, minLift }, outside }
}

function mix(shares: readonly Share[], of: (polar: Polar) => number | null): number | null {
  let sum = 0
  for (const { polar, weight } of shares) {
    const value = of(polar)
    if (value === null) return null
    sum += weight * value
  }
  return sum
}

function pointBetween(shares: readonly Share[], of: (polar: Polar) => PolarPoint): PolarPoint {
  const all = (value: (point: PolarPoint) => number | null): number | null =>
    mix(shares, (polar) => value(of(polar)))
  return {
    alpha: of(shares[0].polar).alpha,
    liftCoefficient: all((point) => point.liftCoefficient),
    dragCoefficient: all((point) => point.dragCoefficient),
    momentCoefficient: all((point) => point.momentCoefficient),
    transitionUpper: all((point) => point.transitionUpper),
    transitionLower: all((point) => point.transitionLower),
    converged: shares.every(({ polar }) => of(polar).converged),
    reason: shares.map(({ polar }) => of(polar).reason).find((words) => words !== '') ?? '',
  }
}

function limitBetween(shares: readonly Share[], of: (polar: Polar) => LiftLimit | null): LiftLimit | null {
  const alpha = mix(shares, (polar) => of(polar)?.alpha ?? null)
  const liftCoefficient = mix(shares, (polar) => of(polar)?.liftCoefficient ?? null)
  if (alpha === null || liftCoefficient === null) return null
  const nose = shares.some(({ polar }) => of(polar)?.by === 'nose')
  return { alpha, liftCoefficient, by: nose ? 'nose' : 'layers' }
}

/** The point of an interpolated limit; none where a requested angle already stands. */
function limitPoint(
  shares: readonly Share[],
  limit: LiftLimit,
  of: (polar: Polar) => LiftLimit | null,
  points: readonly PolarPoint[],
): PolarPoint[] {
  if (points.some(({ alpha }) => alpha === limit.alpha)) return []
  const at = new Map(shares.map(({ polar }) => [polar, atAngle(polar, of(polar)!.alpha)]))
  const value = (name: 'dragCoefficient' | 'momentCoefficient'): number | null =>
    mix(shares, (polar) => {
      const found = at.get(polar)!
      return found.kind === 'point' ? found.point[name] : null
    })
  return [
    {
      alpha: limit.alpha,
      liftCoefficient: limit.liftCoefficient,
      dragCoefficient: value('dragCoefficient'),
      momentCoefficient: value('momentCoefficient'),
      transitionUpper: null,
      transitionLower: null,
      converged: true,
      reason: '',
    },
  ]
}

/** Greatest section lift of a family at a state, linear between the lattice; null where a polar has none. */
export function maxLiftAt(family: PolarFamily, reynolds: number, mach: number): number | null {
  const shares = sharesOf(family, reynolds, mach)
  if (shares === null || isOutside(reynolds, mach)) return null
  return mix(shares, (polar) => polar.maxLift?.liftCoefficient ?? null)
}

/** The straight lift line of a family at a state, linear between the lattice's; null where a polar has none. */
export function lineAt(family: PolarFamily, reynolds: number, mach: number): SectionLine | null {
  const shares = sharesOf(family, reynolds, mach)
  if (shares === null) return null
  const slope = mix(shares, (polar) => knownLine(polar)?.slope ?? null)
  const zeroLift = mix(shares, (polar) => knownLine(polar)?.zeroLift ?? null)
  const momentAtZeroLift = mix(shares, (polar) => knownLine(polar)?.momentAtZeroLift ?? null)
  if (slope === null || zeroLift === null || momentAtZeroLift === null) return null
  return { slope, zeroLift, momentAtZeroLift }
}

/** Lines of polars met before: a polar never changes. */
const met = new WeakMap<Polar, SectionLine | null>()

function knownLine(polar: Polar): SectionLine | null {
  const had = met.get(polar)
  if (had !== undefined) return had
  const line = liftLine(polar)
  met.set(polar, line)
  return line
}
