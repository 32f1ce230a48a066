import { describe, expect, it } from 'vitest'
import {
  checkDefinition,
  gradeAnswer,
  judgeExercise,
  showAnswer,
  workCalculator,
} from '../../../server/exercises/ownCalculatorTasks.service'
import { findCalculator } from '../../../shared/calculators'
import type { Answer, Exercise } from '../../../shared/contracts/exercises'
import type { OwnCalculatorDefinition, OwnSnapshot } from '../../../shared/contracts/ownCalculators'
import { barrows, barrowsWithFormula } from '../../shared/ownCalculators/definitions'
import { slabDefinition } from '../../support/factories'
import { ownDefinition } from './ownCalculatorScene'

const own: OwnSnapshot = { key: 'barrows', version: 1, definition: barrows() }
const exerciseOf = (
  definition: Extract<Exercise, { kind: 'calculator' }>['definition'],
): Exercise => ({
  kind: 'calculator',
  prompt: 'How much?',
  tries: 3,
  definition,
})
const exercise = exerciseOf(ownDefinition(own))
const answer = (text: string): Answer => ({
  kind: 'calculator',
  inputs: {},
  answer: text,
  units: 'metric',
})

/** As many inputs and as long formulas as can be, every input a range: thousands of mixtures to try. */
function heaviest(): Exercise {
  const [length] = barrows().inputs
  const names = Array.from({ length: 12 }, (_, index) => `side${index}`)
  const product = names
    .map((name) => `hypot(${name}, 2 m)`)
    .join(' + ')
    .slice(0, 290)
  const expression = product.slice(0, product.lastIndexOf(' + '))
  const outputs = Array.from({ length: 8 }, (_, index) => ({
    name: `sum${index}`,
    label: `Sum ${index}`,
    quantity: 'length' as const,
    expression,
  }))
  const inputs = Object.fromEntries(names.map((name) => [name, '3 m']))
  const used = names.filter((name) => expression.includes(`${name},`)).length
  const expected = (side: number) =>
    Object.fromEntries(
      outputs.map(({ name }) => [name, `${used * Math.hypot(side, 2)} m`.slice(0, 8) + ' m']),
    )
  const definition: OwnCalculatorDefinition = {
    ...barrows(),
    inputs: names.map((name) => ({ ...length!, name, label: name })),
    outputs,
    slips: [],
    examples: [
      { inputs, expected: expected(3) },
      { inputs: Object.fromEntries(names.map((name) => [name, '4 m'])), expected: expected(4) },
    ],
  }
  return exerciseOf({
    calculator: 'own:heavy',
    own: { key: 'heavy', version: 1, definition },
    inputs: Object.fromEntries(
      names.map((name) => [name, { mode: 'ranged', min: 1, max: 20, step: 0.1 }]),
    ),
    asked: 'sum7',
    tolerance: { kind: 'percent', value: 1 },
    hints: [],
    slips: [],
  })
}

describe('the tasks of own calculators', () => {
  it('are done aside: graded, shown, judged, worked and checked', async () => {
    expect(await gradeAnswer(exercise, answer('0.9 m³'), 1)).toMatchObject({ outcome: 'right' })
    expect(await gradeAnswer(exercise, answer('0.72 m³'), 1)).toMatchObject({
      slip: { id: 'no-extra' },
    })
    expect((await showAnswer(exercise, 1, null)).metric).toBe('0.9\u00a0m³')
    expect(await judgeExercise(exercise)).toEqual([])
    const [{ inputs } = { inputs: {} }] = barrows().examples
    expect(await workCalculator(own, inputs, 'metric')).toMatchObject({ outputs: { barrows: 15 } })
    expect((await checkDefinition(barrowsWithFormula('weight', 'loos'))).problems).toMatchObject([
      { path: 'outputs.3.expression', column: 1 },
    ])
  })

  it('leave built-in calculators to the process', async () => {
    const built = exerciseOf(slabDefinition)
    expect(await gradeAnswer(built, answer('0.286 m³'), 1)).toMatchObject({ outcome: 'right' })
    expect(await showAnswer(built, 1, null)).toMatchObject({ metric: '0.286\u00a0m³' })
    expect(await judgeExercise(built)).toEqual([])
    const slab = findCalculator('slab')!
    const run = await workCalculator(slab, slab.example.inputs, 'metric')
    expect(run.ok).toBe(true)
  })

  it('are ended when they take too long, and the next is done as if nothing was', async () => {
    const heavy = heaviest()
    const judged = judgeExercise(heavy)
    const next = gradeAnswer(exercise, answer('0.9 m³'), 1)
    expect(await judged).toEqual([
      {
        path: 'definition.calculator',
        message:
          'The formula took too long to work out. Give fewer inputs as ranges, or shorten it.',
        blocking: true,
      },
    ])
    expect(await next).toMatchObject({ outcome: 'right' })
  })

  it('are not ended for being many', async () => {
    const verdicts = await Promise.all(
      Array.from({ length: 50 }, (_, seed) => gradeAnswer(exercise, answer('0.9 m³'), seed)),
    )
    expect(verdicts.every(({ right }) => right)).toBe(true)
  })
})
