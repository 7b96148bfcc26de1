import { intervalBalance, SLOPES } from './intervalBalance'
import { log } from '../../numerics/elementary'
import type { Layer, TransitionLaw } from './layer'
import {
  EQUILIBRIUM,
  GROWTH,
  LAMINAR,
  LOG_SPEED,
  RATES_LENGTH,
  stationRates,
  TURBULENT,
  type LayerKind,
  type Stream,
} from './stationRates'
import { STARTING_SHEAR_SHARE } from './turbulentClosure'

/**
 * Workspace and result of the equations that join a station to the one before: three balances and their
 * derivatives with respect to (q, t, d, u) before, here, and to the share of the interval before transition.
 */
export interface Step {
  readonly balance: Float64Array
  /** 3 x 4 */
  readonly before: Float64Array
  readonly here: Float64Array
  readonly share: Float64Array
  readonly slopes: Float64Array
  readonly more: Float64Array
  readonly moreSlopes: Float64Array
  readonly atLaminar: Float64Array
  readonly atTurbulent: Float64Array
  /** Mean amplification rate over the interval and its derivatives by the rates of the two stations before. */
  growth: number
  growthBefore: number
  growthFarther: number
}

export function newStep(): Step {
  const array = (n: number): Float64Array => new Float64Array(n)
  return {
    balance: array(3),
    before: array(12),
    here: array(12),
    share: array(3),
    slopes: array(3 * SLOPES),
    more: array(3),
    moreSlopes: array(3 * SLOPES),
    atLaminar: array(RATES_LENGTH),
    atTurbulent: array(RATES_LENGTH),
    growth: 0,
    growthBefore: 0,
    growthFarther: 0,
  }
}

/**
 * Mean amplification rate between stations i - 1 and i, from the two stations before alone (the formula of
 * Adams and Bashforth, of second order): what happens behind the transition cannot move it.
 */
export function meanGrowth(step: Step, layer: Layer, i: number): void {
  const near = layer.rates[i - 1][GROWTH]
  const far = i > 1 ? layer.rates[i - 2][GROWTH] : near
  const reach = i > 1 ? (0.5 * (layer.x[i] - layer.x[i - 1])) / (layer.x[i - 1] - layer.x[i - 2]) : 0
  const mean = near + reach * (near - far)
  // Held between half and double the nearer rate, where the onset or noise makes a line through two a poor guide.
  if (mean < 0.5 * near || mean > 2 * near) {
    const factor = mean < 0.5 * near ? 0.5 : 2
    step.growth = factor * near
    step.growthBefore = factor
    step.growthFarther = 0
  } else {
    step.growth = mean
    step.growthBefore = 1 + reach
    step.growthFarther = -reach
  }
}

/**
 * Finds whether the layer turns turbulent between station i - 1 (laminar) and i, and sets layer.transition:
 * where N reaches its critical value or at the forced place, whichever comes first. Needs meanGrowth.
 */
export function findTransition(step: Step, layer: Layer, i: number, law: TransitionLaw): boolean {
  const dx = layer.x[i] - layer.x[i - 1]
  const room = law.amplification - layer.q[i - 1]
  const natural = step.growth * dx > 0 ? Math.max(room, 0) / (step.growth * dx) : Infinity
  const forced = Math.max((law.forcedAt - layer.x[i - 1]) / dx, 0)
  if (Math.min(natural, forced) > 1) return false
  layer.transition.at = i
  layer.transition.forced = forced <= natural
  layer.transition.share = Math.max(Math.min(natural, forced), LEAST_SHARE)
  return true
}

/** The part before the transition is never quite empty, so that logarithms and derivatives exist. */
const LEAST_SHARE = 1e-4

/**
 * Balances between station i - 1 and i with (q, t, d, u) given here; layer.rates[i - 1] and layer.kind must
 * be set, and layer.rates[i] is set here. The laminar third balance is that of the amplification, a tenth of
 * N - N1 - (mean rate) dx.
 */
