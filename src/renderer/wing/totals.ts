import type { WingAtCondition } from '../../core'
import { shown } from '../shortlist/columns'

/** A row of the wing's totals. */
export interface TotalRow {
  readonly label: string
  readonly unit: string
  /** Belongs to the row before it. */
  readonly inner: boolean
  readonly text: (wing: WingAtCondition) => string
}

const RADIAN = 180 / Math.PI
const row = (
  label: string,
  unit: string,
  digits: number,
  value: (wing: WingAtCondition) => number | null,
): TotalRow => ({
  label: label.trimStart(),
  unit,
  inner: label.startsWith(' '),
  text: (wing) => shown(value(wing), digits),
})

/** The totals of a wing at a condition, in the order in which they are read. */
export const TOTALS: readonly TotalRow[] = [
  row('Lift coefficient C_L', '', 4, (wing) => wing.liftCoefficient),
  row('Angle of root chord', 'deg', 2, (wing) => wing.alpha * RADIAN),
  row('Lift slope', '1/rad', 3, (wing) => wing.liftSlope),
  row('  by Helmbold', '1/rad', 3, (wing) => wing.helmboldSlope),
  row('  by the handbook', '1/rad', 3, (wing) => wing.handbookSlope),
  row('Largest local lift', '', 3, (wing) => wing.peakLiftCoefficient),
  row('  at y', 'm', 2, (wing) => wing.peakLiftAt),
  row('Induced drag coefficient', '', 5, (wing) => wing.inducedDragCoefficient),
  row('Induced drag', 'N', 2, (wing) => wing.inducedDrag),
  row('Span efficiency', '', 4, (wing) => wing.spanEfficiency),
  row('Profile drag coefficient', '', 5, (wing) => wing.profileDragCoefficient),
  row('Drag, with the rest', 'N', 2, (wing) => wing.drag),
  row('Thrust power', 'W', 1, (wing) => wing.power),
  row('Glide ratio', '', 2, (wing) => wing.glideRatio),
  row('Sink', 'm/s', 3, (wing) => wing.sink),
  row('Largest C_L, first stall', '', 3, (wing) => wing.maxLiftCoefficient),
  row('  at share of semispan', '', 2, (wing) => wing.stallAtSemispan),
  row('  tip margin', '', 3, (wing) => wing.tipMargin),
  row('True airspeed', 'm/s', 2, (wing) => wing.speed),
  row('Root bending moment', 'N m', 1, (wing) => wing.rootBendingMoment),
  row('Tail load, up', 'N', 1, (wing) => wing.tailLoad),
  row('Re at mean chord', 'million', 3, (wing) => wing.reynolds / 1e6),
  row('Mach number', '', 3, (wing) => wing.mach),
  row('Density', 'kg/m³', 4, (wing) => wing.density),
  row('Dynamic pressure', 'Pa', 1, (wing) => wing.dynamicPressure),
  row('Equivalent airspeed', 'm/s', 2, (wing) => wing.equivalentAirspeed),
  row('Wing loading', 'kg/m²', 2, (wing) => wing.wingLoadingMass),
  row('Wing loading', 'N/m²', 1, (wing) => wing.wingLoadingForce),
  row('  of ambient pressure', '%', 2, (wing) => 100 * wing.wingLoadingShare),
]
