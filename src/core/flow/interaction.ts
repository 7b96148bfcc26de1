import { factorInPlace, solveInPlace } from '../numerics/denseSolve'
import { STEEPEST } from './boundaryLayer/march'
import { answeredSpeeds, gather, type Layers, type ViscousSetting } from './couplingState'
import { linearise } from './couplingSystem'
import type { DisplacementAnswer } from './displacement'
import { newtonStep } from './newtonStep'
import { remarch } from './remarch'
import { placeStagnation } from './stagnationPlace'
import { answerAt, systemFor, type LinearSystem, type ViscousSection } from './viscousSection'

/** A coupled solution, or the state at which the iteration stopped. */
export interface ViscousSolution {
  /** rad */
  readonly alpha: number
  readonly layers: Layers
  readonly answer: DisplacementAnswer
  readonly converged: boolean
  /** Greatest balance or difference of edge speeds left, in units of the stream's speed. */
  readonly residual: number
  readonly iterations: number
}

/** Residual below which a solution counts as converged. */
export const CONVERGED = 1e-5
const MOST_ITERATIONS = 40
/** Steps without progress after which they are shortened. */
const PATIENCE = 5
/** Steps without progress after which there will be none. */
const HOPELESS = 16
/** Relative change below which a step is small: layers may then be as steep as they like. */
const SMALL_STEP = 0.1
/** A linear system is used again as long as a step with it leaves less than this share of the residual. */
const GOOD_STEP = 0.3
/** Intervals by which a transition may have moved for that; 1 takes 6 % longer, 0 25 %. */
const NEAR = 2

/**
 * Solves layers, wake and potential flow together by Newton's method from `start` (used up) at a fixed angle
 * (rad). The unknowns are the mass defects; everything else of the layers answers to them (couplingSystem).
 * Between steps the layers are marched anew with a local interaction law, so that what is left is the
 * difference between the edge speeds of the layers and those of the potential flow. A factored system serves
 * as long as it brings the residual down and the transition stays near, also from one angle to
 * the next unless the start is to be `fresh`. Bounded: at most 40 steps.
 */
export function solveAtAngle(
  section: ViscousSection,
  setting: ViscousSetting,
  start: Layers,
  alpha: number,
  { tolerance = CONVERGED, fresh = false }: { readonly tolerance?: number; readonly fresh?: boolean } = {},
): ViscousSolution {
  const answer = answerAt(section, alpha)
  const system = systemFor(section, `${setting.tripUpper} ${setting.tripLower}`)
  if (fresh) system.factors = null
  const change = new Float64Array(answer.size)
  let layers = start
  let [residual, best, last, idle, released] = [Infinity, Infinity, Infinity, 0, false]
  let n = 0
  for (; n < MOST_ITERATIONS; n++) {
    const sound = remarch(section, layers, answer, setting, true, released ? Infinity : STEEPEST)
    const before = residual
    residual = speedDifferences(layers, answer, alpha, change)
    const balances = sound
      ? 0
      : linearise(system.rows, layers, section.step, setting.stream, gapOf(section, layers))
    residual = Math.max(residual, balances)
    if (!(residual < 1e6)) break
    if (residual < tolerance) {
      return { alpha, layers, answer, converged: isSound(layers), residual, iterations: n }
    }
    idle = residual < 0.7 * best ? 0 : idle + 1
    best = Math.min(best, residual)
    if (last < SMALL_STEP && idle >= 2) released = true
    if (idle > HOPELESS) break
    const serves = sound && holdsFor(system, layers) && (n === 0 || residual < GOOD_STEP * before)
    if (!serves) {
      if (sound) linearise(system.rows, layers, section.step, setting.stream, gapOf(section, layers))
      factorSystem(system, layers, answer)
      if (system.factors === null) break
    }
    for (let g = 0; g < change.length; g++) change[g] -= system.rows.u0[g]
    solveInPlace(system.factors!, change)
    // A transition that hops between two intervals keeps full steps from settling: shorter ones do not overshoot.
    const share = idle < PATIENCE ? 1 : idle % 2 === 0 ? 0.5 : 0.25
    last = newtonStep(layers, system.rows, change, share)
    // The constants are the balances left, which a system that is used again must not subtract twice.
    clearConstants(system)
    layers = placeStagnation(section, setting, layers)
  }
  return { alpha, layers, answer, converged: false, residual, iterations: n }
}

/** Length of the interval that holds the stagnation point, chords. */
const gapOf = ({ s }: ViscousSection, { stagnation }: Layers): number => s[stagnation + 1] - s[stagnation]

/** Edge speeds of the potential flow less those of the layers, into `out`; returns the greatest size. */
function speedDifferences(
  layers: Layers,
  answer: DisplacementAnswer,
  alpha: number,
  out: Float64Array,
): number {
  const { size } = answer
  const { stagnation, upper, lower } = layers
  const nodes = upper.count + lower.count
  const [speed, defect] = [new Float64Array(size), new Float64Array(size)]
  gather(layers, speed, defect)
  answeredSpeeds(answer, alpha, stagnation, defect, out)
  let greatest = 0
  for (let g = 0; g < size; g++) {
    out[g] = (g <= stagnation || g >= nodes ? out[g] : -out[g]) - speed[g]
    greatest = Math.max(greatest, Math.abs(out[g]))
  }
  return greatest
}

/** Whether a system was made for the same stagnation interval and for transition near where it is. */
function holdsFor({ factors, stagnation, upper, lower }: LinearSystem, layers: Layers): boolean {
  return (
    factors !== null &&
    stagnation === layers.stagnation &&
    Math.abs(upper - layers.upper.transition.at) <= NEAR &&
    Math.abs(lower - layers.lower.transition.at) <= NEAR
  )
}

/** Factors (speed of the layers less that of the potential flow) by the mass defects, for the rows of `system`. */
function factorSystem(system: LinearSystem, layers: Layers, answer: DisplacementAnswer): void {
  const { rows, matrix } = system
  const { size } = answer
  const { stagnation, upper, lower } = layers
  const nodes = upper.count + lower.count
  for (let g = 0, row = 0; g < size; g++, row += size) {
    const sign = g <= stagnation || g >= nodes ? 1 : -1
    for (let j = 0; j <= stagnation; j++) matrix[row + j] = rows.u[row + j] + sign * answer.matrix[row + j]
    for (let j = stagnation + 1; j < size; j++) {
      matrix[row + j] = rows.u[row + j] - sign * answer.matrix[row + j]
    }
  }
  const factors = factorInPlace(matrix, size)
  system.factors = factors.singular ? null : factors
  system.stagnation = stagnation
  system.upper = upper.transition.at
  system.lower = lower.transition.at
}

function clearConstants({ rows }: LinearSystem): void {
  rows.q0.fill(0)
  rows.t0.fill(0)
  rows.u0.fill(0)
}

/** Whether every shape factor on the surface is above one, as that of a real layer is. */
function isSound({ upper, lower }: Layers): boolean {
  return [upper, lower].every(({ m, u, t }) => m.every((defect, i) => i === 0 || defect > u[i] * t[i]))
}
