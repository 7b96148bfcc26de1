import { readdir, readFile, utimes, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { cacheFolder, diskCache } from '../../src/cli/diskCache'
import type { TaskResult } from '../../src/core'
import type { SideLayer } from '../../src/core/flow/surfaceLayers'
import { temporaryFolder } from '../support/commandLine'

const root = temporaryFolder()
let count = 0
const fresh = (): string => join(root(), `cache-${count++}`)

/** A side's boundary layer; its amplification is not a number behind transition. */
const side = (value: number): SideLayer => ({
  ...{ transition: 0.5, laminarSeparation: null, reattachment: null, turbulentSeparation: 0.9 },
  ...{ x: Float64Array.of(0, 0.5, 1), momentumThickness: Float64Array.of(1e-5, value, 1) },
  ...{ shapeFactor: Float64Array.of(2.2, 2.6, 1.4), frictionCoefficient: Float64Array.of(-0, -1e-4, value) },
  amplification: Float64Array.of(0, 9, NaN),
})

function result(value: number): TaskResult {
  const values = Float64Array.from([value, -0, 1 / 3])
  return {
    kind: 'pressure',
    pressure: {
      layers: {
        upper: side(value),
        lower: side(-value),
        dragCoefficient: 0.01,
        frictionDrag: 0,
        pressureDrag: 0,
      },
      ...{ method: 'panel', alpha: 0.1, liftCoefficient: 0.5, momentCoefficient: -0.05 },
      ...{ x: values, y: values.slice(), pressureCoefficient: values.slice(), converged: true, reason: '' },
    },
  }
}

describe('the cache on the disk', () => {
  it('gives back exactly what was put, also to a later run', async () => {
    const folder = fresh()
    await diskCache(folder, 'core', 1e6).put('task', result(1))
    expect(await diskCache(folder, 'core', 1e6).get('task')).toEqual(result(1))
  })

  it('knows nothing of another task or another core', async () => {
    const folder = fresh()
    await diskCache(folder, 'core', 1e6).put('task', result(1))
    expect(await diskCache(folder, 'core', 1e6).get('other')).toBeNull()
    expect(await diskCache(folder, 'newer core', 1e6).get('task')).toBeNull()
  })

  it.each([
    ['cut short', (bytes: Buffer) => bytes.subarray(0, bytes.length - 3)],
    ['changed', (bytes: Buffer) => bytes.fill(7, bytes.length - 4)],
    ['empty', () => Buffer.alloc(0)],
  ])('ignores an entry that is %s', async (_how, damage) => {
    const folder = fresh()
    const cache = diskCache(folder, 'core', 1e6)
    await cache.put('task', result(1))
    const [name] = await readdir(folder)
    await writeFile(join(folder, name!), damage(await readFile(join(folder, name!))))
    expect(await cache.get('task')).toBeNull()
    await cache.put('task', result(2))
    expect(await cache.get('task')).toEqual(result(2))
  })

  it('removes what was used least recently when it is over its bound', async () => {
    const folder = fresh()
    const roomy = diskCache(folder, 'core', 1e6)
    const sizes: number[] = []
    for (const key of ['a', 'b', 'c']) {
      await roomy.put(key, result(1))
      for (const name of await readdir(folder)) sizes.push((await readFile(join(folder, name))).length)
    }
    const past = new Date(Date.now() - 60_000)
    for (const name of await readdir(folder)) await utimes(join(folder, name), past, past)
    await roomy.get('a')
    const tight = diskCache(folder, 'core', 1.5 * sizes[0]!)
    await tight.put('a', result(1))
    await tight.tidy()
    expect(await readdir(folder)).toHaveLength(1)
    expect(await tight.get('a')).toEqual(result(1))
  })

  it('keeps nothing and stops nothing where it cannot write', async () => {
    const file = fresh()
    await writeFile(file, '')
    const cache = diskCache(join(file, 'below a file'), 'core', 1e6)
    await cache.put('task', result(1))
    expect(await cache.get('task')).toBeNull()
    await cache.tidy()
  })

  it.each([
    ['linux', { XDG_CACHE_HOME: '/c' }, join('/c', 'sectionwright')],
    ['win32', { LOCALAPPDATA: '/l' }, join('/l', 'sectionwright', 'cache')],
  ] as const)('lies in the cache folder of the user on %s', (platform, env, folder) => {
    expect(cacheFolder(platform, env)).toBe(folder)
  })
})
