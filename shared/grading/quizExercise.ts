import type { Answer, Exercise, QuestionVerdict, UnitSystem, Verdict } from '../contracts/exercises'
import type { ExerciseProblem } from './grader'
import { findQuestionProblems, gradeQuestion, showQuestionAnswer } from './questions'
import { unreadVerdict } from './verdict'

type QuizExercise = Extract<Exercise, { kind: 'quiz' }>
type QuizAnswer = Extract<Answer, { kind: 'quiz' }>

/**
 * Grades the answered questions of a quiz; it is right once the pass mark is reached.
 * A question left open counts as not right yet; one that cannot be read stops the grading and costs no try.
 */
export function gradeQuiz(exercise: QuizExercise, answer: QuizAnswer): Verdict {
  const verdicts: Record<string, QuestionVerdict> = {}
  for (const question of exercise.questions) {
    const given = answer.answers[question.key]
    if (given === undefined) continue
    const { unread, ...verdict } = gradeQuestion(question, given)
    if (unread)
      return {
        ...unreadVerdict(verdict.message, question.key),
        questions: { [question.key]: verdict },
      }
    verdicts[question.key] = verdict
  }
  const total = exercise.questions.length
  if (Object.keys(verdicts).length === 0)
    return unreadVerdict('Answer at least one question.', 'answer')
  const held = Object.values(verdicts).filter(({ right }) => right).length
  const right = held * 100 >= exercise.passMark * total
  return {
    right,
    outcome: right ? 'right' : 'wrong',
    slip: null,
    message:
      held === total ? 'All of it holds.' : `${String(held)} of ${String(total)} hold so far.`,
    wayBack: right
      ? 'That is enough to carry on.'
      : 'What holds is marked. Look at the others again.',
    field: null,
    questions: verdicts,
  }
}

/** The right answers of a quiz, one after the other. */
export const showQuizAnswer = (exercise: QuizExercise, system: UnitSystem): string =>
  exercise.questions
    .map((question) => `${question.prompt} ${showQuestionAnswer(question, system)}`)
    .join(' · ')

/** What keeps a quiz from being used. */
export function findQuizProblems(exercise: QuizExercise): ExerciseProblem[] {
  const keys = exercise.questions.map(({ key }) => key)
  const problems: ExerciseProblem[] = []
  if (keys.length === 0) {
    problems.push({ path: 'questions', message: 'The quiz has no question.', blocking: true })
  }
  if (new Set(keys).size < keys.length) {
    problems.push({
      path: 'questions',
      message: 'Two questions have the same key.',
      blocking: true,
    })
  }
  const found = exercise.questions.flatMap((question, index) =>
    findQuestionProblems(question).map((problem) => ({
      ...problem,
      path: `questions.${String(index)}.${problem.path}`,
    })),
  )
  return [...problems, ...found]
}
