import { describe, expect, it } from 'vitest'
import { FRICTION, LAMINAR, TURBULENT } from '../../../src/core/flow/boundaryLayer/stationRates'
import { arcLength, layersAt, type Layers } from '../../../src/core/flow/couplingState'
import { sideEvents, sideLayer, type SideEvents } from '../../../src/core/flow/surfaceLayers'
import { solvePanels } from '../../../src/core/flow/vortexPanels'
import { WAKE_STATIONS } from '../../../src/core/flow/wake'
import { nacaSection } from '../../../src/core/shape/naca'
import { placePanels } from '../../../src/core/shape/panels'

const flow = solvePanels(placePanels(nacaSection('0012'), 120))
const STAGNATION = 59

/** Layers on which the friction on the upper side is `friction` of x/c, turbulent from station `turns` on. */
function layersWith(friction: (x: number) => number, turns = Infinity, share = 1): Layers {
  const setting = { stream: { reynolds: 1e6, mach: 0 }, amplification: 9, tripUpper: 1, tripLower: 1 }
  const wakeS = Float64Array.from({ length: WAKE_STATIONS + 1 }, (_, i) => 1 + i / WAKE_STATIONS)
  const layers = layersAt(flow, arcLength(flow), STAGNATION, wakeS, setting)
  for (const side of [layers.upper, layers.lower]) {
    side.t.fill(0.001)
    side.u.fill(1.1)
    side.m.fill(0.001 * 1.1 * 2.5)
    side.q.fill(3)
    side.rates.forEach((rate) => (rate[FRICTION] = 1))
  }
  const { upper } = layers
  upper.rates.forEach((rate, i) => {
    rate[FRICTION] = friction(xAt(i))
    upper.kind[i] = i < turns ? LAMINAR : TURBULENT
  })
  upper.transition.at = Math.min(turns, upper.count)
  upper.transition.share = share
  return layers
}
const xAt = (i: number): number => flow.panels.x[STAGNATION - i]!
const stationBehind = (x: number): number => {
  let i = 0
  while (xAt(i) < x) i++
  return i
}
const eventsOf = (layers: Layers): SideEvents => sideEvents(flow, layers, 0)

describe('the events of a layer', () => {
  it('are none, with transition at 1, where it stays laminar and attached', () => {
    expect(eventsOf(layersWith(() => 2))).toEqual({
      transition: 1,
      laminarSeparation: null,
      reattachment: null,
      turbulentSeparation: null,
    })
  })

  it('put the transition at its share of the interval', () => {
    const turns = stationBehind(0.4)
    const [before, behind] = [xAt(turns - 1), xAt(turns)]
    for (const share of [0, 0.25, 1]) {
      const { transition } = eventsOf(layersWith(() => 2, turns, share))
      expect(transition).toBeCloseTo(before + share * (behind - before), 12)
    }
  })

  it('are laminar separation and reattachment around a bubble, at the zeros of a linear friction', () => {
    // Down through zero at 0.4 and up through it at 0.6; turbulent from 0.55.
    const friction = (x: number): number => (x < 0.5 ? 0.4 - x : x - 0.6)
    const events = eventsOf(layersWith(friction, stationBehind(0.55)))
    expect(events.laminarSeparation).toBeCloseTo(0.4, 12)
    expect(events.reattachment).toBeCloseTo(0.6, 12)
    expect(events.turbulentSeparation).toBeNull()
  })

  it('are turbulent separation where the friction of a turbulent layer stays lost', () => {
    const turns = stationBehind(0.1)
    const events = eventsOf(layersWith((x) => 0.8 - x, turns))
    expect(events.laminarSeparation).toBeNull()
    expect(events.turbulentSeparation).toBeCloseTo(0.8, 12)
    // Regained before the edge it is no separation of the edge.
    const regained = eventsOf(layersWith((x) => (x < 0.7 ? 0.6 - x : x - 0.85), turns))
    expect(regained.turbulentSeparation).toBeNull()
  })

  it('keep a bubble apart from a separation behind it', () => {
    const friction = (x: number): number => (x < 0.3 ? 0.2 - x : x < 0.6 ? x - 0.4 : 0.8 - x)
    const events = eventsOf(layersWith(friction, stationBehind(0.35)))
    expect(events.laminarSeparation).toBeCloseTo(0.2, 12)
    expect(events.reattachment).toBeCloseTo(0.4, 12)
    expect(events.turbulentSeparation).toBeCloseTo(0.8, 12)
  })

  it('are null for a bubble that never closes', () => {
    const events = eventsOf(layersWith((x) => 0.5 - x, stationBehind(0.7)))
    expect(events.laminarSeparation).toBeCloseTo(0.5, 12)
    expect(events.reattachment).toBeNull()
  })
})

describe('a side as the user sees it', () => {
  it('runs from the stagnation point to the trailing edge, with its shape factor, stress and amplification', () => {
    const turns = stationBehind(0.4)
    const layers = layersWith(() => 0.5, turns)
    const upper = sideLayer(flow, layers, 0)
    const last = upper.x.length - 1
    expect(upper.x[0]).toBe(flow.panels.x[STAGNATION])
    expect(upper.x[last]).toBeCloseTo(1, 12)
    expect(upper.shapeFactor[last]).toBeCloseTo(2.5, 12)
    expect(upper.frictionCoefficient[last]).toBeCloseTo(2 * 1.1 * 0.001 * 0.5, 15)
    expect(upper.amplification[turns - 1]).toBe(3)
    expect(upper.amplification[turns]).toBeNaN()
    const lower = sideLayer(flow, layers, 1)
    expect(lower.x[0]).toBe(flow.panels.x[STAGNATION + 1])
    expect(lower.x.length + upper.x.length).toBe(flow.panels.x.length)
  })
})
