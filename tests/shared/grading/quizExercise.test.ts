import { describe, expect, it } from 'vitest'
import { verdictSchema, type QuestionAnswer } from '../../../shared/contracts/exercises'
import { gradeExercise, shownAnswer } from '../../../shared/grading/index'
import { buildQuiz, questions } from './exercises'

const all = Object.values(questions)
const right: Record<string, QuestionAnswer> = {
  'which-mix': { choice: 'a' },
  'what-to-wear': { choices: ['a', 'b'] },
  'how-much-water': { value: '2.5 L', units: 'metric' },
  'the-pour': { order: ['wet', 'tip', 'strike', 'float'] },
}
const grade = (answers: Record<string, QuestionAnswer>, passMark = 100) => {
  const verdict = gradeExercise(buildQuiz(all, passMark), { kind: 'quiz', answers }, 1)
  expect(verdictSchema.safeParse(verdict).success).toBe(true)
  return verdict
}

describe('gradeExercise on a quiz', () => {
  it('is right when every question is', () => {
    expect(grade(right)).toMatchObject({
      right: true,
      outcome: 'right',
      message: 'All of it holds.',
    })
  })

  it.each([
    [100, false],
    [76, false],
    [75, true],
    [50, true],
  ])('with three of four and a pass mark of %i %%: %s', (passMark, passed) => {
    const verdict = grade({ ...right, 'which-mix': { choice: 'b' } }, passMark)
    expect(verdict).toMatchObject({ right: passed, message: '3 of 4 hold so far.' })
    expect(verdict.questions['which-mix']?.right).toBe(false)
  })

  it('counts a question left open as not right yet, and says nothing of it', () => {
    const verdict = grade({ 'which-mix': { choice: 'a' } })
    expect(verdict).toMatchObject({
      right: false,
      outcome: 'wrong',
      message: '1 of 4 hold so far.',
    })
    expect(Object.keys(verdict.questions)).toEqual(['which-mix'])
  })

  it('names the question that cannot be read, and costs no try', () => {
    const verdict = grade({ ...right, 'how-much-water': { value: '2.5 bananas', units: 'metric' } })
    expect(verdict).toMatchObject({
      right: false,
      outcome: 'unread',
      field: 'how-much-water',
      wayBack: 'This costs no try.',
    })
    expect(verdict.message).toContain('“2.5 bananas” cannot be read as a volume')
  })

  it('does not read an empty answer or answers to questions it does not have', () => {
    expect(grade({}).outcome).toBe('unread')
    expect(grade({ moon: { choice: 'a' } }).outcome).toBe('unread')
    expect(gradeExercise(buildQuiz([]), { kind: 'quiz', answers: {} }, 1).outcome).toBe('unread')
  })

  it('shows every answer at last, in both systems', () => {
    const shown = shownAnswer(buildQuiz([questions.single, questions.number]), 1, null)
    expect(shown.metric.replaceAll(/\s/g, ' ')).toBe(
      'Which of these goes into the form? Stands, top closes · How much water goes into the first bag? 2.5 L',
    )
    expect(shown.imperial).toMatch(/2\.64.qt$/)
  })
})
