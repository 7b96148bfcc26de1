import { FileProblem } from '../problem'

/** Text of more bytes is refused before it is read. */
export const LARGEST_TEXT = 5 * 1024 * 1024

/** Throws a FileProblem for a size in bytes over 5 MB. */
export function refuseLarge(bytes: number, file: string): void {
  if (bytes > LARGEST_TEXT) {
    throw new FileProblem(
      file,
      null,
      `${(bytes / 1024 / 1024).toFixed(1)} MB is too large for a section`,
      'give a text of at most 5 MB',
    )
  }
}

/** Text of a file: UTF-8 with or without its mark, else Latin-1. Throws a FileProblem for what is no text. */
export function decodeText(bytes: Uint8Array, file: string): string {
  refuseLarge(bytes.byteLength, file)
  if (bytes.includes(0)) {
    throw new FileProblem(file, null, 'this is not a text file', 'open the coordinates as plain text')
  }
  const codes = [...bytes.subarray(0, 4096)]
  const strange = codes.filter((code) => code < 32 && ![9, 10, 11, 12, 13, 26].includes(code)).length
  if (strange > 0) {
    throw new FileProblem(file, null, 'this is not a text file', 'open the coordinates as plain text')
  }
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes)
  } catch {
    return new TextDecoder('latin1').decode(bytes)
  }
}
