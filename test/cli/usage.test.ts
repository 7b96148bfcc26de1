import { mkdir, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { callersFolder } from '../../src/cli/terminal'
import { command, LENS, temporaryFolder } from '../support/commandLine'

const folder = temporaryFolder()
const COMMANDS = ['shape', 'sweep', 'pressure', 'wing', 'compare']

describe('the command line', () => {
  it('without a command names all commands on standard error, with status 2', async () => {
    const { status, out, err } = await command([])
    expect([status, out]).toEqual([2, ''])
    for (const name of COMMANDS) expect(err).toContain(`  ${name} `)
  })

  it.each(['polar', 'toString', '--version', 'SHAPE'])('refuses the command "%s"', async (name) => {
    const { status, out, err } = await command([name])
    expect([status, out]).toEqual([2, ''])
    expect(err).toContain(`There is no command "${name}"`)
  })

  it('prints its help', async () => {
    const { status, out, err } = await command(['--help'])
    expect([status, err]).toEqual([0, ''])
    expect(out).toContain('Usage:')
  })

  it.each(COMMANDS)('prints the help of %s', async (name) => {
    const { status, out, err } = await command([name, '--help'])
    expect([status, err]).toEqual([0, ''])
    expect(out).toContain(`Usage: ${name} `)
  })
})

describe('the folder of the caller', () => {
  it('is what npm says only when npm runs this command itself', () => {
    const env = { npm_lifecycle_event: 'cli', INIT_CWD: '/caller' }
    expect(callersFolder(env, '/project')).toBe('/caller')
    expect(callersFolder({ ...env, npm_lifecycle_event: 'test' }, '/project')).toBe('/project')
    expect(callersFolder({}, '/here')).toBe('/here')
  })

  it('is where relative paths start', async () => {
    await mkdir(join(folder(), 'caller'))
    await writeFile(join(folder(), 'caller', 'lens.txt'), LENS)
    const env = { npm_lifecycle_event: 'cli', INIT_CWD: join(folder(), 'caller') }
    const found = await command(['shape', 'lens.txt'], { folder: folder(), env })
    expect(found.status).toBe(0)
    const missed = await command(['shape', 'lens.txt'], { folder: folder() })
    expect(missed.status).toBe(2)
  })
})
