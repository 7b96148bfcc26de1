import type { ChartDataset, PointStyle } from 'chart.js'
import { DEGREES, type LayerEventKind, type Plot } from '../../io/plots/plot'
import type { AxisEnds } from '../../io/plots/axisTicks'

type PointSet = ChartDataset<'line', { x: number; y: number }[]>

/** How an event of a layer is drawn; the key of the panes draws the same shapes. */
const EVENT_SHAPES: Record<LayerEventKind, { readonly pointStyle: PointStyle; readonly rotation: number }> = {
  transition: { pointStyle: 'circle', rotation: 0 },
  'laminar separation': { pointStyle: 'triangle', rotation: 0 },
  reattachment: { pointStyle: 'triangle', rotation: 180 },
  'turbulent separation': { pointStyle: 'rectRot', rotation: 0 },
}

/** Events of layers, ends of lift, and failed angles at the lower edge of what is seen. */
export function markSets(
  plot: Plot,
  seenY: AxisEnds,
  colour: (entry: number) => string,
  panel: string,
): PointSet[] {
  const common = { showLine: false, pointBorderWidth: 1.6, pointBackgroundColor: panel }
  const edge = plot.y.reversed ? seenY[1] : seenY[0]
  return [
    ...(plot.events ?? []).map(({ entry, kind, x, y }): PointSet => ({
      ...common,
      data: [{ x, y }],
      pointStyle: EVENT_SHAPES[kind].pointStyle,
      pointRotation: EVENT_SHAPES[kind].rotation,
      pointRadius: 4.2,
      pointBorderColor: colour(entry),
    })),
    ...(plot.ends ?? []).map(({ entry, x, y }): PointSet => ({
      ...common,
      data: [{ x, y }],
      pointStyle: 'line',
      pointRadius: 9,
      pointBorderWidth: 2.4,
      pointBorderColor: colour(entry),
    })),
    ...(plot.failures ?? []).map(({ entry, alpha }): PointSet => ({
      ...common,
      data: [{ x: alpha * DEGREES, y: edge }],
      clip: false,
      pointStyle: 'crossRot',
      pointRadius: 4,
      pointBorderColor: colour(entry),
    })),
  ]
}

/** How near the pointer must be to a mark, px. */
const REACH = 9

/** What marks near the pointer have to say: why an angle failed, what limits the lift; empty without. */
export function markWords(
  plot: Plot,
  pixel: (axis: 'x' | 'y', value: number) => number,
  seenY: AxisEnds,
  px: number,
  py: number,
): string[] {
  const near = (x: number, y: number): boolean => Math.hypot(pixel('x', x) - px, pixel('y', y) - py) < REACH
  const edge = plot.y.reversed ? seenY[1] : seenY[0]
  return [
    ...(plot.failures ?? [])
      .filter(({ alpha }) => near(alpha * DEGREES, edge))
      .map(({ name, alpha, reason }) => `${name} at ${(alpha * DEGREES).toFixed(1)}°: ${reason}`),
    ...(plot.ends ?? []).filter(({ x, y }) => near(x, y)).map(({ words }) => words),
  ]
}
