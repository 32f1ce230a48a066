import {
  performFormulaTask,
  warmUpDefinition,
  type FormulaTask,
} from '../../shared/ownCalculators/tasks'

/** A task with the number its answer carries. */
export interface FormulaQuestion {
  id: number
  task: FormulaTask
}
/** What the worker tells. */
export type FormulaNews = 'ready' | { taken: number } | { done: number; found: unknown }

const tell = (news: FormulaNews) => self.postMessage(news)

performFormulaTask({ name: 'check', given: { definition: warmUpDefinition } })
self.addEventListener('message', ({ data }: MessageEvent<FormulaQuestion>) => {
  tell({ taken: data.id })
  tell({ done: data.id, found: performFormulaTask(data.task) })
})
tell('ready')
