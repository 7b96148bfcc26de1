/**
 * The bench runner: `[NAME…] [--json FILE]` runs the named benches, all without a name, each in a process of
 * its own, and writes { name: { median_ms, runs, peak_MB, parts?, note? } } to the file or to standard
 * output. One that cannot run here has null figures and a note. Exit status 2 for input that makes no sense.
 */
import { spawnSync } from 'node:child_process'
import { renameSync, rmSync, writeFileSync } from 'node:fs'
import { resolve } from 'node:path'
import { parseArgs } from 'node:util'
import { measure, type Figures } from './measure'
import { benches } from './registry'

type Result =
  Figures | { readonly median_ms: null; readonly runs: 0; readonly peak_MB: null; readonly note: string }

void main(process.argv.slice(2)).then((status) => {
  process.exitCode = status
})

async function main(args: readonly string[]): Promise<number> {
  if (args[0] === '--one') {
    process.stdout.write(JSON.stringify(await one(args[1] ?? '')))
    return 0
  }
  let request: { json: string | undefined; names: string[] }
  try {
    request = read(args)
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`)
    return 2
  }
  const names = request.names.length > 0 ? request.names : benches.map((bench) => bench.name)
  const results: Record<string, Result> = {}
  for (const name of names) {
    if (process.stderr.isTTY) process.stderr.write(`${name} …\n`)
    results[name] = inOwnProcess(name)
  }
  return write(`${JSON.stringify(results, null, 2)}\n`, request.json)
}

function read(args: readonly string[]): { json: string | undefined; names: string[] } {
  const { values, positionals } = parseArgs({
    args: [...args],
    options: { json: { type: 'string' } },
    allowPositionals: true,
  })
  const known = benches.map((bench) => bench.name)
  const unknown = positionals.filter((name) => !known.includes(name))
  if (unknown.length > 0) {
    throw new Error(`no bench is named ${unknown.join(', ')}; there are: ${known.join(', ')}`)
  }
  return { json: values.json, names: positionals }
}

async function one(name: string): Promise<Result> {
  const made = await benches.find((bench) => bench.name === name)?.make()
  if (made === undefined) return notHere(`no bench is named ${name}`)
  if (!('run' in made)) return notHere(made.note)
  const figures = await measure(made)
  await made.stop?.()
  return figures
}

function notHere(note: string): Result {
  return { median_ms: null, runs: 0, peak_MB: null, note }
}

function inOwnProcess(name: string): Result {
  const child = spawnSync(process.execPath, [...process.execArgv, process.argv[1] ?? '', '--one', name], {
    encoding: 'utf8',
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  if (child.status === 0) return JSON.parse(child.stdout) as Result
  process.stderr.write(child.stderr)
  return notHere(`it stopped: ${child.stderr.trim().split('\n').at(-1) ?? child.signal ?? 'no message'}`)
}

function write(text: string, file: string | undefined): number {
  if (file === undefined || file === '-') {
    process.stdout.write(text)
    return 0
  }
  const { npm_lifecycle_event: script, INIT_CWD: caller } = process.env
  const path = resolve(script === 'bench' && caller !== undefined ? caller : '.', file)
  const part = `${path}.part`
  try {
    writeFileSync(part, text)
    renameSync(part, path)
    return 0
  } catch (error) {
    rmSync(part, { force: true })
    process.stderr.write(
      `${file} cannot be written: ${error instanceof Error ? error.message : String(error)}\n`,
    )
    return 2
  }
}
