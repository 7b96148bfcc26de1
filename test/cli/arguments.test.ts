import { fc, test } from '@fast-check/vitest'
import { describe, expect, it } from 'vitest'
import { angleRange, joinNegatives, MOST_ANGLES, numberIn, wordOf } from '../../src/cli/arguments'

describe('joinNegatives', () => {
  it.each([
    [['--alpha', '-4:12:0.5'], ['--alpha=-4:12:0.5']],
    [
      ['--alpha', '-.5', 'x'],
      ['--alpha=-.5', 'x'],
    ],
    [['--alpha=-4:12:0.5'], ['--alpha=-4:12:0.5']],
    [
      ['--alpha', '--csv', '-'],
      ['--alpha', '--csv', '-'],
    ],
    [
      ['--csv', '-', '-3'],
      ['--csv', '-', '-3'],
    ],
    [
      ['--', '--alpha', '-4'],
      ['--', '--alpha', '-4'],
    ],
  ])('makes %j into %j', (given, joined) => {
    expect(joinNegatives(given)).toEqual(joined)
  })
})

describe('angleRange', () => {
  it.each([
    ['-4:12:4', [-4, 0, 4, 8, 12]],
    ['0:1:0.4', [0, 0.4, 0.8]],
    ['4:-4:-4', [4, 0, -4]],
    ['3:3:1', [3]],
    ['3:3:-1', [3]],
  ])('reads %s', (text, angles) => {
    expect(angleRange('--alpha', text)).toEqual(angles)
  })

  it.each([
    ...['', '4', '0:4', '0:4:1:2', 'a:4:1', '0:4:0', '0:4:-1', '4:0:1', '0::1', '0:4:1e', '0x1:4:1'],
    ...['0:NaN:1', '0:Infinity:1', '-181:0:1', '0:180:0.001', ' : : '],
  ])('refuses "%s"', (text) => {
    expect(() => angleRange('--alpha', text)).toThrow('--alpha')
  })

  test.prop([
    fc.integer({ min: -60, max: 60 }),
    fc.integer({ min: 0, max: 400 }),
    fc.constantFrom(0.1, 0.25, 0.7, 1),
  ])('ends at TO when TO is a whole number of steps away, however the steps round', (from, steps, step) => {
    fc.pre(from + steps * step <= 180)
    const angles = angleRange('--alpha', `${from}:${from + steps * step}:${step}`)
    expect(angles).toHaveLength(steps + 1)
    expect(angles[0]).toBe(from)
    expect(angles[steps]).toBe(from + steps * step)
  })

  it('says how many angles there are when there are too many', () => {
    expect(() => angleRange('--alpha', '0:180:0.01')).toThrow(`18001 angles; at most ${MOST_ANGLES}`)
  })
})

describe('numberIn', () => {
  it.each([
    ['0', 0],
    ['0.5', 0.5],
    ['.25', 0.25],
    ['1e-1', 0.1],
    ['+0.3', 0.3],
  ])('reads %s', (text, value) => {
    expect(numberIn('--mach', text, 0, 0.5)).toBe(value)
  })

  it.each(['', ' ', '0.51', '-0.1', '0,3', 'Infinity', 'NaN', '0x0', '1e', 'half'])(
    'refuses "%s"',
    (text) => {
      expect(() => numberIn('--mach', text, 0, 0.5)).toThrow('--mach takes a number from 0 to 0.5')
    },
  )
})

describe('wordOf', () => {
  it('names the words that it takes', () => {
    expect(wordOf('--edge', 'open', ['closed', 'open'])).toBe('open')
    expect(() => wordOf('--edge', 'OPEN', ['closed', 'open'])).toThrow(
      '--edge takes closed or open, not "OPEN"',
    )
  })
})
