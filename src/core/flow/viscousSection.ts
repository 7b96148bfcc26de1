import type { Factors } from '../numerics/denseSolve'
import { newStep, type Step } from './boundaryLayer/stationStep'
import { arcLength } from './couplingState'
import { newAnswers, type Answers } from './couplingRows'
import { displacementAnswer, type DisplacementAnswer } from './displacement'
import { surfaceAnswer, type SurfaceAnswer } from './surfaceAnswer'
import { traceWake, WAKE_STATIONS } from './wake'
import type { PanelFlow } from './vortexPanels'

/** A section made ready for viscous solutions; answers for wakes are kept as they are made. */
export interface ViscousSection {
  readonly flow: PanelFlow
  readonly surface: SurfaceAnswer
  /** Arc length at the nodes from the upper trailing edge, chords. */
  readonly s: Float64Array
  readonly answers: Map<number, DisplacementAnswer>
  readonly step: Step
  /** Linearised systems by the name of the setting that they were made for; see interaction.ts. */
  readonly systems: Map<string, LinearSystem>
}

/** The linearised equations of some state, factored, and what they hold for. */
export interface LinearSystem {
  readonly rows: Answers
  readonly matrix: Float64Array
  factors: Factors | null
  /** Stagnation node and transition intervals of the state. */
  stagnation: number
  upper: number
  lower: number
}

/** Wakes are laid for whole steps of the angle, so that neighbours share them; rad. */
const WAKE_STEP = Math.PI / 180

/** Makes a solved panel flow ready. */
export function prepareViscous(flow: PanelFlow): ViscousSection {
  return {
    flow,
    surface: surfaceAnswer(flow),
    s: arcLength(flow),
    answers: new Map(),
    step: newStep(),
    systems: new Map(),
  }
}

/** Answer of the edge speeds to displacement at an angle (rad). */
export function answerAt(section: ViscousSection, alpha: number): DisplacementAnswer {
  const key = Math.round(alpha / WAKE_STEP)
  const known = section.answers.get(key)
  if (known) return known
  const answer = displacementAnswer(section.surface, traceWake(section.surface, key * WAKE_STEP))
  section.answers.set(key, answer)
  return answer
}

/** The system kept under a name, made when it is asked for first. */
export function systemFor(section: ViscousSection, name: string): LinearSystem {
  const known = section.systems.get(name)
  if (known) return known
  const size = section.flow.panels.x.length + WAKE_STATIONS
  const system = {
    rows: newAnswers(size),
    matrix: new Float64Array(size * size),
    factors: null,
    ...{ stagnation: -1, upper: -1, lower: -1 },
  }
  section.systems.set(name, system)
  return system
}
