// The whole check: types, lint, layers, then every suite, with the totals as the last line.
// Exit status 1 when anything failed. Without a Chromium the browser suite is left out and says so;
// with CI set that is a failure.
import { spawnSync } from 'node:child_process'
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

const folder = mkdtempSync(join(tmpdir(), 'sectionwright-test-'))
let passed = 0
let failed = 0

function run(command, args) {
  return (
    spawnSync('npx', ['--no-install', command, ...args], {
      stdio: 'inherit',
      shell: process.platform === 'win32',
    }).status === 0
  )
}

/** A check counts as one test. */
function check(name, command, args) {
  const good = run(command, args)
  console.log(`${good ? 'passed' : 'FAILED'}: ${name}`)
  if (good) passed++
  else failed++
}

/** A suite counts as many as it has tests; one that ends without a report counts as one failure. */
function suite(name, args) {
  const report = join(folder, `${name}.json`)
  const good = run('vitest', [
    'run',
    ...args,
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
  ])
  const totals = existsSync(report)
    ? JSON.parse(readFileSync(report, 'utf8'))
    : { numPassedTests: 0, numFailedTests: 0 }
  passed += totals.numPassedTests
  failed += totals.numFailedTests
  if (!good && totals.numFailedTests === 0) failed++
  console.log(`${name}: ${totals.numPassedTests} passed, ${totals.numFailedTests} failed`)
}

check('types of the core', 'tsc', ['-p', 'tsconfig.core.json'])
check('types of command line, main and io', 'tsc', ['-p', 'tsconfig.node.json'])
check('types of the window', 'vue-tsc', ['-p', 'tsconfig.web.json'])
check('types of tests and bench', 'vue-tsc', ['-p', 'tsconfig.test.json'])
check('lint', 'eslint', ['.', '--max-warnings', '0'])
check('layers', 'depcruise', ['src', '--config', '.dependency-cruiser.cjs', '--output-type', 'err'])
check('format', 'prettier', ['--check', '--log-level', 'warn', '.'])
check('build', 'electron-vite', ['build', '--logLevel', 'error'])
suite('suites', [])

const chromium = process.env.CHROMIUM_PATH ?? '/usr/bin/chromium'
if (existsSync(chromium)) suite('browser', ['--config', 'vitest.e2e.config.ts'])
else if (process.env.CI) {
  console.log('FAILED: no Chromium for the browser suite')
  failed++
} else console.log('browser: not run: no Chromium')

rmSync(folder, { recursive: true, force: true })
console.log(`${passed} passed, ${failed} failed`)
process.exit(failed === 0 ? 0 : 1)
