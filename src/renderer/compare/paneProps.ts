import type { Comparison } from '../../core'
import type { PointState } from '../../io/plots/plot'
import type { EntryStyle } from '../style/palette'

/** What every pane shows: the comparison at a condition, and the state that is hovered anywhere. */
export interface PaneProps {
  readonly comparison: Comparison | null
  readonly styles: readonly EntryStyle[]
  /** Index of the shown condition. */
  readonly condition: number
  readonly hover: PointState | null
  readonly stale: boolean
}
