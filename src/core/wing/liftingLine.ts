import { acos, cos, power, sin } from '../numerics/elementary'
import { factorInPlace, solveInPlace } from '../numerics/denseSolve'

/** A wing for the lifting line. Functions of the distance y from the centreline (m), on one half. */
export interface LiftingLineInput {
  /** m */
  readonly span: number
  /** m2 */
  readonly area: number
  /** m */
  readonly chord: (y: number) => number
  /** Section lift slope, per rad. */
  readonly slope: (y: number) => number
  /** Angle of the section's zero-lift line against the root chord, rad: twist minus zero-lift angle. */
  readonly set: (y: number) => number
  /** Where chord, slope or setting have a kink, from 0 to the tip, both included. */
  readonly breaks: readonly number[]
}

/** Circulation of a wing as a linear function of the angle of its root chord. */
export interface LiftingLine {
  readonly input: LiftingLineInput
  /** Coefficients of the odd terms, per rad of root angle. */
  readonly perAngle: Float64Array
  /** The same at root angle 0. */
  readonly atZero: Float64Array
}

/**
 * Odd Fourier terms. Measured in Galerkin's form on straight-tapered wings of aspect ratio 4 to 10: 20 terms
 * give the lift slope to 2e-7 and the induced-drag factor to 1e-6, 40 terms to 1e-8 and 1e-7 (at aspect
 * ratio 40: 1e-7 and 3e-6), the local lift to 1e-5 and at the kink of the root to 2e-4. Kinks inside the
 * half span leave 1e-6 in slope and drag.
 */
const TERMS = 40
/** Quadrature: each smooth stretch is cut into pieces of at most this angle, five Gauss points each. */
const PIECE = Math.PI / 100
const GAUSS_5: readonly (readonly [number, number])[] = [
  [0.5, 0.284444444444444],
  [0.230765344947158, 0.239314335249683],
  [0.769234655052842, 0.239314335249683],
  [0.046910077030668, 0.118463442528095],
  [0.953089922969332, 0.118463442528095],
]

/**
 * Prandtl's lifting line for a symmetric wing, circulation 2 b V sum A_n sin(n theta) with odd n and
 * y = (b/2) cos(theta). The equation, times sin(theta), is weighted with each sin(m theta) and integrated
 * over the half span (Galerkin's form), piece by piece between kinks of chord and twist. One factorisation
 * serves all angles.
 * Source: Glauert, The Elements of Aerofoil and Airscrew Theory (1926), chapter XI, equation 11.16;
 * weighting after Gates, ARC R&M 1175 (1928).
 */
export function solveLiftingLine(input: LiftingLineInput, terms: number = TERMS): LiftingLine {
  const { span } = input
  const matrix = new Float64Array(terms * terms)
  const perAngle = new Float64Array(terms)
  const atZero = new Float64Array(terms)
  const sines = new Float64Array(terms)
  for (const [theta, weight] of quadrature(input)) {
    const y = 0.5 * span * cos(theta)
    oddSinesInPlace(sines, theta)
    const stiffness = (weight * 4 * span * sines[0]) / (input.chord(y) * input.slope(y))
    const set = input.set(y)
    for (let row = 0; row < terms; row++) {
      const weighted = stiffness * sines[row]
      for (let column = 0; column <= row; column++) matrix[row * terms + column] += weighted * sines[column]
      perAngle[row] += weight * sines[0] * sines[row]
      atZero[row] += weight * sines[0] * sines[row] * set
    }
  }
  for (let row = 0; row < terms; row++) {
    for (let column = 0; column < row; column++) matrix[column * terms + row] = matrix[row * terms + column]
    matrix[row * terms + row] += ((2 * row + 1) * Math.PI) / 4
  }
  const factors = factorInPlace(matrix, terms)
  solveInPlace(factors, perAngle)
  solveInPlace(factors, atZero)
  return { input, perAngle, atZero }
}

