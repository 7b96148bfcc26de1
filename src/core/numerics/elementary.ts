/**
 * Elementary functions that give the same bits everywhere. The language leaves the last digits of
 * Math.sin, Math.log and their kin to each engine, and the command line, the desktop window and a browser
 * run on different ones; what they export must agree byte for byte. Only +, -, *, / and the square root
 * are used here, which the language fixes. Errors stay within 2 units of the last place (tested).
 *
 * Source of the reductions: Muller, Elementary Functions (2006), chapters 3 and 11; series are Taylor's.
 */

const LN2_HIGH = 6.9314718036912381649e-1
const LN2_LOW = 1.90821492927058770002e-10

/** Natural logarithm; -Infinity at 0, NaN below. x = m 2^k, ln m = 2 artanh((m - 1)/(m + 1)). */
export function log(x: number): number {
  if (!(x > 0)) return x === 0 ? -Infinity : NaN
  if (x === Infinity) return x
  let m = x
  let k = 0
  while (m >= 4294967296) {
    m *= 2.3283064365386963e-10
    k += 32
  }
  while (m < 2.3283064365386963e-10) {
    m *= 4294967296
    k -= 32
  }
  while (m >= 16) {
    m *= 0.0625
    k += 4
  }
  while (m < 0.0625) {
    m *= 16
    k -= 4
  }
  while (m > 1.4142135623730951) {
    m *= 0.5
    k++
  }
  while (m < 0.7071067811865476) {
    m *= 2
    k--
  }
  const f = m - 1
  const s = f / (2 + f)
  const z = s * s
  const tail =
    z *
    (2 / 3 +
      z *
        (2 / 5 +
          z *
            (2 / 7 + z * (2 / 9 + z * (2 / 11 + z * (2 / 13 + z * (2 / 15 + z * (2 / 17 + z * (2 / 19)))))))))
  // ln(1 + f) = f - s (f - tail): the large part is exact.
  return k * LN2_HIGH - (s * (f - tail) - k * LN2_LOW - f)
}

/** e^x: x = k ln 2 + r with |r| below 0.35, Taylor's series of e^r, and exact doublings. */
export function exp(x: number): number {
  if (x > 709.78) return Infinity
  if (x < -745.2) return 0
  if (x !== x) return NaN
  const k = Math.round(x / 0.6931471805599453)
  const high = x - k * LN2_HIGH
  const low = k * LN2_LOW
  const r = high - low
  let sum = 1
  for (let n = 14; n >= 2; n--) sum = 1 + (r / n) * sum
  return scaled(1 + (high - (low - high * (sum - 1) + low * (sum - 1))), k)
}

/** v 2^k, by exact steps. */
function scaled(v: number, k: number): number {
  let value = v
  let left = k
  while (left >= 16) {
    value *= 65536
    left -= 16
  }
  while (left <= -16) {
    value *= 1.52587890625e-5
    left += 16
  }
  for (; left > 0; left--) value *= 2
  for (; left < 0; left++) value *= 0.5
  return value
}

/** x^y: repeated multiplication for whole y up to 64, else e^(y ln x); NaN for x < 0 and y not whole. */
export function power(x: number, y: number): number {
  if (Number.isInteger(y) && Math.abs(y) <= 64) {
    let result = 1
    let base = x
    for (let n = Math.abs(y); n > 0; n = Math.floor(n / 2)) {
      if (n % 2 === 1) result *= base
      base *= base
    }
    return y < 0 ? 1 / result : result
  }
  if (x === 0) return y > 0 ? 0 : Infinity
  return exp(y * log(x))
}

/** Three parts of pi/2; the products with quadrants up to 2^20 are exact in the first two. */
const HALF_PI_1 = 1.57079632673412561417
const HALF_PI_2 = 6.0771005063039659766e-11
const HALF_PI_3 = 2.02226624879595063154e-21

