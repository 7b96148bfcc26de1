import { exp, power } from '../numerics/elementary'
import { BadInput } from '../numerics/errors'

/** State of the air, SI. */
export interface Air {
  /** K */
  readonly temperature: number
  /** Pa */
  readonly pressure: number
  /** kg/m3 */
  readonly density: number
  /** m/s */
  readonly speedOfSound: number
  /** Dynamic viscosity, Pa s. */
  readonly viscosity: number
}

/** m/s2, standard acceleration of free fall. */
export const G0 = 9.80665
/** J/(kg K) */
const GAS_CONSTANT = 287.05287
const GAMMA = 1.4
export const SEA_LEVEL_TEMPERATURE = 288.15
export const SEA_LEVEL_PRESSURE = 101325
export const SEA_LEVEL_DENSITY = SEA_LEVEL_PRESSURE / (GAS_CONSTANT * SEA_LEVEL_TEMPERATURE)
/** K/m in the troposphere. */
const LAPSE = -0.0065
const TROPOPAUSE = 11000
const TROPOPAUSE_TEMPERATURE = SEA_LEVEL_TEMPERATURE + LAPSE * TROPOPAUSE
export const LOWEST_ALTITUDE = -1000
export const HIGHEST_ALTITUDE = 20000
/** kg/(m s K^0.5) and K, the constants of Sutherland's law in the standard atmosphere. */
const SUTHERLAND_FACTOR = 1.458e-6
const SUTHERLAND_TEMPERATURE = 110.4
/** K: beyond these an offset is a slip of the pen, and Sutherland's law would be stretched. */
const COLDEST = 100
const HOTTEST = 500

/**
 * The standard atmosphere at a geopotential pressure altitude (m, -1000 to 20000), its temperature shifted
 * by an offset (K) while the pressure keeps its standard value. Throws BadInput outside the range and for
 * an offset that leaves no ordinary air.
 * Source: Manual of the ICAO Standard Atmosphere, Doc 7488/3 (1993); viscosity by Sutherland's law (same).
 */
export function atmosphere(altitude: number, offset: number): Air {
  if (!(altitude >= LOWEST_ALTITUDE && altitude <= HIGHEST_ALTITUDE)) {
    throw new BadInput(`altitude ${altitude} m: give ${LOWEST_ALTITUDE} to ${HIGHEST_ALTITUDE} m`)
  }
  const standard = SEA_LEVEL_TEMPERATURE + LAPSE * Math.min(altitude, TROPOPAUSE)
  const exponent = -G0 / (LAPSE * GAS_CONSTANT)
  const lower = SEA_LEVEL_PRESSURE * power(standard / SEA_LEVEL_TEMPERATURE, exponent)
  const above = Math.max(altitude - TROPOPAUSE, 0)
  const pressure = lower * exp((-G0 * above) / (GAS_CONSTANT * TROPOPAUSE_TEMPERATURE))
  const temperature = standard + offset
  if (!(temperature >= COLDEST && temperature <= HOTTEST)) {
    throw new BadInput(
      `ISA offset ${offset} K: give one that leaves air of ${COLDEST} to ${HOTTEST} K; here the standard is ${standard} K`,
    )
  }
  return {
    temperature,
    pressure,
    density: pressure / (GAS_CONSTANT * temperature),
    speedOfSound: Math.sqrt(GAMMA * GAS_CONSTANT * temperature),
    viscosity: (SUTHERLAND_FACTOR * power(temperature, 1.5)) / (temperature + SUTHERLAND_TEMPERATURE),
  }
}
