import { checkMach } from '../flow/compressibility'
import type { ViscousSetting } from '../flow/couplingState'
import type { ViscousSolution } from '../flow/interaction'
import { prepareViscous, type ViscousSection } from '../flow/viscousSection'
import { alphaForLift } from '../flow/panelLoads'
import { sideLayer } from '../flow/surfaceLayers'
import { viscousLoads } from '../flow/viscousLoads'
import { solvePanels } from '../flow/vortexPanels'
import { BadInput } from '../numerics/errors'
import { placePanels } from '../shape/panels'
import type { Section } from '../shape/section'
import { NO_LIMITS, type Polar, type PolarPoint } from './polar'
import type { Operating, PressureResult, SectionState } from './state'
import { solvePoint, solveSweep, type MarchedPoint } from './viscousMarch'

/** Chord Reynolds numbers for which the closures were fitted. */
export const LEAST_REYNOLDS = 5e4
export const GREATEST_REYNOLDS = 2e7
/** Greatest critical amplification exponent that is accepted. */
const GREATEST_AMPLIFICATION = 14
/** Widest trailing-edge gap, chords, for which the wake is believed. */
const GREATEST_GAP = 0.2

/** What a caller may watch a sweep with: `progress` is told how many of the points are done. */
export interface SweepHooks {
  readonly progress?: (done: number, of: number) => void
}

/**
 * An angle sweep with boundary layers: one point for each of `alphas` (rad), in their order, computed from the
 * angle nearest to zero outwards. Points that do not converge are marked and empty. Throws BadInput for a
 * Reynolds number outside 5e4 to 2e7, a Mach number outside 0 to 0.5, an amplification outside 0 to 14, a
 * trip outside 0 to 1, a deflected flap or an angle that is no number.
 */
export function viscousSweep(
  section: Section,
  state: SectionState,
  alphas: readonly number[],
  hooks: SweepHooks = {},
): Polar {
  const setting = settingOf(state)
  const absurd = alphas.find((alpha) => !Number.isFinite(alpha))
  if (absurd !== undefined) throw new BadInput(`angle of attack ${absurd}: give a finite angle`)
  const ready = readySection(section, state)
  const points: PolarPoint[] = new Array<PolarPoint>(alphas.length)
  let done = 0
  if (ready === null) alphas.forEach((alpha, i) => (points[i] = emptyPoint(alpha, NO_PANELS)))
  else {
    solveSweep(ready, setting, alphas, (i, solution) => {
      points[i] = pointOf(ready, setting, alphas[i], solution)
      done++
      hooks.progress?.(done, alphas.length)
    })
  }
  return {
    method: 'viscous',
    reynolds: setting.stream.reynolds,
    mach: state.mach,
    surface: state.surface,
    amplification: setting.amplification,
    tripUpper: state.tripUpper,
    tripLower: state.tripLower,
    flap: state.flap,
    points,
    ...NO_LIMITS,
  }
}

const NO_PANELS = 'the panel equations have no solution for this outline'

/** Section with its panels, null when they have no solution. */
function readySection(section: Section, state: SectionState): ViscousSection | null {
  const flow = solvePanels(placePanels(section, state.panels))
  if (flow.edge.gap >= GREATEST_GAP) {
    throw new BadInput(
      `trailing-edge gap ${flow.edge.gap.toFixed(3)} chords: give a section with a gap below ${GREATEST_GAP}`,
    )
  }
  return flow.solved ? prepareViscous(flow) : null
}

