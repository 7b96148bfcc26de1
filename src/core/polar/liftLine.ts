import { power } from '../numerics/elementary'
import type { Polar } from './polar'

/** What a linear lifting line needs of a section. */
export interface SectionLine {
  /** Section lift slope, per rad. */
  readonly slope: number
  /** Zero-lift angle from the chord line, rad. */
  readonly zeroLift: number
  /** Moment about the quarter chord at zero lift. */
  readonly momentAtZeroLift: number
}

/** The lift range over which the straight line is laid: that in which sections fly attached. */
const LOWEST_LIFT = -0.2
const HIGHEST_LIFT = 0.9

/**
 * The straight line of a polar: zero-lift angle and moment where the lift crosses zero (interpolated
 * linearly between points), slope by least squares through that crossing over c_l from -0.2 to 0.9.
 * Null when the polar does not cross zero lift with converged points, or has no other point in that range.
 */
export function liftLine(polar: Polar): SectionLine | null {
  const points = polar.points.filter(
    (p) => p.converged && p.liftCoefficient !== null && p.momentCoefficient !== null,
  )
  for (let i = 0; i + 1 < points.length; i++) {
    const a = points[i]
    const b = points[i + 1]
    const la = a.liftCoefficient!
    const lb = b.liftCoefficient!
    if (la > 0 || lb <= 0) continue
    const t = -la / (lb - la)
    const zeroLift = a.alpha + t * (b.alpha - a.alpha)
    let moments = 0
    let weights = 0
    for (const { alpha, liftCoefficient } of points) {
      if (liftCoefficient! < LOWEST_LIFT || liftCoefficient! > HIGHEST_LIFT) continue
      moments += (alpha - zeroLift) * liftCoefficient!
      weights += power(alpha - zeroLift, 2)
    }
    if (weights === 0) return null
    return {
      slope: moments / weights,
      zeroLift,
      momentAtZeroLift: a.momentCoefficient! + t * (b.momentCoefficient! - a.momentCoefficient!),
    }
  }
  return null
}
