import { cos, hypot } from '../numerics/elementary'
import { leastSquaresPolynomial } from '../numerics/leastSquares'
import { contourOf, pointAt, type Contour } from './contour'
import { noseRadius } from './panels'
import type { Section } from './section'

/** Points of each side on which the perpendiculars are cut. */
const SIDE_POINTS = 400
/** Rounds of moving the mean line to the middle of its perpendiculars, and the share of each move taken. */
const ROUNDS = 30
const RELAXATION = 0.6
const SETTLED = 1e-7
/**
 * Inside the nose circle a perpendicular says nothing of the mean line (every diameter is one). Ahead of
 * this many nose radii the line continues the cubic fitted to it over the next stretch, in chords.
 */
const NOSE_REACH = 1.5
const FITTED_STRETCH = 0.12

/**
 * The mean line of an outline, from the leading edge (the point farthest from the trailing edge) to the
 * middle of the trailing edge, at `count` + 1 abscissae spaced by the cosine rule.
 *
 * Every point of it lies midway between the two sides, measured along the perpendicular to the mean line:
 * the way in which the NACA families are built. It differs near the nose from the mean of both ordinates
 * at equal x. Found by repeatedly moving each point to the middle of its perpendicular.
 */
export function meanLineOf(section: Section, count: number): { x: Float64Array; y: Float64Array } {
  const contour = contourOf(section)
  const upper = sidePoints(contour, 0, contour.nose)
  const lower = sidePoints(contour, contour.length, contour.nose)
  const nose = pointAt(contour, contour.nose)
  const last = section.x.length - 1
  const edgeX = 0.5 * (section.x[0] + section.x[last])
  const edgeY = 0.5 * (section.y[0] + section.y[last])
  const x = new Float64Array(count + 1)
  const y = new Float64Array(count + 1)
  for (let k = 0; k <= count; k++) {
    const share = 0.5 * (1 - cos((Math.PI * k) / count))
    x[k] = nose.x + share * (edgeX - nose.x)
    y[k] = nose.y + share * (edgeY - nose.y)
  }
  for (let round = 0; round < ROUNDS; round++) {
    const move = centreInPlace(x, y, upper, lower)
    continueToNoseInPlace(x, y, nose.x + NOSE_REACH * noseRadius(contour))
    if (move < SETTLED) break
  }
  return { x, y }
}

function continueToNoseInPlace(x: Float64Array, y: Float64Array, ahead: number): void {
  const from = x.findIndex((value) => value >= ahead)
  const to = x.findIndex((value) => value > ahead + FITTED_STRETCH)
  const fit = leastSquaresPolynomial(x.subarray(from, to), y.subarray(from, to), 3)
  for (let k = 0; k < from; k++) y[k] = fit(x[k])
}

interface Side {
  readonly x: Float64Array
  readonly y: Float64Array
}

/** Points of a side from the trailing edge to the nose, by the cosine rule in arc length. */
function sidePoints(contour: Contour, from: number, to: number): Side {
  const x = new Float64Array(SIDE_POINTS + 1)
  const y = new Float64Array(SIDE_POINTS + 1)
  for (let k = 0; k <= SIDE_POINTS; k++) {
    const point = pointAt(contour, from + 0.5 * (1 - cos((Math.PI * k) / SIDE_POINTS)) * (to - from))
    x[k] = point.x
    y[k] = point.y
  }
  return { x, y }
}

/** One round: moves the inner points of the mean line and returns the largest move. */
function centreInPlace(x: Float64Array, y: Float64Array, upper: Side, lower: Side): number {
  const before = y.slice()
  let largest = 0
  for (let k = 1; k + 1 < x.length; k++) {
    const slope = slopeAt(x, before, k)
    const size = hypot(1, slope)
    const above = distanceTo(upper, x[k], before[k], 1 / size, slope / size)
    const below = distanceTo(lower, x[k], before[k], 1 / size, slope / size)
    if (above === null || below === null) continue
    const move = (RELAXATION * 0.5 * (above + below)) / size
    y[k] = before[k] + move
    largest = Math.max(largest, Math.abs(move))
  }
  return largest
}

/** Slope of the parabola through three neighbours. */
function slopeAt(x: Float64Array, y: Float64Array, k: number): number {
  const left = (y[k] - y[k - 1]) / (x[k] - x[k - 1])
  const right = (y[k + 1] - y[k]) / (x[k + 1] - x[k])
  const share = (x[k] - x[k - 1]) / (x[k + 1] - x[k - 1])
  return left + share * (right - left)
}

/**
 * Signed distance along the perpendicular (-ty, tx) from a point to a side; null where it misses. Of
 * several cuts the one nearest to the nose counts only if none lies nearer to the trailing edge.
 */
function distanceTo(side: Side, px: number, py: number, tx: number, ty: number): number | null {
  let before = (side.x[0] - px) * tx + (side.y[0] - py) * ty
  for (let k = 1; k < side.x.length; k++) {
    const after = (side.x[k] - px) * tx + (side.y[k] - py) * ty
    if (before > 0 && after <= 0) {
      const t = before / (before - after)
      const x = side.x[k - 1] + t * (side.x[k] - side.x[k - 1]) - px
      const y = side.y[k - 1] + t * (side.y[k] - side.y[k - 1]) - py
      return y * tx - x * ty
    }
    before = after
  }
  return null
}
