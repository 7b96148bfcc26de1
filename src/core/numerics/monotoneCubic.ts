/**
 * Slopes of the piecewise cubic through points (x ascending) that overshoots nowhere: where the data are
 * monotone the curve is, and at a turning point of the data it is level. Interior slopes are the weighted
 * harmonic mean of the neighbouring differences (a choice inside the region of monotonicity), end slopes the
 * difference of the end piece.
 * Source: Fritsch and Carlson, Monotone piecewise cubic interpolation, SIAM J. Numer. Anal. 17 (1980);
 * harmonic mean after Fritsch and Butland, A method for constructing local monotone piecewise cubic
 * interpolants, SIAM J. Sci. Stat. Comput. 5 (1984), equation 5.
 */
export function monotoneSlopes(x: readonly number[], y: readonly number[]): Float64Array {
  const n = x.length
  const slopes = new Float64Array(n)
  if (n < 2) return slopes
  const difference = (i: number): number => (y[i + 1] - y[i]) / (x[i + 1] - x[i])
  slopes[0] = difference(0)
  slopes[n - 1] = difference(n - 2)
  for (let i = 1; i + 1 < n; i++) {
    const before = difference(i - 1)
    const behind = difference(i)
    if (before * behind <= 0) continue
    const near = x[i] - x[i - 1]
    const far = x[i + 1] - x[i]
    const share = (near + 2 * far) / (3 * (near + far))
    slopes[i] = (before * behind) / (share * behind + (1 - share) * before)
  }
  return slopes
}

/** The curve of `monotoneSlopes` on piece i (x[i] to x[i + 1]) at `at`. */
export function monotoneValue(
  x: readonly number[],
  y: readonly number[],
  slopes: Float64Array,
  i: number,
  at: number,
): number {
  const width = x[i + 1] - x[i]
  const t = (at - x[i]) / width
  const rise = y[i + 1] - y[i]
  const [a, b] = [slopes[i] * width, slopes[i + 1] * width]
  return y[i] + t * (a + t * (3 * rise - 2 * a - b + t * (a + b - 2 * rise)))
}
