/** The marched layer alone, against exact solutions and published measurements; no coupling to the outer flow. */
import { describe, expect, it } from 'vitest'
import type { TransitionLaw } from '../../src/core/flow/boundaryLayer/layer'
import { stagnationLayer } from '../../src/core/flow/boundaryLayer/stagnation'
import { blasius, frictionOf, geometric, marched, shapeOf } from '../support/layers'

describe('the flat plate', () => {
  it('laminar: thicknesses and friction of Blasius within 1 per cent', () => {
    // Exact: t 0.664115, d 1.720788 and c_f 0.664115, each times its power of Re_x.
    const reynolds = 1e6
    const { layer, failed } = marched(geometric(0.02, 1, 80), () => 1, reynolds, blasius(0.02, reynolds))
    expect(failed).toBe(-1)
    for (const i of [20, 50, 80]) {
      const root = Math.sqrt(reynolds * layer.x[i])
      expect(Math.abs(((layer.t[i] / layer.x[i]) * root) / 0.664114672 - 1)).toBeLessThan(0.01)
      expect(Math.abs(((layer.m[i] / layer.x[i]) * root) / 1.720787657 - 1)).toBeLessThan(0.01)
      expect(Math.abs((frictionOf(layer, i) * root) / 0.664114672 - 1)).toBeLessThan(0.01)
    }
  })

  it('turbulent: friction within 5 per cent of the line of von Karman and Schoenherr from Re_x 1e6 to 1e8', () => {
    // Local friction 1/(17.08 lg^2 R + 25.11 lg R + 6.012) with R of the momentum thickness, the same line.
    const reynolds = 1e8
    const start = { momentum: 1.2e-5, shape: 1.45, shearRoot: 0.04 }
    const { layer, failed } = marched(geometric(0.004, 1, 160), () => 1, reynolds, start)
    expect(failed).toBe(-1)
    for (let i = 0; i < layer.count; i++) {
      if (layer.x[i] * reynolds < 1e6) continue
      const lg = Math.log10(reynolds * layer.t[i])
      const line = 1 / (17.08 * lg ** 2 + 25.11 * lg + 6.012)
      expect(Math.abs(frictionOf(layer, i) / line - 1)).toBeLessThan(0.05)
    }
  })

  /** Re_x at which a plate turns turbulent. */
  function transitionAt(amplification: number): number {
    const reynolds = 8e6
    const law: TransitionLaw = { amplification, forcedAt: Infinity }
    const { layer } = marched(geometric(0.01, 1, 240), () => 1, reynolds, blasius(0.01, reynolds), law)
    const { at, share } = layer.transition
    expect(at).toBeLessThan(layer.count)
    return reynolds * (layer.x[at - 1] + share * (layer.x[at] - layer.x[at - 1]))
  }

  it('turns turbulent at N = 9 near the Re_x of 2.8e6 that Schubauer and Skramstad measured (NACA 909, 1948)', () => {
    expect(Math.abs(transitionAt(9) / 2.8e6 - 1)).toBeLessThan(0.15)
  })

  it('turns earlier in more turbulent air, without exception', () => {
    const places = [4, 6, 8, 9, 10, 11].map(transitionAt)
    places.slice(1).forEach((place, i) => expect(place).toBeGreaterThan(places[i]))
  })

  it('turns where it is tripped', () => {
    const reynolds = 3e6
    const law: TransitionLaw = { amplification: Infinity, forcedAt: 0.3 }
    const { layer } = marched(geometric(0.01, 1, 120), () => 1, reynolds, blasius(0.01, reynolds), law)
    const { at, share, forced } = layer.transition
    expect(forced).toBe(true)
    expect(layer.x[at - 1] + share * (layer.x[at] - layer.x[at - 1])).toBeCloseTo(0.3, 6)
  })
})

describe('similar layers, u = x^m', () => {
  /** Exact shape factors of Falkner and Skan by the differential equation (Blasius at m = 0). */
  it.each([
    [0, 2.591100195],
    [1, 2.216229],
  ])('m = %d keep the exact shape factor within 1.5 per cent', (m, shape) => {
    const reynolds = 1e6
    const start = m === 0 ? blasius(0.02, reynolds) : stagnationStart(0.02, reynolds)
    const { layer, failed } = marched(geometric(0.02, 1, 120), (x) => x ** m, reynolds, start)
    expect(failed).toBe(-1)
    expect(Math.abs(shapeOf(layer, 120) / shape - 1)).toBeLessThan(0.015)
  })
})

function stagnationStart(_: number, reynolds: number) {
  const { shape, thickness } = stagnationLayer()
  return { momentum: thickness / Math.sqrt(reynolds), shape, shearRoot: null }
}

describe('laminar separation', () => {
  /** Place where the friction first vanishes, linear between stations; the march ends just behind it. */
  function separation(
    x: readonly number[],
    speed: (x: number) => number,
    start: ReturnType<typeof blasius>,
    reynolds: number,
  ): number {
    const { layer, failed } = marched(x, speed, reynolds, start)
    const last = failed < 0 ? layer.count : failed
    for (let i = 1; i < last; i++) {
      const [a, b] = [frictionOf(layer, i - 1), frictionOf(layer, i)]
      if (b < 0) return layer.x[i - 1] + (a / (a - b)) * (layer.x[i] - layer.x[i - 1])
    }
    return failed < 0 ? Infinity : layer.x[failed]
  }

  it('of the linearly retarded flow lies near x/L 0.1198 (Howarth 1938), within 5 per cent', () => {
    const reynolds = 1e6
    const x = geometric(0.002, 0.16, 400)
    const place = separation(x, (at) => 1 - at, blasius(0.002, reynolds), reynolds)
    expect(Math.abs(place / 0.1198 - 1)).toBeLessThan(0.05)
  })

  it('of the potential flow round a cylinder lies near 104.45 deg (Terrill 1960), within 2 deg', () => {
    const reynolds = 1e5
    const degree = Math.PI / 180
    const { shape, thickness } = stagnationLayer()
    // u = 2 sin(phi) with x the angle in rad: a = 2 at the stagnation point.
    const start = { momentum: thickness / Math.sqrt(2 * reynolds), shape, shearRoot: null }
    const x = Array.from({ length: 500 }, (_, i) => (1 + 0.23 * i) * degree)
    const place = separation(x, (at) => 2 * Math.sin(at), start, reynolds)
    expect(Math.abs(place / degree - 104.45)).toBeLessThan(2)
  })
})
