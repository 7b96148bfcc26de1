/** The whole job in a real Chromium, by mouse and keyboard, its files compared with the command line's. */
import { execFileSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { Download, Page } from 'playwright-core'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { chooseMethod, computed, curvesIn, openWindow, type OpenWindow } from './window'

let opened: OpenWindow
let page: Page
let folder: string

beforeEach(async () => {
  opened = await openWindow()
  page = opened.page
  folder = mkdtempSync(join(tmpdir(), 'sectionwright-e2e-'))
})

afterEach(async () => {
  await opened.close()
  rmSync(folder, { recursive: true, force: true })
  expect(opened.complaints).toEqual([])
})

/** A brief of one section and two conditions is some twenty polars. */
const VISCOUS_PATIENCE = 240_000

const rows = () => page.locator('.shortlist tbody tr')

async function removeAll(): Promise<void> {
  while ((await rows().count()) > 0)
    await page.getByRole('button', { name: 'Remove', exact: true }).first().click()
}

async function openFiles(
  files: { name: string; mimeType: string; buffer: Buffer }[] | string[],
): Promise<void> {
  const chooser = page.waitForEvent('filechooser')
  await page.getByRole('button', { name: 'Open coordinate files…' }).click()
  await (await chooser).setFiles(files as string[])
}

async function downloads(count: number, act: () => Promise<void>): Promise<Map<string, Buffer>> {
  const found: Download[] = []
  const all = new Promise<void>((resolve) => {
    page.on('download', (download) => {
      found.push(download)
      if (found.length === count) resolve()
    })
  })
  await act()
  await all
  return new Map(
    await Promise.all(
      found.map(async (file) => [file.suggestedFilename(), readFileSync(await file.path())] as const),
    ),
  )
}

/** Expects the exported files to equal those of `compare` byte for byte. */
function expectComparesFiles(exported: ReadonlyMap<string, Buffer>, brief: string, method: string): void {
  const out = join(folder, 'out')
  try {
    execFileSync(process.execPath, ['out/main/cli.js', 'compare', brief, '--out', out, '--method', method], {
      env: { ...process.env, SECTIONWRIGHT_NO_CACHE: '1' },
      stdio: 'pipe',
    })
  } catch (error) {
    // 1: something is marked, such as the scan that is warned of; anything else is a fault.
    expect((error as { status: number }).status).toBe(1)
  }
  for (const name of ['polars.csv', 'pressures.csv', 'wing.csv']) {
    expect(exported.get(name)!.equals(readFileSync(join(out, name))), name).toBe(true)
  }
}

describe('the window', () => {
  it('opens the sample brief, computed, with a curve for each section in every pane', async () => {
    expect(await page.getByLabel('Name of the brief').inputValue()).toBe('Shoreline mapping drone')
    for (const plot of ['pressure', 'lift', 'moment']) expect(await curvesIn(page, plot)).toBe(5)
    await page.getByText('This is the sample brief').isVisible()
  })

  it('does the whole job: import two files, add a code, change a condition, export what compare writes', async () => {
    await removeAll()
    await page.getByText('The shortlist is empty').waitFor()
    await openFiles(['sample-data/dunlin-115.txt', 'sample-data/rib-scan-7.txt'])
    await page.getByText('decimal commas').waitFor()
    await page.getByLabel('Add NACA code').fill('4412')
    await page.keyboard.press('Enter')
    await computed(page)
    expect(await rows().count()).toBe(3)

    const ribbon = page.getByRole('radio', { name: /Mapping, 600 m/ })
    await ribbon.click()
    const before = await ribbon.textContent()
    await page.locator('.brief summary').filter({ hasText: 'Mapping, 600 m' }).click()
    await page.getByLabel('True airspeed').filter({ visible: true }).fill('28,5')
    await computed(page)
    expect(await ribbon.textContent()).not.toBe(before)
    for (const plot of ['pressure', 'lift', 'moment']) expect(await curvesIn(page, plot)).toBe(3)

    const saved = await downloads(1, () => page.getByRole('button', { name: 'Save', exact: true }).click())
    const brief = join(folder, 'job.brief.json')
    writeFileSync(brief, [...saved.values()][0]!)
    const exported = await downloads(3, () => page.getByRole('button', { name: 'Export CSV' }).click())
    expectComparesFiles(exported, brief, 'panel')
  })

  it('names what is wrong with a file, keeps the good one, and loses nothing', async () => {
    const count = await rows().count()
    await openFiles([
      { name: 'broken.txt', mimeType: 'text/plain', buffer: Buffer.from('Broken\n1 0\n0.5 NaN\n0 0\n') },
      { name: 'good.txt', mimeType: 'text/plain', buffer: readFileSync('sample-data/whimbrel-15.txt') },
    ])
    await page.getByText(/broken\.txt, line 3: "NaN" is not a coordinate/).waitFor()
    await computed(page)
    expect(await rows().count()).toBe(count + 1)
    await page.getByLabel('Add NACA code').fill('63-415')
    await page.keyboard.press('Enter')
    await page.getByText(/not generated here; open a coordinate file/).waitFor()
    expect(await rows().count()).toBe(count + 1)
  })

  it('shows a wrong number beside its field and keeps the last good figures', async () => {
    const lift = await page.getByRole('radio', { checked: true }).textContent()
    await page.getByLabel('Wing area').fill('-2')
    await page.getByRole('alert').filter({ hasText: 'give more than 0' }).waitFor()
    await computed(page)
    expect(await page.getByRole('radio', { checked: true }).textContent()).toBe(lift)
    await page.getByLabel('Wing area').fill('1,3')
    await computed(page)
    expect(await page.getByRole('radio', { checked: true }).textContent()).not.toBe(lift)
  })

  it('undoes and redoes by name', async () => {
    await page.getByRole('button', { name: 'Remove', exact: true }).first().click()
    expect(await rows().count()).toBe(4)
    await page.keyboard.press('Control+z')
    expect(await rows().count()).toBe(5)
    await page.keyboard.press('Control+Shift+z')
    expect(await rows().count()).toBe(4)
    await computed(page)
  })

  it('works from the keyboard: ribbon, views, sorting, order, and the points of a curve', async () => {
    await page.getByRole('radio', { checked: true }).focus()
    await page.keyboard.press('ArrowRight')
    await page.waitForFunction(() => document.activeElement?.textContent?.includes('Mapping, 600 m'))
    await page.getByRole('button', { name: /Thickness/ }).focus()
    await page.keyboard.press('Enter')
    expect(await page.locator('th[aria-sort="ascending"]').count()).toBe(1)
    await page.keyboard.press('Enter')
    await page.keyboard.press('Enter')
    await page.getByLabel('Name of section 1', { exact: true }).focus()
    await page.keyboard.press('Alt+ArrowDown')
    expect(await page.getByLabel('Name of section 1', { exact: true }).inputValue()).toBe('NACA 2415')
    await page.locator('[data-plot="lift"]').focus()
    await page.keyboard.press('ArrowRight')
    await page
      .getByText(/angle of attack, deg -?\d+\.\d+, lift c_l/)
      .first()
      .waitFor({ state: 'attached' })
    expect(await page.locator('.shortlist tr.marked').count()).toBe(1)
    await page.getByRole('button', { name: 'Wing', exact: true }).focus()
    await page.keyboard.press('Enter')
    await page.getByRole('heading', { name: 'Totals' }).waitFor()
    expect(await curvesIn(page, 'span lift')).toBe(5)
    await computed(page)
  })

  it('marks the hovered state in the other panes', async () => {
    const chart = page.locator('[data-plot="pressure"]')
    const box = (await chart.boundingBox())!
    for (let share = 0.2; share < 0.8; share += 0.05) {
      await page.mouse.move(box.x + box.width * 0.6, box.y + box.height * share)
      if ((await page.locator('.shape .spot').count()) > 0) break
    }
    expect(await page.locator('.shape .spot').count()).toBeGreaterThan(0)
    expect(await page.locator('.shortlist tr.marked').count()).toBe(1)
  })

  it('follows the theme of the system, and the one that is chosen', async () => {
    const surface = () =>
      page.locator('.window').evaluate((element) => getComputedStyle(element).backgroundColor)
    const light = await surface()
    await page.emulateMedia({ colorScheme: 'dark' })
    await page.locator('.window[data-theme="dark"]').waitFor()
    const dark = await surface()
    expect(dark).not.toBe(light)
    await page.getByLabel('Theme').selectOption('light')
    expect(await surface()).toBe(light)
    await page.emulateMedia({ colorScheme: 'light' })
    await page.getByLabel('Theme').selectOption('dark')
    expect(await surface()).toBe(dark)
  })

  it('keeps the caution in sight, its words one key away', async () => {
    const caution = page.locator('.caution summary')
    const box = (await caution.boundingBox())!
    expect(box.y + box.height).toBeLessThanOrEqual(900)
    await caution.focus()
    await page.keyboard.press('Enter')
    await page.getByText('the applicable airworthiness').waitFor()
  })

  it('cancels at once, keeps the last figures marked, and computes again when asked', async () => {
    const codes = Array.from({ length: 40 }, (_, i) => `24${String(i + 6).padStart(2, '0')}`)
    await page.getByLabel('Add NACA code').fill(codes.join(' '))
    await page.keyboard.press('Enter')
    await page.getByRole('button', { name: 'Cancel', exact: true }).first().click()
    await page.getByText('Cancelled.').waitFor()
    expect(await page.locator('progress').count()).toBe(0)
    expect(await page.getByText('updating…').count()).toBeGreaterThan(0)
    expect(await curvesIn(page, 'lift')).toBeGreaterThanOrEqual(5)
    while ((await rows().count()) > 6) await page.getByRole('button', { name: 'Undo', exact: true }).click()
    await computed(page)
    expect(await curvesIn(page, 'lift')).toBe(5)
  })

  it('takes the method, forced transition and a fixed Reynolds number', async () => {
    await page.getByLabel('Method').selectOption({ label: 'thin-airfoil theory' })
    await page.getByText('Thin-airfoil theory gives no surface pressure').waitFor()
    await computed(page)
    await page.getByLabel('Method').selectOption({ label: 'panels, without boundary layers' })
    await computed(page)
    expect(await curvesIn(page, 'pressure')).toBe(5)
    await page.getByRole('button', { name: 'Transition', exact: true }).first().click()
    await page.getByLabel('Upper side, forced at x/c').filter({ visible: true }).fill('0,3')
    await page.getByRole('button', { name: 'Close', exact: true }).filter({ visible: true }).click()
    await page.getByRole('button', { name: 'Undo', exact: true }).hover()
    expect(await page.getByTitle('Undo: force transition').count()).toBe(1)
    await computed(page)
  })

  it(
    'computes with boundary layers: polars, slowest speed, layers on demand, and files as compare writes them',
    async () => {
      while ((await rows().count()) > 1)
        await page.getByRole('button', { name: 'Remove', exact: true }).last().click()
      await chooseMethod(page, 'with boundary layers')
      await computed(page, VISCOUS_PATIENCE)
      for (const plot of ['pressure', 'lift', 'drag', 'moment']) {
        expect(await curvesIn(page, plot), plot).toBeGreaterThan(0)
      }
      await page.getByRole('radio', { name: /Slowest, sea level.*C_L 1\.\d\d/ }).click()
      await page.getByRole('button', { name: 'Boundary layers' }).click()
      expect(await curvesIn(page, 'shape factor')).toBeGreaterThan(0)
      const saved = await downloads(1, () => page.getByRole('button', { name: 'Save', exact: true }).click())
      const brief = join(folder, 'job.brief.json')
      writeFileSync(brief, [...saved.values()][0]!)
      const exported = await downloads(3, () => page.getByRole('button', { name: 'Export CSV' }).click())
      expectComparesFiles(exported, brief, 'viscous')
    },
    VISCOUS_PATIENCE,
  )

  it('says why the slowest condition has no figures yet', async () => {
    await page.getByRole('radio', { name: /Slowest, sea level/ }).click()
    await page
      .getByText(/the slowest speed needs the viscous method/)
      .first()
      .waitFor()
  })
})
