import type { Polar, PolarPoint } from '../../../src/core/polar/polar'
import type { SectionState } from '../../../src/core/polar/state'
import { sweep } from '../../../src/core/polar/sweep'
import { nacaSection } from '../../../src/core/shape/naca'
import type { Section } from '../../../src/core/shape/section'
import { sectionFromPoints } from '../../../src/core/shape/normalise'
import { LOW_REYNOLDS_OUTLINE } from '../cases/lowReynolds'

const DEGREE = Math.PI / 180

/** A clean section in still air at a Reynolds number, but for what `change` says. */
export const viscousState = (reynolds: number, change: Partial<SectionState> = {}): SectionState => ({
  ...{ method: 'viscous', reynolds, mach: 0, surface: 'clean', amplification: 9 },
  ...{ tripUpper: 1, tripLower: 1, flap: 0, panels: 180 },
  ...change,
})

export const lowReynoldsSection = (): Section =>
  sectionFromPoints(
    { kind: 'loop', points: LOW_REYNOLDS_OUTLINE },
    { name: 'low Reynolds number', chordLine: null },
  ).section

/** Polars computed once and kept, by section and state. */
export function polarStore(): (section: string, state: SectionState, from: number, to: number) => Polar {
  const known = new Map<string, Polar>()
  return (name, state, from, to) => {
    const key = JSON.stringify([name, state, from, to])
    const polar =
      known.get(key) ??
      sweep(
        name === 'low' ? lowReynoldsSection() : nacaSection(name),
        state,
        Array.from({ length: to - from + 1 }, (_, i) => (from + i) * DEGREE),
      )
    known.set(key, polar)
    return polar
  }
}

/** Converged points, those of the refinement too, by angle. */
export function solved({ points, between }: Polar): readonly PolarPoint[] {
  return [...points, ...between].filter(({ converged }) => converged).sort((a, b) => a.alpha - b.alpha)
}

/** The value `of` at a lift coefficient, by straight lines between points up to maximum lift; null outside. */
export function atLift(polar: Polar, lift: number, of: (point: PolarPoint) => number | null): number | null {
  const points = solved(polar).filter(
    ({ alpha }) => polar.maxLift === null || alpha <= polar.maxLift.alpha + 1e-9,
  )
  for (let i = 1; i < points.length; i++) {
    const [a, b] = [points[i - 1]!, points[i]!]
    const [la, lb] = [a.liftCoefficient!, b.liftCoefficient!]
    if (lift < la || lift > lb) continue
    return of(a)! + ((lift - la) / (lb - la)) * (of(b)! - of(a)!)
  }
  return null
}
