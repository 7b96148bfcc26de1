/** What drag costs; null where the profile drag is not known. */
export interface Performance {
  /** Wing and rest of the aircraft, N. */
  readonly drag: number | null
  /** Thrust power, drag times true airspeed, W. */
  readonly power: number | null
  /** Weight over drag; at load factor 1 only. */
  readonly glideRatio: number | null
  /** Drag times speed over weight, m/s; at load factor 1 only. */
  readonly sink: number | null
}

/** Forces of a wing in flight; SI. */
export interface DraggedWing {
  readonly dynamicPressure: number
  readonly area: number
  readonly profileDragCoefficient: number | null
  readonly inducedDragCoefficient: number
  /** Of everything but the wing, m2. */
  readonly dragArea: number
  readonly speed: number
  readonly weight: number
  readonly loadFactor: number
}

/** Drag, power, glide ratio and sink from the drag coefficients: D = q (S (C_D0 + C_Di) + drag area). */
export function performance(wing: DraggedWing): Performance {
  const { profileDragCoefficient, speed, weight } = wing
  if (profileDragCoefficient === null) return { drag: null, power: null, glideRatio: null, sink: null }
  const coefficient = profileDragCoefficient + wing.inducedDragCoefficient
  const drag = wing.dynamicPressure * (wing.area * coefficient + wing.dragArea)
  const level = wing.loadFactor === 1
  return {
    drag,
    power: drag * speed,
    glideRatio: level ? weight / drag : null,
    sink: level ? (drag * speed) / weight : null,
  }
}
