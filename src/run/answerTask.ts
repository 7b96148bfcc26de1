import { runTask } from '../core'
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
    const result = runTask(task)
    post({ id, result }, transferables(result))
  } catch (error) {
    post({ id, fault: error instanceof Error ? error.message : String(error) }, [])
  }
}
