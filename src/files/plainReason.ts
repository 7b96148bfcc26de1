const REASONS: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file or folder',
  ENOTDIR: 'a part of its path is not a folder',
  EISDIR: 'it is a folder',
  EACCES: 'this user is not allowed to',
  EPERM: 'this user is not allowed to',
  EROFS: 'the disk is read-only',
  ENOSPC: 'the disk is full',
  EMFILE: 'too many files are open',
  ENAMETOOLONG: 'its name is too long',
}

/** Why an operation on a file failed, in plain words that end a sentence. */
export function plainReason(error: unknown): string {
  const code = (error as NodeJS.ErrnoException).code
  const known = code === undefined ? undefined : REASONS[code]
  return known ?? (error instanceof Error ? error.message : String(error))
}
