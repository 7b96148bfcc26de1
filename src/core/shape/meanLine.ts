import { cos, hypot, power } from '../numerics/elementary'
import { leastSquaresPolynomial } from '../numerics/leastSquares'
import { contourOf, pointAt, type Contour } from './contour'
import { noseRadius } from './panels'
import type { Section } from './section'

/** Points of each side on which the perpendiculars are cut. */
const SIDE_POINTS = 400
/** Rounds of moving the mean line to the middle of its perpendiculars, and the largest share of a move taken. */
const ROUNDS = 150
const LARGEST_SHARE = 0.6
const SETTLED = 1e-7
/**
 * Inside the nose circle a perpendicular says nothing of the mean line (every diameter is one). Ahead of
 * this many nose radii the line continues the parabola fitted to it over the next stretch, in chords, and
 * over at least so many points. A longer reach or stretch misses mean lines that bend sharply just behind the
 * nose; a shorter one, or a cubic, magnifies the noise of thick sections.
 */
const NOSE_REACH = 0.8
const FITTED_STRETCH = 0.06
const FEWEST_FITTED = 4
/** The nose never counts for more than this share of the chord, however blunt or dented it is. */
const LONGEST_NOSE = 0.25

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
  const radius = noseRadius(contour)
  const half = new Float64Array(count + 1)
  for (let round = 0; round < ROUNDS; round++) {
    const move = centreInPlace(x, y, half, upper, lower)
    continueToNoseInPlace(x, y, nose.x + Math.min(NOSE_REACH * radius, LONGEST_NOSE))
    if (move < SETTLED) break
  }
  return { x, y }
}

/**
 * Share of each move that is taken. Tilting a perpendicular by a small angle moves its middle by g = h dh/dx
 * times that angle, h being half the thickness; so a round multiplies a ripple of wave number k by
 * 1 - share (1 + i k g). 1 / (1 + (k g)^2) damps it most, and the shortest ripple has k = 1 / step.
 */
function sharesOfMoves(x: Float64Array, half: Float64Array): Float64Array {
  const last = x.length - 1
  return x.map((_, k) => {
    const [before, after] = [Math.max(k - 1, 0), Math.min(k + 1, last)]
    const step = 0.5 * (x[after] - x[before])
    const g = (0.25 * (power(half[after], 2) - power(half[before], 2))) / step
    return Math.min(LARGEST_SHARE, 1 / (1 + power(g / step, 2)))
  })
}

function continueToNoseInPlace(x: Float64Array, y: Float64Array, ahead: number): void {
  const from = x.findIndex((value) => value >= ahead)
  const behind = x.findIndex((value) => value > ahead + FITTED_STRETCH)
  const to = Math.max(behind, from + FEWEST_FITTED)
  const fit = leastSquaresPolynomial(x.subarray(from, to), y.subarray(from, to), 2)
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

/** One round: moves the inner points of the mean line, notes half the thickness, returns the largest move. */
function centreInPlace(
  x: Float64Array,
  y: Float64Array,
  half: Float64Array,
  upper: Side,
  lower: Side,
): number {
  const before = y.slice()
  const shares = sharesOfMoves(x, half)
  let largest = 0
  for (let k = 1; k + 1 < x.length; k++) {
    const slope = slopeAt(x, before, k)
    const size = hypot(1, slope)
    const above = distanceTo(upper, x[k], before[k], 1 / size, slope / size)
    const below = distanceTo(lower, x[k], before[k], 1 / size, slope / size)
    if (above === null || below === null) continue
    half[k] = 0.5 * (above - below)
    const move = (shares[k] * 0.5 * (above + below)) / size
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
