import { plainReason } from '../files/plainReason'
import type { FileToWrite } from '../files/writeFiles'

/** What recovery needs from outside. */
export interface RecoveryParts {
  /** Where the unsaved document is kept, in the program's own folder. */
  readonly path: string
  readonly readText: (path: string) => Promise<string>
  readonly write: (files: readonly FileToWrite[]) => Promise<void>
  readonly remove: (path: string) => Promise<void>
}

/**
 * Keeps the unsaved document so that a crash loses nothing. Writes follow one another, the latest wins:
 * what was superseded while another write was under way is skipped.
 */
export function recovery(parts: RecoveryParts): {
  recover(): Promise<string | null>
  keep(text: string | null): Promise<void>
} {
  let latest: { text: string | null } | null = null
  let writing: Promise<void> = Promise.resolve()

  const writeLatest = async (): Promise<void> => {
    const next = latest
    if (next === null) return
    latest = null
    if (next.text === null) await parts.remove(parts.path)
    else await parts.write([{ path: parts.path, content: next.text }])
  }

  return {
    recover: async () => {
      await writing.catch(() => {})
      try {
        return await parts.readText(parts.path)
      } catch (error) {
        if ((error as NodeJS.ErrnoException).code === 'ENOENT') return null
        throw new Error(`The unsaved brief cannot be read: ${plainReason(error)}`, { cause: error })
      }
    },
    keep: (text) => {
      latest = { text }
      writing = writing.catch(() => {}).then(writeLatest)
      return writing
    },
  }
}
