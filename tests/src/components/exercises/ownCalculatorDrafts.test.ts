import { describe, expect, it } from 'vitest'
import { ownCalculatorDefinitionSchema } from '../../../../shared/contracts/ownCalculators'
import { checkOwnCalculator } from '../../../../shared/ownCalculators'
import {
  findUnreadBounds,
  newInput,
  newOutput,
  newOwnDefinition,
  newSlip,
  readOwnDraft,
  refuseNewName,
  relabel,
  renameInDraft,
  suggestName,
  systemOfText,
  takeOutNamed,
} from '../../../../src/components/exercises/ownCalculatorDrafts'
import { barrows } from '../../../shared/ownCalculators/definitions'

describe('suggestName', () => {
  it.each([
    ['Length of trench', 'length_of_trench'],
    ['2 by 4', 'by_4'],
    ['', 'input'],
    ['…', 'input'],
  ])('makes of “%s” the name %s', (label, name) => {
    expect(suggestName(label, [], 'input')).toBe(name)
  })
  it('numbers a name that is taken or means something else', () => {
    expect(suggestName('Depth', ['depth', 'depth_2'], 'input')).toBe('depth_3')
    expect(suggestName('Feet', [], 'input')).toBe('feet_2')
    expect(suggestName('Round', [], 'input')).toBe('round_2')
  })
  it('never makes one that is too long', () => {
    expect(
      suggestName('Height of the stack of boards over the ground', [], 'x').length,
    ).toBeLessThanOrEqual(24)
  })
})

describe('refuseNewName', () => {
  it('says why something cannot be called so', () => {
    expect(refuseNewName('depth', ['depth'])).toBe('Something else is called depth already.')
    expect(refuseNewName('kg', [])).toContain('unit')
    expect(refuseNewName('two words', [])).toContain('no name')
    expect(refuseNewName('depth', ['width'])).toBe('')
  })
})

describe('renameInDraft', () => {
  it('renames a thing in formulas, slips and examples, and the calculator still stands', () => {
    const renamed = readOwnDraft(renameInDraft(barrows(), 'trench', 'hole'))
    expect(renamed.outputs.map(({ expression }) => expression)).toEqual([
      'length * width * depth',
      'hole * (1 + extra)',
      'ceil(loose / barrow)',
      'loose * 1600 kg/m^3',
    ])
    expect(renamed.slips[0]?.expression).toBe('hole')
    expect(renamed.examples[0]?.expected['hole']).toBe('0.72 m³')
    expect(checkOwnCalculator(renamed).problems).toEqual([])
  })
  it('leaves names alone of which it is only a part', () => {
    const renamed = renameInDraft(barrows(), 'barrow', 'cart')
    expect(renamed.outputs[2]).toMatchObject({
      name: 'barrows',
      expression: 'ceil(loose / cart)',
    })
    expect(renamed.examples[0]?.inputs['cart']).toBe('60 L')
    expect(renamed.examples[0]?.expected['barrows']).toBe('15')
  })
  it('moves the slips of an answer with it', () => {
    expect(renameInDraft(barrows(), 'loose', 'stone').slips[0]?.output).toBe('stone')
  })
})

describe('relabel', () => {
  it('lets the name follow until somebody has chosen one', () => {
    const started = newOwnDefinition('Barrows')
    const typed = relabel(started, 'inputs', 0, 'Length')
    expect(typed.inputs[0]).toMatchObject({ label: 'Length', name: 'length' })
    expect(relabel(typed, 'inputs', 0, 'Length of it').inputs[0]?.name).toBe('length_of_it')
    const chosen = renameInDraft(typed, 'length', 'run')
    expect(relabel(chosen, 'inputs', 0, 'Run of wall').inputs[0]?.name).toBe('run')
  })
  it('takes formulas with it', () => {
    const { outputs } = relabel(barrows(), 'inputs', 0, 'Long side')
    expect(outputs[0]?.expression).toBe('long_side * width * depth')
  })
  it('gives no two things one name', () => {
    const draft = relabel(barrows(), 'outputs', 0, 'Width')
    expect(draft.outputs[0]?.name).toBe('width_2')
  })
})

describe('takeOutNamed', () => {
  it('takes the numbers of a thing out of the examples too', () => {
    const draft = takeOutNamed(barrows(), 'weight')
    expect(draft.outputs.map(({ name }) => name)).toEqual(['trench', 'loose', 'barrows'])
    expect(Object.keys(draft.examples[0]?.expected ?? {})).not.toContain('weight')
    expect(checkOwnCalculator(readOwnDraft(draft)).problems).toEqual([])
  })
})

describe('bounds that cannot be read', () => {
  const draft = () => {
    const { inputs, ...rest } = barrows()
    return {
      ...rest,
      inputs: inputs.map((input, at) => (at === 1 ? { ...input, max: 'x' } : input)),
    }
  }
  it('are found by their place', () => {
    expect(findUnreadBounds(draft().inputs)).toEqual([
      { field: 'inputs.1.max', message: '“x” cannot be read as a number here.' },
    ])
  })
  it('bound nothing while it is tried out', () => {
    expect(ownCalculatorDefinitionSchema.parse(readOwnDraft(draft())).inputs[1]?.max).toBe(1e12)
  })
})

describe('systemOfText', () => {
  const loose = { name: 'loose', label: 'Loose', quantity: 'volume' as const, expression: '1 m^3' }
  it.each([
    ['0.875 ft³', 'imperial'],
    ['24.8 L', 'metric'],
    ['0.9', 'metric'],
    ['', 'metric'],
    ['much', 'metric'],
  ])('reads “%s” as %s', (text, system) => {
    expect(systemOfText(loose, text)).toBe(system)
  })
})

describe('what is begun', () => {
  it('is taken by the contract as it stands, in its order', () => {
    const started = newOwnDefinition('Barrows')
    const draft = {
      ...started,
      inputs: [...started.inputs, newInput(started)],
      outputs: [...started.outputs, newOutput(started)],
      slips: [newSlip(started)],
    }
    const definition = readOwnDraft(draft)
    expect(JSON.stringify(ownCalculatorDefinitionSchema.parse(definition))).toBe(
      JSON.stringify(definition),
    )
    expect(definition.inputs.map(({ name }) => name)).toEqual(['input', 'input_2'])
  })
})
