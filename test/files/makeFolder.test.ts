import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { expect, it } from 'vitest'
import { makeFolder } from '../../src/files/makeFolder'

it('makeFolder makes what is missing, says so, and refuses a place under a file', async () => {
  const base = mkdtempSync(join(tmpdir(), 'sectionwright-folder-'))
  try {
    expect(await makeFolder(join(base, 'a', 'b'))).toBe(true)
    expect(await makeFolder(join(base, 'a', 'b'))).toBe(false)
    writeFileSync(join(base, 'file'), '')
    await expect(makeFolder(join(base, 'file'))).rejects.toMatchObject({ code: 'EEXIST' })
    await expect(makeFolder(join(base, 'file', 'under'))).rejects.toThrow()
  } finally {
    rmSync(base, { recursive: true, force: true })
  }
})

it.runIf(existsSync('/proc/self'))(
  'makeFolder ends where the file system calls a new folder missing',
  async () => {
    await expect(makeFolder('/proc/sectionwright/out')).rejects.toThrow()
  },
)
