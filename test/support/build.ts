/**
 * Global set-up: commands and window are tested as built, so they are built first when a source is newer.
 * A build that fails does not stop the tests that need none of it; `checkBuilt` stops those that do.
 */
import { spawnSync } from 'node:child_process'
import { existsSync, readdirSync, statSync } from 'node:fs'
import { join } from 'node:path'

const BUILT = ['out/main/cli.js', 'out/main/start.js', 'out/preload/index.cjs', 'out/renderer/index.html']
const SOURCES = ['src', 'bench', 'electron.vite.config.ts', 'package-lock.json']
const BUILDER = 'node_modules/electron-vite/bin/electron-vite.js'
/** Carries what could not be built from the set-up to the tests, which run in other processes. */
const STALE = 'SECTIONWRIGHT_TEST_STALE'

export default function buildIfStale(): void {
  const source = Math.max(...SOURCES.map(newest))
  const stale = (): string[] => BUILT.filter((path) => !existsSync(path) || statSync(path).mtimeMs <= source)
  delete process.env[STALE]
  if (stale().length === 0) return
  const { status, stderr } = spawnSync(process.execPath, [BUILDER, 'build'], { encoding: 'utf8' })
  if (status !== 0) process.env[STALE] = [...stale(), stderr].join('\n')
}

/** Throws when a built file is older than its sources because the build failed. */
export function checkBuilt(path: string): void {
  const fault = process.env[STALE] ?? ''
  if (fault.split('\n').includes(path)) throw new Error(`the build failed:\n${fault}`)
}

function newest(path: string): number {
  const found = statSync(path)
  if (!found.isDirectory()) return found.mtimeMs
  return Math.max(found.mtimeMs, ...readdirSync(path).map((name) => newest(join(path, name))))
}
