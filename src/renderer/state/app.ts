import { computed, inject, provide, ref, shallowRef, watch, type InjectionKey } from 'vue'
import type { Host, OpenedFile } from '../../shared/host'
import type { Brief } from '../../io/briefTypes'
import type { Reading } from '../worker/protocol'
import { entryStyle } from '../style/palette'
import { BLANK_BRIEF } from './blanks'
import { createDocument } from './document'
import { openDesk } from './desk'
import { createView } from './view'

/** A typed value waits this long for the next key before it is computed. */
const TYPING_PAUSE_MS = 120
const RECOVERY_PAUSE_MS = 1500

/** The window's state and what it can do: document, view and results, each in its own drawer. */
export function createApp(host: Host, worker: Worker) {
  const document = createDocument(BLANK_BRIEF)
  const view = createView()
  const desk = openDesk(worker)
  /** Reports of the last sections read. */
  const readings = shallowRef<readonly Reading[]>([])
  /** A sentence about what was just done or why it could not be. */
  const message = ref<{ text: string; bad: boolean } | null>(null)

  let typing: ReturnType<typeof setTimeout> | undefined
  let keeping: ReturnType<typeof setTimeout> | undefined
  watch(document.brief, (brief) => {
    clearTimeout(typing)
    typing = setTimeout(() => desk.compute(brief, view.method), TYPING_PAUSE_MS)
    if (view.condition >= brief.conditions.length) view.condition = Math.max(0, brief.conditions.length - 1)
    clearTimeout(keeping)
    keeping = setTimeout(() => void keepForRecovery(brief), RECOVERY_PAUSE_MS)
  })
  watch(
    () => view.method,
    (method) => desk.compute(document.brief.value, method),
  )
  watch(
    [document.brief, document.unsaved],
    ([{ name }, unsaved]) => void host.showDocument({ title: name, unsaved }),
  )

  const say = (text: string, bad = false): void => void (message.value = { text, bad })
  /** Does something that can fail and tells the user why it did. */
  async function attempt(work: () => Promise<void>): Promise<void> {
    try {
      await work()
    } catch (error) {
      say(error instanceof Error ? error.message : String(error), true)
    }
  }

  async function keepForRecovery(brief: Brief): Promise<void> {
    await attempt(async () =>
      host.keepForRecovery(document.unsaved.value ? await desk.ask({ kind: 'brief text', brief }) : null),
    )
  }

  function addReadings(found: readonly Reading[]): void {
    const entries = found.flatMap(({ entry }) => (entry === null ? [] : [entry]))
    if (entries.length > 0) document.addEntries(entries)
    readings.value = found.filter(
      ({ fault, understood, warnings }) => fault !== null || understood.length + warnings.length > 0,
    )
  }

  const addFiles = (files: readonly OpenedFile[]): Promise<void> =>
    attempt(async () => {
      if (files.length > 0) addReadings(await desk.ask({ kind: 'read sections', files }))
    })

  return {
    host,
    document,
    view,
    results: desk.results,
    readings,
    message,
    say,
    attempt,
    cancel: desk.cancel,
    recompute: (): void => desk.compute(document.brief.value, view.method),
    styles: computed(() =>
      document.brief.value.shortlist.map(({ colour, mark }, i) =>
        entryStyle(colour ?? i, mark ?? colour ?? i),
      ),
    ),
    addFiles,
    addCodes: (text: string): Promise<void> =>
      attempt(async () => addReadings(await desk.ask({ kind: 'read codes', text }))),
    addText: (name: string, text: string): Promise<void> =>
      addFiles([{ name, bytes: new TextEncoder().encode(text) }]),
    read: (name: string, text: string): Promise<readonly Reading[]> =>
      desk.ask({ kind: 'read sections', files: [{ name, bytes: new TextEncoder().encode(text) }] }),
    openFiles: (): Promise<void> => attempt(async () => addFiles(await host.openFiles())),
    open(brief: Brief, asSaved: boolean): void {
      document.open(brief, asSaved)
      Object.assign(view, { condition: firstComputed(brief), sort: null, hover: null })
      readings.value = []
    },
    newBrief: (): Promise<void> =>
      attempt(async () => {
        await host.forgetBrief()
        document.open(BLANK_BRIEF, true)
      }),
    openBrief: (): Promise<void> =>
      attempt(async () => {
        const file = await host.openBrief()
        if (file === null) return
        const brief = await desk.ask({ kind: 'read brief', ...file })
        document.open(brief, true)
        Object.assign(view, { condition: firstComputed(brief), sort: null, hover: null })
      }),
    readBrief: (name: string, text: string): Promise<Brief> =>
      desk.ask({ kind: 'read brief', name, bytes: new TextEncoder().encode(text) }),
    save: (as: boolean): Promise<void> =>
      attempt(async () => {
        const brief = document.brief.value
        const text = await desk.ask({ kind: 'brief text', brief })
        const saved = await host.saveBrief(text, `${fileStem(brief.name)}.brief.json`, { as })
        if (saved === null) return
        document.markSaved()
        await host.keepForRecovery(null)
        say(`Saved ${saved.name}`)
      }),
    exportFiles: (): Promise<void> =>
      attempt(async () => {
        const saved = await host.saveFiles(
          await desk.ask({ kind: 'export', brief: document.brief.value, method: view.method }),
        )
        if (saved !== null) say(`Exported ${saved.name}`)
      }),
  }
}

/** The first condition whose speed is given: at a slowest one there may be nothing to show yet. */
function firstComputed(brief: Brief): number {
  return Math.max(
    0,
    brief.conditions.findIndex((condition) => condition.speed_m_s !== 'slowest'),
  )
}

const fileStem = (name: string): string =>
  name
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-+|-+$/g, '') || 'brief'

export type App = ReturnType<typeof createApp>

const KEY: InjectionKey<App> = Symbol('app')

export const provideApp = (app: App): void => provide(KEY, app)

/** The window's state, in any component below App. */
export function useApp(): App {
  const app = inject(KEY)
  if (app === undefined) throw new Error('useApp is called outside the window')
  return app
}
