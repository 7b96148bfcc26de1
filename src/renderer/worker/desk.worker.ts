import { assemble, type Comparison, type Method } from '../../core'
import { readBrief, writeBrief, type Brief } from '../../io/brief'
import { decodeText } from '../../io/coordinates'
import { compareFiles } from '../../io/csv'
import { jobFromBrief, type ReadyJob } from '../../io/job'
import { FileProblem } from '../../io/problem'
import type { ReadBytes } from '../../io/resolveSection'
import { openPool, type Pool } from '../../run/pool'
import { run, type Known, type Progress } from '../../run/run'
import { memoryStore } from '../../run/store'
import { readCodes, readSections } from './readings'
import type { DeskMessage, DeskRequest, Question } from './protocol'
import { webWorker } from './webWorker'

/** Results kept for changes back and forth. */
const KEPT_RESULTS = 2000
/** The window is told of new results no more often than this. */
const TELL_EVERY_MS = 250

const store = memoryStore(KEPT_RESULTS)
let pool: Pool | null = null
const poolOf = (): Pool => (pool ??= openPool(webWorker, navigator.hardwareConcurrency))

const post = (message: DeskMessage): void => self.postMessage(message)

/** Sections named by paths are not at hand in the window: it embeds what it opens. */
const noFiles: ReadBytes = (path) => {
  throw new FileProblem(path, null, 'the file is not at hand', 'remove the entry and open the file here')
}

const ready = (brief: Brief, method: Method): ReadyJob =>
  jobFromBrief(brief, 'the brief', noFiles, { method, allowEmpty: true })

async function complete(ready: ReadyJob, signal: AbortSignal, tell?: (known: Known, p: Progress) => void) {
  return run(ready.job, { pool: poolOf, store, signal, ...(tell ? { onResult: tell } : {}) })
}

let current = new AbortController()

async function compute(version: number, brief: Brief, method: Method): Promise<void> {
  current.abort()
  const mine = (current = new AbortController())
  try {
    const prepared = ready(brief, method)
    const tell = (comparison: Comparison, progress: Progress, finished: boolean): void => {
      const { faults, warnings } = prepared
      post({ kind: 'comparison', version, comparison, faults, warnings, ...progress, finished })
    }
    let last = 0
    const known = await complete(prepared, mine.signal, (some, progress) => {
      if (performance.now() - last < TELL_EVERY_MS) return
      last = performance.now()
      tell(assemble(prepared.job, some), progress, false)
    })
    if (mine.signal.aborted) return
    tell(assemble(prepared.job, known), { done: known.size, asked: known.size }, true)
  } catch (error) {
    if (mine.signal.aborted) post({ kind: 'cancelled', version })
    else post({ kind: 'failed', version, message: wordsOf(error) })
  }
}

async function answer(question: Question): Promise<unknown> {
  switch (question.kind) {
    case 'read sections':
      return readSections(question.files)
    case 'read codes':
      return readCodes(question.text)
    case 'read brief':
      return readBrief(decodeText(question.bytes, question.name), question.name)
    case 'brief text':
      return writeBrief(question.brief)
    case 'export': {
      // From the text of the brief, so that the files are those of the brief as saved.
      const prepared = ready(readBrief(writeBrief(question.brief), 'the brief'), question.method)
      const known = await complete(prepared, new AbortController().signal)
      return compareFiles(assemble(prepared.job, known))
    }
  }
}

const wordsOf = (error: unknown): string => (error instanceof Error ? error.message : String(error))

self.addEventListener('message', (event: MessageEvent<DeskRequest>) => {
  const request = event.data
  if (request.kind === 'cancel') current.abort()
  else if (request.kind === 'compute') void compute(request.version, request.brief, request.method)
  else {
    const { id, question } = request
    answer(question).then(
      (found) => post({ kind: 'answer', id, answer: found }),
      (error: unknown) => post({ kind: 'refused', id, message: wordsOf(error) }),
    )
  }
})
