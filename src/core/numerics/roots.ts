/**
 * Root of a continuous f between a and b, where f changes sign, by bisection to the last bit or 100 steps.
 * Plain, bounded and safe: for places where robustness counts more than speed.
 */
export function bisect(f: (x: number) => number, a: number, b: number): number {
  let low = a
  let high = b
  const lowSign = Math.sign(f(low))
  if (lowSign === 0) return low
  for (let step = 0; step < 100; step++) {
    const middle = 0.5 * (low + high)
    if (middle === low || middle === high) break
    const sign = Math.sign(f(middle))
    if (sign === 0) return middle
    if (sign === lowSign) low = middle
    else high = middle
  }
  return 0.5 * (low + high)
}

/** Place of the greatest value of a unimodal f on [a, b], by golden-section search to a relative 1e-10. */
export function maximise(f: (x: number) => number, a: number, b: number): number {
  const ratio = (Math.sqrt(5) - 1) / 2
  let low = a
  let high = b
  let p = high - ratio * (high - low)
  let q = low + ratio * (high - low)
  let fp = f(p)
  let fq = f(q)
  while (high - low > 1e-10 * Math.abs(b - a)) {
    if (fp >= fq) {
      high = q
      q = p
      fq = fp
      p = high - ratio * (high - low)
      fp = f(p)
    } else {
      low = p
      p = q
      fp = fq
      q = low + ratio * (high - low)
      fq = f(q)
    }
  }
  return 0.5 * (low + high)
}
