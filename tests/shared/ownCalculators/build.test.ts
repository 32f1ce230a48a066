import { describe, expect, it } from 'vitest'
import { convertText, runCalculator } from '../../../shared/calculators'
import { buildOwnCalculator, describeOwnCalculator } from '../../../shared/ownCalculators'
import { barrows, barrowsWith, barrowsWithFormula } from './definitions'

const source = { key: 'barrows', version: 3 }
const texts = { length: '12 m', width: '0.4 m', depth: '150 mm', extra: '25 %', barrow: '60 L' }
const plain = (text: string) => text.replaceAll('\u00a0', ' ')

describe('buildOwnCalculator', () => {
  it('makes a calculator that runs like any other', () => {
    const calculator = buildOwnCalculator(barrows(), source)
    expect([calculator.id, calculator.version]).toEqual(['own:barrows', 3])
    const run = runCalculator(calculator, texts, 'metric')
    expect(run).toMatchObject({ ok: true, values: { length: 12, depth: 0.15, extra: 25 } })
    if (!run.ok) return
    expect(run.outputs['trench']).toBeCloseTo(0.72, 12)
    expect(run.outputs['loose']).toBeCloseTo(0.9, 12)
    expect(run.outputs['barrows']).toBe(15)
    expect(run.outputs['weight']).toBeCloseTo(1440, 9)
  })

  it('writes one step an output: the formula, the numbers put in, the result', () => {
    const run = runCalculator(buildOwnCalculator(barrows(), source), texts, 'metric')
    const steps = run.ok ? run.steps : []
    expect(
      steps.map((step) => [step.output, ...[step.formula, step.numbers, step.result].map(plain)]),
    ).toEqual([
      [
        'trench',
        'length × width × depth',
        '12000 mm × 400 mm × 150 mm'.replace('12000', '12\u202f000'),
        '0.72 m³',
      ],
      ['loose', 'trench × (1 + extra)', '0.72 m³ × (1 + 25 %)', '0.9 m³'],
      ['barrows', 'round up(loose ÷ barrow)', 'round up(0.9 m³ ÷ 60 L)', '15'],
      ['weight', 'loose × 1600 kg/m³', '0.9 m³ × 1600 kg/m³', '1440 kg'],
    ])
  })

  it.each([
    ['-length + width^2 / 1 m', '−length + width² ÷ 1 m', '−12 m + (400 mm)² ÷ 1 m'],
    ['length > 2 m ? sqrt(width * depth) : depth', 'length > 2 m ? √(width × depth) : depth', ''],
    ['max(length, width) * sin(30 deg)', 'largest of(length; width) × sin(30 deg)', ''],
    ['length * (2 in / 3 inch)^3', 'length × (2 in ÷ 3 in)³', ''],
  ])('writes %s with the signs a person reads', (expression, formula, numbers) => {
    const length = { ...barrows().outputs[0]!, quantity: 'length' as const, expression }
    const definition = barrowsWith({ outputs: [length] })
    const run = runCalculator(buildOwnCalculator(definition, source), texts, 'metric')
    const [step] = run.ok ? run.steps : []
    expect(plain(step?.formula ?? '')).toBe(formula)
    if (numbers) expect(plain(step?.numbers ?? '').replace('12\u202f000 mm', '12 m')).toBe(numbers)
  })

  it('reads inputs in either system and refuses what is out of bounds', () => {
    const calculator = buildOwnCalculator(barrows(), source)
    const imperial = runCalculator(
      calculator,
      { ...texts, length: `39' 4-7/16"`, barrow: '2.12' },
      'imperial',
    )
    expect(imperial.ok && imperial.outputs['barrows']).toBe(15)
    const refused = runCalculator(calculator, { ...texts, length: '400 m' }, 'metric')
    expect(refused).toMatchObject({
      ok: false,
      errors: { length: expect.stringContaining('out of range') },
    })
    expect(plain(convertText(calculator.inputs[4]!, '60', 'metric', 'imperial'))).toBe('2.119 ft³')
  })

  it('counts what was left empty as 0', () => {
    const inputs = barrows().inputs.map((input) =>
      input.name === 'extra' ? { ...input, optional: true } : input,
    )
    const calculator = buildOwnCalculator(barrowsWith({ inputs }), source)
    const run = runCalculator(calculator, { ...texts, extra: '' }, 'metric')
    expect(run.ok && run.outputs['loose']).toBeCloseTo(0.72, 12)
  })

  it('gives per cent as the number of per cent', () => {
    const share = { ...barrows().outputs[1]!, name: 'share', quantity: 'percent' as const }
    const outputs = [barrows().outputs[0]!, { ...share, expression: 'barrow / trench' }]
    const run = runCalculator(buildOwnCalculator(barrowsWith({ outputs }), source), texts, 'metric')
    expect(run.ok && run.outputs['share']).toBeCloseTo(100 / 12, 9)
  })

  it('says in a sentence when the numbers give no value', () => {
    const definition = barrowsWithFormula('barrows', 'ceil(loose / (barrow - 60 L))')
    expect(runCalculator(buildOwnCalculator(definition, source), texts, 'metric')).toMatchObject({
      ok: false,
      errors: { length: expect.stringContaining('Barrows: With these numbers this divides by 0.') },
    })
  })

  it('never runs a formula that is wrong', () => {
    for (const expression of ['trench.constructor', 'barow', 'length', 'import("fs")']) {
      const definition = barrowsWithFormula('loose', expression)
      const run = runCalculator(buildOwnCalculator(definition, source), texts, 'metric')
      expect([expression, run.ok]).toEqual([expression, false])
    }
  })

  it('names slips by their formulas', () => {
    const calculator = buildOwnCalculator(barrows(), source)
    const run = runCalculator(calculator, texts, 'metric')
    const [slip] = calculator.slips
    expect(run.ok && slip?.wrong(run.values, run.outputs, 'metric')).toBeCloseTo(0.72, 12)
    const broken = barrows().slips.map((one) => ({ ...one, expression: 'nothing' }))
    const [silent] = buildOwnCalculator(barrowsWith({ slips: broken }), source).slips
    expect(run.ok && silent?.wrong(run.values, run.outputs, 'metric')).toBeUndefined()
  })
})

describe('describeOwnCalculator', () => {
  it('has the fields of the calculator, without its formulas', () => {
    const face = describeOwnCalculator(barrows(), source)
    expect(buildOwnCalculator(barrows(), source)).toMatchObject(face)
    expect(JSON.stringify(face)).not.toContain('trench *')
  })
})
