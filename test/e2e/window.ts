import { chromium, type Browser, type Page } from 'playwright-core'
import { spawn, type ChildProcess } from 'node:child_process'

/** The window in a real Chromium, served as `npm start` serves it. */
export interface OpenWindow {
  readonly page: Page
  /** Errors and warnings that the page wrote; a test ends by finding none. */
  readonly complaints: string[]
  close(): Promise<void>
}

const EXECUTABLE = process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium'

/**
 * Serves the built window on a free port and opens it. The panel method is chosen at once, which drops the
 * viscous polars of the sample brief that a first start begins with: a test takes a second, not a minute.
 */
export async function openWindow(): Promise<OpenWindow> {
  const { server, url } = await serve()
  const browser: Browser = await chromium.launch({
    executablePath: EXECUTABLE,
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
    ],
  })
  const context = await browser.newContext({ viewport: { width: 1440, height: 900 }, acceptDownloads: true })
  const page = await context.newPage()
  const complaints: string[] = []
  page.on('console', (message) => {
    if (['error', 'warning'].includes(message.type())) complaints.push(message.text())
  })
  page.on('pageerror', (error) => complaints.push(error.message))
  await page.goto(url)
  await chooseMethod(page, 'panels, without boundary layers')
  await computed(page)
  return {
    page,
    complaints,
    close: async () => {
      await browser.close()
      server.kill('SIGINT')
    },
  }
}

function serve(): Promise<{ server: ChildProcess; url: string }> {
  const server = spawn(process.execPath, ['out/main/start.js', '--browser'], {
    env: { ...process.env, DISPLAY: '', BROWSER: 'none' },
  })
  return new Promise((resolve, reject) => {
    let said = ''
    const listen = (chunk: Buffer): void => {
      said += chunk.toString()
      const url = /http:\/\/127\.0\.0\.1:\d+\/?/.exec(said)?.[0]
      if (url !== undefined) resolve({ server, url })
    }
    server.stdout.on('data', listen)
    server.stderr.on('data', listen)
    server.on('exit', () => reject(new Error(`the server ended: ${said}`)))
  })
}

/** Waits until the last change is computed and shown. */
export async function computed(page: Page, patience = 30_000): Promise<void> {
  // Longer than the pause after typing, so that the computation has begun.
  await page.waitForTimeout(250)
  await page.waitForFunction(
    () => document.querySelector('progress') === null && !document.querySelector('.stale'),
    undefined,
    { timeout: patience },
  )
}

/** Chooses a method by its words. */
export async function chooseMethod(page: Page, words: string): Promise<void> {
  await page.getByLabel('Method').selectOption({ label: words })
}

/** Curves drawn in a plot, by its key. */
export async function curvesIn(page: Page, plot: string): Promise<number> {
  return Number(await page.locator(`[data-plot="${plot}"]`).getAttribute('data-curves'))
}
