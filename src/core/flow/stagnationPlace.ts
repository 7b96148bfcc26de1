import { LAMINAR, WAKE } from './boundaryLayer/stationRates'
import type { Layer } from './boundaryLayer/layer'
import { layersAt, startLayers, type Layers, type ViscousSetting } from './couplingState'
import type { ViscousSection } from './viscousSection'

/** Edge speed kept at a first station when the stagnation point falls on its node. */
export const LEAST_SPEED = 1e-7

/**
 * How far the stagnation point may lie beyond its interval before it is moved to the next, as a share of the
 * interval. Neighbouring intervals are not quite alike: without a band in which both serve, a point on a node
 * would be passed to and fro.
 */
const FAR_SIDE = 0.1

/** Rebuilds the layers when the speed at a first station has changed sign. */
export function placeStagnation(section: ViscousSection, setting: ViscousSetting, layers: Layers): Layers {
  const { upper, lower, wake, stagnation } = layers
  const nodes = upper.count + lower.count
  let to = stagnation
  const far = (layer: Layer, other: Layer, i: number): boolean =>
    layer.u[i] < (i === 0 && layer.transition.at > 1 ? -FAR_SIDE * other.u[0] : 0)
  for (let i = 0; i < upper.count - 4 && far(upper, lower, i); i++) to--
  if (to === stagnation) for (let i = 0; i < lower.count - 4 && far(lower, upper, i); i++) to++
  if (to === stagnation) {
    for (const layer of [upper, lower]) {
      for (let i = 1; i < layer.count; i++) layer.u[i] = Math.max(layer.u[i], LEAST_SPEED)
      if (Math.abs(layer.u[0]) < LEAST_SPEED) layer.u[0] = LEAST_SPEED
    }
    return layers
  }
  const moved = layersAt(section.flow, section.s, to, layers.wake.x, setting)
  for (let g = 0; g < nodes; g++) {
    const [from, i] = g <= stagnation ? [upper, stagnation - g] : [lower, g - stagnation - 1]
    const [into, k] = g <= to ? [moved.upper, to - g] : [moved.lower, g - to - 1]
    const flips = g <= stagnation !== g <= to
    into.kind[k] = flips ? LAMINAR : from.kind[i]
    into.q[k] = flips ? 0 : from.q[i]
    into.t[k] = from.t[i]
    into.u[k] = Math.max(flips ? -from.u[i] : from.u[i], LEAST_SPEED)
    into.m[k] = flips ? 2.24 * into.t[k] * into.u[k] : from.m[i]
  }
  copyWake(wake, moved.wake)
  startLayers(moved, section.s, setting.stream)
  return moved
}

function copyWake(from: Layer, to: Layer): void {
  to.q.set(from.q)
  to.t.set(from.t)
  to.m.set(from.m)
  to.u.set(from.u)
  to.kind.fill(WAKE)
}
