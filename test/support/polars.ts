import type { Polar, PolarPoint } from '../../src/core/polar/polar'

const DEGREE = Math.PI / 180

/** An invented section: straight lift up to a sharp maximum, drag a parabola of lift. */
export interface InventedSection {
  readonly slope: number
  /** rad */
  readonly zeroLift: number
  readonly maxLift: (reynolds: number) => number
  readonly moment: number
  readonly drag: (lift: number) => number
}

/** Lift lost per rad behind the maximum, as a share of the slope. */
const FALL = -0.5

/** The polar of an invented section from -12 to 20 deg by half a degree, at a state of the lattice. */
export function inventedPolar(section: InventedSection, reynolds: number, mach = 0): Polar {
  const { slope, zeroLift, moment } = section
  const most = section.maxLift(reynolds)
  const stall = zeroLift + most / slope
  const point = (alpha: number): PolarPoint => {
    const straight = slope * (alpha - zeroLift)
    const lift = alpha <= stall ? straight : most + FALL * slope * (alpha - stall)
    return {
      alpha,
      liftCoefficient: lift,
      dragCoefficient: section.drag(lift),
      momentCoefficient: moment,
      transitionUpper: 1,
      transitionLower: 1,
      converged: true,
      reason: '',
    }
  }
  return {
    method: 'viscous',
    reynolds,
    mach,
    surface: 'clean',
    amplification: 9,
    tripUpper: 1,
    tripLower: 1,
    flap: 0,
    points: Array.from({ length: 65 }, (_, i) => point((-12 + 0.5 * i) * DEGREE)),
    between: [point(stall)],
    maxLift: { alpha: stall, liftCoefficient: most, by: 'layers' },
    minLift: null,
  }
}
