import { mkdtemp, mkdir, rm, symlink, writeFile } from 'node:fs/promises'
import { request } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { serveWindow, type Served } from '../../src/serve/server'
import { CONTENT_SECURITY_POLICY } from '../../src/shared/security'

let folder: string
let served: Served

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'served-'))
  await mkdir(join(folder, 'window', 'assets'), { recursive: true })
  await writeFile(join(folder, 'secret.txt'), 'secret')
  await writeFile(join(folder, 'window', 'index.html'), '<!doctype html>')
  await writeFile(join(folder, 'window', 'assets', 'main.js'), 'export {}')
  await writeFile(join(folder, 'window', 'notes.exe'), 'no kind of ours')
  await symlink(join(folder, 'secret.txt'), join(folder, 'window', 'link.txt'))
  served = await serveWindow(join(folder, 'window'))
})

afterAll(async () => {
  await served.close()
  await rm(folder, { recursive: true })
})

interface Answer {
  readonly status: number
  readonly headers: Readonly<Record<string, string | string[] | undefined>>
  readonly body: string
}

/** A request as it is: fetch would tidy the path and set the host. */
function ask(path: string, options: { method?: string; host?: string } = {}): Promise<Answer> {
  const { port } = new URL(served.address)
  return new Promise((resolve, reject) => {
    const headers = { host: options.host ?? `127.0.0.1:${port}` }
    const asked = request({ host: '127.0.0.1', port, path, method: options.method ?? 'GET', headers })
    asked.on('error', reject)
    asked.on('response', (answer) => {
      let body = ''
      answer.on('data', (part: Buffer) => (body += part.toString()))
      answer.on('end', () => resolve({ status: answer.statusCode ?? 0, headers: answer.headers, body }))
    })
    asked.end()
  })
}

describe('the served window', () => {
  it('is on this machine only, at a port of its own', () => {
    expect(served.address).toMatch(/^http:\/\/127\.0\.0\.1:\d+\/$/)
  })

  it.each([
    ['/', 'text/html; charset=utf-8', '<!doctype html>'],
    ['/?view=wing', 'text/html; charset=utf-8', '<!doctype html>'],
    ['/assets/main.js', 'text/javascript; charset=utf-8', 'export {}'],
  ])('answers %s with its type, its text and the security policy', async (path, type, body) => {
    const answer = await ask(path)
    expect(answer.status).toBe(200)
    expect(answer.headers['content-type']).toBe(type)
    expect(answer.headers['content-security-policy']).toBe(CONTENT_SECURITY_POLICY)
    expect(answer.headers['x-content-type-options']).toBe('nosniff')
    expect(answer.body).toBe(body)
  })

  it('answers HEAD without the text', async () => {
    const answer = await ask('/', { method: 'HEAD' })
    expect([answer.status, answer.body]).toEqual([200, ''])
    expect(answer.headers['content-length']).toBe('15')
  })

  it.each([
    '/../secret.txt',
    '/%2e%2e/secret.txt',
    '/assets/..%2f..%2f..%2fsecret.txt',
    '/..\\secret.txt',
    '/link.txt',
    '/assets',
    '/notes.exe',
    '/missing.js',
    '/%00.js',
    '/%zz',
  ])('gives nothing for %s', async (path) => {
    const answer = await ask(path)
    expect(answer.status).toBe(404)
    expect(answer.body).not.toContain('secret')
  })

  it.each(['POST', 'PUT', 'DELETE', 'OPTIONS'])('refuses %s', async (method) => {
    expect((await ask('/', { method })).status).toBe(405)
  })

  it.each(['example.org', '127.0.0.1', '127.0.0.1:1'])('refuses a request for host "%s"', async (host) => {
    expect((await ask('/', { host })).status).toBe(403)
  })
})
