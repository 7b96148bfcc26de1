import { BadInput, sectionFromPoints, waviness, type ChordLine, type Section, type Understood } from '../core'
import { findOutline } from './coordinates/outline'
import { readRows } from './coordinates/rows'
import { FileProblem } from './problem'

export { decodeText, refuseLarge, LARGEST_TEXT } from './coordinates/decode'

/** A section read from a text and the report of the reading. */
export interface ReadSection {
  readonly section: Section
  /** What was understood, in plain sentences. */
  readonly understood: readonly string[]
  /** What deserves a second look. */
  readonly warnings: readonly string[]
}

/**
 * Reads a section from any plain text in which coordinates are passed round. Throws a FileProblem that
 * names the file, the line where there is one, what is wrong and the cure.
 */
export function readSection(
  text: string,
  file: string,
  options: { readonly chordLine?: ChordLine | null } = {},
): ReadSection {
  if (text.trim() === '') {
    throw new FileProblem(file, null, 'the file is empty', 'give x and y of the outline, a point a line')
  }
  const rows = readRows(text, file)
  const found = findOutline(rows, file)
  const name = rows.title ?? file.replace(/^.*[/\\]/, '').replace(/\.[a-z0-9]+$/i, '')
  try {
    const { section, understood } = sectionFromPoints(found.raw, {
      name,
      chordLine: options.chordLine ?? null,
    })
    const decimals = rows.decimalComma ? ['decimal commas'] : []
    const report = [...decimals, ...found.assumed, ...sentences(understood)]
    const warnings = [...found.warnings, ...warningsOf(understood), ...waves(section)]
    return { section: { ...section, notes: [...report, ...warnings] }, understood: report, warnings }
  } catch (error) {
    if (!(error instanceof BadInput)) throw error
    throw new FileProblem(file, null, error.message, 'check the points and their order')
  }
}

const degrees = (angle: number): string => ((angle * 180) / Math.PI).toFixed(2)

function sentences(found: Understood): string[] {
  const list = [`${found.points} points`]
  if (found.dropped > 0)
    list.push(`${found.dropped} repeated ${found.dropped === 1 ? 'point' : 'points'} left out`)
  if (found.restarted) list.push('the loop did not begin at its trailing edge and was put in order')
  if (found.reversed) list.push('the order was reversed')
  if (found.exchanged) list.push('the first list lies below the second and was taken as the lower side')
  if (Math.abs(found.chord - 1) > 1e-6)
    list.push(`scaled from a chord of ${Number(found.chord.toPrecision(6))}`)
  if (found.turned) list.push(`turned by ${degrees(-found.longestChordAngle)} deg onto its longest chord`)
  else if (Math.abs(found.longestChordAngle) > 1e-4) {
    list.push(
      `its longest chord lies ${degrees(found.longestChordAngle)} deg off the axis of the file, which is kept`,
    )
  }
  list.push(
    found.edgeGap < 1e-6
      ? 'closed trailing edge'
      : `trailing edge ${(100 * found.edgeGap).toFixed(2)} % thick`,
  )
  return list
}

/** Above this turning it is not clear which side is meant to be the upper one. */
const FAR_TURNED = Math.PI / 4
const FEW_POINTS = 30

function warningsOf(found: Understood): string[] {
  const list: string[] = []
  if (Math.abs(found.longestChordAngle) > FAR_TURNED && found.turned) {
    list.push(`turned by ${degrees(-found.longestChordAngle)} deg: check which side is the upper one`)
  }
  if (found.points < FEW_POINTS) list.push(`only ${found.points} points: the nose may be poorly described`)
  if (found.edgeGap > 0.02) list.push(`the trailing edge is ${(100 * found.edgeGap).toFixed(1)} % thick`)
  return list
}

function waves(section: Section): string[] {
  const worst = waviness(section).waves[0]
  if (worst === undefined) return []
  const height = Math.abs(100 * worst.height).toFixed(2)
  return [`the ${worst.side} side is wavy or kinked: ${height} % of the chord at x/c ${worst.at.toFixed(2)}`]
}

/** A section as a coordinate text: its name, then the outline from the upper trailing edge round. */
export function writeCoordinates(section: Section): string {
  const lines = Array.from(section.x, (x, i) => `${x} ${section.y[i]}`)
  return `${section.name}\n${lines.join('\n')}\n`
}
