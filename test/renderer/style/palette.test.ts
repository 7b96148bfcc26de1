import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { entryStyle, PALETTE_SIZE } from '../../../src/renderer/style/palette'

const css = readFileSync('src/renderer/style/theme.css', 'utf8')

/** Colours of one block of the style sheet by their names. */
function coloursOf(block: number): Map<string, string> {
  const body = css.split('{').filter((part) => part.includes('--entry-0'))[block]!
  return new Map([...body.matchAll(/--([\w-]+): (#[0-9a-f]{6})/g)].map(([, name, hex]) => [name!, hex!]))
}

/** Relative luminance (WCAG 2.2, definition of relative luminance). */
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const c = parseInt(hex.slice(at, at + 2), 16) / 255
    return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4
  })
  return 0.2126 * r! + 0.7152 * g! + 0.0722 * b!
}

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

  it('begins again after the last', () => {
    expect(entryStyle(PALETTE_SIZE, PALETTE_SIZE)).toEqual(entryStyle(0, 0))
  })
})

describe.each([
  ['light', 0],
  ['dark', 1],
  ['dark by the system', 2],
])('the %s theme', (_, block) => {
  const colours = coloursOf(block)

  it('draws every entry with a contrast of 3 to 1 (WCAG 2.2, 1.4.11)', () => {
    for (let i = 0; i < PALETTE_SIZE; i++) {
      expect(contrast(colours.get(`entry-${i}`)!, colours.get('panel')!)).toBeGreaterThanOrEqual(3)
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

it('the dark theme is the same by choice and by the system', () => {
  expect(coloursOf(2)).toEqual(coloursOf(1))
})
