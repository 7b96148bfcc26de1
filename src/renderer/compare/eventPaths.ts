import type { LayerEventKind } from '../../io/plots/plot'

/** Shapes of the events of a layer about their middle, px: the same as the charts draw. */
export const EVENT_PATHS: Record<LayerEventKind, string> = {
  transition: 'M-4 0a4 4 0 1 0 8 0a4 4 0 1 0 -8 0Z',
  'laminar separation': 'M0 -4.2L3.8 2.6L-3.8 2.6Z',
  reattachment: 'M0 4.2L3.8 -2.6L-3.8 -2.6Z',
  'turbulent separation': 'M0 -4.4L4.4 0L0 4.4L-4.4 0Z',
}
