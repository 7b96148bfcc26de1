import { asin, atan2, cos, hypot, sin } from '../numerics/elementary'
import type { Panels } from '../shape/panels'
import { checkMach, compressiblePressure, criticalPressure } from './compressibility'
import type { PanelFlow } from './vortexPanels'

/** Loads on a section at one angle; coefficients of chord 1, moment about the quarter chord, nose up positive. */
export interface PanelLoads {
  /** rad */
  readonly alpha: number
  /** From the circulation, with the compressibility correction of the pressures. */
  readonly liftCoefficient: number
  readonly liftFromPressure: number
  readonly momentCoefficient: number
  /** At the nodes of the panels. */
  readonly pressureCoefficient: Float64Array
  /** Where the flow divides: chords of panel length from the upper trailing edge, and the point. */
  readonly stagnation: { readonly s: number; readonly x: number; readonly y: number }
  /** What deserves a mark; empty when there is nothing to say. */
  readonly reason: string
}

/**
 * Loads at the angle of attack `alpha` (rad) and the free-stream Mach number `mach`, 0 to 0.5: pressures by
 * Bernoulli's equation and the rule of von Karman and Tsien, lift and moment from those pressures. The lift
 * from circulation gets the increment that the correction gives to the pressure lift. Flow that turns sonic
 * is marked in `reason`. Throws BadInput for a Mach number outside the range.
 */
export function panelLoads(flow: PanelFlow, alpha: number, mach: number = 0): PanelLoads {
  checkMach(mach)
  const { along, across, weights, panels } = flow
  const size = along.length
  const cosine = cos(alpha)
  const sine = sin(alpha)
  const pressureCoefficient = new Float64Array(size)
  let circulation = 0
  let [fx, fy, moment, incompressibleLift, lowest] = [0, 0, 0, 0, 1]
  for (let i = 0; i < size; i++) {
    const speed = along[i] * cosine + across[i] * sine
    const plain = 1 - speed * speed
    const cp = mach === 0 ? plain : compressiblePressure(plain, mach)
    pressureCoefficient[i] = cp
    if (cp < lowest) lowest = cp
    circulation += weights.circulation[i] * speed
    incompressibleLift += plain * (weights.across[i] * cosine - weights.along[i] * sine)
    fx += cp * weights.along[i]
    fy += cp * weights.across[i]
    moment += cp * weights.moment[i]
  }
  const liftFromPressure = fy * cosine - fx * sine
  return {
    alpha,
    liftCoefficient: 2 * circulation + liftFromPressure - incompressibleLift,
    liftFromPressure,
    momentCoefficient: moment,
    pressureCoefficient,
    stagnation: stagnationOf(panels, along, across, cosine, sine),
    reason: reasonOf(flow.solved, lowest, mach),
  }
}

function reasonOf(solved: boolean, lowest: number, mach: number): string {
  if (!solved) return 'the panel equations have no solution for this outline'
  return lowest < criticalPressure(mach) ? 'the flow turns sonic on the surface' : ''
}

/** First place from the upper edge where the surface speed changes sign; the leading node pair decides. */
function stagnationOf(
  { x, y }: Panels,
  along: Float64Array,
  across: Float64Array,
  cosine: number,
  sine: number,
): { s: number; x: number; y: number } {
  let s = 0
  const last = x.length - 1
  for (let i = 0; i < last; i++) {
    const here = along[i] * cosine + across[i] * sine
    const next = along[i + 1] * cosine + across[i + 1] * sine
    const h = hypot(x[i + 1] - x[i], y[i + 1] - y[i])
    if (here > 0 && next <= 0) {
      const t = here / (here - next)
      return { s: s + t * h, x: x[i] + t * (x[i + 1] - x[i]), y: y[i] + t * (y[i + 1] - y[i]) }
    }
    s += h
  }
  return { s, x: x[last], y: y[last] }
}

/** First step of the secant search for a lift, rad. */
const FIRST_STEP = 0.01

/**
 * Angle of attack (rad) at which the section has the lift coefficient `lift` at `mach`; null when the
 * potential flow reaches no such lift. Closed form at Mach 0, where lift is linear in the sine and cosine of
 * the angle; secant steps from there otherwise.
 */
export function alphaForLift(flow: PanelFlow, lift: number, mach: number = 0): number | null {
  checkMach(mach)
  const atZero = panelLoads(flow, 0).liftCoefficient
  const atRight = panelLoads(flow, Math.PI / 2).liftCoefficient
  const size = hypot(atZero, atRight)
  const closed = (wanted: number): number => asin(wanted / size) - atan2(atZero, atRight)
  if (!(size > 0) || Math.abs(lift) > size) return null
  let alpha = closed(lift)
  if (mach === 0) return alpha
  let before = alpha - FIRST_STEP
  let errorBefore = panelLoads(flow, before, mach).liftCoefficient - lift
  for (let step = 0; step < 50; step++) {
    const error = panelLoads(flow, alpha, mach).liftCoefficient - lift
    if (Math.abs(error) < 1e-10) return alpha
    if (error === errorBefore) return null
    const next = alpha - (error * (alpha - before)) / (error - errorBefore)
    ;[before, errorBefore, alpha] = [alpha, error, next]
    if (!(Math.abs(alpha) < Math.PI / 2)) return null
  }
  return null
}
