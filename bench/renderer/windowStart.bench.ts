import { spawn } from 'node:child_process'
import { existsSync } from 'node:fs'
import type { Measured, NotHere } from '../registry'

const CHROMIUM = process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium'

/** From opening the page in a running Chromium to the sample brief computed and drawn. */
export async function windowStart(): Promise<Measured | NotHere> {
  if (!existsSync(CHROMIUM)) return { note: 'no Chromium on this machine' }
  const { chromium } = await import('playwright-core')
  const server = spawn(process.execPath, ['out/main/start.js', '--browser'], {
    env: { ...process.env, DISPLAY: '' },
  })
  const url = await new Promise<string>((resolve) => {
    let said = ''
    server.stdout.on('data', (chunk: Buffer) => {
      said += chunk.toString()
      const found = /http:\/\/127\.0\.0\.1:\d+\/?/.exec(said)
      if (found !== null) resolve(found[0])
    })
  })
  const browser = await chromium.launch({ executablePath: CHROMIUM, args: ['--no-sandbox', '--disable-gpu'] })
  return {
    run: async () => {
      const page = await browser.newPage()
      await page.goto(url)
      await page.locator('[data-plot="pressure"][data-curves="5"]').waitFor()
      await page.close()
    },
    stop: async () => {
      await browser.close()
      server.kill('SIGINT')
    },
    note: 'page opened in a running Chromium, to the sample brief computed and drawn',
  }
}
