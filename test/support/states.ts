import type { SectionState } from '../../src/core/polar/state'

/** A clean section by panels at rest, with free transition and no flap, but for what `change` says. */
export const sectionState = (change: Partial<SectionState> = {}): SectionState => ({
  method: 'panel',
  reynolds: null,
  mach: 0,
  surface: 'clean',
  amplification: null,
  tripUpper: 1,
  tripLower: 1,
  flap: 0,
  panels: 180,
  ...change,
})
