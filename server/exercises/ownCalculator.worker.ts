import { parentPort } from 'node:worker_threads'
import { performOwnTask, warmUpOwnTasks, type OwnTask } from '../../shared/grading/ownTasks'

const port = parentPort
if (!port) throw new Error('this runs in a worker thread only')

warmUpOwnTasks()
port.on('message', ({ id, task }: { id: number; task: OwnTask }) => {
  port.postMessage({ taken: id })
  try {
    port.postMessage({ done: id, found: performOwnTask(task) })
  } catch (error) {
    port.postMessage({ done: id, failed: error instanceof Error ? error.message : String(error) })
  }
})
port.postMessage('ready')
