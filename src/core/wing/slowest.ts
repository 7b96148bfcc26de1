import { firstStall } from './stall'
import { rootAngleForLift } from './liftingLine'
import { stationStates } from './linearSections'
import { prepareWing } from './preparedWing'
import { stallStations } from './viscousFigures'
import type { WingInput } from './wingInput'

/**
 * The speed (m/s) at which the wing carries its load with the greatest lift that it has at the Reynolds and
 * Mach numbers of `input.condition.speed`: a fixed point of this map is the slowest speed. The load is the
 * load factor times weight less the tail load, which is linear in dynamic pressure:
 * q (S C_Lmax + t) = n W - c with tail load t q + c. A reason when there is none.
 */
export function slowestStep(input: WingInput): number | string {
  const wing = prepareWing(input)
  if (wing.sections === null) return 'the slowest speed needs the viscous method'
  const alpha = rootAngleForLift(wing.line, 1)
  const stations = stationStates(wing.linear, wing.line, alpha, wing.reynoldsOf)
  const stalls = stallStations(wing.sections, stations)
  if (stalls === null) {
    return 'no slowest speed: a polar does not reach its maximum lift, or the flight is outside the polars'
  }
  const stall = firstStall(wing.line, stalls)
  const perPressure = input.shape.area * (stall?.liftCoefficient ?? 0) + (wing.tail?.perPressure ?? 0)
  const load = wing.flight.load - (wing.tail?.constant ?? 0)
  if (stall === null || perPressure <= 0 || load <= 0) return 'no slowest speed: no lift balances the load'
  return Math.sqrt((2 * load) / (perPressure * wing.flight.air.density))
}
