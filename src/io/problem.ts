/** A file that cannot be used: which, where, what is wrong and what to do about it. */
export class FileProblem extends Error {
  override readonly name = 'FileProblem'

  constructor(
    readonly file: string,
    /** Counted from 1; null when the fault is not of one line. */
    readonly line: number | null,
    what: string,
    readonly cure: string,
  ) {
    super(`${file}${line === null ? '' : `, line ${line}`}: ${what}; ${cure}`)
  }
}
