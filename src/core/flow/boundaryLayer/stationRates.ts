import { log, power } from '../../numerics/elementary'
import { amplificationRate } from './envelope'
import { laminarDissipation, laminarEnergyShape, laminarFriction } from './laminarClosure'
import {
  equilibriumShear,
  layerThickness,
  slipVelocity,
  turbulentEnergyShape,
  turbulentFriction,
} from './turbulentClosure'

/** What a layer is at a station. */
export const LAMINAR = 0
export const TURBULENT = 1
export const WAKE = 2
export type LayerKind = typeof LAMINAR | typeof TURBULENT | typeof WAKE

/** The stream outside: chord Reynolds number and free-stream Mach number. */
export interface Stream {
  readonly reynolds: number
  readonly mach: number
}

/**
 * Rows of the rates of a station; each row holds a value and its derivatives with respect to the four
 * variables q, t, d, u: q the root of the shear stress coefficient (turbulent; unused when laminar), t the
 * momentum thickness, d the displacement thickness in chords, u the edge speed over that of the stream.
 */
export const ROW = 5
/** c_f/2 u/t. */
export const FRICTION = 0
/** (2 D/H_s - c_f/2) u/t. */
export const ENERGY = 5
/** ln H_s. */
export const LOG_SHAPE = 10
/** 2 + H - M^2, coefficient of d ln u in the momentum balance. */
export const MOMENTUM_SHARE = 15
/** 1 - H + 2 H''/H_s (H'' the density shape factor), coefficient of d ln u in the energy balance. */
export const ENERGY_SHARE = 20
/** Laminar: dN/dx. Turbulent: (q_eq - q)/delta. */
export const GROWTH = 25
/** ln(H - 1) of the kinematic shape factor. */
export const LOG_EXCESS = 30
/** ln of the edge speed, of the compressible flow. */
export const LOG_SPEED = 35
/** Turbulent: q_eq, the root of the equilibrium shear stress. */
export const EQUILIBRIUM = 40
export const RATES_LENGTH = 45

/** Least kinematic shape factors that the closures are asked for. */
const LEAST_SHAPE = 1.02
const LEAST_WAKE_SHAPE = 1.0005

const a = new Float64Array(3)
const b = new Float64Array(3)
const c = new Float64Array(3)

/**
 * Fills `out` (RATES_LENGTH numbers) with what a layer of the given kind does at a station, by the closures
 * of Drela and Giles (AIAA Journal 25(10), 1987). A wake is two equal half layers without friction.
 */
export function stationRates(
  out: Float64Array,
  kind: LayerKind,
  stream: Stream,
  q: number,
  t: number,
  d: number,
  u: number,
): void {
  if (stream.mach === 0) {
    fill(out, kind, q, t, d, u, stream.reynolds, 0)
    return
  }
  // The edge state depends on u through several relations: its derivatives are taken by a difference.
  const step = 1e-6 * u
  atMach(ahead, kind, stream, q, t, d, u + step)
  atMach(out, kind, stream, q, t, d, u)
  for (let row = 0; row < RATES_LENGTH; row += ROW) out[row + 4] = (ahead[row] - out[row]) / step
}

const ahead = new Float64Array(RATES_LENGTH)

/** Edge state behind the rule of von Karman and Tsien (see compressibility.ts) and isentropic flow. */
function atMach(
  out: Float64Array,
  kind: LayerKind,
  { reynolds, mach }: Stream,
  q: number,
  t: number,
  d: number,
  u: number,
): void {
  const m2 = mach * mach
  const beta = Math.sqrt(1 - m2)
  const lambda = m2 / ((1 + beta) * (1 + beta))
  const speed = (u * (1 - lambda)) / Math.max(1 - lambda * u * u, 0.1)
  const warmth = Math.max(1 + 0.2 * m2 * (1 - speed * speed), 0.3)
  const density = warmth * warmth * Math.sqrt(warmth)
  const viscosity = power(warmth, 0.76)
  fill(out, kind, q, t, d, speed, (reynolds * density) / viscosity, (m2 * speed * speed) / warmth)
}

