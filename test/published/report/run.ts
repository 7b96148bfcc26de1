/**
 * Prints how the viscous method compares with published measurements: `[FIGURE…]` prints the named figures, all
 * without a name; `convergence` prints where it finds solutions, which takes minutes. Exit status 2 for a name that does not exist.
 */
import { matrixCases } from '../../support/viscousSections'
import { printConvergence } from './convergence'
import { printFigure } from './figure'
import { publishedFigures } from './figures'

const figures = publishedFigures()
const MATRIX = 'convergence'
const asked = process.argv.slice(2)
const unknown = asked.find((name) => name !== MATRIX && !(name in figures))
if (unknown !== undefined) {
  process.stderr.write(
    `no figure is named ${unknown}; there are ${[...Object.keys(figures), MATRIX].join(', ')}\n`,
  )
  process.exitCode = 2
} else {
  process.stdout.write('Viscous method, 180 panels, N = 9, one set of constants for all cases.\n\n')
  for (const name of asked.length > 0 ? asked : Object.keys(figures)) {
    if (process.stderr.isTTY) process.stderr.write(`${name} …\n`)
    if (name === MATRIX) {
      const numbers = [1e5, 2e5, 5e5, 1e6, 3e6, 9e6]
      const title = 'Converged points by half degrees; Reynolds number 1e5 is indicative'
      process.stdout.write(`${title}\n${printConvergence(matrixCases(), numbers)}\n`)
    } else process.stdout.write(`${printFigure(figures[name]!())}\n`)
  }
}
