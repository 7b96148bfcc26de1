/**
 * Prints how the viscous method compares with published measurements: `[FIGURE…]` prints the named figures, all
 * without a name. Exit status 2 for a name that does not exist.
 */
import { printFigure } from './figure'
import { publishedFigures } from './figures'

const figures = publishedFigures()
const asked = process.argv.slice(2)
const unknown = asked.find((name) => !(name in figures))
if (unknown !== undefined) {
  process.stderr.write(`no figure is named ${unknown}; there are ${Object.keys(figures).join(', ')}\n`)
  process.exitCode = 2
} else {
  process.stdout.write('Viscous method, 180 panels, N = 9, one set of constants for all cases.\n\n')
  for (const name of asked.length > 0 ? asked : Object.keys(figures)) {
    if (process.stderr.isTTY) process.stderr.write(`${name} …\n`)
    process.stdout.write(`${printFigure(figures[name]!())}\n`)
  }
}
