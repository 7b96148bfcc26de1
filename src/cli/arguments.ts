import { parseArgs, type ParseArgsConfig } from 'node:util'
import { Failure } from './failure'

/** Joins an option to a value that begins with a minus and a digit, which else reads as an option. */
export function joinNegatives(args: readonly string[]): string[] {
  const joined: string[] = []
  for (let i = 0; i < args.length; i++) {
    const arg = args[i]!
    const next = args[i + 1]
    if (arg === '--') return [...joined, ...args.slice(i)]
    if (/^--[^=]+$/.test(arg) && next !== undefined && /^-\.?\d/.test(next)) {
      joined.push(`${arg}=${next}`)
      i++
    } else joined.push(arg)
  }
  return joined
}

/**
 * The options and positional words of a command.
 *
 * Throws Failure for an option that the command does not have, or one without its value.
 */
export function readArguments<T extends NonNullable<ParseArgsConfig['options']>>(
  args: readonly string[],
  options: T,
): ReturnType<typeof parseArgs<{ args: string[]; options: T; allowPositionals: true }>> {
  try {
    return parseArgs({ args: joinNegatives(args), options, allowPositionals: true })
  } catch (error) {
    // The first sentence says what is wrong; the rest is about the parser.
    throw new Failure((error as Error).message.split(/(?<=\.) /)[0]!.replace(/\.$/, ''))
  }
}

const NUMBER = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i

/** A plain decimal number in a range. Throws Failure that names the option. */
export function numberIn(option: string, text: string, least: number, greatest: number): number {
  const value = NUMBER.test(text.trim()) ? Number(text) : NaN
  if (!(value >= least && value <= greatest)) {
    throw new Failure(`${option} takes a number from ${least} to ${greatest}, not "${text}"`)
  }
  return value
}

/** One of a few words. Throws Failure that names the option and the words. */
export function wordOf<T extends string>(option: string, text: string, words: readonly T[]): T {
  const word = words.find((candidate) => candidate === text)
  if (word === undefined) throw new Failure(`${option} takes ${words.join(' or ')}, not "${text}"`)
  return word
}

/** More angles than any use of a polar; more than this is taken for a slip in the step. */
export const MOST_ANGLES = 10_000

/**
 * The angles of FROM:TO:STEP in degrees: FROM + i STEP for i = 0 ... floor((TO - FROM)/STEP + 1e-9), so
 * that a last angle that rounding puts just beyond TO is kept.
 *
 * Throws Failure for a range that is none, has no angle, or has too many.
 */
export function angleRange(option: string, text: string): number[] {
  const parts = text.split(':')
  if (parts.length !== 3) throw new Failure(`${option} takes FROM:TO:STEP in degrees, not "${text}"`)
  const [from, to, step] = parts.map((part) => numberIn(option, part, -180, 180)) as [number, number, number]
  if (step === 0) throw new Failure(`${option}: the step of "${text}" is zero`)
  const last = Math.floor((to - from) / step + 1e-9)
  if (last < 0) throw new Failure(`${option}: "${text}" steps away from its end, so it has no angles`)
  if (last >= MOST_ANGLES) {
    throw new Failure(`${option}: "${text}" has ${last + 1} angles; at most ${MOST_ANGLES} are computed`)
  }
  return Array.from({ length: last + 1 }, (_, i) => from + i * step)
}
