import { exp, log, power, tanh } from '../../numerics/elementary'

/**
 * Turbulent closure of the two-equation integral method.
 *
 * Each function writes [value, derivative with respect to H, derivative with respect to R] to `out`, with H
 * the kinematic shape factor and R the Reynolds number of the momentum thickness.
 *
 * Sources: M. Drela, M. B. Giles, "Viscous-inviscid analysis of transonic and low Reynolds number
 * airfoils", AIAA Journal 25(10), 1987, 1347-1355; for friction T. W. Swafford, "Analytical approximation
 * of two-dimensional separated turbulent boundary-layer velocity profiles", AIAA Journal 21(6), 1983, 923-926.
 */

/** Below this R no turbulent layer exists and the fits bend away; they are held at its value. */
const LEAST_R = 200

/** Energy shape factor: falls with H while attached, least at H0, rises when separated. */
export function turbulentEnergyShape(H: number, R: number, out: Float64Array): void {
  const r = Math.max(R, LEAST_R)
  const H0 = r < 400 ? 4 : 3 + 400 / r
  const dH0 = r < 400 ? 0 : -400 / (r * r)
  let slopeR = -4 / (r * r)
  if (H < H0) {
    const z = H0 - H
    const root = Math.sqrt(r)
    const a = 0.165 - 1.6 / root
    const p = power(z, 0.6)
    const f = (p * z) / H
    const fz = (1.6 * p) / H
    out[0] = 1.505 + 4 / r + a * f
    out[1] = a * (-fz - f / H)
    slopeR += (0.8 / (r * root)) * f + a * fz * dH0
  } else {
    const z = H - H0
    const ln = log(r)
    const b = z + 4 / ln
    const g = 0.04 / H + (0.007 * ln) / (b * b)
    const gb = (-0.014 * ln) / (b * b * b)
    out[0] = 1.505 + 4 / r + z * z * g
    out[1] = 2 * z * g + z * z * (-0.04 / (H * H) + gb)
    const gR = 0.007 / (r * b * b) + gb * (-dH0 - 4 / (ln * ln * r))
    slopeR += -2 * z * g * dH0 + z * z * gR
  }
  out[2] = R > LEAST_R ? slopeR : 0
}

/** Friction coefficient c_f. */
export function turbulentFriction(H: number, R: number, out: Float64Array): void {
  const r = Math.max(R, LEAST_R)
  const lg = log(r) / Math.LN10
  const exponent = -1.74 - 0.31 * H
  const main = 0.3 * exp(-1.33 * H) * power(lg, exponent)
  const th = tanh(4 - H / 0.875)
  out[0] = main + 0.00011 * (th - 1)
  out[1] = main * (-1.33 - 0.31 * log(lg)) - (0.00011 / 0.875) * (1 - th * th)
  out[2] = R > LEAST_R ? (main * exponent) / (lg * r * Math.LN10) : 0
}

/** Slip velocity U_s of the outer layer over the edge velocity, from energy shape Hs and H. */
export function slipVelocity(Hs: number, H: number): number {
  return (Hs / 2) * (1 - (4 * (H - 1)) / (3 * H))
}

/**
 * Maximum shear stress coefficient in equilibrium, over rho u_e^2; H stands for both shape factors, which
 * differ only in compressible flow.
 */
export function equilibriumShear(Hs: number, Us: number, H: number): number {
  const z = H - 1
  return (Hs * 0.015 * z * z * z) / ((1 - Us) * H * H * H)
}

/** Thickness of the layer, delta, from momentum thickness t, displacement thickness d and H. */
export function layerThickness(t: number, d: number, H: number): number {
  return t * (3.15 + 1.72 / (H - 1)) + d
}

/** Rate constant of the lag equation (delta/C_tau) dC_tau/dx = K (sqrt C_tau_eq - sqrt C_tau). */
export const LAG_RATE = 4.2

/**
 * Share of the equilibrium shear stress C_tau with which a turbulent layer starts at transition. As in the
 * 1987 paper; a larger share shortens laminar bubbles.
 */
export const STARTING_SHEAR_SHARE = 0.7
