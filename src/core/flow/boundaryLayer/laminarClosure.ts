import { power } from '../../numerics/elementary'

/**
 * Laminar closure of the two-equation integral method: energy shape factor, friction and dissipation as
 * functions of the kinematic shape factor H.
 *
 * Each function writes [value, derivative with respect to H] to `out`. R is the Reynolds number of the
 * momentum thickness. Valid for H from about 2 (accelerated) to about 8 (reversed flow).
 *
 * Source: M. Drela, M. B. Giles, "Viscous-inviscid analysis of transonic and low Reynolds number airfoils",
 * AIAA Journal 25(10), 1987, 1347-1355: fits to the Falkner-Skan profiles.
 */

/** Energy shape factor: energy thickness over momentum thickness. */
export function laminarEnergyShape(H: number, out: Float64Array): void {
  const z = H - 4
  const a = z < 0 ? 0.076 : 0.04
  out[0] = 1.515 + (a * z * z) / H
  out[1] = (a * z * (2 * H - z)) / (H * H)
}

/** R c_f / 2. */
export function laminarFriction(H: number, out: Float64Array): void {
  if (H < 7.4) {
    const z = 7.4 - H
    out[0] = -0.067 + (0.01977 * z * z) / (H - 1)
    out[1] = (-0.01977 * z * (2 * (H - 1) + z)) / ((H - 1) * (H - 1))
  } else {
    const z = 1 - 1.4 / (H - 6)
    out[0] = -0.067 + 0.022 * z * z
    out[1] = (0.044 * z * 1.4) / ((H - 6) * (H - 6))
  }
}

/** 2 R D / H_s, with D the dissipation coefficient and H_s the energy shape factor. */
export function laminarDissipation(H: number, out: Float64Array): void {
  if (H < 4) {
    const z = 4 - H
    const p = 0.00205 * power(z, 4.5)
    out[0] = 0.207 + p * z
    out[1] = -5.5 * p
  } else {
    const z = H - 4
    const b = 1 + 0.02 * z * z
    out[0] = 0.207 - (0.003 * z * z) / b
    out[1] = (-0.006 * z) / (b * b)
  }
}
