import { monotoneSlopes, monotoneValue } from '../numerics/monotoneCubic'
import type { Polar, PolarPoint } from './polar'

/** What a polar has at one angle or lift. Null coefficients are those that the method does not give. */
export interface CurvePoint {
  /** rad */
  readonly alpha: number
  readonly liftCoefficient: number
  readonly dragCoefficient: number | null
  readonly momentCoefficient: number | null
}

/** What came of a look-up: a point, or why there is none. */
export type LookUp =
  | { readonly kind: 'point'; readonly point: CurvePoint }
  /** The question lies beyond the polar's ends, or its lift beyond the stalls. */
  | { readonly kind: 'outside' }
  /** A point next to it did not converge, and none is bridged over. */
  | { readonly kind: 'failed'; readonly reason: string }

/** Lift beyond a maximum by no more than this is the maximum: rounding of a lift solved for; no more. */
const LIFT_ROUNDING = 1e-7
/** Halvings in the search of an angle within one piece: below 1e-14 rad for pieces of a degree. */
const HALVINGS = 44

/** All points of a polar by angle, requested ones and those in between. */
export function allPoints({ points, between }: Polar): PolarPoint[] {
  return [...points, ...between].sort((a, b) => a.alpha - b.alpha)
}

/**
 * The polar at an angle (rad): in each stretch of converged neighbours the monotone cubic through its
 * points, exact at them. Says when the angle is outside the polar or in a piece with a failed end.
 */
export function atAngle(polar: Polar, alpha: number): LookUp {
  const points = allPoints(polar)
  const last = points.length - 1
  if (last < 0 || alpha < points[0].alpha || alpha > points[last].alpha) return { kind: 'outside' }
  const at = Math.min(
    Math.max(
      points.findLastIndex((point) => point.alpha <= alpha),
      0,
    ),
    last,
  )
  if (points[at].alpha === alpha && points[at].converged) return { kind: 'point', point: own(points[at]) }
  return inPiece(points, Math.min(at, last - 1), () => alpha)
}

/**
 * The polar at a lift coefficient, between the negative and the positive stall: from the zero of lift
 * outwards, the first piece that holds the lift. Outside beyond the stalls, where a limit is known.
 */
export function atLift(polar: Polar, lift: number): LookUp {
  const top = polar.maxLift
  const bottom = polar.minLift
  const wanted = held(lift, bottom?.liftCoefficient ?? -Infinity, top?.liftCoefficient ?? Infinity)
  if (wanted === null) return { kind: 'outside' }
  const points = allPoints(polar)
  const zero = zeroOfLift(points)
  if (zero === null) return { kind: 'outside' }
  const outward = wanted >= 0 ? 1 : -1
  for (let i = zero; i >= 0 && i + 1 < points.length; i += outward) {
    const [a, b] = [points[i], points[i + 1]]
    if (!a.converged || !b.converged) return { kind: 'failed', reason: a.reason || b.reason || 'failed' }
    const [la, lb] = [a.liftCoefficient!, b.liftCoefficient!]
    if (Math.min(la, lb) > wanted || Math.max(la, lb) < wanted) continue
    return inPiece(points, i, (liftAt) => angleOf(liftAt, a.alpha, b.alpha, wanted, lb > la))
  }
  return { kind: 'outside' }
}

/** A value inside its limits, one beyond them by rounding brought to them, null further out. */
function held(value: number, least: number, most: number): number | null {
  if (value > most + LIFT_ROUNDING || value < least - LIFT_ROUNDING) return null
  return Math.min(Math.max(value, least), most)
}

/** Index of the point before lift first turns positive between two converged neighbours; null without. */
export function zeroOfLift(points: readonly PolarPoint[]): number | null {
  const at = points.findIndex((a, i) => {
    const b = points[i + 1]
    if (!a.converged || b === undefined || !b.converged) return false
    return a.liftCoefficient !== null && a.liftCoefficient <= 0 && (b.liftCoefficient ?? 0) > 0
  })
  return at < 0 ? null : at
}

function angleOf(
  liftAt: (alpha: number) => number,
  from: number,
  to: number,
  wanted: number,
  rising: boolean,
): number {
  let [low, high] = [from, to]
  for (let n = 0; n < HALVINGS; n++) {
    const middle = 0.5 * (low + high)
    if (liftAt(middle) < wanted === rising) low = middle
    else high = middle
  }
  return 0.5 * (low + high)
}

/** The curve on piece i at an angle that may depend on the lift curve. */
function inPiece(
  points: readonly PolarPoint[],
  i: number,
  choose: (liftAt: (alpha: number) => number) => number,
): LookUp {
  const [a, b] = [points[i], points[i + 1]]
  if (!a.converged || !b.converged) return { kind: 'failed', reason: a.reason || b.reason || 'failed' }
  // Slopes of a piece depend on its neighbours alone: four points at most, none beyond a failed one.
  const from = i > 0 && points[i - 1].converged ? i - 1 : i
  const to = points[i + 2]?.converged ? i + 2 : i + 1
  const some = points.slice(from, to + 1)
  const x = some.map(({ alpha }) => alpha)
  const piece = i - from
  const curve = (of: (point: PolarPoint) => number | null): ((alpha: number) => number) | null => {
    const values = some.map(of)
    if (values.some((value) => value === null)) return null
    const y = values as number[]
    const slopes = monotoneSlopes(x, y)
    return (alpha) => monotoneValue(x, y, slopes, piece, alpha)
  }
  const lift = curve((point) => point.liftCoefficient)
  if (lift === null) return { kind: 'outside' }
  const alpha = choose(lift)
  return {
    kind: 'point',
    point: {
      alpha,
      liftCoefficient: lift(alpha),
      dragCoefficient: curve((point) => point.dragCoefficient)?.(alpha) ?? null,
      momentCoefficient: curve((point) => point.momentCoefficient)?.(alpha) ?? null,
    },
  }
}

function own({ alpha, liftCoefficient, dragCoefficient, momentCoefficient }: PolarPoint): CurvePoint {
  return { alpha, liftCoefficient: liftCoefficient!, dragCoefficient, momentCoefficient }
}