function fill(
  out: Float64Array,
  kind: LayerKind,
  q: number,
  thickness: number,
  displacement: number,
  u: number,
  scale: number,
  m2: number,
): void {
  const share = kind === WAKE ? 0.5 : 1
  const t = thickness * share
  const d = displacement * share
  const H = d / t
  const slope = 1 / (1 + 0.113 * m2)
  const least = kind === WAKE ? LEAST_WAKE_SHAPE : LEAST_SHAPE
  const raw = (H - 0.29 * m2) * slope
  const held = raw < least
  const k = held ? least : raw
  // Derivatives of the kinematic shape factor and of R with respect to the given t, d, u.
  const kt = held ? 0 : (-H * slope) / thickness
  const kd = held ? 0 : slope / thickness
  const R = Math.max(scale * u * t, 1e-3)
  const Rt = R / thickness
  const Ru = R / u
  const rate = u / t
  out[MOMENTUM_SHARE] = 2 + H - m2
  set(out, MOMENTUM_SHARE, 0, -H / thickness, 1 / thickness, 0)
  out[LOG_EXCESS] = log(k - 1)
  set(out, LOG_EXCESS, 0, kt / (k - 1), kd / (k - 1), 0)
  out[LOG_SPEED] = log(u)
  set(out, LOG_SPEED, 0, 0, 0, 1 / u)
  if (kind === LAMINAR) {
    laminarEnergyShape(k, a)
    a[2] = 0
    laminarFriction(k, b)
    laminarDissipation(k, c)
    // u/(t R): it does not depend on u, and holds at the stagnation point itself.
    const inverse = 1 / (scale * t * t)
    const P = b[0] * inverse
    out[FRICTION] = P
    const bb = b[1] * inverse
    set(out, FRICTION, 0, bb * kt - (2 * P) / thickness, bb * kd, 0)
    const E = (c[0] - b[0]) * inverse
    const ee = (c[1] - b[1]) * inverse
    out[ENERGY] = E
    set(out, ENERGY, 0, ee * kt - (2 * E) / thickness, ee * kd, 0)
    amplificationRate(k, R, c)
    out[GROWTH] = c[0] / t
    set(out, GROWTH, 0, (c[1] * kt + c[2] * Rt - c[0] / thickness) / t, (c[1] * kd) / t, (c[2] * Ru) / t)
    out[EQUILIBRIUM] = 0
    set(out, EQUILIBRIUM, 0, 0, 0, 0)
  } else fillTurbulent(out, kind, q, t, d, k, kt, kd, R, Rt, Ru, rate, thickness, share, m2)
  // Compressible energy shape factor and density thickness; Whitfield's fits as used in the 1987 paper.
  const widen = 1 / (1 + 0.014 * m2)
  const Hs = (a[0] + 0.028 * m2) * widen
  const sH = (a[1] * widen) / Hs
  const sR = (a[2] * widen) / Hs
  out[LOG_SHAPE] = log(Hs)
  set(out, LOG_SHAPE, 0, sH * kt + sR * Rt, sH * kd, sR * Ru)
  const z = k - 0.8
  const density = (0.064 / z + 0.251) * m2
  const wH = (2 / Hs) * ((-0.064 / (z * z)) * m2 - density * sH)
  out[ENERGY_SHARE] = 1 - H + (2 * density) / Hs
  const wR = ((-2 * density) / Hs) * sR
  set(out, ENERGY_SHARE, 0, H / thickness + wH * kt + wR * Rt, -1 / thickness + wH * kd, wR * Ru)
}

function set(out: Float64Array, row: number, q: number, t: number, d: number, u: number): void {
  out[row + 1] = q
  out[row + 2] = t
  out[row + 3] = d
  out[row + 4] = u
}

/** Rates of a turbulent layer or half wake; leaves the energy shape factor in `a`. */
function fillTurbulent(
  out: Float64Array,
  kind: LayerKind,
  q: number,
  t: number,
  d: number,
  k: number,
  kt: number,
  kd: number,
  R: number,
  Rt: number,
  Ru: number,
  rate: number,
  thickness: number,
  share: number,
  m2: number,
): void {
  turbulentEnergyShape(k, R, a)
  const Hs = a[0]
  if (kind === WAKE) b.fill(0)
  else {
    turbulentFriction(k, R, b)
    const cool = 1 / Math.sqrt(1 + 0.2 * m2)
    for (let j = 0; j < 3; j++) b[j] *= cool
  }
  // Slip velocity, kept below 1 where a wake has all but healed.
  const g = 0.5 * (1 - (4 * (k - 1)) / (3 * k))
  const gH = -2 / (3 * k * k)
  const free = Math.min(slipVelocity(Hs, k), 0.995)
  const UH = free < 0.995 ? a[1] * g + Hs * gH : 0
  const UR = free < 0.995 ? a[2] * g : 0
  // Equilibrium root of the shear stress: logarithmic derivatives.
  const shear = equilibriumShear(Hs, free, k)
  const eq = Math.sqrt(shear)
  const eqH = 0.5 * eq * (a[1] / Hs + UH / (1 - free) + 3 / (k - 1) - 3 / k)
  const eqR = 0.5 * eq * (a[2] / Hs + UR / (1 - free))
  out[EQUILIBRIUM] = eq
  set(out, EQUILIBRIUM, 0, eqH * kt + eqR * Rt, eqH * kd, eqR * Ru)
  // Friction and energy rates.
  const P = 0.5 * b[0] * rate
  out[FRICTION] = P
  const PH = 0.5 * b[1] * rate
  const PR = 0.5 * b[2] * rate
  set(out, FRICTION, 0, PH * kt + PR * Rt - P / thickness, PH * kd, PR * Ru + (0.5 * b[0]) / t)
  const D = 0.5 * b[0] * free + q * q * (1 - free)
  const DH = 0.5 * b[1] * free + (0.5 * b[0] - q * q) * UH
  const DR = 0.5 * b[2] * free + (0.5 * b[0] - q * q) * UR
  const e = (2 * D) / Hs - 0.5 * b[0]
  const eH = (2 / Hs) * (DH - (D * a[1]) / Hs) - 0.5 * b[1]
  const eR = (2 / Hs) * (DR - (D * a[2]) / Hs) - 0.5 * b[2]
  out[ENERGY] = e * rate
  set(
    out,
    ENERGY,
    ((4 * q * (1 - free)) / Hs) * rate,
    (eH * kt + eR * Rt - e / thickness) * rate,
    eH * kd * rate,
    eR * Ru * rate + e / t,
  )
  // Lag of the shear stress behind its equilibrium.
  const delta = layerThickness(t, d, k)
  const excess = k - 1
  const deltaK = (-1.72 * t) / (excess * excess)
  const L = (eq - q) / delta
  out[GROWTH] = L
  set(
    out,
    GROWTH,
    -1 / delta,
    (out[EQUILIBRIUM + 2] - L * (deltaK * kt + share * (3.15 + 1.72 / excess))) / delta,
    (out[EQUILIBRIUM + 3] - L * (deltaK * kd + share)) / delta,
    out[EQUILIBRIUM + 4] / delta,
  )
}
