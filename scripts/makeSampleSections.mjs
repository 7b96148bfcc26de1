// Makes the invented sections of sample-data: node scripts/makeSampleSections.mjs
// Thickness: half = t (a sqrt(x) (1 - x) + b x (1 - x)^2 + c x (1 - x)) scaled to its maximum; camber: a cubic
// that is zero at both ends. Both are our own shapes; any likeness to a section in use is chance.
import { writeFileSync } from 'node:fs'

const SECTIONS = [
  {
    file: 'dunlin-115.txt',
    name: 'Dunlin 115',
    t: 0.115,
    shape: [1.0, 0.25, 0.35],
    camber: 0.034,
    aft: -0.25,
    edge: 0.002,
    n: 60,
  },
  {
    file: 'whimbrel-15.txt',
    name: 'Whimbrel 15',
    t: 0.15,
    shape: [1.15, 0.1, 0.3],
    camber: 0.025,
    aft: -0.1,
    edge: 0.003,
    n: 50,
  },
  {
    file: 'plover-12.csv',
    name: 'Plover 12',
    t: 0.12,
    shape: [0.9, 0.1, 0.7],
    camber: 0.02,
    aft: 0.35,
    edge: 0.0015,
    n: 70,
  },
  {
    file: 'sanderling-9.txt',
    name: 'Sanderling 9',
    t: 0.09,
    shape: [0.85, 0.1, 0.55],
    camber: 0.022,
    aft: 0.1,
    edge: 0.0015,
    n: 55,
  },
]

const half = ([a, b, c], x) => a * Math.sqrt(x) * (1 - x) + b * x * (1 - x) ** 2 + c * x * (1 - x)

/** Outline from the upper trailing edge round the nose to the lower one. */
function outline({ t, shape, camber, aft, edge, n }) {
  const xs = Array.from({ length: n + 1 }, (_, i) => 0.5 * (1 - Math.cos((Math.PI * i) / n)))
  const most = Math.max(...Array.from({ length: 2001 }, (_, i) => half(shape, i / 2000)))
  const y = (x, side) =>
    camber * 4 * x * (1 - x) * (1 + aft * (2 * x - 1)) +
    side * ((0.5 * t * half(shape, x)) / most + 0.5 * edge * x)
  return [...xs.toReversed().map((x) => [x, y(x, 1)]), ...xs.slice(1).map((x) => [x, y(x, -1)])]
}

for (const section of SECTIONS) {
  const points = outline(section).map(([x, y]) => [x.toFixed(5), y.toFixed(5)])
  const csv = section.file.endsWith('.csv')
  const head = csv ? `# ${section.name}\nx,y` : section.name
  writeFileSync(
    `sample-data/${section.file}`,
    `${head}\n${points.map((p) => p.join(csv ? ',' : '  ')).join('\n')}\n`,
  )
}

// A rib of 312 mm traced from the wing: millimetres, turned by 3 deg, uneven, begun somewhere on the belly.
const rib = outline({ t: 0.135, shape: [1.05, 0.2, 0.35], camber: 0.035, aft: -0.15, edge: 0.006, n: 44 })
const wobble = (s) =>
  0.08 * Math.sin(61 * s + 0.4) + 0.06 * Math.sin(97 * s + 2.1) + 0.04 * Math.sin(143 * s + 4.2)
const turned = rib.map(([x, y], i) => {
  const [mx, my] = [312 * x, 312 * y + wobble(i / rib.length)]
  const [c, s] = [Math.cos(0.0524), Math.sin(0.0524)]
  return [41 + c * mx + s * my, 118 - s * mx + c * my]
})
const start = 62
const scan = [...turned.slice(start), ...turned.slice(0, start)]
const lines = scan.map(([x, y]) => `${x.toFixed(2)}; ${y.toFixed(2)}`.replaceAll('.', ','))
writeFileSync('sample-data/rib-scan-7.txt', `Rib scan 7\r\n${lines.join('\r\n')}\r\n`)
