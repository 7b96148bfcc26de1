import { solveLiftingLine, type LiftingLine } from '../../src/core/wing/liftingLine'

/** Lifting line of a straight-tapered wing of area 1 with symmetric sections of slope 2 pi and linear washout (rad). */
export function taperedLine(aspectRatio: number, taper: number, washout = 0, terms?: number): LiftingLine {
  const span = Math.sqrt(aspectRatio)
  const root = 2 / (span * (1 + taper))
  const half = 0.5 * span
  return solveLiftingLine(
    {
      span,
      area: 1,
      chord: (y) => root * (1 - ((1 - taper) * y) / half),
      slope: () => 2 * Math.PI,
      set: (y) => (-washout * y) / half,
      breaks: [0, half],
    },
    terms,
  )
}

/** Lifting line of an untwisted elliptic wing of area 1. */
export function ellipticLine(aspectRatio: number): LiftingLine {
  const span = Math.sqrt(aspectRatio)
  const half = 0.5 * span
  const root = 4 / (Math.PI * span)
  return solveLiftingLine({
    span,
    area: 1,
    chord: (y) => root * Math.sqrt(Math.max(1 - (y / half) ** 2, 0)),
    slope: () => 2 * Math.PI,
    set: () => 0,
    breaks: [0, half],
  })
}
