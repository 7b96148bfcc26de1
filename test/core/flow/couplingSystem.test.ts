import { describe, expect, it } from 'vitest'
import { copyLayers, type Layers } from '../../../src/core/flow/couplingState'
import { newAnswers } from '../../../src/core/flow/couplingRows'
import { linearise } from '../../../src/core/flow/couplingSystem'
import { marchLayer } from '../../../src/core/flow/boundaryLayer/march'
import { joinWake, startLayers } from '../../../src/core/flow/couplingState'
import type { Layer, TransitionLaw } from '../../../src/core/flow/boundaryLayer/layer'
import { solvePoint } from '../../../src/core/polar/viscousMarch'
import { readySection, settingOf } from '../../../src/core/polar/viscousState'
import { nacaSection } from '../../../src/core/shape/naca'
import { viscousState } from '../../published/report/polars'

const state = viscousState(2e6)
const ready = readySection(nacaSection('2412'), state)!
const setting = settingOf(state)
const { solution } = solvePoint(ready, setting, 0.03, null)
const nodes = ready.s.length

/** Layers marched with mass defects that are all but given: a stiff law u = u0 + k (m - m0), k large. */
function marchedAt(layers: Layers, place: number, change: number): Layers {
  const moved = copyLayers(layers)
  const { upper, lower, wake, stagnation } = moved
  const stiff = 1e7
  const run = (layer: Layer, law: TransitionLaw, node: (i: number) => number): void => {
    const defect = Float64Array.from(layer.m, (m, i) => m + (node(i) === place ? change : 0))
    const answer = new Float64Array(layer.count).fill(stiff)
    marchLayer(layer, ready.step, setting.stream, law, { speed: layer.u.slice(), answer, defect }, 1, true)
  }
  startLayers(moved, ready.s, setting.stream)
  run(upper, moved.upperLaw, (i) => stagnation - i)
  run(lower, moved.lowerLaw, (i) => stagnation + 1 + i)
  joinWake(moved, setting.stream)
  run(wake, { amplification: Infinity, forcedAt: Infinity }, (k) => (k === 0 ? -1 : nodes + k - 1))
  return moved
}

describe('the linearised layers', () => {
  it('answer to a mass defect as the layers marched with a slightly different one do', () => {
    expect(solution.converged).toBe(true)
    const { layers } = solution
    const rows = newAnswers(solution.answer.size)
    const gap = ready.s[layers.stagnation + 1]! - ready.s[layers.stagnation]!
    expect(linearise(rows, layers, ready.step, setting.stream, gap)).toBeLessThan(1e-6)
    const { upper, stagnation } = layers
    for (const station of [20, 45, upper.count - 15]) {
      const place = stagnation - station
      const change = 1e-5 * upper.m[station]!
      const more = marchedAt(layers, place, change)
      for (const i of [station, station + 1]) {
        const node = stagnation - i
        const slope = (more.upper.t[i]! - upper.t[i]!) / (more.upper.m[station]! - upper.m[station]!)
        const row = rows.t[node * rows.size + place]!
        expect(slope / row, `station ${station}, ${i}`).toBeCloseTo(1, 1)
      }
    }
  })
})
