/** How an entry of the shortlist is drawn, the same in every pane and table. */
export interface EntryStyle {
  /** A style-sheet colour that follows the theme. */
  readonly colour: string
  /** Lengths of strokes and gaps, px; empty: a full line. */
  readonly dash: readonly number[]
  readonly marker: 'circle' | 'triangle' | 'rect' | 'rectRot' | 'star' | 'cross'
}

/** Dashes that tell curves apart in greyscale. */
const DASHES: readonly (readonly number[])[] = [
  [],
  [8, 4],
  [2, 3],
  [10, 3, 2, 3],
  [5, 2],
  [12, 3, 2, 3, 2, 3],
  [3, 2, 8, 2],
  [1, 2],
]
const MARKERS = ['circle', 'triangle', 'rect', 'rectRot', 'star', 'cross', 'circle', 'triangle'] as const

/** Colours in the palette; the style sheet holds them as --entry-0 to --entry-7, for light and dark. */
export const PALETTE_SIZE = 8

/** Numbers past the palette take the dash this many places on: a repeated colour has another dash and mark. */
const NEXT_ROUND = 3

/** The style of a colour and a mark by their numbers; colours repeat after the palette, whole styles do not soon. */
export function entryStyle(colour: number, mark: number): EntryStyle {
  const place = (mark + NEXT_ROUND * Math.floor(mark / PALETTE_SIZE)) % PALETTE_SIZE
  return {
    colour: `var(--entry-${colour % PALETTE_SIZE})`,
    dash: DASHES[place]!,
    marker: MARKERS[place]!,
  }
}
