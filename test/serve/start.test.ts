import { spawn, type ChildProcess } from 'node:child_process'
import { join } from 'node:path'
import { afterEach, describe, expect, it } from 'vitest'
import { CONTENT_SECURITY_POLICY } from '../../src/shared/security'
import { checkBuilt } from '../support/build'

const START = join(process.cwd(), 'out', 'main', 'start.js')
let child: ChildProcess | null = null

afterEach(() => {
  child?.kill('SIGKILL')
  child = null
})

/** Starts the built program without a display, and waits for so many lines of what it says. */
function startWithoutDisplay(lines: number): Promise<{ running: ChildProcess; said: string }> {
  const env = { ...process.env, DISPLAY: '', WAYLAND_DISPLAY: '' }
  const running = spawn(process.execPath, [START], { env, stdio: ['ignore', 'pipe', 'inherit'] })
  child = running
  return new Promise((resolve, reject) => {
    let said = ''
    running.once('exit', () => reject(new Error(`it ended after saying: ${said}`)))
    running.stdout.on('data', (part: Buffer) => {
      said += part.toString()
      if (said.split('\n').length > lines) resolve({ running, said })
    })
  })
}

describe.skipIf(process.platform === 'darwin' || process.platform === 'win32')(
  'npm start without a display',
  () => {
    it('gives an address that answers with the window, and the same job by command; Ctrl-C ends it', async () => {
      checkBuilt('out/renderer/index.html')
      const { running, said } = await startWithoutDisplay(2)
      const address = /http:\/\/127\.0\.0\.1:\d+\//.exec(said)?.[0]
      expect(address).toBeDefined()
      expect(said).toContain('npm run -s cli -- compare sample-data/')
      const answer = await fetch(address!)
      expect(answer.status).toBe(200)
      expect(answer.headers.get('content-security-policy')).toBe(CONTENT_SECURITY_POLICY)
      const page = await answer.text()
      const script = /src="\.?\/?([^"]+\.js)"/.exec(page)?.[1]
      const code = await fetch(new URL(script!, address))
      expect(code.headers.get('content-type')).toBe('text/javascript; charset=utf-8')
      const ended = new Promise((resolve) => running.once('exit', resolve))
      running.kill('SIGINT')
      expect(await ended).toBe(0)
      await expect(fetch(address!)).rejects.toThrow()
    })
  },
)
