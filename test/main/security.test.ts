import type { Session, WebContents } from 'electron'
import { mkdir, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { beforeAll, describe, expect, it } from 'vitest'
import { guardContents, guardSession } from '../../src/main/guardContents'
import { answerWindowFile } from '../../src/main/windowFiles'
import { ORIGIN, SCHEME_PRIVILEGES, windowOptions } from '../../src/main/windowOptions'
import { CONTENT_SECURITY_POLICY } from '../../src/shared/security'
import { temporaryFolder } from '../support/commandLine'
import { fakeEmitter } from './fakeElectron'

describe('the window', () => {
  it('reaches nothing but its preload: isolated, sandboxed, without Node, web security on', () => {
    expect(windowOptions('/preload.cjs').webPreferences).toMatchObject({
      preload: '/preload.cjs',
      contextIsolation: true,
      sandbox: true,
      nodeIntegration: false,
      nodeIntegrationInWorker: false,
      nodeIntegrationInSubFrames: false,
      webSecurity: true,
      webviewTag: false,
    })
  })

  it('does not bypass the content-security policy by its scheme', () => {
    expect(SCHEME_PRIVILEGES.privileges).toEqual({
      ...{ standard: true, secure: true, supportFetchAPI: true, codeCache: true },
    })
  })

  it('loads scripts and workers only from itself, and connects to nothing else', () => {
    const rules = CONTENT_SECURITY_POLICY.split('; ')
    expect(rules).toContain("default-src 'none'")
    expect(rules).toContain("script-src 'self' 'wasm-unsafe-eval'")
    expect(rules).toContain("worker-src 'self'")
    expect(rules).toContain("connect-src 'self'")
    expect(CONTENT_SECURITY_POLICY).not.toMatch(/'unsafe-eval'|\*|https?:/)
  })

  it('stays where it is and opens no other window', () => {
    const { on, emit } = fakeEmitter()
    let opened: unknown
    const setWindowOpenHandler = (handler: () => unknown): void => void (opened = handler())
    guardContents({ on, setWindowOpenHandler } as unknown as WebContents)
    for (const event of ['will-navigate', 'will-redirect', 'will-attach-webview'])
      expect(emit(event)).toBe(true)
    expect(opened).toEqual({ action: 'deny' })
  })

  it('is given no permission', () => {
    const answers: boolean[] = []
    guardSession({
      setPermissionRequestHandler: (handler: (...given: unknown[]) => void) =>
        handler(null, 'geolocation', (granted: boolean) => answers.push(granted)),
      setPermissionCheckHandler: (handler: () => boolean) => answers.push(handler()),
    } as unknown as Session)
    expect(answers).toEqual([false, false])
  })
})

describe('the files of the window', () => {
  const root = temporaryFolder()
  beforeAll(async () => {
    await mkdir(join(root(), 'window'))
    await writeFile(join(root(), 'window', 'index.html'), '<!doctype html>')
    await writeFile(join(root(), 'secret.txt'), 'secret')
  })
  const ask = (url: string, method = 'GET'): Promise<Response> =>
    answerWindowFile(join(root(), 'window'), new Request(url, { method }))

  it.each([`${ORIGIN}/`, `${ORIGIN}/index.html?view=wing`])('answers %s with the policy', async (url) => {
    const answer = await ask(url)
    expect(answer.status).toBe(200)
    expect(answer.headers.get('content-type')).toBe('text/html; charset=utf-8')
    expect(answer.headers.get('content-security-policy')).toBe(CONTENT_SECURITY_POLICY)
    expect(await answer.text()).toBe('<!doctype html>')
  })

  it.each([
    [`${ORIGIN}/missing.js`, 404],
    [`${ORIGIN}/..%2fsecret.txt`, 404],
    [`${ORIGIN}/%2e%2e%2fsecret.txt`, 404],
    [`${ORIGIN}/..%5csecret.txt`, 404],
    [`${ORIGIN}/%00`, 404],
    [`${ORIGIN}/%zz.js`, 404],
    ['sectionwright://elsewhere/', 403],
  ])('refuses %s', async (url, status) => {
    const answer = await ask(url)
    expect(answer.status).toBe(status)
    expect(await answer.text()).not.toContain('secret')
  })

  it('answers nothing but GET', async () => {
    expect((await ask(`${ORIGIN}/`, 'POST')).status).toBe(405)
  })
})
