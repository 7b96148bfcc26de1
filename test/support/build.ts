/** Global set-up: commands and window are tested as built, so they are built first when something is newer. */
import { execFileSync } from 'node:child_process'
import { existsSync, readdirSync, statSync } from 'node:fs'
import { join } from 'node:path'

const BUILT = ['out/main/cli.js', 'out/preload/index.cjs', 'out/renderer/index.html']
const SOURCES = ['src', 'bench', 'electron.vite.config.ts', 'package-lock.json']

export default function buildIfStale(): void {
  const oldest = Math.min(...BUILT.map((path) => (existsSync(path) ? statSync(path).mtimeMs : 0)))
  if (Math.max(...SOURCES.map(newest)) < oldest) return
  execFileSync(process.execPath, ['node_modules/electron-vite/bin/electron-vite.js', 'build'], {
    stdio: 'pipe',
  })
}

function newest(path: string): number {
  const found = statSync(path)
  if (!found.isDirectory()) return found.mtimeMs
  return Math.max(found.mtimeMs, ...readdirSync(path).map((name) => newest(join(path, name))))
}
