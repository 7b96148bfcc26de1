import { power } from './elementary'
import { factorInPlace, solveInPlace } from './denseSolve'

/**
 * The polynomial of a degree that fits points (x, y) in the least-squares sense, as a function of x; more
 * points than the degree are needed. The abscissae are shifted and scaled so that the normal equations
 * keep their digits up to degree 5.
 */
export function leastSquaresPolynomial(
  x: ArrayLike<number>,
  y: ArrayLike<number>,
  degree: number,
): (x: number) => number {
  const size = degree + 1
  const middle = 0.5 * (x[0] + x[x.length - 1])
  const half = 0.5 * (x[x.length - 1] - x[0])
  const matrix = new Float64Array(size * size)
  const coefficients = new Float64Array(size)
  for (let i = 0; i < x.length; i++) {
    const u = (x[i] - middle) / half
    for (let row = 0; row < size; row++) {
      coefficients[row] += power(u, row) * y[i]
      for (let column = 0; column < size; column++) matrix[row * size + column] += power(u, row + column)
    }
  }
  solveInPlace(factorInPlace(matrix, size), coefficients)
  return (at) => coefficients.reduceRight((sum, value) => sum * ((at - middle) / half) + value, 0)
}
