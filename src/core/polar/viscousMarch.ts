import { coldLayers, solveAtAngle, type ViscousSection, type ViscousSolution } from '../flow/interaction'
import { copyLayers, type ViscousSetting } from '../flow/couplingState'

/** Least step of the angle when a point is approached from a solved neighbour, rad. */
const STEPS_BETWEEN = 4

/**
 * Solves at `alpha` from a neighbouring solution, else from nothing, else by smaller steps of the angle from
 * the neighbour. Bounded: at most 2 + STEPS_BETWEEN iterations of Newton's method, each bounded itself.
 */
export function solvePoint(
  section: ViscousSection,
  setting: ViscousSetting,
  alpha: number,
  neighbour: ViscousSolution | null,
): ViscousSolution {
  if (neighbour) {
    const next = solveAtAngle(section, setting, copyLayers(neighbour.layers), alpha)
    if (next.converged) return next
  }
  const cold = solveAtAngle(section, setting, coldLayers(section, alpha, setting), alpha)
  if (cold.converged || !neighbour) return cold
  let between = neighbour
  for (let k = 1; k <= STEPS_BETWEEN; k++) {
    const at = neighbour.alpha + ((alpha - neighbour.alpha) * k) / STEPS_BETWEEN
    between = solveAtAngle(section, setting, copyLayers(between.layers), at)
    if (!between.converged) return cold.residual < between.residual ? cold : { ...between, alpha }
  }
  return between
}

/** Solutions at `alphas` (rad): from the angle nearest to zero outwards both ways, each from its neighbour. */
export function solveSweep(
  section: ViscousSection,
  setting: ViscousSetting,
  alphas: readonly number[],
  visit: (index: number, solution: ViscousSolution) => void,
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
      const solution: ViscousSolution = solvePoint(section, setting, alphas[order[k]], neighbour)
      visit(order[k], solution)
      if (solution.converged) neighbour = solution
      if (k === start && solution.converged) first = solution
    }
  }
}
