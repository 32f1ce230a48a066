import type { Exercise } from '../../shared/contracts/exercises'
import { findExerciseProblems } from '../../shared/grading'
import { warmUpOwnTasks } from '../../shared/grading/ownTasks'
import type { AsideNews, AsideQuestion } from './asideThread'

const tell = (news: AsideNews) => self.postMessage(news)

warmUpOwnTasks()
self.addEventListener('message', ({ data }: MessageEvent<AsideQuestion<Exercise>>) => {
  tell({ taken: data.id })
  tell({ done: data.id, found: findExerciseProblems(data.task) })
})
tell('ready')
