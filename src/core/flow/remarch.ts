import { cos, sin } from '../numerics/elementary'
import type { Layer, TransitionLaw } from './boundaryLayer/layer'
import { marchLayer, STEEPEST, type EdgeLaw } from './boundaryLayer/march'
import { joinWake, layersAt, nodeOf, startLayers, type Layers, type ViscousSetting } from './couplingState'
import type { DisplacementAnswer } from './displacement'
import { LEAST_SPEED } from './stagnationPlace'
import { answerAt, type ViscousSection } from './viscousSection'

/**
 * Weight of a station's own answer in the local law. The neighbours' defects move with its own, so more than
 * the diagonal alone is felt; of 0.5, 1, 1.5, 2, 3, 4 and 10 those from 1.5 to 3 left the fewest points unsolved.
 */
const LOCAL_SHARE = 2

/** Sizes of the answers of edge speed to its own station's mass defect: the local interaction law. */
function edgeLaw(layer: Layer, answer: DisplacementAnswer, node: (i: number) => number): EdgeLaw {
  const own = new Float64Array(layer.count)
  for (let i = 0; i < layer.count; i++)
    own[i] = LOCAL_SHARE * Math.abs(answer.matrix[node(i) * (answer.size + 1)])
  return { speed: Float64Array.from(layer.u), answer: own, defect: Float64Array.from(layer.m) }
}

/** Marches both sides and the wake with the local interaction law about their present state. */
export function remarch(
  section: ViscousSection,
  layers: Layers,
  answer: DisplacementAnswer,
  setting: ViscousSetting,
  warm: boolean,
  steepest: number,
): boolean {
  const { stagnation, upper, lower, wake } = layers
  const nodes = upper.count + lower.count
  const sides: readonly (readonly [Layer, TransitionLaw, number])[] = [
    [upper, layers.upperLaw, 0],
    [lower, layers.lowerLaw, 1],
  ]
  let sound = true
  startLayers(layers, section.s, setting.stream)
  for (const [layer, law, side] of sides) {
    const edge = edgeLaw(layer, answer, (i) => nodeOf(stagnation, side, i))
    sound = marchLayer(layer, section.step, setting.stream, law, edge, 1, warm, steepest) < 0 && sound
  }
  const edge = edgeLaw(wake, answer, (k) => (k === 0 ? 0 : nodes + k - 1))
  joinWake(layers, setting.stream)
  const free = { amplification: Infinity, forcedAt: Infinity }
  return marchLayer(wake, section.step, setting.stream, free, edge, 1, warm, steepest) < 0 && sound
}

/** Layers from nothing: speeds of the potential flow, marched once. */
export function coldLayers(section: ViscousSection, alpha: number, setting: ViscousSetting): Layers {
  const answer = answerAt(section, alpha)
  const [ca, sa] = [cos(alpha), sin(alpha)]
  const nodes = section.s.length
  const speed = Float64Array.from(answer.along, (a, i) => a * ca + answer.across[i] * sa)
  const layers = layersAt(section.flow, section.s, stagnationNode(speed, nodes), answer.wake.s, setting)
  setSpeeds(layers, speed)
  remarch(section, layers, answer, setting, false, STEEPEST)
  return layers
}

/** Last node before the first change of sign of the vorticity; the ends of the section are never chosen. */
function stagnationNode(speed: Float64Array, nodes: number): number {
  for (let i = 1; i < nodes - 3; i++) if (speed[i] > 0 && speed[i + 1] <= 0) return i
  return nodes >> 1
}

function setSpeeds({ upper, lower, wake, stagnation }: Layers, speed: Float64Array): void {
  const nodes = upper.count + lower.count
  for (let i = 0; i < upper.count; i++) upper.u[i] = Math.max(speed[nodeOf(stagnation, 0, i)], LEAST_SPEED)
  for (let i = 0; i < lower.count; i++) lower.u[i] = Math.max(-speed[nodeOf(stagnation, 1, i)], LEAST_SPEED)
  wake.u[0] = upper.u[upper.count - 1]
  for (let k = 1; k < wake.count; k++) wake.u[k] = speed[nodes + k - 1]
}
