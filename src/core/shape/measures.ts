import { atan2, cos, hypot } from '../numerics/elementary'
import { maximise } from '../numerics/roots'
import { contourOf, ordinateAt, pointAt, type Contour } from './contour'
import { noseRadius } from './panels'
import type { Section } from './section'

/** Measured figures of a section; lengths in chords, angle in rad. */
export interface Measures {
  readonly maxThickness: number
  readonly maxThicknessAt: number
  /** Signed: negative where the mean line bends downward. */
  readonly maxCamber: number
  readonly maxCamberAt: number
  readonly noseRadius: number
  readonly edgeGap: number
  /** Full angle between the two sides at the trailing edge. */
  readonly edgeAngle: number
  /** Enclosed area in chords squared. */
  readonly area: number
}

/** Abscissae of the first look for the largest thickness and camber. */
const LOOKS = 80
/** The edge angle is that between the sides' secants, continued to the edge from those over 1 and 2 per cent. */
const EDGE_STRETCH = 0.01

/**
 * Measures a section. Thickness is upper minus lower ordinate and camber half their sum, both at equal x;
 * the nose radius is the mean over a short arc at the leading edge.
 */
export function measure(section: Section): Measures {
  const contour = contourOf(section)
  const [maxThickness, maxThicknessAt] = largest((x) => thicknessOf(contour, x))
  const camber = (x: number): number => camberOf(contour, x)
  const [up, upAt] = largest(camber)
  const [down, downAt] = largest((x) => -camber(x))
  const { x, y } = section
  const last = x.length - 1
  return {
    maxThickness,
    maxThicknessAt,
    maxCamber: up >= down ? up : -down,
    maxCamberAt: Math.max(up, down) < 1e-9 ? 0 : up >= down ? upAt : downAt,
    noseRadius: noseRadius(contour),
    edgeGap: hypot(x[0] - x[last], y[0] - y[last]),
    edgeAngle: 2 * secantAngle(contour, EDGE_STRETCH) - secantAngle(contour, 2 * EDGE_STRETCH),
    area: enclosedArea(contour),
  }
}

/** Depth of a section at a chord fraction, in chords: upper minus lower ordinate. */
export function depthAt(section: Section, x: number): number {
  return thicknessOf(contourOf(section), x)
}

function thicknessOf(contour: Contour, x: number): number {
  const upper = ordinateAt(contour, 'upper', x)
  const lower = ordinateAt(contour, 'lower', x)
  return upper === null || lower === null ? 0 : upper - lower
}

function camberOf(contour: Contour, x: number): number {
  const upper = ordinateAt(contour, 'upper', x)
  const lower = ordinateAt(contour, 'lower', x)
  return upper === null || lower === null ? 0 : 0.5 * (upper + lower)
}

function largest(f: (x: number) => number): [value: number, at: number] {
  const place = (k: number): number => 0.5 * (1 - cos((Math.PI * k) / LOOKS))
  let best = 1
  for (let k = 2; k < LOOKS; k++) if (f(place(k)) > f(place(best))) best = k
  const at = maximise(f, place(best - 1), place(best + 1))
  return [f(at), at]
}

function secantAngle(contour: Contour, stretch: number): number {
  const upper = direction(contour, stretch, 0)
  const lower = direction(contour, contour.length - stretch, contour.length)
  return Math.abs(atan2(upper[0] * lower[1] - upper[1] * lower[0], upper[0] * lower[0] + upper[1] * lower[1]))
}

function direction(contour: Contour, from: number, to: number): [number, number] {
  const a = pointAt(contour, from)
  const b = pointAt(contour, to)
  return [b.x - a.x, b.y - a.y]
}

/** By the trapezoid formula over points dense enough for six digits. */
function enclosedArea(contour: Contour): number {
  const points = 2000
  let area = 0
  let before = pointAt(contour, contour.length)
  for (let k = 0; k <= points; k++) {
    const here = pointAt(contour, (contour.length * k) / points)
    area += 0.5 * (before.x * here.y - before.y * here.x)
    before = here
  }
  return area
}
