import { loadWeights } from '../../../src/core/flow/loadWeights'
import { panelLoads } from '../../../src/core/flow/panelLoads'
import { fillVortexInfluence } from '../../../src/core/flow/panelInfluence'
import { solvePanels } from '../../../src/core/flow/vortexPanels'
import { factorInPlace, solveInPlace } from '../../../src/core/numerics/denseSolve'
import { nacaSection } from '../../../src/core/shape/naca'
import { placePanels, type Panels } from '../../../src/core/shape/panels'
import type { Section } from '../../../src/core/shape/section'
import { readSection } from '../../../src/io/coordinates'
import type { Measured } from '../../registry'

/** -4 to 16 deg by 0.5, in rad. */
const ALPHAS = Array.from({ length: 41 }, (_, i) => ((-4 + 0.5 * i) * Math.PI) / 180)
const PANELS = 180

function sweepOf(panels: Panels): void {
  const flow = solvePanels(panels)
  for (const alpha of ALPHAS) panelLoads(flow, alpha)
}

/** NACA 2412, from placed panels: assemble, factor, 41 loads and pressures. */
export function angleSweep(): Measured {
  const panels = placePanels(nacaSection('2412'), PANELS)
  const flow = solvePanels(panels)
  const size = PANELS + 1
  const filled = new Float64Array(size * size)
  fillVortexInfluence(panels, filled, size)
  // Without the equation of the sharp edge two rows are equal; a shift of the diagonal makes it solvable.
  for (let i = 0; i < size; i++) filled[i * size + i] += 0.1
  const matrix = new Float64Array(size * size)
  const rhs = new Float64Array(size)
  return {
    run: () => sweepOf(panels),
    parts: {
      assemble: () => {
        matrix.fill(0)
        fillVortexInfluence(panels, matrix, size)
      },
      factor_and_solve: () => {
        matrix.set(filled)
        const factors = factorInPlace(matrix, size)
        for (let k = 0; k < 2; k++) solveInPlace(factors, rhs.fill(1))
      },
      load_weights: () => void loadWeights(panels, flow.edge),
      loads_41: () => {
        for (const alpha of ALPHAS) panelLoads(flow, alpha)
      },
    },
  }
}

/** The same from the text of a coordinate file: reading, the contour and the panels come on top. */
export function angleSweepFromText(): Measured {
  const { name, x, y } = nacaSection('2412')
  const lines = Array.from(x, (value, i) => `${value.toFixed(6)} ${y[i].toFixed(6)}`)
  const text = `${[name, ...lines].join('\n')}\n`
  const read = (): Section => readSection(text, 'naca2412.dat').section
  const section = read()
  const panels = placePanels(section, PANELS)
  return {
    run: () => sweepOf(placePanels(read(), PANELS)),
    parts: {
      read: () => void read(),
      place_panels: () => void placePanels(section, PANELS),
      sweep: () => sweepOf(panels),
    },
  }
}
