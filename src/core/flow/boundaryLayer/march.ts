import type { Layer, TransitionLaw } from './layer'
import { EQUILIBRIUM, LAMINAR, stationRates, TURBULENT, type LayerKind, type Stream } from './stationRates'
import { findTransition, meanGrowth, stationStep, type Step } from './stationStep'
import { STARTING_SHEAR_SHARE } from './turbulentClosure'

/**
 * How the edge speed answers to the layer at a station: u = speed + answer (m - defect). With answer 0 the
 * speed is prescribed (the direct problem), with a large answer the mass defect is (the inverse problem);
 * between lies the local interaction law of Veldman (AIAA Journal 19(1), 1981, 79-85), which has no
 * singularity at separation.
 */
export interface EdgeLaw {
  readonly speed: Float64Array
  readonly answer: Float64Array
  readonly defect: Float64Array
}

/** Most steps of the local Newton method at a station. */
const MOST_STEPS = 30
/** Balance at which a station is solved. */
const SOLVED = 1e-10
/** Greatest relative change of a variable in one step. */
const GREATEST_CHANGE = 0.3

/**
 * Marches a layer downstream from station `from` (whose predecessor is known, as is station 0), solving the
 * balances at each station together with the edge law. Arrays of `layer` hold the first guess where `warm`,
 * else each station starts from the one before. Stations that find no solution keep the values of the guess
 * with the smallest balances; the first of them is returned, -1 if there is none.
 */
export function marchLayer(
  layer: Layer,
  step: Step,
  stream: Stream,
  law: TransitionLaw,
  edge: EdgeLaw,
  from: number,
  warm: boolean,
  steepest = Infinity,
): number {
  let failed = -1
  const { kind, transition, x } = layer
  layer.transition.at = layer.kind[0] === LAMINAR ? layer.count : -1
  refreshRates(layer, stream, 0, from)
  for (let i = from; i < layer.count; i++) {
    const old = layer.kind[i]
    setKind(layer, step, i, law)
    if (!warm || old !== layer.kind[i]) guessFromBefore(layer, i, stream, warm)
    if (!warm && edge.answer[i] > 0) predict(layer, edge, i)
    let solved = solveStation(layer, step, i, stream, edge)
    if (kind[i - 1] === TURBULENT && i !== transition.at) {
      const most = shapeOf(layer, i - 1) + (steepest * (x[i] - x[i - 1])) / layer.t[i - 1]
      if (shapeOf(layer, i) > most) solved = solveAtShape(layer, step, i, stream, most)
    }
    if (!solved && failed < 0) failed = i
  }
  return failed
}

/**
 * Greatest rise t dH/dx of a turbulent layer. Layers that separate on the way to the stall reach 0.25; the
 * balances over one short interval have a second, false root beyond, separated in a single step.
 */
export const STEEPEST = 0.3

const shapeOf = ({ m, u, t }: Layer, i: number): number => m[i] / (u[i] * t[i])

/** Newton's method for (q, t, u) of a turbulent station whose shape factor is given. */
function solveAtShape(layer: Layer, step: Step, i: number, stream: Stream, H: number): boolean {
  const { q, t, m, u } = layer
  q[i] = q[i - 1]
  t[i] = t[i - 1]
  u[i] = u[i - 1]
  for (let n = 0; n < MOST_STEPS; n++) {
    stationStep(step, layer, i, stream, q[i], t[i], H * t[i], u[i])
    m[i] = u[i] * H * t[i]
    const { balance, here } = step
    if (Math.abs(balance[0]) + Math.abs(balance[1]) + Math.abs(balance[2]) < SOLVED) return true
    for (let r = 0; r < 3; r++) {
      here[4 * r + 1] += H * here[4 * r + 2]
      here[4 * r + 2] = here[4 * r + 3]
    }
    const change = solve3(step, (r) => here[4 * r + 2])
    if (change === null) return false
    const most = Math.max(Math.abs(change[0]) / q[i], Math.abs(change[1]) / t[i], Math.abs(change[2]) / u[i])
    const scale = Math.min(1, GREATEST_CHANGE / most)
    q[i] += scale * change[0]
    t[i] += scale * change[1]
    u[i] += scale * change[2]
  }
  return false
}

function refreshRates(layer: Layer, stream: Stream, first: number, end: number): void {
  for (let i = first; i < end; i++) refreshStation(layer, i, stream)
}

/**
 * Recomputes the rates of station i from its state. A first station may lie a little on the far side of the
 * stagnation point, where its speed and mass defect are negative: its thicknesses are those of the near side.
 */
export function refreshStation({ kind, q, t, m, u, rates }: Layer, i: number, stream: Stream): void {
  stationRates(rates[i], kind[i] as LayerKind, stream, q[i], t[i], m[i] / u[i], Math.abs(u[i]))
}

/** Without a former state the law is centred on a displacement thickness that stays as it is. */
function predict({ m, u, kind, t }: Layer, edge: EdgeLaw, i: number): void {
  const growth = Math.max(edge.speed[i] / u[i - 1], 1)
  u[i] = edge.speed[i]
  m[i] *= growth
  if (growth > 1.2 && kind[i] === LAMINAR) t[i] = t[i - 1]
  edge.defect[i] = m[i]
}

