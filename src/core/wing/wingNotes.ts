/** What decides which notes a wing carries. */
export interface NotedWing {
  readonly aspectRatio: number
  readonly mach: number
  readonly sweepQuarterChord: number
  /** The largest local lift coefficient. */
  readonly peakLift: number
  readonly leastReynolds: number
  readonly greatestReynolds: number
  readonly tailless: boolean
  readonly lacksCentreOfGravity: boolean
  readonly lacksTailArm: boolean
}

/** Below this aspect ratio the lifting line reads visibly high (common practice). */
const LOW_ASPECT_RATIO = 4
const NOTED_SWEEP = (5 * Math.PI) / 180
const FASTEST = 0.5
const LOWEST_REYNOLDS = 5e4
const HIGHEST_REYNOLDS = 2e7
/** What highly cambered sections without flaps reach at most (common practice). */
const MOST_SECTION_LIFT = 2.2

/** The doubts that a wing's figures carry, in plain sentences. */
export function wingNotes(wing: NotedWing): string[] {
  const degrees = (Math.abs(wing.sweepQuarterChord) * 180) / Math.PI
  const notes: [boolean, string][] = [
    [
      wing.aspectRatio < LOW_ASPECT_RATIO,
      `aspect ratio ${wing.aspectRatio.toFixed(1)}: the lifting line reads a few per cent high below ${LOW_ASPECT_RATIO}`,
    ],
    [
      Math.abs(wing.sweepQuarterChord) > NOTED_SWEEP,
      `sweep of ${degrees.toFixed(0)} deg: only the section slope is corrected; the outboard shift of lift is not computed`,
    ],
    [
      wing.mach > FASTEST,
      `Mach ${wing.mach.toFixed(2)} is above ${FASTEST}: the compressibility rule does not reach it`,
    ],
    [
      wing.leastReynolds < LOWEST_REYNOLDS,
      wing.greatestReynolds < LOWEST_REYNOLDS
        ? 'the Reynolds number is below 50 000 on the whole span'
        : 'the Reynolds number falls below 50 000 where the chord is short',
    ],
    [wing.greatestReynolds > HIGHEST_REYNOLDS, 'the Reynolds number exceeds 20 million'],
    [
      wing.peakLift > MOST_SECTION_LIFT,
      `a local lift coefficient of ${wing.peakLift.toFixed(1)} is more than sections without flaps carry; straight lift curves do not stall`,
    ],
    [
      wing.lacksCentreOfGravity,
      'no centre of gravity given: it is taken at the aerodynamic centre of the wing',
    ],
    [wing.lacksTailArm && !wing.tailless, 'no tail arm given: the wing carries the whole load'],
    [
      wing.tailless,
      'tailless: the wing carries the whole load; whether it balances itself is not judged here',
    ],
  ]
  return notes.filter(([holds]) => holds).map(([, words]) => words)
}
