import { describe, expect, it } from 'vitest'
import { exerciseSchema } from '../../../../shared/contracts/exercises'
import { findExerciseProblems } from '../../../../shared/grading'
import { calculators } from '../../../../shared/calculators'
import { findUnfinished, readDraft } from '../../../../src/components/exercises/exerciseDrafts'
import {
  newCalculatorExercise,
  newDefinition,
  newQuestion,
  newQuizExercise,
} from '../../../../src/components/exercises/newExercises'

describe('findUnfinished', () => {
  it('names every number that cannot be read', () => {
    const draft = newCalculatorExercise('metric')
    draft.tries = 'many'
    draft.definition.inputs['length'] = { mode: 'ranged', min: 1, max: '', step: 0.1 }
    expect(findUnfinished(draft).map(({ field }) => field)).toEqual([
      'tries',
      'definition.inputs.length.max',
    ])
    expect(readDraft(draft)).toBeNull()
  })
  it('names choices and lines that are still empty', () => {
    const quiz = newQuizExercise()
    if (quiz.kind !== 'quiz') throw new Error('expected a quiz')
    quiz.questions = [newQuestion('single'), newQuestion('order'), newQuestion('number')]
    expect(findUnfinished(quiz).map(({ field }) => field)).toEqual([
      'questions.0.definition.choices.0.text',
      'questions.0.definition.choices.1.text',
      'questions.1.definition.items.0.text',
      'questions.1.definition.items.1.text',
      'questions.1.definition.items.2.text',
      'questions.2.definition.answer',
    ])
  })
})

describe('a new calculator exercise', () => {
  const cases = calculators.flatMap(({ id }) => [
    { id, system: 'metric' as const },
    { id, system: 'imperial' as const },
  ])
  it.each(cases)('of $id in $system can be kept and issued once it is asked', ({ id, system }) => {
    const draft = { ...newCalculatorExercise(system), prompt: 'How much?' }
    const exercise = readDraft({ ...draft, definition: newDefinition(id, system) })
    const parsed = exerciseSchema.parse(exercise)
    expect(findExerciseProblems(parsed).filter(({ blocking }) => blocking)).toEqual([])
  })
  it('leaves out hints that are still empty', () => {
    const draft = newCalculatorExercise('metric')
    draft.definition.hints = ['Square it.', '  ']
    const exercise = readDraft(draft)
    expect(exercise?.kind === 'calculator' && exercise.definition.hints).toEqual(['Square it.'])
  })
})
