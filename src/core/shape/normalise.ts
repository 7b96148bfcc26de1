import { atan2, cos, hypot, power, sin } from '../numerics/elementary'
import { bisect } from '../numerics/roots'
import { BadInput } from '../numerics/errors'
import { evaluate } from '../numerics/spline'
import { contourOf } from './contour'
import { closedLoop, findTrailingEdge, type Points } from './loop'
import { crossesItself } from './crossing'
import type { ChordLine, Section } from './section'

/** Raw points of an outline: one loop from any start in either direction, or two sides in either direction. */
export type RawOutline =
  | { readonly kind: 'loop'; readonly points: Points }
  | { readonly kind: 'sides'; readonly upper: Points; readonly lower: Points }

/** What was understood when raw points became a section. Lengths in chords of the result, angles in rad. */
export interface Understood {
  readonly points: number
  /** Repeated points left out. */
  readonly dropped: number
  /** The order was reversed to run from the upper trailing edge forward. */
  readonly reversed: boolean
  /** The loop did not begin at its trailing edge. */
  readonly restarted: boolean
  /** The list named upper lay below the other one. */
  readonly exchanged: boolean
  /** Length of the chord in the units of the file. */
  readonly chord: number
  /** Angle of the longest chord off the axis of the file, nose up positive. */
  readonly longestChordAngle: number
  /** The section was turned onto its longest chord. */
  readonly turned: boolean
  readonly edgeGap: number
}

const FEWEST_POINTS = 10
const MOST_POINTS = 5000
/** A longest chord farther than this off the axis of the file means that the file was not drawn level. */
const LEVEL = Math.PI / 180
const WIDEST_GAP = 0.2
/** Enclosed area below which there is no section, chords squared (a flat plate). */
const SMALLEST_AREA = 1e-4

/**
 * A section from raw points: put in order, moved and scaled to chord 1, and turned onto its longest chord
 * where the axis of the file is more than 1 deg off it or `chordLine` asks for it. The longest chord runs
 * from the middle of the trailing edge to the farthest point of the outline.
 *
 * Throws BadInput for points that make no section: too few, not finite, crossing themselves, flat, or
 * with a trailing edge as thick as a fifth of the chord.
 */
export function sectionFromPoints(
  raw: RawOutline,
  options: { readonly name: string; readonly chordLine: ChordLine | null },
): { section: Section; understood: Understood } {
  const { points, dropped, reversed, restarted, exchanged } = inOrder(raw)
  const placed = place(points, options.chordLine)
  const { x, y, turned, chord, longestChordAngle } = placed
  const last = x.length - 1
  const edgeGap = hypot(x[0] - x[last], y[0] - y[last])
  if (!(edgeGap < WIDEST_GAP)) {
    throw new BadInput(
      `the trailing edge is ${(100 * edgeGap).toFixed(0)} % of the chord thick; give less than 20 %`,
    )
  }
  if (crossesItself(x, y)) throw new BadInput('the outline crosses itself')
  const understood = {
    ...{ points: x.length, dropped, reversed, restarted, exchanged },
    ...{ chord, longestChordAngle, turned, edgeGap },
  }
  return { section: { name: options.name, x, y, meanLine: null, notes: [] }, understood }
}

type Ordered = Pick<Understood, 'dropped' | 'reversed' | 'restarted' | 'exchanged'> & {
  readonly points: Points
}

function inOrder(raw: RawOutline): Ordered {
  const all = raw.kind === 'loop' ? raw.points : [...raw.upper, ...raw.lower]
  if (!all.every(([x, y]) => Number.isFinite(x) && Number.isFinite(y))) {
    throw new BadInput('a coordinate is not a finite number')
  }
  if (all.length > MOST_POINTS) {
    throw new BadInput(`${all.length} points; give at most ${MOST_POINTS}: leave out every other one`)
  }
  if (raw.kind === 'sides') return sidesInOrder(raw.upper, raw.lower)
  const { points, dropped } = closedLoop(raw.points)
  checkCount(points)
  const { start, end, restarted } = findTrailingEdge(points)
  let loop = [...points.slice(start), ...points.slice(0, start)]
  if (start === end) loop.push(loop[0])
  const reversed = signedArea(loop) < 0
  if (reversed) loop = loop.reverse()
  return { points: loop, dropped, reversed, restarted, exchanged: false }
}

