// Makes the corpus of coordinate files: node test/corpus/make.mjs. All shapes are invented; the base is a section of
// 13 % thickness and 3 % camber at mid-chord with an edge of 0.3 %, in 61 points.
import { mkdirSync, rmSync, writeFileSync } from 'node:fs'

const FOLDER = 'test/corpus/files'
rmSync(FOLDER, { recursive: true, force: true })
mkdirSync(FOLDER, { recursive: true })
const write = (name, content) => writeFileSync(`${FOLDER}/${name}`, content)

const half = (x) => 0.13 * (1.4845 * Math.sqrt(x) - 0.63 * x - 1.758 * x ** 2 + 1.4215 * x ** 3 - 0.518 * x ** 4)
const camber = (x) => 0.12 * x * (1 - x)
const side = (sign, edge, n) =>
  Array.from({ length: n + 1 }, (_, i) => {
    const x = 0.5 * (1 - Math.cos((Math.PI * i) / n))
    return [x, camber(x) + sign * (half(x) + 0.5 * edge * x)]
  })
const loopOf = (edge = 0.003, n = 30) => [...side(1, edge, n).reverse(), ...side(-1, edge, n).slice(1)]
const upper = side(1, 0.003, 30)
const lower = side(-1, 0.003, 30)
const loop = loopOf()
const closed = loopOf(0)
const map = (points, f) => points.map(([x, y]) => f(x, y))
const scale = (points, k) => map(points, (x, y) => [k * x, k * y])
const turn = (points, deg) => {
  const [c, s] = [Math.cos((deg * Math.PI) / 180), Math.sin((deg * Math.PI) / 180)]
  return map(points, (x, y) => [c * x + s * y, c * y - s * x])
}
const lines = (points, { digits = 6, gap = '  ', end = '\n', comma = false } = {}) =>
  points
    .map((row) => row.map((v) => v.toFixed(digits)).map((t) => (comma ? t.replace('.', ',') : t)).join(gap))
    .join(end) + end
const titled = (points, options) => `Corpus shape${options?.end ?? '\n'}${lines(points, options)}`

