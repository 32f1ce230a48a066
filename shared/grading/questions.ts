import type {
  LearnerQuestion,
  QuestionAnswer,
  QuestionVerdict,
  QuizQuestion,
  UnitSystem,
} from '../contracts/exercises'
import type { ExerciseProblem, QuestionGrader } from './grader'
import { numberEntry } from './numberEntry'
import { putInOrder } from './putInOrder'
import { seedFor } from './seededRandom'
import { severalChoices } from './severalChoices'
import { singleChoice } from './singleChoice'

/** Every kind of question; a new one is one file and one line here. */
const graders = {
  single: singleChoice,
  several: severalChoices,
  number: numberEntry,
  order: putInOrder,
}

/** The grader of a question, bound to its definition: the registry pairs each kind with its own. */
function graderOf(question: QuizQuestion) {
  const grader = graders[question.kind] as QuestionGrader<QuizQuestion['definition']>
  return { grader, definition: question.definition }
}

/** The verdict on one answered question; `unread` costs no try. */
export function gradeQuestion(
  question: QuizQuestion,
  answer: QuestionAnswer,
): QuestionVerdict & { unread?: true } {
  const { grader, definition } = graderOf(question)
  return grader.gradeAnswer(definition, answer)
}

/** A question as a learner sees it: nothing in it tells the answer. */
export function toLearnerQuestion(question: QuizQuestion, seed: number): LearnerQuestion {
  const { grader, definition } = graderOf(question)
  const { key, kind, prompt } = question
  return { key, kind, prompt, ...grader.toLearner(definition, seedFor(seed, key)) }
}

/** The right answer of a question as text. */
export function showQuestionAnswer(question: QuizQuestion, system: UnitSystem): string {
  const { grader, definition } = graderOf(question)
  return grader.showAnswer(definition, system)
}

/** What is wrong with a question, paths beginning at the question. */
export function findQuestionProblems(question: QuizQuestion): ExerciseProblem[] {
  const { grader, definition } = graderOf(question)
  const found = grader
    .findProblems(definition)
    .map((problem) => ({ ...problem, path: `definition.${problem.path}` }))
  if (question.prompt.trim() !== '') return found
  return [{ path: 'prompt', message: 'The question is empty.', blocking: true }, ...found]
}
