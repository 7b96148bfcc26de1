import { cos } from '../numerics/elementary'
import { contourOf, ordinateAt } from './contour'
import type { Section } from './section'

/** Abscissae on each side of a section between two others. */
const STATIONS = 120

/**
 * The section at a share of the way from the root section to the tip section of a straight-lofted wing:
 * ordinates of equal side and abscissa are joined by straight lines.
 */
export function loft(root: Section, tip: Section, share: number): Section {
  if (share <= 0 || root === tip) return root
  if (share >= 1) return tip
  const a = contourOf(root)
  const b = contourOf(tip)
  const x = new Float64Array(2 * STATIONS + 1)
  const y = new Float64Array(2 * STATIONS + 1)
  for (let k = 0; k <= STATIONS; k++) {
    const at = 0.5 * (1 - cos((Math.PI * k) / STATIONS))
    for (const [side, i] of [
      ['upper', STATIONS - k],
      ['lower', STATIONS + k],
    ] as const) {
      x[i] = at
      y[i] = (1 - share) * (ordinateAt(a, side, at) ?? 0) + share * (ordinateAt(b, side, at) ?? 0)
    }
  }
  return { name: `${root.name} > ${tip.name}`, x, y, meanLine: null, notes: [] }
}
