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

/** The style of a colour and a mark by their numbers, which wrap round. */
export function entryStyle(colour: number, mark: number): EntryStyle {
  return {
    colour: `var(--entry-${colour % PALETTE_SIZE})`,
    dash: DASHES[mark % PALETTE_SIZE]!,
    marker: MARKERS[mark % PALETTE_SIZE]!,
  }
}
