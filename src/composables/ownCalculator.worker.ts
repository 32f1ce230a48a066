import {
  performFormulaTask,
  warmUpDefinition,
  type FormulaTask,
} from '../../shared/ownCalculators/tasks'
import type { AsideNews, AsideQuestion } from './asideThread'

const tell = (news: AsideNews) => self.postMessage(news)

performFormulaTask({ name: 'check', given: { definition: warmUpDefinition } })
self.addEventListener('message', ({ data }: MessageEvent<AsideQuestion<FormulaTask>>) => {
  tell({ taken: data.id })
  tell({ done: data.id, found: performFormulaTask(data.task) })
})
tell('ready')
