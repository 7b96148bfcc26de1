import { answerTask } from '../../run/answerTask'
import type { TaskMessage } from '../../run/messages'

self.addEventListener('message', (event: MessageEvent<TaskMessage>) => {
  answerTask(event.data, (answer, transfer) => self.postMessage(answer, { transfer }))
})
