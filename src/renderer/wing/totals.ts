import type { WingAtCondition } from '../../core'
import { shown } from '../shortlist/columns'

/** A row of the wing's totals. */
export interface TotalRow {
  readonly label: string
  readonly unit: string
  readonly text: (wing: WingAtCondition) => string
}

const RADIAN = 180 / Math.PI
const row = (
  label: string,
  unit: string,
  digits: number,
  value: (wing: WingAtCondition) => number | null,
): TotalRow => ({
  label,
  unit,
  text: (wing) => shown(value(wing), digits),
})

/** The totals of a wing at a condition, in the order in which they are read. */
export const TOTALS: readonly TotalRow[] = [
  row('Lift coefficient C_L', '', 4, (wing) => wing.liftCoefficient),
  row('Angle of the root chord', 'deg', 2, (wing) => wing.alpha * RADIAN),
  row('Lift slope', '1/rad', 3, (wing) => wing.liftSlope),
  row('  quick check: Helmbold', '1/rad', 3, (wing) => wing.helmboldSlope),
  row('  quick check: handbook', '1/rad', 3, (wing) => wing.handbookSlope),
  row('Largest local lift', '', 3, (wing) => wing.peakLiftCoefficient),
  row('  at distance from the centreline', 'm', 2, (wing) => wing.peakLiftAt),
  row('Induced drag coefficient', '', 5, (wing) => wing.inducedDragCoefficient),
  row('Induced drag', 'N', 2, (wing) => wing.inducedDrag),
  row('Span efficiency', '', 4, (wing) => wing.spanEfficiency),
  row('Root bending moment', 'N m', 1, (wing) => wing.rootBendingMoment),
  row('Tail load, up positive', 'N', 1, (wing) => wing.tailLoad),
  row('Reynolds number at the mean chord', 'million', 3, (wing) => wing.reynolds / 1e6),
  row('Mach number', '', 3, (wing) => wing.mach),
  row('Density', 'kg/m³', 4, (wing) => wing.density),
  row('Dynamic pressure', 'Pa', 1, (wing) => wing.dynamicPressure),
  row('Equivalent airspeed', 'm/s', 2, (wing) => wing.equivalentAirspeed),
  row('Wing loading', 'kg/m²', 2, (wing) => wing.wingLoadingMass),
  row('Wing loading', 'N/m²', 1, (wing) => wing.wingLoadingForce),
  row('  as a share of the ambient pressure', '%', 2, (wing) => 100 * wing.wingLoadingShare),
]