// Good files, in every dress.
write('plain.txt', titled(loop))
write('no-title.txt', lines(loop))
write('four-decimals.txt', titled(loop, { digits: 4 }))
write('closed.txt', titled(closed))
write('closed-repeated-start.txt', titled([...closed.slice(0, -1), closed[0]]))
write('tabs.txt', titled(loop, { gap: '\t' }))
write('commas.csv', titled(loop, { gap: ',' }))
write('comma-space.txt', titled(loop, { gap: ', ' }))
write('semicolons.txt', titled(loop, { gap: ';' }))
write('decimal-commas-semicolon.txt', titled(loop, { gap: '; ', comma: true }))
write('decimal-commas-spaces.txt', titled(loop, { gap: '   ', comma: true }))
write('crlf.txt', titled(loop, { end: '\r\n' }))
write('cr.txt', titled(loop, { end: '\r' }))
write('byte-order-mark.txt', `\uFEFF${titled(loop)}`)
write('latin-1.txt', Buffer.from(`Möwe Nº 7\n${lines(loop)}`, 'latin1'))
write('end-of-text.txt', `${titled(loop)}\x1a\n`)
write('no-final-newline.txt', titled(loop).trimEnd())
write('indented.txt', titled(loop).replace(/^(?=[\d-])/gm, '    '))
write('blank-lines-around.txt', `\n\n${titled(loop)}\n\n\n`)
write('comments.txt', `# drawn by hand\n! twice\n// and checked\n% so far\n${lines(loop).replace('\n', ' # first\n')}`)
write('reversed.txt', titled([...loop].reverse()))
write('begins-at-nose.txt', titled([...closed.slice(30, -1), ...closed.slice(0, 31)]))
write('begins-on-belly.txt', titled([...loop.slice(45), ...loop.slice(0, 45)]))
write('begins-on-belly-reversed.txt', titled([...loop.slice(45), ...loop.slice(0, 45)].reverse()))
write('repeated-points.txt', titled(loop.flatMap((p, i) => (i % 10 === 5 ? [p, p] : [p]))))
write('per-cent.txt', titled(scale(loop, 100), { digits: 4 }))
write('millimetres.txt', titled(scale(loop, 247.5), { digits: 3 }))
write('shifted.txt', titled(map(loop, (x, y) => [x + 3.2, y - 1.7])))
write('turned-half.txt', titled(turn(loop, 0.5)))
write('turned-four.txt', titled(turn(loop, 4)))
write('turned-minus-twelve-mm.txt', titled(turn(scale(loop, 312), -12), { digits: 3 }))
write('two-lists-blank.txt', `Corpus shape\n${lines(upper)}\n${lines(lower)}`)
write('two-lists-joined.txt', `Corpus shape\n${lines(upper)}${lines(lower)}`)
write('two-lists-lower-first.txt', `Corpus shape\n${lines(lower)}\n${lines(upper)}`)
write('two-lists-edge-to-nose.txt', `Corpus shape\n${lines([...upper].reverse())}\n${lines([...lower].reverse())}`)
write('two-lists-counts.txt', `Corpus shape\n 31. 31.\n\n${lines(upper)}\n${lines(lower)}`)
write('two-lists-counts-each.txt', `Corpus shape\n31\n${lines(upper)}31\n${lines(lower)}`)
write('two-lists-labels.txt', `Corpus shape\nUpper surface\n${lines(upper)}Lower surface\n${lines(lower)}`)
write('header.csv', `x,y\n${lines(loop, { gap: ',' })}`)
write('header-swapped.csv', `"y/c","x/c"\n${lines(map(loop, (x, y) => [y, x]), { gap: ',' })}`)
write('header-extra.csv', `n;x;y;note\n${loop.map(([x, y], i) => `${i};${x.toFixed(6)};${y.toFixed(6)};0`).join('\n')}\n`)
write('header-sides.csv', `x,y_upper,y_lower\n${lines(upper.map(([x, y], i) => [x, y, lower[i][1]]), { gap: ',' })}`)
write('numbered.txt', loop.map(([x, y], i) => `${i + 1} ${x.toFixed(6)} ${y.toFixed(6)}`).join('\n'))
write('three-columns.txt', loop.map(([x, y]) => `${x.toFixed(6)} ${y.toFixed(6)} 0.0`).join('\n'))
write('exponents.txt', titled(loop).replace(/(\d\.\d{6})/g, '$1E+00'))
write('fortran-exponents.txt', titled(loop).replace(/(\d\.\d{6})/g, '$1D+00'))
write('few-points.txt', titled(loopOf(0.003, 10)))
write('thick-edge.txt', titled(loopOf(0.05)))

// Broken files.
write('empty.txt', '')
write('blank.txt', ' \n\n\t\n')
write('title-only.txt', 'Corpus shape\n')
write('binary.dat', Buffer.from([0x7f, 0x45, 0x4c, 0x46, 0, 1, 2, 0, 200, 255, 0, 7]))
write('one-point.txt', 'Corpus shape\n1 0\n')
write('nan.txt', titled(loop).replace(/^(.*\n.*\n)(.*)\n/, '$10.99 NaN\n'))
write('infinite.txt', titled(loop).replace(/^(.*\n.*\n)(.*)\n/, '$1inf 0.01\n'))
write('words.txt', titled(loop).replace(/^((?:.*\n){6})/, '$1checked by 2 people\n'))
write('one-number.txt', titled(loop).replace(/^((?:.*\n){6})/, '$10.5\n'))
write('missing-column.csv', `x,note,y\n${loop.map(([x, y], i) => (i === 9 ? `${x},0` : `${x},0,${y}`)).join('\n')}\n`)
write('crossing.txt', titled([...loop.slice(0, 12), loop[40], ...loop.slice(13, 40), loop[12], ...loop.slice(41)]))
write('flat.txt', titled(map(loop, (x) => [x, 0.1 * x])))
write('wide-edge.txt', titled(loopOf(0.24)))
write('huge-count.txt', titled(loopOf(0.003, 2600), { digits: 7 }))
