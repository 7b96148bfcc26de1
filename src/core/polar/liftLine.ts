import { power } from '../numerics/elementary'
import type { Polar, PolarPoint } from './polar'
import { zeroOfLift } from './polarCurve'

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
 * linearly between neighbouring points), slope by least squares through that crossing over the points from
 * there outwards whose c_l lies from -0.2 to 0.9; a failed point and a stall end that stretch. Null when
 * the lift does not cross zero between converged neighbours, or no other point lies in that range.
 */
export function liftLine(polar: Polar): SectionLine | null {
  const { points } = polar
  const at = zeroOfLift(points)
  if (at === null) return null
  const [a, b] = [points[at], points[at + 1]]
  const la = a.liftCoefficient!
  const lb = b.liftCoefficient!
  if (a.momentCoefficient === null || b.momentCoefficient === null) return null
  const t = -la / (lb - la)
  const zeroLift = a.alpha + t * (b.alpha - a.alpha)
  let moments = 0
  let weights = 0
  for (const { alpha, liftCoefficient } of [...attached(points, at, -1), ...attached(points, at + 1, 1)]) {
    moments += (alpha - zeroLift) * liftCoefficient!
    weights += power(alpha - zeroLift, 2)
  }
  if (weights === 0) return null
  return {
    slope: moments / weights,
    zeroLift,
    momentAtZeroLift: a.momentCoefficient + t * (b.momentCoefficient - a.momentCoefficient),
  }
}

/** Points from one on outwards (`step` 1 up, -1 down) while they converge and lie in the range. */
function attached(points: readonly PolarPoint[], from: number, step: 1 | -1): PolarPoint[] {
  const some: PolarPoint[] = []
  for (let i = from; i >= 0 && i < points.length; i += step) {
    const { converged, liftCoefficient } = points[i]
    if (!converged || liftCoefficient === null) break
    if (liftCoefficient < LOWEST_LIFT || liftCoefficient > HIGHEST_LIFT) break
    some.push(points[i])
  }
  return some
}
