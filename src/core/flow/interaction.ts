import { cos, sin } from '../numerics/elementary'
import { factorInPlace, solveInPlace } from '../numerics/denseSolve'
import { LAMINAR, WAKE } from './boundaryLayer/stationRates'
import { marchLayer, STEEPEST, type EdgeLaw } from './boundaryLayer/march'
import { newStep, type Step } from './boundaryLayer/stationStep'
import type { Layer, TransitionLaw } from './boundaryLayer/layer'
import { linearise, newAnswers, type Answers } from './couplingSystem'
import {
  answeredSpeeds,
  arcLength,
  gather,
  joinWake,
  layersAt,
  nodeOf,
  startLayers,
  type Layers,
  type ViscousSetting,
} from './couplingState'
import {
  displacementAnswer,
  surfaceAnswer,
  traceWake,
  type DisplacementAnswer,
  type SurfaceAnswer,
} from './displacement'
import type { PanelFlow } from './vortexPanels'

/** A section made ready for viscous solutions; answers for wakes are kept as they are made. */
export interface ViscousSection {
  readonly flow: PanelFlow
  readonly surface: SurfaceAnswer
  readonly s: Float64Array
  readonly answers: Map<number, DisplacementAnswer>
  readonly step: Step
  readonly rows: Answers
  readonly matrix: Float64Array
}

/** A coupled solution, or the state at which the iteration stopped. */
export interface ViscousSolution {
  readonly alpha: number
  readonly layers: Layers
  readonly answer: DisplacementAnswer
  readonly converged: boolean
  /** Greatest balance or difference of edge speeds left. */
  readonly residual: number
  readonly iterations: number
}

/** Residual below which a solution counts as converged. */
export const CONVERGED = 1e-5
const MOST_ITERATIONS = 40
/** Steps without progress after which they are shortened. */
const PATIENCE = 5
/** Wakes are laid for whole steps of the angle, so that neighbours share them; rad. */
const WAKE_STEP = Math.PI / 180

export function prepareViscous(flow: PanelFlow): ViscousSection {
  const surface = surfaceAnswer(flow)
  const size = flow.panels.x.length + 24
  return {
    flow,
    surface,
    s: arcLength(flow),
    answers: new Map(),
    step: newStep(),
    rows: newAnswers(size),
    matrix: new Float64Array(size * size),
  }
}

export function answerAt(section: ViscousSection, alpha: number): DisplacementAnswer {
  const key = Math.round(alpha / WAKE_STEP)
  const known = section.answers.get(key)
  if (known) return known
  const answer = displacementAnswer(section.surface, traceWake(section.surface, key * WAKE_STEP))
  section.answers.set(key, answer)
  return answer
}

/**
 * Weight of a station's own answer in the local law. The neighbours' defects move with its own, so more than
 * the diagonal alone is felt; of 0.5, 1, 1.5, 2, 3, 4 and 10 those from 1.5 to 3 left the fewest points unsolved.
 */
const LOCAL_SHARE = 2

/** Sizes of the answers of edge speed to its own station's mass defect: the local interaction law. */
function edgeLaw(layer: Layer, answer: DisplacementAnswer, node: (i: number) => number): EdgeLaw {
  const own = new Float64Array(layer.count)
  for (let i = 0; i < layer.count; i++)
    own[i] = LOCAL_SHARE * Math.abs(answer.matrix[node(i) * (answer.size + 1)])
  return { speed: Float64Array.from(layer.u), answer: own, defect: Float64Array.from(layer.m) }
}

/** Marches both sides and the wake with the local interaction law about their present state. */
export function remarch(
  section: ViscousSection,
  layers: Layers,
  answer: DisplacementAnswer,
  setting: ViscousSetting,
  warm: boolean,
  steepest: number,
): boolean {
  const { stagnation, upper, lower, wake } = layers
  const nodes = upper.count + lower.count
  const sides: readonly (readonly [Layer, TransitionLaw, number])[] = [
    [upper, layers.upperLaw, 0],
    [lower, layers.lowerLaw, 1],
  ]
  let sound = true
  startLayers(layers, section.s, setting.stream)
  for (const [layer, law, side] of sides) {
    const edge = edgeLaw(layer, answer, (i) => nodeOf(stagnation, side, i))
    sound = marchLayer(layer, section.step, setting.stream, law, edge, 1, warm, steepest) < 0 && sound
  }
  const edge = edgeLaw(wake, answer, (k) => (k === 0 ? 0 : nodes + k - 1))
  joinWake(layers, setting.stream)
  const free = { amplification: Infinity, forcedAt: Infinity }
  return marchLayer(wake, section.step, setting.stream, free, edge, 1, warm, steepest) < 0 && sound
}

/** Layers from nothing: speeds of the potential flow, marched once. */
export function coldLayers(section: ViscousSection, alpha: number, setting: ViscousSetting): Layers {
  const answer = answerAt(section, alpha)
  const [ca, sa] = [cos(alpha), sin(alpha)]
  const nodes = section.s.length
  const speed = Float64Array.from(answer.along, (a, i) => a * ca + answer.across[i] * sa)
  const layers = layersAt(section.flow, section.s, stagnationNode(speed, nodes), answer.wake.s, setting)
  setSpeeds(layers, speed)
  remarch(section, layers, answer, setting, false, STEEPEST)
  return layers
}