/** Sine of an angle in rad, |x| below 1e6. */
export function sin(x: number): number {
  const quadrant = Math.round(x / 1.5707963267948966)
  const r = x - quadrant * HALF_PI_1 - quadrant * HALF_PI_2 - quadrant * HALF_PI_3
  switch (quadrant & 3) {
    case 0:
      return sinSeries(r)
    case 1:
      return cosSeries(r)
    case 2:
      return -sinSeries(r)
    default:
      return -cosSeries(r)
  }
}

/** Cosine of an angle in rad, |x| below 1e6. */
export function cos(x: number): number {
  const quadrant = Math.round(x / 1.5707963267948966)
  const r = x - quadrant * HALF_PI_1 - quadrant * HALF_PI_2 - quadrant * HALF_PI_3
  switch (quadrant & 3) {
    case 0:
      return cosSeries(r)
    case 1:
      return -sinSeries(r)
    case 2:
      return -cosSeries(r)
    default:
      return sinSeries(r)
  }
}

/** Tangent of an angle in rad. */
export const tan = (x: number): number => sin(x) / cos(x)

function sinSeries(r: number): number {
  const z = r * r
  const tail =
    -1 / 6 +
    z *
      (1 / 120 +
        z *
          (-1 / 5040 +
            z *
              (1 / 362880 +
                z * (-1 / 39916800 + z * (1 / 6227020800 + z * (-1 / 1307674368000 + z / 355687428096000))))))
  return r + r * z * tail
}

function cosSeries(r: number): number {
  const z = r * r
  const tail =
    1 / 24 +
    z *
      (-1 / 720 +
        z *
          (1 / 40320 +
            z * (-1 / 3628800 + z * (1 / 479001600 + z * (-1 / 87178291200 + z / 20922789888000)))))
  return 1 - (0.5 * z - z * z * tail)
}

/** Arctangents of 0, 1/8, ... 1. */
const ATAN_EIGHTHS = [
  0, 0.12435499454676144, 0.24497866312686414, 0.3587706702705722, 0.4636476090008061, 0.5585993153435624,
  0.6435011087932844, 0.7188299996216245, 0.7853981633974483,
] as const

/** Arctangent in rad: reduced to the nearest eighth, whose remainder is at most 1/16, then the series. */
export function atan(x: number): number {
  if (x !== x) return NaN
  const size = Math.abs(x)
  const inverted = size > 1
  const u = inverted ? 1 / size : size
  const eighth = Math.round(8 * u)
  const c = eighth / 8
  const t = (u - c) / (1 + c * u)
  const z = t * t
  const series =
    t - t * z * (1 / 3 - z * (1 / 5 - z * (1 / 7 - z * (1 / 9 - z * (1 / 11 - z * (1 / 13 - z / 15))))))
  const angle = ATAN_EIGHTHS[eighth] + series
  const result = inverted ? 1.5707963267948966 - angle : angle
  return x < 0 ? -result : result
}

/** Angle of the vector (x, y) in rad, from -pi to pi; 0 for the zero vector. */
export function atan2(y: number, x: number): number {
  if (x > 0) return atan(y / x)
  if (x < 0) return y >= 0 ? Math.PI + atan(y / x) : atan(y / x) - Math.PI
  return y > 0 ? 1.5707963267948966 : y < 0 ? -1.5707963267948966 : 0
}

/** Angle of a cosine from -1 to 1, rad. */
export const acos = (x: number): number => atan2(Math.sqrt((1 - x) * (1 + x)), x)

/** Angle of a sine from -1 to 1, rad. */
export const asin = (x: number): number => atan2(x, Math.sqrt((1 - x) * (1 + x)))

/** Hyperbolic tangent. */
export function tanh(x: number): number {
  const size = Math.abs(x)
  if (size > 20) return x < 0 ? -1 : 1
  if (size < 0.1) {
    const z = x * x
    return x * (1 - z * (1 / 3 - z * (2 / 15 - z * (17 / 315 - z * (62 / 2835 - z * (1382 / 155925))))))
  }
  const e = exp(-2 * size)
  return x < 0 ? -(1 - e) / (1 + e) : (1 - e) / (1 + e)
}

/** Length of the vector (x, y). */
export const hypot = (x: number, y: number): number => Math.sqrt(x * x + y * y)
