/**
 * Whether an open polygon crosses itself. Every pair of segments that are not neighbours is compared;
 * touching at the two ends (a closed trailing edge) is no crossing.
 */
export function crossesItself(x: Float64Array, y: Float64Array): boolean {
  const last = x.length - 1
  for (let i = 0; i < last; i++) {
    const left = Math.min(x[i], x[i + 1])
    const right = Math.max(x[i], x[i + 1])
    for (let j = i + 2; j < last; j++) {
      if (i === 0 && j === last - 1) continue
      if (Math.max(x[j], x[j + 1]) < left || Math.min(x[j], x[j + 1]) > right) continue
      if (segmentsCross(x, y, i, j)) return true
    }
  }
  return false
}

function segmentsCross(x: Float64Array, y: Float64Array, i: number, j: number): boolean {
  const side = (a: number, p: number): number =>
    Math.sign((x[a + 1] - x[a]) * (y[p] - y[a]) - (y[a + 1] - y[a]) * (x[p] - x[a]))
  return side(i, j) * side(i, j + 1) < 0 && side(j, i) * side(j, i + 1) < 0
}
