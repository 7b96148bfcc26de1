import { alphaForLift, panelLoads, type PanelLoads } from '../flow/panelLoads'
import { thinAirfoil, thinLift } from '../flow/thinAirfoil'
import { solvePanels } from '../flow/vortexPanels'
import { checkMach } from '../flow/compressibility'
import { BadInput } from '../numerics/errors'
import { placePanels } from '../shape/panels'
import type { Section } from '../shape/section'
import { NO_LIMITS, type Polar, type PolarPoint } from './polar'
import type { Operating, PressureResult, SectionState } from './state'
import { viscousPressure } from './viscousPressure'
import { viscousSweep, type SweepExtent } from './viscousSweep'

/** Fields that a method without a boundary layer leaves empty. */
const NO_BOUNDARY_LAYER = { dragCoefficient: null, transitionUpper: null, transitionLower: null } as const

/**
 * An angle sweep of one section: one point for each of `alphas` (rad), in their order. `thin` is always
 * incompressible and is recorded at Mach 0. Throws BadInput for a method that does not exist, a panel count
 * or a Mach number outside its range.
 */
export function sweep(
  section: Section,
  state: SectionState,
  alphas: readonly number[],
  extent: SweepExtent = {},
): Polar {
  if (state.method === 'viscous') return viscousSweep(section, state, alphas, extent)
  checkState(state)
  const absurd = alphas.find((alpha) => !Number.isFinite(alpha))
  if (absurd !== undefined) throw new BadInput(`angle of attack ${absurd}: give a finite angle`)
  const points = pointsOf(section, state, alphas)
  const { method, surface, tripUpper, tripLower, flap } = state
  const mach = method === 'thin' ? 0 : state.mach
  return {
    method,
    reynolds: null,
    mach,
    surface,
    amplification: null,
    tripUpper,
    tripLower,
    flap,
    points,
    ...NO_LIMITS,
  }
}

/** Throws BadInput for what these methods do not compute. */
function checkState({ flap, mach, method }: SectionState): void {
  if (flap !== 0) throw new BadInput('a deflected flap is not computed: give a flap angle of 0')
  if (method !== 'thin') checkMach(mach)
}

function pointsOf(section: Section, state: SectionState, alphas: readonly number[]): readonly PolarPoint[] {
  if (state.method === 'thin') return thinPoints(section, alphas)
  const flow = solvePanels(placePanels(section, state.panels))
  return alphas.map((alpha) => panelPoint(panelLoads(flow, alpha, state.mach), flow.solved))
}

/** Lift 2 pi (alpha - zero-lift angle) and the constant moment of thin-airfoil theory. */
function thinPoints(section: Section, alphas: readonly number[]): readonly PolarPoint[] {
  const thin = thinAirfoil(section)
  return alphas.map((alpha) => ({
    ...NO_BOUNDARY_LAYER,
    alpha,
    liftCoefficient: thinLift(thin, alpha),
    momentCoefficient: thin.momentQuarterChord,
    converged: true,
    reason: '',
  }))
}

function panelPoint(loads: PanelLoads, solved: boolean): PolarPoint {
  const { alpha, liftCoefficient, momentCoefficient, reason } = loads
  const results = solved
    ? { liftCoefficient, momentCoefficient }
    : { liftCoefficient: null, momentCoefficient: null }
  return { ...NO_BOUNDARY_LAYER, alpha, ...results, converged: solved, reason }
}

/**
 * Surface pressure at an angle or at a lift coefficient. A lift that the potential flow does not reach, or
 * an outline without a solution, comes back as not converged, with no points. Throws BadInput as `sweep`
 * does, and for `thin`, which has no surface pressure.
 */
export function pressureAt(section: Section, state: SectionState, at: Operating): PressureResult {
  if (state.method === 'thin') {
    throw new BadInput('thin-airfoil theory gives no surface pressure; use the panel method')
  }
  if (state.method === 'viscous') return viscousPressure(section, state, at)
  checkState(state)
  const asked = 'alpha' in at ? at.alpha : at.lift
  if (!Number.isFinite(asked)) throw new BadInput(`angle or lift coefficient ${asked}: give a finite value`)
  const panels = placePanels(section, state.panels)
  const flow = solvePanels(panels)
  const alpha = 'alpha' in at ? at.alpha : flow.solved ? alphaForLift(flow, at.lift, state.mach) : null
  if (alpha === null) {
    const reason = flow.solved ? 'no angle gives this lift coefficient' : panelLoads(flow, 0).reason
    return notConverged(state, 'alpha' in at ? at.alpha : 0, reason)
  }
  const loads = panelLoads(flow, alpha, state.mach)
  if (!flow.solved) return notConverged(state, alpha, loads.reason)
  const { liftCoefficient, momentCoefficient, pressureCoefficient, reason } = loads
  const { x, y } = panels
  return {
    method: state.method,
    alpha,
    liftCoefficient,
    momentCoefficient,
    x,
    y,
    pressureCoefficient,
    layers: null,
    converged: true,
    reason,
  }
}

function notConverged(state: SectionState, alpha: number, reason: string): PressureResult {
  const none = new Float64Array(0)
  return {
    method: state.method,
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
