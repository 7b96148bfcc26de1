import { atan2, hypot, log } from '../numerics/elementary'
import type { Panels } from '../shape/panels'

/** The trailing edge of panels: the gap from the lower edge to the upper one and the way the flow leaves. */
export interface TrailingEdge {
  /** Gap in chords; 0 when sharp. */
  readonly gap: number
  readonly sharp: boolean
  /** Unit vector of the bisector of both sides, pointing downstream. */
  readonly bisectorX: number
  readonly bisectorY: number
  /** Strength of the sources and of the vorticity on the gap, for unit edge speed. */
  readonly source: number
  readonly vorticity: number
}

/** A gap smaller than this share of the outline's length is taken as none. */
const SHARP = 1e-6

/**
 * The base of a blunt edge is closed by one panel. Behind it the fluid moves off along the bisector with
 * the edge speed, inside the section it is at rest; the panel carries just that jump: sources for its part
 * across the gap, vorticity for its part along it.
 */
export function trailingEdgeOf({ x, y }: Panels): TrailingEdge {
  const n = x.length - 1
  const upper = unit(x[0] - x[1], y[0] - y[1])
  const lower = unit(x[n] - x[n - 1], y[n] - y[n - 1])
  const [bisectorX, bisectorY] = unit(upper[0] + lower[0], upper[1] + lower[1])
  const gapX = x[0] - x[n]
  const gapY = y[0] - y[n]
  const gap = hypot(gapX, gapY)
  const sharp = gap < SHARP
  const across = sharp ? 0 : (bisectorX * gapY - bisectorY * gapX) / gap
  const along = sharp ? 0 : (bisectorX * gapX + bisectorY * gapY) / gap
  return { gap, sharp, bisectorX, bisectorY, source: across, vorticity: -along }
}

function unit(x: number, y: number): [number, number] {
  const size = hypot(x, y)
  return [x / size, y / size]
}

/**
 * Stream function at a point of the section for unit edge speed, of the sources and the vorticity on the
 * gap panel. The branch cut of the sources runs downstream along the bisector, outside the section.
 */
export function gapInfluence(panels: Panels, edge: TrailingEdge, px: number, py: number): number {
  const { x, y } = panels
  const n = x.length - 1
  const h = edge.gap
  const alongX = (x[0] - x[n]) / h
  const alongY = (y[0] - y[n]) / h
  const place = (px - x[n]) * alongX + (py - y[n]) * alongY
  const above = (py - y[n]) * alongX - (px - x[n]) * alongY
  const beyond = place - h
  const angle = (dx: number, dy: number): number => {
    if (dx === 0 && dy === 0) return 0
    const counterclockwise = edge.bisectorY * dx - edge.bisectorX * dy
    return atan2(counterclockwise, -edge.bisectorX * dx - edge.bisectorY * dy)
  }
  const start = angle(px - x[n], py - y[n])
  const end = angle(px - x[0], py - y[0])
  const logarithm = (w: number): number => (w * w + above * above > 0 ? log(w * w + above * above) : 0)
  const ofSources = place * start - beyond * end + 0.5 * above * (logarithm(place) - logarithm(beyond))
  const ofVorticity =
    0.5 * (place * logarithm(place) - beyond * logarithm(beyond)) - h + above * (end - start)
  return (edge.source * ofSources + edge.vorticity * ofVorticity) / (2 * Math.PI)
}