function sidesInOrder(first: Points, second: Points): Ordered {
  const fromNose = (side: Points): Points =>
    side.length > 1 && side[0][0] > side[side.length - 1][0] ? [...side].reverse() : side
  const [a, b] = [fromNose(first), fromNose(second)]
  const exchanged = signedArea([...[...a].reverse(), ...b]) < 0
  const [upper, lower] = exchanged ? [b, a] : [a, b]
  const joined = [...[...upper].reverse(), ...lower]
  const points = joined.filter(
    (point, i) => i === 0 || point[0] !== joined[i - 1][0] || point[1] !== joined[i - 1][1],
  )
  checkCount(points)
  return {
    points,
    dropped: joined.length - points.length,
    reversed: a !== first || b !== second,
    restarted: false,
    exchanged,
  }
}

function checkCount(points: Points): void {
  if (points.length < FEWEST_POINTS) {
    throw new BadInput(
      `${points.length} different ${points.length === 1 ? 'point' : 'points'}; a section needs at least ${FEWEST_POINTS}`,
    )
  }
}

function signedArea(points: Points): number {
  let area = 0
  for (let i = 0; i < points.length; i++) {
    const [ax, ay] = points[i]
    const [bx, by] = points[(i + 1) % points.length]
    area += 0.5 * (ax * by - bx * ay)
  }
  return area
}

type Placed = Pick<Understood, 'turned' | 'chord' | 'longestChordAngle'> & {
  x: Float64Array
  y: Float64Array
}

function place(points: Points, chordLine: ChordLine | null): Placed {
  const x = Float64Array.from(points, ([value]) => value)
  const y = Float64Array.from(points, ([, value]) => value)
  const last = x.length - 1
  const edgeX = 0.5 * (x[0] + x[last])
  const edgeY = 0.5 * (y[0] + y[last])
  const contour = contourOf({ x, y })
  const noseX = evaluate(contour.x, contour.nose).value
  const noseY = evaluate(contour.y, contour.nose).value
  const longest = hypot(edgeX - noseX, edgeY - noseY)
  if (!(longest > 0)) throw new BadInput('the chord has no length')
  if (signedArea(points) < SMALLEST_AREA * power(longest, 2))
    throw new BadInput('the outline encloses no area')
  const angle = atan2(noseY - edgeY, edgeX - noseX)
  const turned = chordLine === 'longest' || (chordLine === null && Math.abs(angle) > LEVEL)
  const foremost = foremostX(contour.x.s, contour.x.f, (s) => evaluate(contour.x, s))
  if (!turned && !(edgeX > foremost)) throw new BadInput('the nose does not point to smaller x')
  const chord = turned ? longest : edgeX - foremost
  const c = turned ? cos(angle) : 1
  const s = turned ? sin(angle) : 0
  return {
    x: x.map((value, i) => 1 + ((value - edgeX) * c - (y[i] - edgeY) * s) / chord),
    y: y.map((value, i) => ((x[i] - edgeX) * s + (value - edgeY) * c) / chord),
    turned,
    chord,
    longestChordAngle: angle,
  }
}

function foremostX(
  s: Float64Array,
  x: Float64Array,
  curve: (s: number) => { value: number; first: number },
): number {
  const k = x.indexOf(Math.min(...x))
  const low = s[Math.max(k - 1, 0)]
  const high = s[Math.min(k + 1, s.length - 1)]
  const slope = (at: number): number => curve(at).first
  if (!(slope(low) < 0 && slope(high) > 0)) return x[k]
  return Math.min(curve(bisect(slope, low, high)).value, x[k])
}