export function stationStep(
  step: Step,
  layer: Layer,
  i: number,
  stream: Stream,
  q: number,
  t: number,
  d: number,
  u: number,
): void {
  const kind = layer.kind[i] as LayerKind
  const dx = layer.x[i] - layer.x[i - 1]
  const here = layer.rates[i]
  stationRates(here, kind, stream, q, t, d, u)
  const q1 = layer.q[i - 1]
  const t1 = layer.t[i - 1]
  const u1 = layer.u[i - 1]
  if (i === layer.transition.at) {
    transitionStep(step, layer, i, stream, q, t, d, u)
    return
  }
  const { balance, slopes, before, here: after } = step
  if (i === 1 && kind === LAMINAR && u1 < NEAR_STAGNATION * u) startStep(step, layer, here, t1, u1, t, u, dx)
  else intervalBalance(balance, slopes, kind, layer.rates[i - 1], here, q1, t1, u1, q, t, u, dx)
  for (let r = 0; r < 3; r++) {
    for (let j = 0; j < 4; j++) {
      before[4 * r + j] = slopes[SLOPES * r + j]
      after[4 * r + j] = slopes[SLOPES * r + 4 + j]
    }
  }
  step.share.fill(0)
  if (kind === LAMINAR) {
    balance[2] = 0.1 * (q - q1 - step.growth * dx)
    for (let j = 0; j < 4; j++) before[8 + j] = after[8 + j] = 0
    after[8] = 0.1
    before[8] = -0.1
  }
}

/** Share of the next station's speed below which the first station counts as the stagnation point itself. */
const NEAR_STAGNATION = 0.1

/**
 * First interval when its beginning is all but the stagnation point: u = a x there and the layer is similar,
 * so the balances hold from any place on; they are taken from where the speed is a tenth of the next one.
 */
function startStep(
  step: Step,
  layer: Layer,
  here: Float64Array,
  t1: number,
  u1: number,
  t: number,
  u: number,
  dx: number,
): void {
  const { slopes, atLaminar } = step
  const start = NEAR_STAGNATION * u
  const part = (u - start) / (u - u1)
  atLaminar.set(layer.rates[0])
  atLaminar[LOG_SPEED] += log(start / Math.abs(u1))
  atLaminar[LOG_SPEED + 4] = 1 / start
  intervalBalance(step.balance, slopes, LAMINAR, atLaminar, here, 0, t1, start, 0, t, u, part * dx)
  for (let row = 0; row < 2 * SLOPES; row += SLOPES) {
    const byLength = (slopes[row + 8] * dx * part) / (u - u1)
    slopes[row + 7] += NEAR_STAGNATION * slopes[row + 3] - (byLength * u1) / u
    slopes[row + 3] = byLength
  }
}

/**
 * The interval with the transition: laminar up to it, turbulent behind, the state there linear between the
 * two stations, and shear stress starting from a share of its equilibrium. Sums of both parts' balances.
 */
function transitionStep(
  step: Step,
  layer: Layer,
  i: number,
  stream: Stream,
  q: number,
  t: number,
  d: number,
  u: number,
): void {
  const f = layer.transition.share
  const g = 1 - f
  const dx = layer.x[i] - layer.x[i - 1]
  const q1 = layer.q[i - 1]
  const t1 = layer.t[i - 1]
  const u1 = layer.u[i - 1]
  const d1 = layer.m[i - 1] / u1
  const tt = g * t1 + f * t
  const dt = g * d1 + f * d
  const ut = g * u1 + f * u
  const { balance, slopes, more, moreSlopes, atLaminar, atTurbulent } = step
  stationRates(atLaminar, LAMINAR, stream, 0, tt, dt, ut)
  stationRates(atTurbulent, TURBULENT, stream, 0.03, tt, dt, ut)
  const root = Math.sqrt(STARTING_SHEAR_SHARE)
  const start = root * atTurbulent[EQUILIBRIUM]
  const startSlope = [0, 0, 0, 0]
  for (let j = 1; j < 4; j++) startSlope[j] = root * atTurbulent[EQUILIBRIUM + 1 + j]
  stationRates(atTurbulent, TURBULENT, stream, start, tt, dt, ut)
  intervalBalance(balance, slopes, LAMINAR, layer.rates[i - 1], atLaminar, q1, t1, u1, 0, tt, ut, f * dx)
  intervalBalance(more, moreSlopes, TURBULENT, atTurbulent, layer.rates[i], start, tt, ut, q, t, u, g * dx)
  const change = [0, t - t1, d - d1, u - u1]
  for (let r = 0; r < 3; r++) {
    const row = SLOPES * r
    let byShare = (slopes[row + 8] - moreSlopes[row + 8]) * dx
    balance[r] += more[r]
    step.before[4 * r] = slopes[row]
    step.here[4 * r] = moreSlopes[row + 4]
    for (let j = 1; j < 4; j++) {
      const inner = slopes[row + 4 + j] + moreSlopes[row + j] + moreSlopes[row] * startSlope[j]
      step.before[4 * r + j] = slopes[row + j] + g * inner
      step.here[4 * r + j] = moreSlopes[row + 4 + j] + f * inner
      byShare += inner * change[j]
    }
    step.share[r] = layer.transition.forced ? 0 : byShare
  }
}
