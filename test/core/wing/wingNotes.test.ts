import { describe, expect, it } from 'vitest'
import { wingNotes, type NotedWing } from '../../../src/core/wing/wingNotes'

const sound: NotedWing = {
  aspectRatio: 8,
  mach: 0.2,
  sweepQuarterChord: 0,
  peakLift: 1,
  leastReynolds: 3e5,
  greatestReynolds: 6e5,
  tailless: false,
  lacksCentreOfGravity: false,
  lacksTailArm: false,
}

describe('the notes of a wing', () => {
  it('are none for a wing inside every range', () => {
    expect(wingNotes(sound)).toEqual([])
  })

  it.each<[string, Partial<NotedWing>]>([
    ['aspect ratio 3.0', { aspectRatio: 3 }],
    ['sweep of 20 deg', { sweepQuarterChord: (-20 * Math.PI) / 180 }],
    ['Mach 0.55', { mach: 0.55 }],
    ['below 50 000 where the chord is short', { leastReynolds: 4e4 }],
    ['below 50 000 on the whole span', { leastReynolds: 3e4, greatestReynolds: 4e4 }],
    ['exceeds 20 million', { greatestReynolds: 3e7 }],
    ['local lift coefficient of 2.5', { peakLift: 2.5 }],
    ['no centre of gravity', { lacksCentreOfGravity: true }],
    ['no tail arm', { lacksTailArm: true }],
    ['tailless', { lacksTailArm: true, tailless: true }],
  ])('say "%s" when it holds, and nothing else', (words, change) => {
    const notes = wingNotes({ ...sound, ...change })
    expect(notes).toHaveLength(1)
    expect(notes[0]).toContain(words)
  })
})
