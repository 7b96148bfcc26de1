import { writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { describe, expect, it } from 'vitest'
import { threadPool } from '../../src/cli/threads'
import { nacaSection, runTask, taskKey, type SectionState, type Task } from '../../src/core'
import { temporaryFolder } from '../support/commandLine'

const folder = temporaryFolder()
const signal = new AbortController().signal
const BUILT = pathToFileURL(join(process.cwd(), 'out', 'main', 'cliWorker.js'))

const VISCOUS = { method: 'viscous', reynolds: 1e6, amplification: 9 } as const

function tasks(): Task[] {
  const state: SectionState = {
    ...{ method: 'panel', reynolds: null, mach: 0.2, surface: 'clean', amplification: null },
    ...{ tripUpper: 1, tripLower: 1, flap: 0, panels: 60 },
  }
  const section = nacaSection('2412')
  return [
    { kind: 'polar', section, state, alphas: [-0.05, 0, 0.1] },
    { kind: 'pressure', section, state, at: { lift: 0.4 } },
    { kind: 'pressure', section, state: { ...state, method: 'thin' }, at: { lift: 0.4 } },
    { kind: 'pressure', section, state: { ...state, ...VISCOUS }, at: { alpha: 0.03 } },
    { kind: 'polar', section, state: { ...state, ...VISCOUS }, alphas: [0.03] },
  ]
}

describe('worker threads', () => {
  it('give exactly what the same tasks give here, and stop when they are closed', async () => {
    const { pool, close } = threadPool(BUILT)
    const results = await Promise.all(
      tasks().map((task) => pool().run(taskKey(task), task, { priority: 0, signal })),
    )
    expect(results).toEqual(tasks().map(runTask))
    close()
  })

  it('that break mark their task failed instead of leaving it waiting', async () => {
    const script = join(folder(), 'broken.mjs')
    await writeFile(script, 'throw new Error("cannot start")')
    const { pool, close } = threadPool(pathToFileURL(script))
    const [task] = tasks()
    const result = await pool().run('a', task!, { priority: 0, signal })
    expect(result).toMatchObject({ kind: 'failed' })
    expect(result).toHaveProperty('reason', expect.stringContaining('cannot start'))
    close()
  })

  it('end at once when nobody waits for them any more, however busy', async () => {
    const script = join(folder(), 'endless.mjs')
    await writeFile(
      script,
      'import { parentPort } from "node:worker_threads"\nparentPort.on("message", () => { for (;;); })',
    )
    const { pool, close } = threadPool(pathToFileURL(script))
    const cancel = new AbortController()
    const running = pool().run('a', tasks()[0]!, { priority: 0, signal: cancel.signal })
    setTimeout(() => cancel.abort(), 200)
    await expect(running).rejects.toThrow()
    close()
  })
})