/** Sines of theta, 3 theta, 5 theta and so on, by the recurrence of Chebyshev. */
function oddSinesInPlace(sines: Float64Array, theta: number): Float64Array {
  const twice = 2 * cos(2 * theta)
  let before = -sin(theta)
  let here = -before
  for (let k = 0; k < sines.length; k++) {
    sines[k] = here
    const next = twice * here - before
    before = here
    here = next
  }
  return sines
}

function* quadrature({
  span,
  breaks,
}: LiftingLineInput): Generator<readonly [theta: number, weight: number]> {
  for (let k = 0; k + 1 < breaks.length; k++) {
    const from = acos(Math.min(breaks[k + 1] / (0.5 * span), 1))
    const to = acos(breaks[k] / (0.5 * span))
    const pieces = Math.ceil((to - from) / PIECE)
    const step = (to - from) / pieces
    for (let piece = 0; piece < pieces; piece++) {
      for (const [place, weight] of GAUSS_5) yield [from + (piece + place) * step, weight * step]
    }
  }
}

/** Coefficients at a root angle (rad). */
export function coefficientsAt(line: LiftingLine, alpha: number): Float64Array {
  return line.atZero.map((value, k) => value + alpha * line.perAngle[k])
}

/** Lift slope of the wing, per rad. */
export function wingLiftSlope(line: LiftingLine): number {
  return Math.PI * aspectRatio(line) * line.perAngle[0]
}

/** Root angle (rad) at which the wing carries C_L. */
export function rootAngleForLift(line: LiftingLine, liftCoefficient: number): number {
  return (liftCoefficient / (Math.PI * aspectRatio(line)) - line.atZero[0]) / line.perAngle[0]
}

function aspectRatio({ input }: LiftingLine): number {
  return power(input.span, 2) / input.area
}

/** Wing totals at a root angle (rad). */
export interface WingLift {
  readonly liftCoefficient: number
  readonly inducedDragCoefficient: number
  /** Bending moment of one half wing at the root over dynamic pressure, m3. */
  readonly rootMomentOverPressure: number
}

/** Lift, induced drag and root bending moment, all closed sums over the coefficients. */
export function wingLiftAt(line: LiftingLine, alpha: number): WingLift {
  const { span } = line.input
  const a = coefficientsAt(line, alpha)
  let induced = 0
  let moment = 0
  for (let k = 0; k < a.length; k++) {
    const n = 2 * k + 1
    const sign = k % 2 === 0 ? 1 : -1 // sin(n pi/2)
    induced += n * a[k] * a[k]
    moment += a[k] * 0.25 * sign * (1 / (n + 2) - 1 / (n - 2))
  }
  const slender = Math.PI * aspectRatio(line)
  return {
    liftCoefficient: slender * a[0],
    inducedDragCoefficient: slender * induced,
    rootMomentOverPressure: power(span, 3) * moment,
  }
}

/**
 * Local lift coefficient and induced angle (rad, positive for downwash) at a distance y (m) from the
 * centreline; `coefficients` are those of the angle, for callers that need many places. The induced angle
 * follows from the section's own lift curve, which holds pointwise; its series converges too slowly near
 * the tip.
 */
export function localLift(
  line: LiftingLine,
  alpha: number,
  y: number,
  coefficients: Float64Array = coefficientsAt(line, alpha),
): { liftCoefficient: number; inducedAngle: number } {
  const { span, chord, slope, set } = line.input
  const theta = acos(Math.min((2 * y) / span, 1))
  const sines = oddSinesInPlace(new Float64Array(coefficients.length), theta)
  let sum = 0
  for (let k = 0; k < sines.length; k++) sum += coefficients[k] * sines[k]
  const liftCoefficient = (4 * span * sum) / chord(y)
  return { liftCoefficient, inducedAngle: alpha + set(y) - liftCoefficient / slope(y) }
}
