import type { Comparison, SectionFacts } from '../../core'
import { shownName } from '../entryName'
import { plotNumber } from './axisTicks'

/** A section drawn at true scale; lengths in chords. */
export interface ShapeOutline {
  /** Index of the entry. */
  readonly entry: number
  readonly name: string
  /** Outline as an SVG path in chords, y down. */
  readonly path: string
  readonly x: Float64Array
  readonly y: Float64Array
  readonly low: number
  readonly high: number
  /** Thickness and camber. */
  readonly caption: string
  /** Depth at the spar on the wing's own chord, less the skin on both sides. */
  readonly spar: string
}

/** The outlines of every entry: its root section, and the tip section where it differs. */
export function shapeOutlines({ entries, wing }: Comparison): ShapeOutline[] {
  const [rootChord, tipChord] = [wing.stations[0]!.chord, wing.stations.at(-1)!.chord]
  const depth = (facts: SectionFacts, chord: number): number =>
    facts.depthAtSpar * chord - 2 * wing.skinThickness
  return entries.flatMap(({ name, root, tip }, entry) => {
    if (root === null || tip === null) return []
    const shown = shownName(name)
    if (root === tip) return [outlineOf(entry, shown, root, depth(root, rootChord))]
    return [
      outlineOf(entry, `${shown}, root`, root, depth(root, rootChord)),
      outlineOf(entry, `${shown}, tip`, tip, depth(tip, tipChord)),
    ]
  })
}

function outlineOf(entry: number, name: string, facts: SectionFacts, sparDepth: number): ShapeOutline {
  const { section, measures } = facts
  const { x, y } = section
  const points = Array.from(x, (at, k) => `${at.toFixed(5)} ${(-y[k]!).toFixed(5)}`)
  return {
    ...{ entry, name, x, y },
    path: `M${points.join('L')}Z`,
    low: Math.min(...y),
    high: Math.max(...y),
    caption: `${plotNumber(100 * measures.maxThickness, 1)} % thick, camber ${plotNumber(100 * measures.maxCamber, 1)} %`,
    spar: `spar depth ${plotNumber(1000 * sparDepth, 1)} mm`,
  }
}

/** Height of the outline at a chord fraction, straight between its points; null off the section. */
export function outlineAt({ x, y }: ShapeOutline, xOverC: number, side: 'upper' | 'lower'): number | null {
  // Upper points run forward and lower ones aft.
  for (let k = 0; k + 1 < x.length; k++) {
    const [from, to] = side === 'upper' ? [k + 1, k] : [x.length - 2 - k, x.length - 1 - k]
    const [a, b] = [x[from]!, x[to]!]
    if (a <= xOverC && xOverC <= b && b > a) return y[from]! + ((xOverC - a) / (b - a)) * (y[to]! - y[from]!)
  }
  return null
}