/** Last node before the first change of sign of the vorticity; the ends of the section are never chosen. */
function stagnationNode(speed: Float64Array, nodes: number): number {
  for (let i = 1; i < nodes - 3; i++) if (speed[i] > 0 && speed[i + 1] <= 0) return i
  return nodes >> 1
}

function setSpeeds({ upper, lower, wake, stagnation }: Layers, speed: Float64Array): void {
  const nodes = upper.count + lower.count
  for (let i = 0; i < upper.count; i++) upper.u[i] = Math.max(speed[nodeOf(stagnation, 0, i)], LEAST_SPEED)
  for (let i = 0; i < lower.count; i++) lower.u[i] = Math.max(-speed[nodeOf(stagnation, 1, i)], LEAST_SPEED)
  wake.u[0] = upper.u[upper.count - 1]
  for (let k = 1; k < wake.count; k++) wake.u[k] = speed[nodes + k - 1]
}

/** Edge speed kept at a first station when the stagnation point falls on its node. */
const LEAST_SPEED = 1e-7

/** Relative change below which a step is small: layers may then be as steep as they like. */
const SMALL_STEP = 0.1

/** Greatest relative changes that a full step may make. */
const GREATEST_RELATIVE = 0.6
const GREATEST_SPEED_CHANGE = 0.25
/** Least shape factor after a step; closures have none below 1, and false solutions with such layers exist. */
const LEAST_SHAPE = 1.05
/** A step is not shortened further for the sake of a few stations: those are held back alone. */
const LEAST_SCALE = 0.1

/**
 * Solves layers, wake and potential flow together by Newton's method from `start` (used up) at a fixed
 * angle. Between steps the layers are marched anew with a local interaction law.
 */
export function solveAtAngle(
  section: ViscousSection,
  setting: ViscousSetting,
  start: Layers,
  alpha: number,
): ViscousSolution {
  const answer = answerAt(section, alpha)
  const { size } = answer
  const nodes = section.s.length
  const { rows, matrix, step, s } = section
  const [speed, defect, signed] = [new Float64Array(size), new Float64Array(size), new Float64Array(size)]
  const change = new Float64Array(size)
  let layers = start
  let residual = Infinity
  let last = Infinity
  let released = false
  let best = Infinity
  let idle = 0
  for (let n = 0; n < MOST_ITERATIONS; n++) {
    remarch(section, layers, answer, setting, true, released ? Infinity : STEEPEST)
    joinWake(layers, setting.stream)
    const balance = linearise(
      rows,
      layers,
      step,
      setting.stream,
      s[layers.stagnation + 1] - s[layers.stagnation],
    )
    gather(layers, speed, defect)
    answeredSpeeds(answer, alpha, layers.stagnation, defect, signed)
    let gapSize = 0
    for (let g = 0; g < size; g++) {
      const sign = g <= layers.stagnation || g >= nodes ? 1 : -1
      const error = sign * signed[g] - speed[g]
      gapSize = Math.max(gapSize, Math.abs(error))
      change[g] = error - rows.u0[g]
      const row = g * size
      for (let j = 0; j < size; j++) {
        const signJ = j <= layers.stagnation ? -1 : 1
        matrix[row + j] = rows.u[row + j] - sign * signJ * answer.matrix[row + j]
      }
    }
    residual = Math.max(gapSize, balance)
    if (!(residual < 1e6)) break
    idle = residual < 0.7 * best ? 0 : idle + 1
    best = Math.min(best, residual)
    if (last < SMALL_STEP && idle >= 2) released = true
    // A transition that hops between two intervals keeps full steps from settling: shorter ones do not overshoot.
    const share = idle < PATIENCE ? 1 : idle % 2 === 0 ? 0.5 : 0.25
    if (residual < CONVERGED) {
      return { alpha, layers, answer, converged: isSound(layers), residual, iterations: n }
    }
    const factors = factorInPlace(matrix, size)
    if (factors.singular) break
    solveInPlace(factors, change)
    ;({ layers, last } = apply(section, setting, layers, rows, change, answer, share))
  }
  return { alpha, layers, answer, converged: false, residual, iterations: MOST_ITERATIONS }
}

/** Whether every shape factor on the surface is above one, as that of a real layer is. */
function isSound({ upper, lower }: Layers): boolean {
  return [upper, lower].every(({ m, u, t }) => m.every((defect, i) => i === 0 || defect > u[i] * t[i]))
}

