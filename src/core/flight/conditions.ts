import { power } from '../numerics/elementary'
import { atmosphere, G0, SEA_LEVEL_DENSITY, type Air } from './atmosphere'

/** What of a condition the state of flight needs; SI. */
export interface FlightInput {
  /** True airspeed, m/s. */
  readonly speed: number
  /** m */
  readonly altitude: number
  /** K */
  readonly isaOffset: number
  readonly loadFactor: number
  /** kg */
  readonly mass: number
}

/** A wing in flight before anything is known of its section; SI. */
export interface FlightState {
  readonly air: Air
  readonly dynamicPressure: number
  /** m/s */
  readonly equivalentAirspeed: number
  /** kg/m2 */
  readonly wingLoadingMass: number
  /** N/m2, at load factor 1 */
  readonly wingLoadingForce: number
  /** The same as a share of the ambient pressure. */
  readonly wingLoadingShare: number
  /** Load factor times weight, N. */
  readonly load: number
  /** The C_L that carries that load without a tail load. */
  readonly liftCoefficient: number
}

/** The state of flight of a wing of an area (m2). Throws BadInput for an altitude out of range. */
export function flightState(area: number, flight: FlightInput): FlightState {
  const air = atmosphere(flight.altitude, flight.isaOffset)
  const dynamicPressure = 0.5 * air.density * power(flight.speed, 2)
  const weight = flight.mass * G0
  const load = flight.loadFactor * weight
  return {
    air,
    dynamicPressure,
    equivalentAirspeed: flight.speed * Math.sqrt(air.density / SEA_LEVEL_DENSITY),
    wingLoadingMass: flight.mass / area,
    wingLoadingForce: weight / area,
    wingLoadingShare: weight / area / air.pressure,
    load,
    liftCoefficient: load / (dynamicPressure * area),
  }
}

/** Reynolds number of a chord (m) at a true airspeed (m/s). */
export function reynoldsNumber(air: Air, speed: number, chord: number): number {
  return (air.density * speed * chord) / air.viscosity
}

/** Why a condition cannot be flown, in a plain sentence; null when it can. */
export function whyUnflyable(flight: FlightInput): string | null {
  if (!isPositive(flight.speed)) return `the speed must be more than 0 m/s, not ${flight.speed}`
  if (!isPositive(flight.mass)) return `the mass must be more than 0 kg, not ${flight.mass}`
  if (!isPositive(flight.loadFactor)) {
    return `the load factor must be more than 0, not ${flight.loadFactor}: the wing has no lift to carry`
  }
  return null
}

function isPositive(value: number): boolean {
  return value > 0 && Number.isFinite(value)
}
