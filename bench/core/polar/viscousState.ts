import { DEFAULT_PANELS, criticalAmplification, type SectionState } from '../../../src/core'

/** -4 to 11 deg by 0.5, in rad. */
export const POLAR_ALPHAS: readonly number[] = Array.from(
  { length: 31 },
  (_, i) => ((-4 + 0.5 * i) * Math.PI) / 180,
)

/** A clean section in still air, as the command line asks for without options. */
export function viscousState(reynolds: number): SectionState {
  return {
    ...{ method: 'viscous', reynolds, mach: 0, surface: 'clean' },
    ...{ amplification: criticalAmplification(0.0007), tripUpper: 1, tripLower: 1 },
    ...{ flap: 0, panels: DEFAULT_PANELS },
  }
}
