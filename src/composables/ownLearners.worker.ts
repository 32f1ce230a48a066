import { buildOwnCalculator } from '../../shared/ownCalculators/build'
import { performFormulaTask, warmUpDefinition } from '../../shared/ownCalculators/tasks'
import {
  workLearners,
  type LearnerRow,
  type LearnersAsked,
} from '../components/exercises/learnerRows'
import type { AsideNews, AsideQuestion } from './asideThread'

const tell = (news: AsideNews) => self.postMessage(news)

function work(asked: LearnersAsked): LearnerRow[] {
  const { own } = asked.definition
  return own ? workLearners(buildOwnCalculator(own.definition, own), asked) : []
}

performFormulaTask({ name: 'check', given: { definition: warmUpDefinition } })
self.addEventListener('message', ({ data }: MessageEvent<AsideQuestion<LearnersAsked>>) => {
  tell({ taken: data.id })
  tell({ done: data.id, found: work(data.task) })
})
tell('ready')
