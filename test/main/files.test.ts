import type { OpenDialogOptions, SaveDialogOptions } from 'electron'
import { describe, expect, it } from 'vitest'
import { briefFile, openFiles, saveFile, saveFiles, type FileParts } from '../../src/main/files'
import { recovery } from '../../src/main/recovery'
import { LARGEST_FILE } from '../../src/shared/host'

/** A disk in memory and dialogs that answer as the test says. */
function desk(files: Record<string, string> = {}): FileParts & {
  disk: Map<string, string>
  asked: (OpenDialogOptions | SaveDialogOptions)[]
  picks: string[][]
  places: (string | null)[]
  large: Set<string>
} {
  const disk = new Map(Object.entries(files))
  const asked: (OpenDialogOptions | SaveDialogOptions)[] = []
  const picks: string[][] = []
  const places: (string | null)[] = []
  const large = new Set<string>()
  return {
    ...{ disk, asked, picks, places, large },
    dialog: {
      open: async (options) => {
        asked.push(options)
        const filePaths = picks.shift() ?? []
        return { canceled: filePaths.length === 0, filePaths }
      },
      save: async (options) => {
        asked.push(options)
        const filePath = places.shift() ?? null
        return { canceled: filePath === null, filePath: filePath ?? '' }
      },
    },
    sizeOf: async (path) => (large.has(path) ? LARGEST_FILE + 1 : disk.get(path)!.length),
    read: async (path) => new TextEncoder().encode(disk.get(path)),
    write: async (written) => {
      for (const { path, content } of written) disk.set(path, content.toString())
    },
  }
}

const text = (bytes: Uint8Array): string => new TextDecoder().decode(bytes)

describe('coordinate files', () => {
  it('are opened several at once, by name without folder', async () => {
    const parts = desk({ '/a/one.txt': '1', '/b/two.txt': '2' })
    parts.picks.push(['/a/one.txt', '/b/two.txt'])
    const opened = await openFiles(parts)
    expect(opened.map(({ name, bytes }) => [name, text(bytes)])).toEqual([
      ['one.txt', '1'],
      ['two.txt', '2'],
    ])
    expect(parts.asked[0]!.properties).toContain('multiSelections')
  })

  it('are none when the user picks none', async () => {
    expect(await openFiles(desk())).toEqual([])
  })

  it('over the size limit are refused before they are read', async () => {
    const parts = desk({ '/a/one.txt': '1' })
    parts.large.add('/a/one.txt')
    parts.picks.push(['/a/one.txt'])
    Object.assign(parts, { read: () => Promise.reject(new Error('it was read')) })
    await expect(openFiles(parts)).rejects.toThrow('one.txt is larger than 5 MB')
  })
})

describe('the file of the brief', () => {
  it('is asked for once, then saved without asking', async () => {
    const parts = desk()
    const brief = briefFile(parts)
    parts.places.push('/documents/mine.brief.json')
    expect(await brief.save('first', 'suggested.brief.json', false)).toEqual({ name: 'mine.brief.json' })
    expect(parts.asked).toHaveLength(1)
    expect((parts.asked[0] as SaveDialogOptions).defaultPath).toBe('suggested.brief.json')
    await brief.save('second', 'suggested.brief.json', false)
    expect(parts.asked).toHaveLength(1)
    expect(parts.disk.get('/documents/mine.brief.json')).toBe('second')
  })

  it('is the one that was opened, until it is saved elsewhere or forgotten', async () => {
    const parts = desk({ '/documents/a.brief.json': 'a' })
    const brief = briefFile(parts)
    parts.picks.push(['/documents/a.brief.json'])
    expect((await brief.open())?.name).toBe('a.brief.json')
    await brief.save('a2', 's', false)
    parts.places.push('/documents/b.brief.json')
    await brief.save('b', 's', true)
    await brief.save('b2', 's', false)
    expect(Object.fromEntries(parts.disk)).toEqual({
      '/documents/a.brief.json': 'a2',
      '/documents/b.brief.json': 'b2',
    })
    brief.forget()
    expect(await brief.save('c', 's', false)).toBeNull()
    expect(parts.asked).toHaveLength(3)
  })

  it('stays as it was when the user gives up or the disk refuses', async () => {
    const parts = desk({ '/documents/a.brief.json': 'a' })
    const brief = briefFile(parts)
    parts.picks.push(['/documents/a.brief.json'])
    await brief.open()
    expect(await brief.save('b', 's', true)).toBeNull()
    expect(await brief.open()).toBeNull()
    parts.places.push('/full/b.brief.json')
    const { write } = parts
    Object.assign(parts, { write: () => Promise.reject(new Error('the disk is full')) })
    await expect(brief.save('b', 's', true)).rejects.toThrow('the disk is full')
    Object.assign(parts, { write })
    await brief.save('a2', 's', false)
    expect(Object.fromEntries(parts.disk)).toEqual({ '/documents/a.brief.json': 'a2' })
  })
})

