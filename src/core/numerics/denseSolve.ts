/** LU factors of a square matrix with the row exchanges that partial pivoting made. */
export interface Factors {
  readonly n: number
  /** Unit lower and upper triangle, row by row, `stride` numbers a row. */
  readonly lu: Float64Array
  readonly stride: number
  readonly pivot: Int32Array
  /** True when a pivot vanished against the matrix: the factors cannot be used. */
  readonly singular: boolean
}

/** Columns eliminated together; the update behind them is a matrix product that runs in registers. */
const BLOCK = 12
/** A pivot this small against the largest entry leaves no digits. */
const SINGULAR = 1e-14

/**
 * Factors a dense n x n matrix in place, `stride` numbers a row: right-looking LU with partial pivoting,
 * eliminating BLOCK columns at a time so that most of the work is the product of a thin panel with the
 * rest, two rows by four columns at a time in registers.
 * Source: Golub and Van Loan, Matrix Computations (1996), algorithm 3.4.1 and section 3.2.10.
 */
export function factorInPlace(a: Float64Array, n: number, stride: number = n): Factors {
  const pivot = new Int32Array(n)
  let largest = 0
  for (let i = 0; i < n; i++) {
    for (let j = 0; j < n; j++) largest = Math.max(largest, Math.abs(a[i * stride + j]))
  }
  let singular = !(largest > 0 && largest < Infinity)
  for (let start = 0; start < n && !singular; start += BLOCK) {
    const end = Math.min(start + BLOCK, n)
    singular = !factorColumns(a, n, stride, start, end, pivot, SINGULAR * largest)
    solveRowsAbove(a, n, stride, start, end)
    updateRest(a, n, stride, start, end)
  }
  return { n, lu: a, stride, pivot, singular }
}

function factorColumns(
  a: Float64Array,
  n: number,
  stride: number,
  start: number,
  end: number,
  pivot: Int32Array,
  tiny: number,
): boolean {
  for (let k = start; k < end; k++) {
    let row = k
    let best = Math.abs(a[k * stride + k])
    for (let i = k + 1; i < n; i++) {
      const size = Math.abs(a[i * stride + k])
      if (size > best) [row, best] = [i, size]
    }
    pivot[k] = row
    if (!(best > tiny)) return false
    if (row !== k) exchangeRows(a, n, stride, k, row)
    const inverse = 1 / a[k * stride + k]
    for (let i = k + 1; i < n; i++) {
      const factor = (a[i * stride + k] *= inverse)
      const to = i * stride
      for (let j = k + 1; j < end; j++) a[to + j] -= factor * a[k * stride + j]
    }
  }
  return true
}

function exchangeRows(a: Float64Array, n: number, stride: number, p: number, q: number): void {
  for (let j = 0; j < n; j++) {
    const kept = a[p * stride + j]
    a[p * stride + j] = a[q * stride + j]
    a[q * stride + j] = kept
  }
}

function solveRowsAbove(a: Float64Array, n: number, stride: number, start: number, end: number): void {
  for (let k = start; k < end; k++) {
    for (let i = k + 1; i < end; i++) {
      const factor = a[i * stride + k]
      for (let j = end; j < n; j++) a[i * stride + j] -= factor * a[k * stride + j]
    }
  }
}

function updateRest(a: Float64Array, n: number, stride: number, start: number, end: number): void {
  const pairs = n - ((n - end) % 2)
  for (let i = end; i < pairs; i += 2) updateTwoRows(a, n, stride, start, end, i)
  for (let i = pairs; i < n; i++) {
    for (let k = start; k < end; k++) {
      const factor = a[i * stride + k]
      for (let j = end; j < n; j++) a[i * stride + j] -= factor * a[k * stride + j]
    }
  }
}

function updateTwoRows(
  a: Float64Array,
  n: number,
  stride: number,
  start: number,
  end: number,
  row: number,
): void {
  const p = row * stride
  const q = p + stride
  let j = end
  for (; j + 3 < n; j += 4) {
    let p0 = a[p + j]
    let p1 = a[p + j + 1]
    let p2 = a[p + j + 2]
    let p3 = a[p + j + 3]
    let q0 = a[q + j]
    let q1 = a[q + j + 1]
    let q2 = a[q + j + 2]
    let q3 = a[q + j + 3]
    for (let k = start, from = start * stride + j; k < end; k++, from += stride) {
      const fp = a[p + k]
      const fq = a[q + k]
      const u0 = a[from]
      const u1 = a[from + 1]
      const u2 = a[from + 2]
      const u3 = a[from + 3]
      p0 -= fp * u0
      p1 -= fp * u1
      p2 -= fp * u2
      p3 -= fp * u3
      q0 -= fq * u0
      q1 -= fq * u1
      q2 -= fq * u2
      q3 -= fq * u3
    }
    a[p + j] = p0
    a[p + j + 1] = p1
    a[p + j + 2] = p2
    a[p + j + 3] = p3
    a[q + j] = q0
    a[q + j + 1] = q1
    a[q + j + 2] = q2
    a[q + j + 3] = q3
  }
  for (; j < n; j++) {
    for (let k = start; k < end; k++) {
      a[p + j] -= a[p + k] * a[k * stride + j]
      a[q + j] -= a[q + k] * a[k * stride + j]
    }
  }
}

/** Solves for one right-hand side of n numbers, which becomes the solution. */
export function solveInPlace(factors: Factors, rhs: Float64Array): void {
  const { n, lu, stride, pivot } = factors
  for (let k = 0; k < n; k++) {
    const row = pivot[k]
    const kept = rhs[row]
    rhs[row] = rhs[k]
    rhs[k] = kept
  }
  for (let i = 1; i < n; i++) {
    let sum = rhs[i]
    for (let j = 0, at = i * stride; j < i; j++) sum -= lu[at + j] * rhs[j]
    rhs[i] = sum
  }
  for (let i = n - 1; i >= 0; i--) {
    let sum = rhs[i]
    for (let j = i + 1, at = i * stride; j < n; j++) sum -= lu[at + j] * rhs[j]
    rhs[i] = sum / lu[i * stride + i]
  }
}
