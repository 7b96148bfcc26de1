import { viscousSweep } from '../../../src/core/polar/viscousSweep'
import { solvePoint, solveSweep } from '../../../src/core/polar/viscousMarch'
import { copyLayers, type ViscousSetting } from '../../../src/core/flow/couplingState'
import { newAnswers } from '../../../src/core/flow/couplingRows'
import { linearise } from '../../../src/core/flow/couplingSystem'
import { displacementAnswer } from '../../../src/core/flow/displacement'
import { coldLayers, remarch } from '../../../src/core/flow/remarch'
import { surfaceAnswer } from '../../../src/core/flow/surfaceAnswer'
import { viscousLoads } from '../../../src/core/flow/viscousLoads'
import { answerAt, prepareViscous, type ViscousSection } from '../../../src/core/flow/viscousSection'
import { solvePanels } from '../../../src/core/flow/vortexPanels'
import { traceWake } from '../../../src/core/flow/wake'
import { factorInPlace, solveInPlace } from '../../../src/core/numerics/denseSolve'
import { nacaSection } from '../../../src/core/shape/naca'
import { placePanels } from '../../../src/core/shape/panels'
import type { Measured } from '../../registry'
import { POLAR_ALPHAS, viscousState } from './viscousState'

/** Where the parts of a step are timed, rad: attached flow with transition on both sides. */
const AT = (4 * Math.PI) / 180

/**
 * NACA 2412 from the section to 31 points, cold. The parts are once a section (potential flow, answers to
 * displacement), once a degree (wake), once a step (marching, linearising, factoring, solving) and once a
 * point (loads); `one_angle_cold` is a whole point from nothing.
 */
export function viscousPolar(reynolds: number): Measured {
  const section = nacaSection('2412')
  const state = viscousState(reynolds)
  const { tripUpper, tripLower } = state
  const setting = {
    stream: { reynolds, mach: state.mach },
    amplification: state.amplification ?? 0,
    tripUpper,
    tripLower,
  }
  const panels = placePanels(section, state.panels)
  const flow = solvePanels(panels)
  const ready = prepareViscous(flow)
  const { solution } = solvePoint(ready, setting, AT, null)
  const layers = copyLayers(solution.layers)
  const answer = answerAt(ready, AT)
  const { size } = answer
  const rows = newAnswers(size)
  const gap = ready.s[layers.stagnation + 1] - ready.s[layers.stagnation]
  const filled = Float64Array.from(answer.matrix)
  for (let i = 0; i < size; i++) filled[i * (size + 1)] += 1
  const matrix = new Float64Array(size * size)
  const factored = factorInPlace(Float64Array.from(filled), size)
  const rhs = new Float64Array(size)
  return {
    run: () => void viscousSweep({ ...section }, state, POLAR_ALPHAS),
    parts: {
      place_panels: () => void placePanels(section, state.panels),
      potential_flow: () => void solvePanels(panels),
      answer_of_surface: () => void surfaceAnswer(flow),
      answer_with_wake: () => void displacementAnswer(ready.surface, traceWake(ready.surface, AT)),
      march_cold: () => void coldLayers(ready, AT, setting),
      march_again: () => void remarch(ready, layers, answer, setting, true, Infinity),
      linearise: () => void linearise(rows, layers, ready.step, setting.stream, gap),
      factor: () => {
        matrix.set(filled)
        factorInPlace(matrix, size)
      },
      solve: () => solveInPlace(factored, rhs.fill(1)),
      loads: () => void viscousLoads(flow, solution, setting.stream),
      one_angle_cold: () => void solvePoint(prepareViscous(flow), setting, AT, null),
    },
    note: stepsOf(prepareViscous(flow), setting),
  }
}

/** How many points of the polar converge, and how many steps the last solve of each takes. */
function stepsOf(ready: ViscousSection, setting: ViscousSetting): string {
  let [solved, steps] = [0, 0]
  solveSweep(ready, setting, POLAR_ALPHAS, (_, { solution }) => {
    if (!solution.converged) return
    solved++
    steps += solution.iterations
  })
  const mean = (steps / solved).toFixed(1)
  return `${solved} of ${POLAR_ALPHAS.length} points converged, ${mean} steps in the last solve of each`
}
