import { wingAt } from '../../../src/core/wing/wing'
import { taperedStations } from '../../../src/core/wing/planform'
import type { Measured } from '../../registry'

/** One wing at one condition: lifting line, trim, totals and stations. */
export function liftingLine(): Measured {
  const shape = {
    area: 1.1,
    span: 3.6,
    stations: taperedStations(1.1, 3.6, 0.6, 0.035),
    sweepQuarterChord: 0,
    sparAt: 0.3,
    skinThickness: 0,
    flap: null,
  }
  const section = { slope: 6.8, zeroLift: -0.07, momentAtZeroLift: -0.1 }
  const condition = { speed: 25, altitude: 600, isaOffset: 0, loadFactor: 1, mass: 24 }
  const aircraft = { tailArm: 1.4, centreOfGravity: 0.27, tailless: false }
  const input = { shape, aircraft, condition, root: section, tip: section, fixedReynolds: null }
  return { run: () => void wingAt(input) }
}
