import type { BrowserWindow, MenuItemConstructorOptions } from 'electron'
import { describe, expect, it } from 'vitest'
import { menuTemplate } from '../../src/main/menu'
import { windowFrame } from '../../src/main/window'
import { MENU_COMMANDS } from '../../src/shared/host'
import { fakeEmitter } from './fakeElectron'

function framed(answer = 0, printed: [boolean, string] = [true, '']) {
  const { on, emit } = fakeEmitter()
  const titles: string[] = []
  let questions = 0
  const window = {
    on,
    setTitle: (title: string) => titles.push(title),
    setDocumentEdited: () => {},
    webContents: {
      print: (_options: object, done: (...outcome: [boolean, string]) => void) => done(...printed),
    },
  } as unknown as BrowserWindow
  const frame = windowFrame(window, { showMessageBoxSync: () => (questions++, answer) })
  return { frame, emit, titles, questions: () => questions }
}

describe('the frame of the window', () => {
  it('carries the title of the brief', () => {
    const { frame, titles } = framed()
    frame.setTitle('Shoreline drone')
    frame.setTitle('')
    expect(titles).toEqual(['Shoreline drone - Sectionwright', 'Sectionwright'])
  })

  it('closes without a question when all is saved', () => {
    const { frame, emit, questions } = framed(1)
    frame.setUnsaved(true)
    frame.setUnsaved(false)
    expect(emit('close')).toBe(false)
    expect(questions()).toBe(0)
  })

  it.each([
    ['stays', 1, true],
    ['closes', 0, false],
  ])('with something unsaved asks, and %s as the user answers', (_what, answer, stays) => {
    const { frame, emit, questions } = framed(answer)
    frame.setUnsaved(true)
    expect(emit('close')).toBe(stays)
    expect(questions()).toBe(1)
  })

  it('prints, takes a cancelled print for done, and says why it failed', async () => {
    await framed(0, [true, '']).frame.print()
    await framed(0, [false, 'Print job canceled']).frame.print()
    await expect(framed(0, [false, 'no printer']).frame.print()).rejects.toThrow('no printer')
  })
})

describe('the menu', () => {
  it.each(['linux', 'darwin', 'win32'] as const)(
    'on %s sends each command once, with keys of its own',
    (platform) => {
      const sent: string[] = []
      const entries = menuTemplate(platform, (command) => sent.push(command)).flatMap(
        ({ submenu }) => (submenu ?? []) as MenuItemConstructorOptions[],
      )
      for (const { click } of entries) (click as (() => void) | undefined)?.()
      expect(sent.sort()).toEqual([...MENU_COMMANDS].sort())
      const keys = entries.flatMap(({ accelerator }) => (accelerator === undefined ? [] : [accelerator]))
      expect(new Set(keys).size).toBe(keys.length)
    },
  )
})
