import { lstat, mkdir, readdir, readFile, symlink, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { plainReason } from '../../src/files/plainReason'
import { writeFiles } from '../../src/files/writeFiles'
import { temporaryFolder } from '../support/commandLine'

const root = temporaryFolder()
let count = 0

async function fresh(): Promise<(name: string) => string> {
  const folder = join(root(), `files-${count++}`)
  await mkdir(folder)
  return (name) => join(folder, name)
}

describe('writeFiles', () => {
  it('writes text and bytes, in place of what was there, and leaves nothing else', async () => {
    const at = await fresh()
    await writeFile(at('a.txt'), 'older and longer text')
    await writeFiles([
      { path: at('a.txt'), content: 'newer' },
      { path: at('b.bin'), content: Uint8Array.from([1, 2, 3]) },
    ])
    expect(await readFile(at('a.txt'), 'utf8')).toBe('newer')
    expect([...(await readFile(at('b.bin')))]).toEqual([1, 2, 3])
    expect((await readdir(at('.'))).sort()).toEqual(['a.txt', 'b.bin'])
  })

  it.each([
    ['a folder that is not there', 'no-such-folder/b.txt', 'there is no such file or folder'],
    ['a folder in its place', 'taken', 'it is a folder'],
    ['a file for a folder', 'a.txt/b.txt', 'a part of its path is not a folder'],
  ])('writes none of several when one meets %s, and says which', async (_why, bad, reason) => {
    const at = await fresh()
    await writeFile(at('a.txt'), 'older')
    await mkdir(at('taken'))
    const files = [
      { path: at('a.txt'), content: 'newer' },
      { path: at(bad), content: 'x' },
    ]
    await expect(writeFiles(files)).rejects.toThrow(`${at(bad)} cannot be written: ${reason}`)
    expect(await readFile(at('a.txt'), 'utf8')).toBe('older')
    expect((await readdir(at('.'))).sort()).toEqual(['a.txt', 'taken'])
  })

  it('keeps a link and replaces what it points to', async () => {
    const at = await fresh()
    await writeFile(at('real.txt'), 'older')
    await symlink(at('real.txt'), at('link.txt'))
    await writeFiles([{ path: at('link.txt'), content: 'newer' }])
    expect((await lstat(at('link.txt'))).isSymbolicLink()).toBe(true)
    expect(await readFile(at('real.txt'), 'utf8')).toBe('newer')
  })

  it.skipIf(process.platform === 'win32')('writes to a device without replacing it', async () => {
    await writeFiles([{ path: '/dev/null', content: 'away' }])
    expect((await lstat('/dev/null')).isCharacterDevice()).toBe(true)
  })
})

describe('plainReason', () => {
  it('says known reasons in plain words and others as they are', () => {
    expect(plainReason(Object.assign(new Error('x'), { code: 'EACCES' }))).toBe('this user is not allowed to')
    expect(plainReason(new Error('something else'))).toBe('something else')
    expect(plainReason('a word')).toBe('a word')
  })
})
