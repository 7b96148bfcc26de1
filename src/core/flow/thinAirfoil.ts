import { acos, cos, sin } from '../numerics/elementary'
import { meanLineOf } from '../shape/meanLine'
import type { MeanLine, Section } from '../shape/section'

/** A section in thin-airfoil theory. Angles in rad, moments about the quarter chord, nose up positive. */
export interface ThinAirfoil {
  readonly zeroLiftAngle: number
  /** Also the moment about the aerodynamic centre, which lies at the quarter chord. */
  readonly momentQuarterChord: number
  /** The angle at which the flow meets the leading edge smoothly. */
  readonly idealAngle: number
  readonly idealLift: number
  /** Fourier coefficients of the slope of the mean line: B0 (the ideal angle), A1, A2. */
  readonly coefficients: readonly [b0: number, a1: number, a2: number]
}

/** Midpoints of the quadrature for a mean line known only by its points. */
const STATIONS = 64

/**
 * Thin-airfoil theory of a section: in closed form where the mean line is a piecewise polynomial, else by
 * quadrature over the mean line found from thickness perpendicular to it.
 * Source: Glauert, The Elements of Aerofoil and Airscrew Theory (1926), chapter VII, equations 7.10 to 7.14.
 */
export function thinAirfoil(section: Section): ThinAirfoil {
  const { meanLine } = section
  return fromCoefficients(
    meanLine === null
      ? pointCoefficients(section)
      : ([0, 1, 2].map((n) => closedForm(meanLine, n)) as Triple),
  )
}

type Triple = [number, number, number]

function fromCoefficients([i0, i1, i2]: Triple): ThinAirfoil {
  const [b0, a1, a2] = [i0 / Math.PI, (2 * i1) / Math.PI, (2 * i2) / Math.PI]
  return {
    zeroLiftAngle: b0 - 0.5 * a1,
    momentQuarterChord: (-Math.PI / 4) * (a1 - a2),
    idealAngle: b0,
    idealLift: Math.PI * a1,
    coefficients: [b0, a1, a2],
  }
}

/** Section lift coefficient at an angle of attack (rad): slope 2 pi. */
export function thinLift(thin: ThinAirfoil, alpha: number): number {
  return 2 * Math.PI * (alpha - thin.zeroLiftAngle)
}

/** Centre of pressure in chords at an angle of attack (rad); null where the lift vanishes. */
export function centreOfPressure(thin: ThinAirfoil, alpha: number): number | null {
  const lift = thinLift(thin, alpha)
  return Math.abs(lift) < 1e-9 ? null : 0.25 - thin.momentQuarterChord / lift
}

/**
 * Integral of the slope times cos(n theta) over theta from 0 to pi, x = (1 - cos theta) / 2: each power of x
 * is a finite cosine series in theta, whose products with cos(n theta) integrate in closed form.
 */
function closedForm(line: MeanLine, n: number): number {
  const joint = acos(1 - 2 * Math.min(Math.max(line.joint, 0), 1))
  return integral(slopeSeries(line.front), n, 0, joint) + integral(slopeSeries(line.rear), n, joint, Math.PI)
}

/** Cosine series in theta of the derivative of a polynomial in x. */
function slopeSeries(polynomial: readonly number[]): number[] {
  const series = new Array<number>(Math.max(polynomial.length, 1)).fill(0)
  let power = [1]
  for (let k = 1; k < polynomial.length; k++) {
    power.forEach((value, m) => (series[m] += k * polynomial[k] * value))
    power = timesX(power)
  }
  return series
}

/** A cosine series times x = 1/2 - cos(theta)/2. */
function timesX(series: readonly number[]): number[] {
  const product = new Array<number>(series.length + 1).fill(0)
  series.forEach((value, m) => {
    product[m] += 0.5 * value
    product[m + 1] -= 0.25 * value
    product[Math.abs(m - 1)] -= 0.25 * value
  })
  return product
}

function integral(series: readonly number[], n: number, from: number, to: number): number {
  const cosine = (m: number): number => (m === 0 ? to - from : (sin(m * to) - sin(m * from)) / m)
  return series.reduce((sum, value, m) => sum + 0.5 * value * (cosine(m + n) + cosine(Math.abs(m - n))), 0)
}

/** The same integrals from the mean line of an outline, by the midpoint rule with secant slopes. */
function pointCoefficients(section: Section): Triple {
  const { x, y } = meanLineOf(section, STATIONS)
  const step = Math.PI / STATIONS
  const sums: Triple = [0, 0, 0]
  for (let k = 0; k < STATIONS; k++) {
    const slope = (y[k + 1] - y[k]) / (x[k + 1] - x[k])
    const theta = (k + 0.5) * step
    for (const n of [0, 1, 2] as const) sums[n] += slope * cos(n * theta) * step
  }
  return sums
}