describe('exports', () => {
  it('go where the user says, or nowhere', async () => {
    const parts = desk()
    parts.places.push('/out/p.csv')
    expect(await saveFile(parts, 'polars.csv', 'x')).toEqual({ name: 'p.csv' })
    expect(await saveFile(parts, 'polars.csv', 'y')).toBeNull()
    expect(parts.disk.get('/out/p.csv')).toBe('x')
  })

  it('of several files go into one folder in one write', async () => {
    const parts = desk()
    parts.picks.push(['/out'])
    const files = [
      { name: 'polars.csv', text: 'p' },
      { name: 'wing.csv', text: 'w' },
    ]
    expect(await saveFiles(parts, files)).toEqual({ name: 'out' })
    expect(Object.fromEntries(parts.disk)).toEqual({ '/out/polars.csv': 'p', '/out/wing.csv': 'w' })
    expect(await saveFiles(parts, files)).toBeNull()
  })
})

describe('recovery', () => {
  const missing = Object.assign(new Error('none'), { code: 'ENOENT' })

  function kept(): ReturnType<typeof recovery> & { disk: Map<string, string>; writes: string[] } {
    const disk = new Map<string, string>()
    const writes: string[] = []
    const unsaved = recovery({
      path: '/user/unsaved',
      readText: async (path) => disk.get(path) ?? Promise.reject(missing),
      write: async ([file]) => {
        writes.push(file!.content.toString())
        await new Promise((resolve) => setTimeout(resolve, 5))
        disk.set(file!.path, file!.content.toString())
      },
      remove: async (path) => void disk.delete(path),
    })
    return { ...unsaved, disk, writes }
  }

  it('gives back what was kept, and nothing when it was let go', async () => {
    const unsaved = kept()
    expect(await unsaved.recover()).toBeNull()
    await unsaved.keep('a')
    expect(await unsaved.recover()).toBe('a')
    await unsaved.keep(null)
    expect(await unsaved.recover()).toBeNull()
  })

  it('writes one after another, leaves out what is superseded, and ends with the latest', async () => {
    const unsaved = kept()
    await Promise.all(['a', 'b', 'c', 'd'].map((text) => unsaved.keep(text)))
    expect(unsaved.writes.at(-1)).toBe('d')
    expect(unsaved.writes.length).toBeLessThan(4)
    expect(await unsaved.recover()).toBe('d')
  })

  it('says plainly when what was kept cannot be read', async () => {
    const denied = Object.assign(new Error('EACCES'), { code: 'EACCES' })
    const unsaved = recovery({
      path: '/user/unsaved',
      readText: () => Promise.reject(denied),
      write: async () => {},
      remove: async () => {},
    })
    await expect(unsaved.recover()).rejects.toThrow('cannot be read: this user is not allowed to')
  })
})
