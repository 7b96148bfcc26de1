import { copyLayers, withLaws, type ViscousSetting } from '../flow/couplingState'
import { solveAtAngle, type ViscousSolution } from '../flow/interaction'
import { coldLayers } from '../flow/remarch'
import type { ViscousSection } from '../flow/viscousSection'

/**
 * Solutions of a section at many angles, each found in a way that does not depend on which was solved before.
 *
 * Where a layer stays laminar up to the trailing edge the equations have several solutions: a laminar
 * separation there takes lift away, and the lost lift keeps the separation going. The one that continues
 * the flow with a turbulent edge is taken: each angle is first solved with transition at the latest at GUARD
 * on both sides, which has one solution, and then let free from there.
 */

/** x/c at which transition is forced in the first solution. */
const GUARD = 0.95
/** Angles aside from which a solution is followed to its place, rad. */
const ASIDE = [-1, 1, -2, 2].map((degrees) => (degrees * Math.PI) / 180)
/** Halvings of the step of the angle when a point is approached from a solved neighbour. */
const MOST_HALVINGS = 3

/** A point of a march: its solution, and the guarded one from which neighbours start. */
export interface MarchedPoint {
  readonly solution: ViscousSolution
  readonly guarded: ViscousSolution
}

/** Solves at `alpha` (rad), starting from the guarded solution of a neighbour where there is one. */
export function solvePoint(
  section: ViscousSection,
  setting: ViscousSetting,
  alpha: number,
  neighbour: ViscousSolution | null,
): MarchedPoint {
  const guarded = approach(section, guardedSetting(setting, GUARD), alpha, neighbour, MOST_HALVINGS)
  if (!guarded.converged) return { solution: guarded, guarded }
  const { upper, lower } = guarded.layers
  const held =
    (upper.transition.forced && setting.tripUpper > GUARD) ||
    (lower.transition.forced && setting.tripLower > GUARD)
  if (!held) return { solution: guarded, guarded }
  return { solution: release(section, setting, guarded), guarded }
}

/**
 * Lets a guarded solution free. Between two branches there may be no solution near the guarded one; then the
 * free solutions at angles aside, found in the same way, are followed to this angle.
 */
function release(
  section: ViscousSection,
  setting: ViscousSetting,
  guarded: ViscousSolution,
): ViscousSolution {
  const free = letFree(section, setting, guarded)
  if (free.converged) return free
  for (const aside of ASIDE) {
    const there = solveAtAngle(
      section,
      guardedSetting(setting, GUARD),
      copyLayers(guarded.layers),
      guarded.alpha + aside,
    )
    if (!there.converged) continue
    const freeThere = letFree(section, setting, there)
    if (!freeThere.converged) continue
    const back = solveAtAngle(section, setting, copyLayers(freeThere.layers), guarded.alpha, { fresh: true })
    if (back.converged) return back
  }
  return free
}

function letFree(
  section: ViscousSection,
  setting: ViscousSetting,
  { alpha, layers }: ViscousSolution,
): ViscousSolution {
  // Near a fold the way there decides the branch: it must not depend on what was solved before.
  return solveAtAngle(section, setting, withLaws(section.flow, copyLayers(layers), setting), alpha, {
    fresh: true,
  })
}

function guardedSetting(setting: ViscousSetting, guard: number): ViscousSetting {
  const { tripUpper, tripLower } = setting
  return { ...setting, tripUpper: Math.min(tripUpper, guard), tripLower: Math.min(tripLower, guard) }
}

/** From a neighbour, else from nothing, else by way of the angle half way to the neighbour or of angles aside. */
function approach(
  section: ViscousSection,
  setting: ViscousSetting,
  alpha: number,
  neighbour: ViscousSolution | null,
  halvings: number,
): ViscousSolution {
  if (neighbour) {
    const next = solveAtAngle(section, setting, copyLayers(neighbour.layers), alpha)
    if (next.converged) return next
  }
  const cold = solveAtAngle(section, setting, coldLayers(section, alpha, setting), alpha)
  if (cold.converged || halvings === 0) return cold
  const places = neighbour ? [0.5 * (alpha + neighbour.alpha)] : ASIDE.map((aside) => alpha + aside)
  for (const place of places) {
    const between = approach(section, setting, place, neighbour, neighbour ? halvings - 1 : 0)
    if (!between.converged) continue
    const next = solveAtAngle(section, setting, copyLayers(between.layers), alpha)
    if (next.converged) return next
  }
  return cold
}

/** Solutions at `alphas` (rad): from the angle nearest to zero outwards both ways, each from its neighbour; a way ends where `enough`. */
export function solveSweep(
  section: ViscousSection,
  setting: ViscousSetting,
  alphas: readonly number[],
  visit: (index: number, point: MarchedPoint) => void,
  enough: (alpha: number) => boolean = () => false,
): void {
  const order = alphas.map((_, i) => i).sort((i, j) => alphas[i] - alphas[j])
  const start = order.reduce(
    (best, i, k) => (Math.abs(alphas[i]) < Math.abs(alphas[order[best]]) ? k : best),
    0,
  )
  let first: ViscousSolution | null = null
  for (const direction of [1, -1]) {
    let neighbour = first
    for (let k = direction === 1 ? start : start - 1; k >= 0 && k < order.length; k += direction) {
      if (enough(alphas[order[k]])) break
      const point = solvePoint(section, setting, alphas[order[k]], neighbour)
      const { guarded } = point
      visit(order[k], point)
      if (guarded.converged) neighbour = guarded
      if (k === start && guarded.converged) first = guarded
    }
  }
}
