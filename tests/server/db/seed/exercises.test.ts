import { describe, expect, it } from 'vitest'
import { demoCourses } from '../../../../server/db/seed'
import { rightAnswer, workedOut } from '../../../../server/db/seed/answers'
import { ownCalculatorDefinitionSchema } from '../../../../shared/contracts/ownCalculators'
import { findExerciseProblems, gradeExercise } from '../../../../shared/grading'
import { checkOwnCalculator } from '../../../../shared/ownCalculators'

const issued = demoCourses.filter(({ issuedOn }) => issuedOn !== null)
const lessonsOf = (list: typeof demoCourses) =>
  list.flatMap((course) => course.stages.flatMap((stage) => stage.lessons))
const exercisesOf = (list: typeof demoCourses) =>
  lessonsOf(list).flatMap((lesson) =>
    lesson.stops.flatMap(({ key, exercise }) =>
      exercise ? [{ place: `${lesson.key}, ${key}`, exercise }] : [],
    ),
  )

describe('the exercises of the demo', () => {
  it('uses five built-in calculators, one of its own and all four kinds of questions', () => {
    const all = exercisesOf(issued).map(({ exercise }) => exercise)
    const calculators = all.flatMap((one) =>
      one.kind === 'calculator' ? [one.definition.calculator] : [],
    )
    const kinds = all.flatMap((one) =>
      one.kind === 'quiz' ? one.questions.map(({ kind }) => kind) : [],
    )
    expect([...new Set(calculators)].sort()).toEqual([
      'diagonals',
      'mix',
      'own:firewood-it-holds',
      'pitch',
      'slab',
      'square',
    ])
    expect([...new Set(kinds)].sort()).toEqual(['number', 'order', 'several', 'single'])
  })

  const own = demoCourses.flatMap(({ ownCalculators = {} }) => Object.entries(ownCalculators))
  it('has two own calculators', () => {
    expect(own.map(([key]) => key)).toEqual(['firewood-it-holds', 'gate-on-its-hinges'])
  })
  it.each(own)('has nothing to mend in the own calculator %s', (_key, definition) => {
    const check = checkOwnCalculator(ownCalculatorDefinitionSchema.parse(definition))
    expect(check.problems).toEqual([])
    const agreed = check.examples.flatMap((example) => Object.values(example))
    expect(agreed.every((given) => given?.agrees === true)).toBe(true)
  })

  it.each(exercisesOf(issued))('has nothing to mend in the exercise of $place', ({ exercise }) => {
    expect(findExerciseProblems(exercise).filter(({ blocking }) => blocking)).toEqual([])
  })

  it.each(exercisesOf(issued))('grades the right answer at $place as right', ({ exercise }) => {
    for (const units of ['metric', 'imperial'] as const) {
      for (let seed = 0; seed < 25; seed++) {
        const verdict = gradeExercise(exercise, rightAnswer(exercise, seed, units), seed)
        expect(verdict).toMatchObject({ right: true, outcome: 'right' })
      }
    }
  })

  it.each(
    exercisesOf(issued).flatMap(({ place, exercise }) =>
      exercise.kind === 'calculator' ? [{ place, exercise }] : [],
    ),
  )('can name every slip that $place lists', ({ exercise }) => {
    const { slips, asked } = exercise.definition
    for (const id of slips) {
      const happens = (['metric', 'imperial'] as const).some((units) => {
        const { calculator, values, outputs } = workedOut(exercise, 1, units)
        const slip = calculator.slips.find((one) => one.id === id && one.output === asked)
        return slip?.wrong(values, outputs, units) !== undefined
      })
      expect({ id, happens }).toEqual({ id, happens: true })
    }
  })
})
