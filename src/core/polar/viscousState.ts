import { checkMach } from '../flow/compressibility'
import type { ViscousSetting } from '../flow/couplingState'
import { prepareViscous, type ViscousSection } from '../flow/viscousSection'
import { solvePanels } from '../flow/vortexPanels'
import { BadInput } from '../numerics/errors'
import { placePanels } from '../shape/panels'
import type { Section } from '../shape/section'
import type { SectionState } from './state'

/** Chord Reynolds numbers for which the closures were fitted. */
export const LEAST_REYNOLDS = 5e4
export const GREATEST_REYNOLDS = 2e7
/** Greatest critical amplification exponent that is accepted. */
const GREATEST_AMPLIFICATION = 14
/** Widest trailing-edge gap, chords, for which the wake is believed. */
const GREATEST_GAP = 0.2

/** Takes from a state what the flow needs. Throws BadInput for what is outside the method's range. */
export function settingOf(state: SectionState): ViscousSetting {
  const { reynolds, mach, amplification, tripUpper, tripLower, flap } = state
  if (flap !== 0) throw new BadInput('a deflected flap is not computed: give a flap angle of 0')
  checkMach(mach)
  if (reynolds === null || !(reynolds >= LEAST_REYNOLDS && reynolds <= GREATEST_REYNOLDS)) {
    throw new BadInput(`Reynolds number ${reynolds}: give a value from 5e4 to 2e7`)
  }
  if (amplification === null || !(amplification >= 0 && amplification <= GREATEST_AMPLIFICATION)) {
    throw new BadInput(`amplification ${amplification}: give a value from 0 to ${GREATEST_AMPLIFICATION}`)
  }
  for (const trip of [tripUpper, tripLower]) {
    if (!(trip >= 0 && trip <= 1)) throw new BadInput(`forced transition at ${trip}: give x/c from 0 to 1`)
  }
  return { stream: { reynolds, mach }, amplification, tripUpper, tripLower }
}

/** Why a section has no solution at all. */
export const NO_PANELS = 'the panel equations have no solution for this outline'

/** Sections made ready before, by their panel count: a section never changes, and its wakes serve every state. */
const met = new WeakMap<Section, Map<number, ViscousSection | null>>()

/** The section with its panels, null when they have no solution. Throws BadInput for a wide open edge. */
export function readySection(section: Section, state: SectionState): ViscousSection | null {
  const known = met.get(section) ?? new Map<number, ViscousSection | null>()
  met.set(section, known)
  const had = known.get(state.panels)
  // The linear systems of former solutions stay out: no result may depend on what was computed before.
  if (had) return { ...had, systems: new Map() }
  const ready = prepareSection(section, state)
  known.set(state.panels, ready)
  return ready
}

function prepareSection(section: Section, state: SectionState): ViscousSection | null {
  const flow = solvePanels(placePanels(section, state.panels))
  if (flow.edge.gap >= GREATEST_GAP) {
    throw new BadInput(
      `trailing-edge gap ${flow.edge.gap.toFixed(3)} chords: give a section with a gap below ${GREATEST_GAP}`,
    )
  }
  return flow.solved ? prepareViscous(flow) : null
}
