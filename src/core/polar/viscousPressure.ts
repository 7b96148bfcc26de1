import type { ViscousSetting } from '../flow/couplingState'
import type { ViscousSolution } from '../flow/interaction'
import { alphaForLift } from '../flow/panelLoads'
import { sideLayer } from '../flow/surfaceLayers'
import { viscousLoads } from '../flow/viscousLoads'
import type { ViscousSection } from '../flow/viscousSection'
import { BadInput } from '../numerics/errors'
import type { Section } from '../shape/section'
import type { Operating, PressureResult, SectionState } from './state'
import { solvePoint, type MarchedPoint } from './viscousMarch'
import { failureOf, marksOf } from './viscousPoint'
import { NO_PANELS, readySection, settingOf } from './viscousState'

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
    // Copies: results may be handed to another thread, and the section is used again.
    x: ready.flow.panels.x.slice(),
    y: ready.flow.panels.y.slice(),
    pressureCoefficient: loads.pressureCoefficient,
    layers: {
      upper: sideLayer(ready.flow, solution.layers, 0),
      lower: sideLayer(ready.flow, solution.layers, 1),
      dragCoefficient: loads.dragCoefficient,
      frictionDrag: loads.frictionDrag,
      pressureDrag: loads.pressureDrag,
    },
    converged: true,
    reason: marksOf(loads, setting),
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
