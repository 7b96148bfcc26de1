/** What of a station the sum needs. */
export interface DragStation {
  /** m */
  readonly y: number
  readonly chord: number
  readonly profileDragCoefficient: number | null
}

/**
 * Profile drag coefficient of a wing from the stations of one half: the sum of c_d c over both halves by
 * trapezoids, over the wing area (m2). Null when a station has none: nothing is bridged over.
 */
export function wingProfileDrag(stations: readonly DragStation[], area: number): number | null {
  let sum = 0
  for (let k = 0; k + 1 < stations.length; k++) {
    const [a, b] = [stations[k], stations[k + 1]]
    if (a.profileDragCoefficient === null || b.profileDragCoefficient === null) return null
    sum += (b.y - a.y) * (a.profileDragCoefficient * a.chord + b.profileDragCoefficient * b.chord)
  }
  return sum / area
}