/** Adds a step, shortened so that no variable changes too much; moves the stagnation point when it must. */
function apply(
  section: ViscousSection,
  setting: ViscousSetting,
  layers: Layers,
  rows: Answers,
  change: Float64Array,
  answer: DisplacementAnswer,
  share: number,
): { layers: Layers; last: number } {
  const { size } = rows
  const { upper, lower, wake, stagnation } = layers
  const nodes = upper.count + lower.count
  const dq = new Float64Array(size)
  const dt = new Float64Array(size)
  const du = new Float64Array(size)
  for (let g = 0; g < size; g++) {
    let [q, t, u] = [rows.q0[g], rows.t0[g], rows.u0[g]]
    const row = g * size
    for (let j = 0; j < size; j++) {
      q += rows.q[row + j] * change[j]
      t += rows.t[row + j] * change[j]
      u += rows.u[row + j] * change[j]
    }
    ;[dq[g], dt[g], du[g]] = [q, t, u]
  }
  let scale = share
  let last = 0
  const limit = (size: number, most: number): void => {
    last = Math.max(last, size)
    if (size * scale > most) scale = most / size
  }
  const parts: readonly (readonly [Layer, (i: number) => number, number])[] = [
    [upper, (i) => stagnation - i, 0],
    [lower, (i) => stagnation + 1 + i, 0],
    [wake, (k) => nodes + k - 1, 1],
  ]
  for (const [layer, at, first] of parts) {
    for (let i = Math.max(first, 1); i < layer.count; i++) {
      const g = at(i)
      limit(Math.abs(dt[g]) / layer.t[i], GREATEST_RELATIVE)
      limit(Math.abs(change[g]) / layer.m[i], GREATEST_RELATIVE)
      if (layer.kind[i] !== LAMINAR) limit(Math.abs(dq[g]) / layer.q[i], GREATEST_RELATIVE)
      limit(Math.abs(du[g]), GREATEST_SPEED_CHANGE)
    }
  }
  scale = Math.max(scale, LEAST_SCALE)
  for (const [layer, at, first] of parts) {
    for (let i = first; i < layer.count; i++) {
      const g = at(i)
      if (i === 0 && layer !== wake) {
        // Its thickness and mass defect follow from the speed.
        layer.u[0] += Math.max(-GREATEST_SPEED_CHANGE, Math.min(GREATEST_SPEED_CHANGE, scale * du[g]))
        continue
      }
      const within = (change: number, most: number): number => Math.max(-most, Math.min(most, scale * change))
      if (layer.kind[i] === LAMINAR) layer.q[i] = Math.max(layer.q[i] + scale * dq[g], 0)
      else layer.q[i] += within(dq[g], GREATEST_RELATIVE * layer.q[i])
      layer.t[i] += within(dt[g], GREATEST_RELATIVE * layer.t[i])
      layer.m[i] += within(change[g], GREATEST_RELATIVE * layer.m[i])
      layer.u[i] += within(du[g], GREATEST_SPEED_CHANGE)
      if (layer !== wake) layer.m[i] = Math.max(layer.m[i], LEAST_SHAPE * layer.t[i] * layer.u[i])
    }
  }
  return { layers: placeStagnation(section, setting, layers, answer), last }
}

/**
 * How far the stagnation point may lie beyond its interval before it is moved to the next, as a share of the
 * interval. Neighbouring intervals are not quite alike: without a band in which both serve, a point on a node
 * would be passed to and fro.
 */
const FAR_SIDE = 0.1

/** Rebuilds the layers when the speed at a first station has changed sign. */
export function placeStagnation(
  section: ViscousSection,
  setting: ViscousSetting,
  layers: Layers,
  answer: DisplacementAnswer,
): Layers {
  const { upper, lower, wake, stagnation } = layers
  const nodes = upper.count + lower.count
  let to = stagnation
  const far = (layer: Layer, other: Layer, i: number): boolean =>
    layer.u[i] < (i === 0 && layer.transition.at > 1 ? -FAR_SIDE * other.u[0] : 0)
  for (let i = 0; i < upper.count - 4 && far(upper, lower, i); i++) to--
  if (to === stagnation) for (let i = 0; i < lower.count - 4 && far(lower, upper, i); i++) to++
  if (to === stagnation) {
    for (const layer of [upper, lower]) {
      for (let i = 1; i < layer.count; i++) layer.u[i] = Math.max(layer.u[i], LEAST_SPEED)
      if (Math.abs(layer.u[0]) < LEAST_SPEED) layer.u[0] = LEAST_SPEED
    }
    return layers
  }
  const moved = layersAt(section.flow, section.s, to, answer.wake.s, setting)
  for (let g = 0; g < nodes; g++) {
    const [from, i] = g <= stagnation ? [upper, stagnation - g] : [lower, g - stagnation - 1]
    const [into, k] = g <= to ? [moved.upper, to - g] : [moved.lower, g - to - 1]
    const flips = g <= stagnation !== g <= to
    into.kind[k] = flips ? LAMINAR : from.kind[i]
    into.q[k] = flips ? 0 : from.q[i]
    into.t[k] = from.t[i]
    into.u[k] = Math.max(flips ? -from.u[i] : from.u[i], LEAST_SPEED)
    into.m[k] = flips ? 2.24 * into.t[k] * into.u[k] : from.m[i]
  }
  copyWake(wake, moved.wake)
  startLayers(moved, section.s, setting.stream)
  return moved
}

function copyWake(from: Layer, to: Layer): void {
  to.q.set(from.q)
  to.t.set(from.t)
  to.m.set(from.m)
  to.u.set(from.u)
  to.kind.fill(WAKE)
}