/** Kind of station i from the one before and from the transition law. */
function setKind(layer: Layer, step: Step, i: number, law: TransitionLaw): void {
  const before = layer.kind[i - 1]
  if (before !== LAMINAR) {
    layer.kind[i] = before
    return
  }
  meanGrowth(step, layer, i)
  layer.kind[i] = findTransition(step, layer, i, law) ? TURBULENT : LAMINAR
}

/** First guess of a station: the one before, and when it has just turned turbulent a shape to match. */
function guessFromBefore(layer: Layer, i: number, stream: Stream, warm: boolean): void {
  const { kind, q, t, m, u, rates } = layer
  if (kind[i] === kind[i - 1]) {
    q[i] = q[i - 1]
    if (warm && kind[i] === LAMINAR) return
    t[i] = t[i - 1]
    m[i] = m[i - 1]
    u[i] = u[i - 1]
    return
  }
  if (!warm) {
    t[i] = 1.05 * t[i - 1]
    u[i] = u[i - 1]
    m[i] = 0.7 * m[i - 1]
  }
  stationRates(rates[i], TURBULENT, stream, 0.03, t[i], m[i] / u[i], u[i])
  q[i] = Math.sqrt(STARTING_SHEAR_SHARE) * Math.min(rates[i][EQUILIBRIUM], 0.2)
}

/** Newton's method for (q, t, m) of one station; u follows the edge law. */
function solveStation(layer: Layer, step: Step, i: number, stream: Stream, edge: EdgeLaw): boolean {
  const { q, t, m, u, kind } = layer
  const laminar = kind[i] === LAMINAR
  const answer = edge.answer[i]
  const speedAt = (defect: number): number =>
    Math.max(edge.speed[i] + answer * (defect - edge.defect[i]), 0.2 * u[i - 1])
  if (laminar) q[i] = q[i - 1] + step.growth * (layer.x[i] - layer.x[i - 1])
  u[i] = speedAt(m[i])
  let best = Infinity
  let bestAt = [q[i], t[i], m[i], u[i]]
  for (let n = 0; n < MOST_STEPS; n++) {
    const d = m[i] / u[i]
    stationStep(step, layer, i, stream, q[i], t[i], d, u[i])
    const { balance, here } = step
    const size = Math.abs(balance[0]) + Math.abs(balance[1]) + (laminar ? 0 : Math.abs(balance[2]))
    if (size < best) {
      best = size
      bestAt = [q[i], t[i], m[i], u[i]]
    }
    if (size < SOLVED) return true
    // d = m/u and u = u(m): one column for m.
    const dm = 1 / u[i] - (d * answer) / u[i]
    const column = (r: number): number => here[4 * r + 2] * dm + here[4 * r + 3] * answer
    const change = laminar ? solve2(step, column) : solve3(step, column)
    if (change === null) break
    let scale = 1
    const limit = (part: number): void => {
      if (Math.abs(part) * scale > GREATEST_CHANGE) scale = GREATEST_CHANGE / Math.abs(part)
    }
    if (!laminar) limit(change[0] / q[i])
    limit(change[1] / t[i])
    limit(change[2] / m[i])
    if (!laminar) q[i] += scale * change[0]
    t[i] += scale * change[1]
    m[i] = Math.max(m[i] + scale * change[2], 1.01 * t[i] * Math.min(u[i], speedAt(m[i])))
    u[i] = speedAt(m[i])
  }
  ;[q[i], t[i], m[i], u[i]] = bestAt
  stationStep(step, layer, i, stream, q[i], t[i], m[i] / u[i], u[i])
  return best < 1e-6
}

type Column = (row: number) => number

/** Change of (q, t, m) that brings the first two balances to zero, with q fixed. */
function solve2({ balance, here }: Step, column: Column): readonly [number, number, number] | null {
  const c0 = column(0)
  const c1 = column(1)
  const det = here[1] * c1 - here[5] * c0
  if (det === 0) return null
  return [0, (-balance[0] * c1 + balance[1] * c0) / det, (-here[1] * balance[1] + here[5] * balance[0]) / det]
}

/** Change of (q, t, m) that brings all three balances to zero, by Cramer's rule. */
function solve3({ balance, here }: Step, column: Column): readonly [number, number, number] | null {
  const [a, b, c] = [here[0], here[1], column(0)]
  const [d, e, f] = [here[4], here[5], column(1)]
  const [g, h, k] = [here[8], here[9], column(2)]
  const [x, y, z] = [-balance[0], -balance[1], -balance[2]]
  const det = a * (e * k - f * h) - b * (d * k - f * g) + c * (d * h - e * g)
  if (det === 0) return null
  return [
    (x * (e * k - f * h) - b * (y * k - f * z) + c * (y * h - e * z)) / det,
    (a * (y * k - f * z) - x * (d * k - f * g) + c * (d * z - y * g)) / det,
    (a * (e * z - y * h) - b * (d * z - y * g) + x * (d * h - e * g)) / det,
  ]
}
