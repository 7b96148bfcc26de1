import { shallowReactive } from 'vue'
import type { Comparison, Method } from '../../core'
import type { Brief } from '../../io/briefTypes'
import { entryProgress, shownMeanwhile, type EntryProgress } from './partial'
import type { Answers, DeskMessage, DeskRequest, Question } from '../worker/protocol'

/** What is known at the moment: the last good comparison, and how the next one is getting on. */
export interface Results {
  comparison: Comparison | null
  faults: readonly string[]
  warnings: readonly string[]
  /** The comparison is of an older document or not complete. */
  stale: boolean
  busy: boolean
  cancelled: boolean
  done: number
  asked: number
  /** How far each entry is. */
  progress: readonly EntryProgress[]
  /** Why the brief as a whole cannot be computed. */
  failure: string | null
}

/** The window's side of the desk worker. */
export interface Desk {
  readonly results: Results
  compute(brief: Brief, method: Method): void
  cancel(): void
  ask<K extends Question['kind']>(question: Extract<Question, { kind: K }>): Promise<Answers[K]>
}

/** Starts the desk worker. */
export function openDesk(worker: Worker): Desk {
  const results = shallowReactive<Results>({
    ...{ comparison: null, faults: [], warnings: [], stale: false, busy: false, cancelled: false },
    ...{ done: 0, asked: 0, failure: null, progress: [] },
  })
  const waiting = new Map<number, { resolve: (answer: never) => void; reject: (error: Error) => void }>()
  let version = 0
  /** The last comparison that was computed to its end. */
  let last: Comparison | null = null
  let asked = 0
  const post = (request: DeskRequest): void => worker.postMessage(request)

  worker.addEventListener('message', (event: MessageEvent<DeskMessage>) => {
    const message = event.data
    if (message.kind === 'answer') waiting.get(message.id)?.resolve(message.answer as never)
    else if (message.kind === 'refused') waiting.get(message.id)?.reject(new Error(message.message))
    else if (message.version === version) show(message)
    if ('id' in message) waiting.delete(message.id)
  })

  function show(message: Extract<DeskMessage, { version: number }>): void {
    if (message.kind === 'comparison') {
      const { comparison, faults, warnings, done, asked: of, finished } = message
      const shown = finished ? comparison : shownMeanwhile(last, comparison)
      if (finished) last = comparison
      Object.assign(results, { done, asked: of, busy: !finished, progress: entryProgress(comparison) })
      Object.assign(results, { comparison: shown, faults, warnings, stale: !finished, failure: null })
      return
    }
    Object.assign(results, { busy: false, progress: [], cancelled: message.kind === 'cancelled' })
    if (message.kind === 'failed') results.failure = message.message
  }

  return {
    results,
    compute(brief, method) {
      version++
      Object.assign(results, { busy: true, cancelled: false, stale: true, done: 0, asked: 0, progress: [] })
      post({ kind: 'compute', version, brief, method })
    },
    cancel() {
      post({ kind: 'cancel' })
      // Late messages of the cancelled run are of an older version.
      if (results.busy) Object.assign(results, { busy: false, cancelled: true, progress: [] })
      version++
    },
    ask: (question) =>
      new Promise((resolve, reject) => {
        const id = asked++
        waiting.set(id, { resolve, reject })
        post({ kind: 'ask', id, question })
      }),
  }
}
