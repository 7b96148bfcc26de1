import { runTask, type Section, type Task } from '../core'
import { transferables, type ResultMessage, type TaskMessage } from './messages'

/**
 * The worker's side of the protocol: runs the task of a message and posts what came of it, arrays by
 * transfer. A fault of ours goes back as its message, so that the asker never waits for nothing.
 */
export function answerTask(
  { id, task }: TaskMessage,
  post: (message: ResultMessage, transfer: ArrayBuffer[]) => void,
): void {
  try {
    const result = runTask(withLastSection(task))
    post({ id, result }, transferables(result))
  } catch (error) {
    post({ id, fault: error instanceof Error ? error.message : String(error) }, [])
  }
}

let last: Section | null = null

/**
 * A message brings its own copy of a section. Where it is the section of the task before, that very object is
 * taken, so that what the core remembers of it (panels, wakes) serves again.
 */
function withLastSection(task: Task): Task {
  if (last !== null && sameSection(last, task.section)) return { ...task, section: last }
  last = task.section
  return task
}

function sameSection(a: Section, b: Section): boolean {
  return (
    a.x.length === b.x.length &&
    a.x.every((x, i) => x === b.x[i] && a.y[i] === b.y[i]) &&
    JSON.stringify([a.name, a.meanLine, a.notes]) === JSON.stringify([b.name, b.meanLine, b.notes])
  )
}
