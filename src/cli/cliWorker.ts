import { parentPort } from 'node:worker_threads'
import { answerTask } from '../run/answerTask'
import type { TaskMessage } from '../run/messages'

parentPort?.on('message', (message: TaskMessage) => {
  answerTask(message, (answer, transfer) => parentPort?.postMessage(answer, transfer))
})
