import { reactive } from 'vue'
import type { Method } from '../../core'
import { METHODS } from '../worker/protocol'
import type { PointState } from '../../io/plots/plot'

export type ViewName = 'Compare' | 'Wing'
export type Theme = 'system' | 'light' | 'dark'

/** What the window shows of the document: not saved, not undone. */
export interface View {
  name: ViewName
  /** Index of the shown condition. */
  condition: number
  hover: PointState | null
  theme: Theme
  sort: { column: string; descending: boolean } | null
  method: Method
  /** Keys of the polar plots that are not shown. */
  hiddenPolars: readonly string[]
  /** The middle pane shows boundary layers in place of pressure. */
  layersShown: boolean
  /** The first-start hint has been read. */
  hint: boolean
}

export function createView(): View {
  return reactive<View>({
    ...{ name: 'Compare', condition: 0, hover: null, theme: 'system', sort: null, hint: true },
    ...{ method: METHODS[0]!.method, hiddenPolars: ['transition'], layersShown: false },
  }) as View
}
