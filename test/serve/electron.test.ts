import { mkdtemp, mkdir, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { browserCommand } from '../../src/serve/browser'
import { electronFolder, findElectron, runDownload } from '../../src/serve/electron'

let folder: string
const never = new AbortController().signal

beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'electron-'))
})
afterEach(() => rm(folder, { recursive: true }))

async function unpack(): Promise<'done'> {
  await mkdir(join(folder, 'dist'))
  await writeFile(join(folder, 'dist', 'electron'), '')
  await writeFile(join(folder, 'path.txt'), 'electron')
  return 'done'
}

describe('finding Electron', () => {
  it('takes the program that is there, without a download', async () => {
    await unpack()
    const download = vi.fn()
    const found = await findElectron({ folder, nodeMajor: 20, download }, never)
    expect(found).toEqual({ program: join(folder, 'dist', 'electron') })
    expect(download).not.toHaveBeenCalled()
  })

  it('lets the package fetch it on first use', async () => {
    const found = await findElectron({ folder, nodeMajor: 22, download: unpack }, never)
    expect(found).toEqual({ program: join(folder, 'dist', 'electron') })
  })

  it('says that the download needs Node 22, and does not try it on an older one', async () => {
    const download = vi.fn()
    const found = await findElectron({ folder, nodeMajor: 20, download }, never)
    expect(found).toEqual({ missing: 'its own download needs Node 22, and this is Node 20' })
    expect(download).not.toHaveBeenCalled()
  })

  it.each([
    ['too slow', 'its download took more than 20 seconds'],
    ['failed', 'its download failed'],
    ['done', 'its download failed'],
  ] as const)('says what came of a download that was %s', async (outcome, missing) => {
    expect(await findElectron({ folder, nodeMajor: 24, download: async () => outcome }, never)).toEqual({
      missing,
    })
  })

  it('says when the package is not installed', async () => {
    const found = await findElectron({ folder: null, nodeMajor: 24, download: unpack }, never)
    expect(found).toEqual({ missing: 'the electron package is not installed' })
  })

  it('finds the folder of the package from a file of ours, and null where there is none', () => {
    expect(electronFolder(join(process.cwd(), 'out', 'main', 'start.js'))).toContain('electron')
    expect(electronFolder(join(folder, 'start.js'))).toBeNull()
  })
})

describe('the download', () => {
  it.each([
    ['process.exit(0)', 'done'],
    ['process.exit(1)', 'failed'],
    ['setTimeout(() => {}, 60_000)', 'too slow'],
  ])('of a script "%s" is %s', async (script, outcome) => {
    await writeFile(join(folder, 'install.js'), script)
    expect(await runDownload(join(folder, 'install.js'), 700, never)).toBe(outcome)
  })
})

describe('the browser', () => {
  it.each([
    ['linux', { DISPLAY: ':0' }, ['xdg-open', 'http://a/']],
    ['linux', { WAYLAND_DISPLAY: 'wayland-0' }, ['xdg-open', 'http://a/']],
    ['linux', {}, null],
    ['darwin', {}, ['open', 'http://a/']],
    ['win32', {}, ['cmd', '/c', 'start', '', 'http://a/']],
  ] as const)('on %s with %o is opened by %o', (platform, env, command) => {
    expect(browserCommand(platform, env, 'http://a/')).toEqual(command)
  })
})
