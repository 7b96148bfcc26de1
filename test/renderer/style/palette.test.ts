import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { entryStyle, PALETTE_SIZE } from '../../../src/renderer/style/palette'

const css = readFileSync('src/renderer/style/theme.css', 'utf8')

/** Colours of one block of the style sheet by their names. */
function coloursOf(block: number): Map<string, string> {
  const body = css.split('{').filter((part) => part.includes('--entry-0'))[block]!
  return new Map([...body.matchAll(/--([\w-]+): (#[0-9a-f]{6})/g)].map(([, name, hex]) => [name!, hex!]))
}

type Triple = readonly [number, number, number]

/** Linear red, green and blue of an sRGB colour (IEC 61966-2-1). */
function linear(hex: string): Triple {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const c = parseInt(hex.slice(at, at + 2), 16) / 255
    return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4
  })
  return [r!, g!, b!]
}

const times = (rows: readonly Triple[], [r, g, b]: Triple): Triple =>
  rows.map(([p, q, s]) => Math.min(Math.max(p * r + q * g + s * b, 0), 1)) as unknown as Triple

/** Relative luminance (WCAG 2.2, definition of relative luminance). */
function luminance(hex: string): number {
  const [r, g, b] = linear(hex)
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}

/** Sight without one kind of cone (Machado, Oliveira and Fernandes 2009, severity 1), and full sight. */
const SIGHTS: readonly (readonly Triple[])[] = [
  [
    [0.152286, 1.052583, -0.204868],
    [0.114503, 0.786281, 0.099216],
    [-0.003882, -0.048116, 1.051998],
  ],
  [
    [0.367322, 0.860646, -0.227968],
    [0.280085, 0.672501, 0.047413],
    [-0.01182, 0.04294, 0.968881],
  ],
  [
    [1.255528, -0.076749, -0.178779],
    [-0.078411, 0.930809, 0.147602],
    [0.004733, 0.691367, 0.3039],
  ],
  [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
]

/** CIE 1976 L*, a*, b* under D65. */
function lab([r, g, b]: Triple): Triple {
  const root = (t: number): number => (t > 0.008856 ? Math.cbrt(t) : 7.787 * t + 16 / 116)
  const x = root((0.4124 * r + 0.3576 * g + 0.1805 * b) / 0.9505)
  const y = root(0.2126 * r + 0.7152 * g + 0.0722 * b)
  const z = root((0.0193 * r + 0.1192 * g + 0.9505 * b) / 1.089)
  return [116 * y - 16, 500 * (x - y), 200 * (y - z)]
}

/** Differences of about 2.3 are just seen; thin lines need several times that. */
const TOLD_APART = 15

function contrast(a: string, b: string): number {
  const [low, high] = [luminance(a), luminance(b)].sort((p, q) => p - q)
  return (high! + 0.05) / (low! + 0.05)
}

describe('entryStyle', () => {
  it('gives eight styles that no two share in colour or in dash', () => {
    const styles = Array.from({ length: PALETTE_SIZE }, (_, i) => entryStyle(i, i))
    expect(new Set(styles.map((style) => style.colour)).size).toBe(8)
    expect(new Set(styles.map((style) => style.dash.join())).size).toBe(8)
  })

  it('repeats a colour only with another dash and another mark', () => {
    for (let i = 0; i < PALETTE_SIZE; i++) {
      const [first, again] = [entryStyle(i, i), entryStyle(i + PALETTE_SIZE, i + PALETTE_SIZE)]
      expect(again.colour).toBe(first.colour)
      expect(again.dash).not.toEqual(first.dash)
      expect(again.marker).not.toBe(first.marker)
    }
  })
})

describe.each([
  ['light', 0],
  ['dark', 1],
])('the %s theme', (_, block) => {
  const colours = coloursOf(block)

  it('draws every entry with a contrast of 3 to 1 (WCAG 2.2, 1.4.11)', () => {
    for (let i = 0; i < PALETTE_SIZE; i++) {
      expect(contrast(colours.get(`entry-${i}`)!, colours.get('panel')!)).toBeGreaterThanOrEqual(3)
    }
  })

  it('parts every two entries, for the colour-blind too', () => {
    for (const sight of SIGHTS) {
      const seen = Array.from({ length: PALETTE_SIZE }, (_, i) =>
        lab(times(sight, linear(colours.get(`entry-${i}`)!))),
      )
      seen.forEach((a, i) => {
        for (const b of seen.slice(0, i)) {
          expect(Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2])).toBeGreaterThan(TOLD_APART)
        }
      })
    }
  })

  it('writes every text with a contrast of 4.5 to 1 (WCAG 2.2, 1.4.3)', () => {
    for (const name of ['ink', 'ink-soft', 'good', 'bad', 'warn', 'accent']) {
      for (const ground of ['panel', 'surface']) {
        expect(contrast(colours.get(name)!, colours.get(ground)!), name).toBeGreaterThanOrEqual(4.5)
      }
    }
  })
})
