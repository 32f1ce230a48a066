import { describe, expect, it } from 'vitest'
import { learnerExerciseSchema, type Exercise } from '../../../shared/contracts/exercises'
import {
  calculatorOf,
  faceOf,
  findExerciseProblems,
  gradeExercise,
  shownAnswer,
  toLearnerExercise,
} from '../../../shared/grading'
import { barrows, barrowsWith, barrowsWithFormula } from '../ownCalculators/definitions'

type Worked = Extract<Exercise, { kind: 'calculator' }>

function buildExercise(changed: Partial<Worked['definition']> = {}): Worked {
  return {
    kind: 'calculator',
    prompt: 'How much stone do you order?',
    tries: 3,
    definition: {
      calculator: 'own:barrows',
      own: { key: 'barrows', version: 2, definition: barrows() },
      inputs: {
        length: { mode: 'fixed', value: '12 m' },
        width: { mode: 'ranged', min: 0.3, max: 0.5, step: 0.05 },
        depth: { mode: 'own', value: '150 mm' },
      },
      asked: 'loose',
      tolerance: { kind: 'percent', value: 2 },
      hints: ['Add the extra.'],
      slips: ['no-extra'],
      ...changed,
    },
  }
}
const answer = (text: string) => ({
  kind: 'calculator' as const,
  inputs: { depth: '200 mm' },
  answer: text,
  units: 'metric' as const,
})

describe('calculatorOf', () => {
  it('finds built-in calculators by their id and own ones by what the exercise carries', () => {
    expect(calculatorOf({ calculator: 'slab' })?.title).toBe('Slab: concrete and bags')
    const { definition } = buildExercise()
    expect(calculatorOf(definition)).toMatchObject({ id: 'own:barrows', version: 2 })
    expect(calculatorOf(definition)).toBe(calculatorOf(definition))
    expect(faceOf(definition)?.inputs).toEqual(calculatorOf(definition)?.inputs)
  })

  it('finds nothing where the id and what is carried do not belong together', () => {
    const { own } = buildExercise().definition
    for (const which of [
      { calculator: 'own:barrows' },
      { calculator: 'slab', own },
      { calculator: 'own:other', own },
      { calculator: 'toString' },
    ]) {
      expect([which.calculator, calculatorOf(which), faceOf(which)]).toEqual([
        which.calculator,
        undefined,
        undefined,
      ])
    }
  })
})

describe('an exercise made of an own calculator', () => {
  it('is graded by its formulas, with the numbers of the seed and the learner’s own', () => {
    const exercise = buildExercise()
    const shown = shownAnswer(exercise, 5, answer(''))
    expect(gradeExercise(exercise, answer(shown.metric), 5)).toMatchObject({ outcome: 'right' })
    expect(gradeExercise(exercise, answer('9 m³'), 5)).toMatchObject({ outcome: 'wrong' })
    expect(gradeExercise(exercise, answer('9 kg'), 5)).toMatchObject({ outcome: 'unread' })
  })

  it('names its slips: without the extra it is four fifths', () => {
    const exercise = buildExercise({ inputs: { width: { mode: 'fixed', value: '0.4 m' } } })
    expect(gradeExercise(exercise, answer('0.72 m³'), 1)).toMatchObject({
      outcome: 'slip',
      slip: { id: 'no-extra', title: 'Forgot the extra' },
    })
  })

  it('goes to the learner with the version and formulas it was made of, without examples and slips', () => {
    const learner = learnerExerciseSchema.parse(toLearnerExercise(buildExercise(), 1, 0, false))
    expect(learner).toMatchObject({
      calculator: 'own:barrows',
      own: { key: 'barrows', version: 2, definition: { title: 'Barrows of stone' } },
    })
    expect(JSON.stringify(learner)).not.toMatch(/1440 kg|no-extra|examples|slips/)
  })

  it('has no problems while its calculator has none', () => {
    expect(findExerciseProblems(buildExercise())).toEqual([])
  })

  it.each([
    ['one example', barrowsWith({ examples: barrows().examples.slice(0, 1) }), 'examples'],
    [
      'an example that disagrees',
      barrowsWith({
        examples: barrows().examples.map((one) => ({
          ...one,
          expected: { ...one.expected, barrows: '3' },
        })),
      }),
      'examples.0.expected.barrows',
    ],
    [
      'an error in a formula',
      barrowsWithFormula('trench', 'length * widht'),
      'outputs.0.expression',
    ],
  ])('cannot be used with %s', (_what, definition, path) => {
    const problems = findExerciseProblems(
      buildExercise({ own: { key: 'barrows', version: 2, definition } }),
    )
    expect(problems[0]).toMatchObject({ path: `definition.own.definition.${path}`, blocking: true })
    expect(problems.every(({ blocking }) => blocking)).toBe(true)
  })

  it('cannot be used where its numbers can divide by 0', () => {
    const outputs = barrows().outputs.map((output) =>
      output.name === 'loose'
        ? { ...output, expression: 'trench * 1 m / (width - 0.3 m)' }
        : output,
    )
    const examples = barrows().examples.map(({ inputs }) => ({
      inputs,
      expected: { trench: inputs['length'] === '12 m' ? '0.72 m³' : '0.18 m³' },
    }))
    const own = {
      key: 'barrows',
      version: 2,
      definition: barrowsWith({ outputs: outputs.slice(0, 2), examples, slips: [] }),
    }
    own.definition.examples[0]!.expected['loose'] = '7.2 m³'
    const problems = findExerciseProblems(buildExercise({ own, slips: [] }))
    expect(problems.filter(({ blocking }) => blocking)).toMatchObject([
      { message: expect.stringContaining('divides by 0') },
    ])
  })
})
