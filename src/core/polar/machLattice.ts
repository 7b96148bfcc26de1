import type { Method, Polar, PolarPoint } from './polar'

/** The free-stream Mach numbers at which polars are computed; between them they are interpolated. */
export const MACH_LATTICE: readonly number[] = [0, 0.15, 0.3, 0.4, 0.5]

/** The lattice Mach numbers that bracket one, and how far it lies between them. */
export interface MachBracket {
  readonly low: number
  readonly high: number
  /** 0 at `low`, 1 at `high`; linear in 1/sqrt(1 - M^2), in which lift and moment grow (Prandtl and Glauert). */
  readonly fraction: number
}

/**
 * The bracket of a Mach number. Thin-airfoil theory is incompressible and always takes 0; above the
 * lattice its last value is taken (the wing marks that state).
 */
export function machBracket(method: Method, mach: number): MachBracket {
  if (method === 'thin') return { low: 0, high: 0, fraction: 0 }
  const top = MACH_LATTICE.length - 1
  if (mach >= MACH_LATTICE[top]) return { low: MACH_LATTICE[top], high: MACH_LATTICE[top], fraction: 0 }
  const k = MACH_LATTICE.findLastIndex((value) => value <= mach)
  const low = MACH_LATTICE[k]
  const high = MACH_LATTICE[k + 1]
  if (mach === low) return { low, high: low, fraction: 0 }
  const growth = (m: number): number => 1 / Math.sqrt(1 - m * m)
  return { low, high, fraction: (growth(mach) - growth(low)) / (growth(high) - growth(low)) }
}

/**
 * A polar between two of the lattice at the same angles: linear in the fraction, point by point. A point
 * that failed on either side fails.
 */
export function polarBetween(low: Polar, high: Polar, fraction: number, mach: number): Polar {
  if (fraction === 0) return low
  return {
    ...low,
    mach,
    points: low.points.map((point, i) => between(point, high.points[i], fraction)),
  }
}

function between(a: PolarPoint, b: PolarPoint, fraction: number): PolarPoint {
  const mix = (p: number | null, q: number | null): number | null =>
    p === null || q === null ? null : p + fraction * (q - p)
  return {
    alpha: a.alpha,
    liftCoefficient: mix(a.liftCoefficient, b.liftCoefficient),
    dragCoefficient: mix(a.dragCoefficient, b.dragCoefficient),
    momentCoefficient: mix(a.momentCoefficient, b.momentCoefficient),
    transitionUpper: mix(a.transitionUpper, b.transitionUpper),
    transitionLower: mix(a.transitionLower, b.transitionLower),
    converged: a.converged && b.converged,
    reason: a.reason || b.reason,
  }
}
