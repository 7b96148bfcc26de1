import { atan, cos, power, sin } from '../numerics/elementary'
import { BadInput } from '../numerics/errors'
import type { Edge, MeanLine, Section } from './section'

/**
 * Points along each side. With 160 the spline through them was measured to stay within 1e-7 chord of the exact
 * outline of symmetric sections and within 3e-6 of cambered ones (4424), whose curvature jumps at the joint.
 */
const POINTS_A_SIDE = 160

/** Joint r and k1 of the standard 5-digit mean lines at design lift 0.3; NACA Report 537 (1935), table I. */
const STANDARD: Readonly<Record<string, readonly [r: number, k1: number]>> = {
  10: [0.058, 361.4],
  20: [0.126, 51.64],
  30: [0.2025, 15.957],
  40: [0.29, 6.643],
  50: [0.391, 3.23],
}

/** Joint r, k1 and k2/k1 of the reflexed 5-digit mean lines at design lift 0.3; NACA Report 537 (1935). */
const REFLEXED: Readonly<Record<string, readonly [r: number, k1: number, k2OverK1: number]>> = {
  21: [0.13, 51.99, 0.000764],
  31: [0.217, 15.793, 0.00677],
  41: [0.318, 6.52, 0.0303],
  51: [0.441, 3.191, 0.1355],
}

/**
 * A NACA 4-digit or 5-digit section (standard or reflexed mean line), thickness laid perpendicular to the
 * mean line, with the chord of that mean line: leading edge of the mean line at (0, 0), trailing edge at
 * (1, 0). The closed edge uses the last thickness coefficient -0.1036, the open one the published -0.1015.
 * Throws BadInput for other families and for designations that name no section.
 * Source: Jacobs, Ward and Pinkerton, NACA Report 460 (1933); Jacobs and Pinkerton, NACA Report 537 (1935).
 */
export function nacaSection(designation: string, options: { readonly edge?: Edge } = {}): Section {
  const digits = designation.trim().replace(/^naca[\s:-]*/i, '')
  if (!/^\d{4,5}$/.test(digits)) {
    throw new BadInput(
      `NACA ${digits || '(nothing)'}: not generated here; open a coordinate file, or give 4 or 5 digits`,
    )
  }
  const thickness = Number(digits.slice(-2)) / 100
  if (thickness === 0) throw new BadInput(`NACA ${digits}: the last two digits give no thickness`)
  const meanLine = digits.length === 4 ? fourDigitLine(digits) : fiveDigitLine(digits)
  const { x, y } = outline(meanLine, thickness, options.edge ?? 'closed')
  return { name: `NACA ${digits}`, x, y, meanLine, notes: [] }
}

function fourDigitLine(digits: string): MeanLine {
  const m = Number(digits[0]) / 100
  const p = Number(digits[1]) / 10
  if (m === 0) return { joint: 1, front: [0], rear: [0] }
  if (p === 0) {
    throw new BadInput(`NACA ${digits}: camber needs its place; the second digit must be 1 to 9`)
  }
  const ahead = m / power(p, 2)
  const behind = m / power(1 - p, 2)
  return {
    joint: p,
    front: [0, 2 * p * ahead, -ahead],
    rear: [(1 - 2 * p) * behind, 2 * p * behind, -behind],
  }
}

function fiveDigitLine(digits: string): MeanLine {
  const scale = Number(digits[0]) / 2
  const line = digits.slice(1, 3)
  if (scale === 0) throw new BadInput(`NACA ${digits}: a design lift of zero names no 5-digit mean line`)
  const standard = STANDARD[line]
  if (standard) {
    const [r, k1] = standard
    const k = (scale * k1) / 6
    return {
      joint: r,
      front: [0, k * r * r * (3 - r), -3 * k * r, k],
      rear: [k * power(r, 3), -k * power(r, 3)],
    }
  }
  const reflexed = REFLEXED[line]
  if (reflexed) {
    const [r, k1, ratio] = reflexed
    const k = (scale * k1) / 6
    const fall = ratio * power(1 - r, 3) + power(r, 3)
    return {
      joint: r,
      front: [0, k * (3 * r * r - fall), -3 * k * r, k],
      rear: [k * power(r, 3) * (1 - ratio), k * (3 * ratio * r * r - fall), -3 * k * ratio * r, k * ratio],
    }
  }
  throw new BadInput(
    `NACA ${digits}: no such 5-digit mean line; digits 2 and 3 are one of 10 20 30 40 50 or 21 31 41 51`,
  )
}

function outline(line: MeanLine, thickness: number, edge: Edge): { x: Float64Array; y: Float64Array } {
  const n = POINTS_A_SIDE
  const x = new Float64Array(2 * n + 1)
  const y = new Float64Array(2 * n + 1)
  const last = edge === 'closed' ? -0.1036 : -0.1015
  for (let i = 0; i <= n; i++) {
    const root = sin((Math.PI * i) / (2 * n)) // square root of the station
    const at = i === n ? 1 : root * root
    const half = 5 * thickness * (0.2969 * root + at * (-0.126 + at * (-0.3516 + at * (0.2843 + at * last))))
    const camber = meanLineAt(line, at)
    const across = i === n && edge === 'closed' ? 0 : half
    const lean = atan(camber.slope)
    x[n - i] = at - across * sin(lean)
    y[n - i] = camber.height + across * cos(lean)
    x[n + i] = at + across * sin(lean)
    y[n + i] = camber.height - across * cos(lean)
  }
  return { x, y }
}

/** Height and slope of a mean line at x, both in chords. */
export function meanLineAt(line: MeanLine, x: number): { height: number; slope: number } {
  const piece = x < line.joint ? line.front : line.rear
  let height = 0
  let slope = 0
  for (let k = piece.length - 1; k >= 0; k--) {
    slope = slope * x + height
    height = height * x + piece[k]
  }
  return { height, slope }
}
