import { nacaSection } from '../../src/core/shape/naca'
import { sectionFromPoints } from '../../src/core/shape/normalise'
import type { Section } from '../../src/core/shape/section'

/** A section of the convergence matrix and the range of angles (deg) over which it must converge. */
export interface MatrixCase {
  readonly name: string
  readonly section: Section
  readonly from: number
  readonly to: number
}

const fromPoints = (name: string, points: readonly (readonly [number, number])[]): Section =>
  sectionFromPoints({ kind: 'loop', points }, { name, chordLine: null }).section

const pointsOf = ({ x, y }: Section): [number, number][] => Array.from(x, (value, i) => [value, y[i]!])

/** A sequence of numbers from 0 to 1, always the same (Lehmer, multiplier 48271). */
function seeded(): () => number {
  let state = 20261201
  return () => (state = (state * 48271) % 2147483647) / 2147483647
}

/**
 * An imported scan: NACA 2414 with smooth noise of 0.0005 chord, waves of 0.1 chord and longer, fading at nose
 * and edge.
 */
function noisy(): Section {
  const random = seeded()
  const waves = Array.from(
    { length: 7 },
    () => [1.5 + 8.5 * random(), 6.28 * random(), 6.28 * random()] as const,
  )
  const points = pointsOf(nacaSection('2414'))
  const middle = points.length / 2
  const height = 0.0005 / Math.sqrt(waves.length / 2)
  return fromPoints(
    'noisy scan',
    points.map(([x, y], i) => {
      const side = i < middle ? 1 : 2
      const sum = waves.reduce((total, wave) => total + Math.sin(2 * Math.PI * wave[0] * x + wave[side]!), 0)
      return [x, y + height * sum * Math.min(1, 4 * x) * Math.min(1, 8 * (1 - x))]
    }),
  )
}

/** A 14 % thick section whose mean line falls away over the last 30 % of the chord. */
function aftLoaded(): Section {
  const camber = (x: number): number =>
    0.03 * (x < 0.7 ? Math.sin((Math.PI / 2) * (x / 0.7)) ** 2 : 1 - ((x - 0.7) / 0.3) ** 1.6)
  return fromPoints(
    'aft-loaded',
    pointsOf(nacaSection('0014')).map(([x, y]) => [x, y + camber(x)]),
  )
}

/** A 12 % thick section whose mean line turns up behind 7/8 of the chord, for a moment near zero. */
function reflexed(): Section {
  const camber = (x: number): number => 0.12 * x * (1 - x) * (7 / 8 - x)
  return fromPoints(
    'reflexed',
    pointsOf(nacaSection('0012')).map(([x, y]) => [x, y + camber(x)]),
  )
}

/** NACA 4415 opened to an edge of 1 % of the chord. */
function blunt(): Section {
  const points = pointsOf(nacaSection('4415'))
  return fromPoints(
    'blunt edge',
    points.map(([x, y], i) => [x, y + (i < points.length / 2 ? 0.005 : -0.005) * x]),
  )
}

/** Nine sections of different kind. */
export const matrixCases = (): readonly MatrixCase[] => [
  { name: 'thin 0008', section: nacaSection('0008'), from: -7, to: 8 },
  { name: 'common 2412', section: nacaSection('2412'), from: -8, to: 12 },
  { name: 'cambered 6412', section: nacaSection('6412'), from: -6, to: 10 },
  { name: 'thick 4421', section: nacaSection('4421'), from: -8, to: 12 },
  { name: 'five-digit 23015', section: nacaSection('23015'), from: -8, to: 12 },
  { name: 'aft-loaded', section: aftLoaded(), from: -6, to: 10 },
  { name: 'noisy scan', section: noisy(), from: -8, to: 12 },
  { name: 'blunt edge', section: blunt(), from: -8, to: 12 },
  { name: 'reflexed', section: reflexed(), from: -8, to: 12 },
]
