import type { ComparedEntry } from '../../core'
import { shownName } from '../entryName'

/** A section drawn at true scale. */
export interface ShapeOutline {
  readonly name: string
  /** Outline as an SVG path in chords, y down. */
  readonly path: string
  readonly low: number
  readonly high: number
  readonly caption: string
}

/** The outlines of an entry: its root section, and the tip section where it differs. */
export function shapeOutlines(entry: ComparedEntry): ShapeOutline[] {
  const { root, tip } = entry
  if (root === null || tip === null) return []
  const facts = root === tip ? [root] : [root, tip]
  return facts.map(({ section, measures }, i) => {
    const points = Array.from(section.x, (x, k) => `${x.toFixed(5)} ${(-section.y[k]!).toFixed(5)}`)
    const camber = (100 * measures.maxCamber).toFixed(1).replace('-', '−')
    return {
      name:
        facts.length === 1 ? shownName(entry.name) : `${shownName(entry.name)}, ${i === 0 ? 'root' : 'tip'}`,
      path: `M${points.join('L')}Z`,
      low: Math.min(...section.y),
      high: Math.max(...section.y),
      caption: `${(100 * measures.maxThickness).toFixed(1)} % thick, camber ${camber} %`,
    }
  })
}
