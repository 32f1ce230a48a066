import { describe, expect, it } from 'vitest'
import {
  ownCalculatorDefinitionSchema,
  ownCheckSchema,
  type OwnCalculatorDefinition,
} from '../../../shared/contracts/ownCalculators'
import { checkOwnCalculator } from '../../../shared/ownCalculators'
import { barrows, barrowsWith, barrowsWithFormula } from './definitions'

const problemsOf = (definition: OwnCalculatorDefinition) =>
  checkOwnCalculator(definition).problems.map(({ path, column, message }) => [
    path,
    column,
    message,
  ])
const pathsOf = (definition: OwnCalculatorDefinition) =>
  checkOwnCalculator(definition).problems.map(({ path }) => path)

describe('checkOwnCalculator', () => {
  it('finds nothing wrong with a sound calculator, and shows what its examples give', () => {
    expect(ownCalculatorDefinitionSchema.parse(barrows())).toEqual(barrows())
    const check = ownCheckSchema.parse(checkOwnCalculator(barrows()))
    expect(check.problems).toEqual([])
    expect(check.examples[0]?.['weight']).toEqual({
      shown: { metric: '1440\u00a0kg', imperial: '3175\u00a0lb' },
      agrees: true,
    })
    expect(check.examples[1]?.['trench']).toMatchObject({ agrees: null })
    expect(check.examples[1]?.['barrows']).toMatchObject({ agrees: true })
  })

  it('places an error at its character and lets only what depends on it wait', () => {
    const check = checkOwnCalculator(barrowsWithFormula('barrows', 'ceil(loose / barow)'))
    expect(check.problems).toEqual([
      {
        path: 'outputs.2.expression',
        output: 'barrows',
        column: 14,
        length: 5,
        message: 'Nothing is called barow.',
        wayOut: 'Did you mean barrow?',
      },
    ])
    expect(check.examples[0]?.['barrows']).toBeNull()
    expect(check.examples[0]?.['weight']).toMatchObject({ agrees: true })
  })

  it.each([
    ['trench', 'trench * 2', 1, 'trench is worked out from itself.'],
    ['trench', '2 * loose', 5, 'trench and loose are each worked out from the other.'],
    [
      'trench',
      'weight / 1600 kg * 1 m^3',
      1,
      'trench and weight are each worked out from the other.',
    ],
    [
      'loose',
      'trench + barrows * barrow',
      10,
      'loose and barrows are each worked out from the other.',
    ],
    ['weight', 'lose * 1600 kg/m^3', 1, 'Nothing is called lose.'],
    ['weight', 'loose', 1, 'This gives a volume, and a mass is asked for.'],
    ['barrows', 'trench', 1, 'This gives a volume, and a plain number is asked for.'],
    ['barrows', '', 1, 'There is no formula yet.'],
  ])('refuses %s = %s at character %i', (name, expression, column, message) => {
    const index = barrows().outputs.findIndex((output) => output.name === name)
    expect(problemsOf(barrowsWithFormula(name, expression))).toContainEqual([
      `outputs.${index}.expression`,
      column,
      message,
    ])
  })

  it('says what is worked out further down', () => {
    const [trench, loose, count, weight] = barrows().outputs
    const moved = barrowsWith({ outputs: [trench!, count!, loose!, weight!] })
    expect(problemsOf(moved)).toEqual([
      ['outputs.1.expression', 6, 'loose is worked out further down.'],
    ])
  })

  it('names the example with which a formula divides by 0, at the sign', () => {
    const definition = barrowsWithFormula('barrows', 'ceil(loose / (barrow - 60 L))')
    expect(problemsOf(definition).slice(0, 2)).toEqual([
      ['outputs.2.expression', 12, 'In example 1: With these numbers this divides by 0.'],
      ['outputs.2.expression', 12, 'In example 2: With these numbers this divides by 0.'],
    ])
  })

  it('wants two examples with different inputs that agree and cover every output', () => {
    const [first, second] = barrows().examples
    expect(problemsOf(barrowsWith({ examples: [first!] }))).toEqual([
      ['examples', null, 'It needs 2 worked examples and has 1.'],
    ])
    expect(problemsOf(barrowsWith({ examples: [first!, first!] }))).toEqual([
      ['examples', null, 'The worked examples have the same inputs.'],
    ])
    expect(problemsOf(barrowsWith({ examples: [second!, { ...first!, expected: {} }] }))).toEqual([
      ['examples', null, 'No worked example says what Trench must be.'],
      ['examples', null, 'No worked example says what Loose stone must be.'],
      ['examples', null, 'No worked example says what Weight must be.'],
      ['examples.1.expected', null, 'Example 2 does not say what must come out.'],
    ])
  })

  it.each([
    ['15', true],
    ['16', false],
    ['14.9', false],
  ])('judges 15 barrows against “%s”', (said, agrees) => {
    const [first, second] = barrows().examples
    const example = { ...first!, expected: { ...first!.expected, barrows: said } }
    const check = checkOwnCalculator(barrowsWith({ examples: [example, second!] }))
    expect(check.examples[0]?.['barrows']?.agrees).toBe(agrees)
    expect(check.problems.map(({ path }) => path)).toEqual(
      agrees ? [] : ['examples.0.expected.barrows'],
    )
  })

  it('refuses examples that cannot be read or name what is not there', () => {
    const [first, second] = barrows().examples
    const example = {
      inputs: { ...first!.inputs, length: '400 m', colour: 'red', depth: 'deep' },
      expected: { ...first!.expected, sand: '1 kg', weight: '1 m' },
    }
    expect(pathsOf(barrowsWith({ examples: [example, second!] }))).toEqual([
      'examples.0.inputs.colour',
      'examples.0.expected.sand',
      'examples.0.inputs.length',
      'examples.0.inputs.depth',
      'examples.0.expected.weight',
    ])
  })

  it('looks at names, units, bounds and words', () => {
    const { inputs, outputs, slips } = barrows()
    const [length, width, depth, extra, barrow] = inputs
    const definition = barrowsWith({
      title: ' ',
      sources: [],
      inputs: [
        { ...length!, name: 'h', label: '' },
        { ...width!, name: 'depth' },
        { ...depth!, min: 0.6, max: 0.6 },
        { ...extra!, initial: { metric: '80', imperial: 'much' } },
        { ...barrow!, unit: { metric: 'L', imperial: 'psi' } },
      ],
      outputs: [{ ...outputs[0]!, name: 'barrow' }],
      slips: [
        { ...slips[0]!, output: 'sand' },
        { ...slips[0]!, sentence: '' },
      ],
      examples: [],
    })
    expect(pathsOf(definition)).toEqual([
      'title',
      'sources',
      'inputs.0.label',
      'inputs.0.name',
      'inputs.2.min',
      'inputs.3.initial.metric',
      'inputs.3.initial.imperial',
      'inputs.4.unit.imperial',
      'inputs.2.name',
      'outputs.0.name',
      'slips.0.output',
      'slips.1.sentence',
      'slips.1.output',
      'slips.1.id',
      'outputs.0.expression',
      'examples',
      'examples',
    ])
  })

  it('finds an empty draft unfinished, and does not fall over', () => {
    const empty = barrowsWith({ inputs: [], outputs: [], examples: [], slips: [], sources: [] })
    expect(pathsOf(empty)).toEqual(['inputs', 'outputs', 'sources', 'examples'])
  })

  it('places an error in a slip, which must fit its output', () => {
    const [slip] = barrows().slips
    const wrong = barrowsWith({ slips: [{ ...slip!, expression: 'trench * length' }] })
    expect(checkOwnCalculator(wrong).problems).toMatchObject([
      { path: 'slips.0.expression', output: 'no-extra', column: 1, length: 15 },
    ])
  })
})

describe('the sizes of a definition', () => {
  it.each([
    ['13 inputs', { inputs: Array.from({ length: 13 }, () => barrows().inputs[0]!) }],
    ['9 outputs', { outputs: Array.from({ length: 9 }, () => barrows().outputs[0]!) }],
    ['9 examples', { examples: Array.from({ length: 9 }, () => barrows().examples[0]!) }],
    ['11 slips', { slips: Array.from({ length: 11 }, () => barrows().slips[0]!) }],
    [
      'a formula of 301 characters',
      { outputs: [{ ...barrows().outputs[0]!, expression: '1'.repeat(301) }] },
    ],
    ['a bound without end', { inputs: [{ ...barrows().inputs[0]!, max: Infinity }] }],
    ['a long title', { title: 'x'.repeat(61) }],
  ])('refuses %s', (_what, changed) => {
    expect(ownCalculatorDefinitionSchema.safeParse({ ...barrows(), ...changed }).success).toBe(
      false,
    )
  })
})
