/** A cubic spline through (s[i], f[i]) held by its slopes at the knots (Hermite form). */
export interface Spline {
  readonly s: Float64Array
  readonly f: Float64Array
  /** df/ds at the knots. */
  readonly slope: Float64Array
}

/**
 * Cubic spline with continuous second derivative through n >= 2 points, s strictly increasing. The ends
 * carry zero third derivative ("parabolic run-out"), which bends a trailing edge less than a natural end.
 * Source: de Boor, A Practical Guide to Splines (1978), chapter IV, equations for the slopes.
 */
export function cubicSpline(s: Float64Array, f: Float64Array): Spline {
  const n = s.length
  const lower = new Float64Array(n)
  const diagonal = new Float64Array(n)
  const upper = new Float64Array(n)
  const slope = new Float64Array(n)
  const chord = (i: number): number => (f[i + 1] - f[i]) / (s[i + 1] - s[i])
  for (let i = 1; i < n - 1; i++) {
    const before = s[i] - s[i - 1]
    const after = s[i + 1] - s[i]
    lower[i] = after
    diagonal[i] = 2 * (before + after)
    upper[i] = before
    slope[i] = 3 * (after * chord(i - 1) + before * chord(i))
  }
  diagonal[0] = diagonal[n - 1] = upper[0] = lower[n - 1] = 1
  slope[0] = 2 * chord(0)
  slope[n - 1] = 2 * chord(n - 2)
  if (n === 2) return { s, f, slope: slope.fill(chord(0)) }
  solveTridiagonalInPlace(lower, diagonal, upper, slope)
  return { s, f, slope }
}

/** Thomas's algorithm: the right-hand side becomes the solution; `diagonal` is overwritten. */
function solveTridiagonalInPlace(
  lower: Float64Array,
  diagonal: Float64Array,
  upper: Float64Array,
  rhs: Float64Array,
): void {
  const n = rhs.length
  for (let i = 1; i < n; i++) {
    const factor = lower[i] / diagonal[i - 1]
    diagonal[i] -= factor * upper[i - 1]
    rhs[i] -= factor * rhs[i - 1]
  }
  rhs[n - 1] /= diagonal[n - 1]
  for (let i = n - 2; i >= 0; i--) rhs[i] = (rhs[i] - upper[i] * rhs[i + 1]) / diagonal[i]
}

/** Index of the interval that holds s, found by bisection; the end intervals serve beyond the ends. */
function intervalOf(knots: Float64Array, s: number): number {
  let low = 0
  let high = knots.length - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (knots[middle] <= s) low = middle
    else high = middle
  }
  return low
}

/** Value, first and second derivative of a spline at s. */
export function evaluate(spline: Spline, s: number): { value: number; first: number; second: number } {
  const i = intervalOf(spline.s, s)
  const h = spline.s[i + 1] - spline.s[i]
  const t = (s - spline.s[i]) / h
  const rise = spline.f[i + 1] - spline.f[i]
  const a = h * spline.slope[i] - rise
  const b = rise - h * spline.slope[i + 1]
  const bump = a * (1 - t) + b * t
  return {
    value: spline.f[i] + t * rise + t * (1 - t) * bump,
    first: (rise + (1 - 2 * t) * bump + t * (1 - t) * (b - a)) / h,
    second: (-2 * bump + 2 * (1 - 2 * t) * (b - a)) / (h * h),
  }
}
