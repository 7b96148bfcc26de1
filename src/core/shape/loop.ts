import { atan2, hypot } from '../numerics/elementary'

/** Points in any order of a loop, as pairs. */
export type Points = readonly (readonly [x: number, y: number])[]

/** Points nearer than this share of the outline's extent are the same point. */
const SAME = 1e-9
/** A single corner turns at least this much to be a sharp trailing edge on its own. */
const SHARP_TURN = (115 * Math.PI) / 180

/** A loop without repeated neighbours, its last point not repeating the first. */
export function closedLoop(raw: Points): { points: Points; dropped: number } {
  const xs = raw.map(([x]) => x)
  const extent = Math.max(...xs) - Math.min(...xs)
  const same = (a: readonly [number, number], b: readonly [number, number]): boolean =>
    hypot(a[0] - b[0], a[1] - b[1]) <= SAME * extent
  const points = raw.filter((point, i) => i === 0 || !same(point, raw[i - 1]))
  const repeated = raw.length - points.length
  if (points.length > 1 && same(points[0], points[points.length - 1])) points.pop()
  return { points, dropped: repeated }
}

/**
 * Where the trailing edge of a loop lies: its sharpest corner, or the pair of neighbouring corners between
 * which the base of a blunt edge runs. A thin nose drawn by few points is a sharp corner too, but turns less
 * with its neighbour than the two corners of a base do. `start` is the first point of the outline and `end`
 * the last; equal for a closed edge.
 */
export function findTrailingEdge(points: Points): { start: number; end: number; restarted: boolean } {
  const n = points.length
  const turns = points.map((_, i) => Math.abs(turnAt(points, i)))
  let sharpest = 0
  for (let i = 1; i < n; i++) if (turns[i] > turns[sharpest]) sharpest = i
  const both = (i: number): number => turns[i] + turns[(i + 1) % n]
  let base = n - 1 // the base of an open file runs from its last point to its first
  for (let i = 0; i < n; i++) if (both(i) > both(base) * (1 + SAME)) base = i
  const start = (base + 1) % n
  if (turns[sharpest] >= SHARP_TURN && (sharpest === base || sharpest === start)) {
    return { start: sharpest, end: sharpest, restarted: sharpest !== 0 }
  }
  return { start, end: base, restarted: start !== 0 }
}

function turnAt(points: Points, i: number): number {
  const n = points.length
  const [ax, ay] = points[(i + n - 1) % n]
  const [bx, by] = points[i]
  const [cx, cy] = points[(i + 1) % n]
  return atan2((bx - ax) * (cy - by) - (by - ay) * (cx - bx), (bx - ax) * (cx - bx) + (by - ay) * (cy - by))
}