/** Checks a state and takes from it what the flow needs. */
function settingOf(state: SectionState): ViscousSetting {
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

function emptyPoint(alpha: number, reason: string): PolarPoint {
  return {
    alpha,
    liftCoefficient: null,
    dragCoefficient: null,
    momentCoefficient: null,
    transitionUpper: null,
    transitionLower: null,
    converged: false,
    reason,
  }
}

function pointOf(
  { flow }: ViscousSection,
  setting: ViscousSetting,
  alpha: number,
  solution: ViscousSolution,
): PolarPoint {
  if (!solution.converged) return emptyPoint(alpha, failureOf(solution))
  const loads = viscousLoads(flow, solution, setting.stream)
  const notes: string[] = []
  if (loads.sonic) notes.push('the flow turns sonic on the surface')
  const sides = [
    ['upper', loads.upper.laminarSeparation, setting.tripUpper],
    ['lower', loads.lower.laminarSeparation, setting.tripLower],
  ] as const
  for (const [side, separation, trip] of sides) {
    if (separation !== null && trip < 1 && separation < trip) {
      notes.push(`transition on the ${side} side is forced behind laminar separation`)
    }
  }
  return {
    alpha,
    liftCoefficient: loads.liftCoefficient,
    dragCoefficient: loads.dragCoefficient,
    momentCoefficient: loads.momentCoefficient,
    transitionUpper: loads.upper.transition,
    transitionLower: loads.lower.transition,
    converged: true,
    reason: notes.join('; '),
  }
}

function failureOf({ residual, iterations }: ViscousSolution): string {
  const left = Number.isFinite(residual) ? residual.toExponential(1) : 'unbounded'
  return `layers and potential flow do not agree after ${iterations} steps (residual ${left}, allowed 1e-5)`
}

/** Steps and tolerance of the search for a lift coefficient. */
const LIFT_STEPS = 12
const LIFT_TOLERANCE = 1e-5

/**
 * Surface pressure with boundary layers at an angle or at a lift coefficient, which is found by secant steps
 * from the angle of the potential flow. Not converged, with no points, where either does not converge.
 * Throws BadInput as viscousSweep does.
 */
export function viscousPressure(section: Section, state: SectionState, at: Operating): PressureResult {
  const setting = settingOf(state)
  const asked = 'alpha' in at ? at.alpha : at.lift
  if (!Number.isFinite(asked)) throw new BadInput(`angle or lift coefficient ${asked}: give a finite value`)
  const ready = readySection(section, state)
  if (ready === null) return noPressure('alpha' in at ? at.alpha : 0, NO_PANELS)
  if ('alpha' in at) return pressureOf(ready, setting, solvePoint(ready, setting, at.alpha, null).solution)
  const first = alphaForLift(ready.flow, at.lift, state.mach)
  if (first === null) return noPressure(0, 'no angle gives this lift coefficient')
  let alpha = first
  let slope = 5.5
  let before: { alpha: number; lift: number } | null = null
  let guarded: ViscousSolution | null = null
  for (let n = 0; n < LIFT_STEPS; n++) {
    const point: MarchedPoint = solvePoint(ready, setting, alpha, guarded)
    const { solution } = point
    guarded = point.guarded
    if (!solution.converged) return noPressure(alpha, failureOf(solution))
    const lift = viscousLoads(ready.flow, solution, setting.stream).liftCoefficient
    if (Math.abs(lift - at.lift) < LIFT_TOLERANCE) return pressureOf(ready, setting, solution)
    if (before && alpha !== before.alpha) slope = (lift - before.lift) / (alpha - before.alpha)
    if (!(slope > 0.2)) break
    before = { alpha, lift }
    alpha += Math.max(-0.06, Math.min(0.06, (at.lift - lift) / slope))
  }
  return noPressure(alpha, 'no attached flow gives this lift coefficient')
}

function pressureOf(
  ready: ViscousSection,
  setting: ViscousSetting,
  solution: ViscousSolution,
): PressureResult {
  if (!solution.converged) return noPressure(solution.alpha, failureOf(solution))
  const loads = viscousLoads(ready.flow, solution, setting.stream)
  return {
    method: 'viscous',
    alpha: solution.alpha,
    liftCoefficient: loads.liftCoefficient,
    momentCoefficient: loads.momentCoefficient,
    x: ready.flow.panels.x,
    y: ready.flow.panels.y,
    pressureCoefficient: loads.pressureCoefficient,
    layers: {
      upper: sideLayer(ready.flow, solution.layers, 0),
      lower: sideLayer(ready.flow, solution.layers, 1),
      dragCoefficient: loads.dragCoefficient,
      frictionDrag: loads.frictionDrag,
      pressureDrag: loads.pressureDrag,
    },
    converged: true,
    reason: loads.sonic ? 'the flow turns sonic on the surface' : '',
  }
}

function noPressure(alpha: number, reason: string): PressureResult {
  const none = new Float64Array(0)
  return {
    method: 'viscous',
    alpha,
    liftCoefficient: 0,
    momentCoefficient: 0,
    x: none,
    y: none,
    pressureCoefficient: none,
    layers: null,
    converged: false,
    reason,
  }
}
