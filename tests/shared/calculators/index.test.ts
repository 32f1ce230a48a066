import { describe, expect, it } from 'vitest'
import {
  calculators,
  findCalculator,
  hideAnswer,
  runCalculator,
  showInput,
  showOutput,
} from '../../../shared/calculators/index'
import type { Calculator, Value } from '../../../shared/calculators/calculator'

const systems = ['metric', 'imperial'] as const
const named = calculators.map((calculator) => [calculator.id, calculator] as const)
const initials = ({ inputs }: Calculator, system: 'metric' | 'imperial') =>
  Object.fromEntries(inputs.map(({ name, initial }) => [name, initial[system]]))

/** The texts that a calculator starts from, and those with one number after the other at its least and at its most. */
function startAndEnds(calculator: Calculator, system: 'metric' | 'imperial') {
  const start = initials(calculator, system)
  const ends = calculator.inputs.flatMap((input) => {
    if (input.quantity === 'choice') return []
    const { name, min, max } = input
    return [min, max].map((value) => ({ ...start, [name]: showInput(input, value, system) }))
  })
  return [start, ...ends]
}

function toSixFigures(value: Value | undefined): Value | undefined {
  if (Array.isArray(value))
    return (value as readonly number[]).map((one) => Number(one.toPrecision(6)))
  return typeof value === 'number' ? Number(value.toPrecision(6)) : value
}

describe('every calculator', () => {
  it.each(named)('%s computes its example', (_id, calculator) => {
    const run = runCalculator(calculator, calculator.example.inputs, 'metric')
    if (!run.ok) throw new Error(JSON.stringify(run.errors))
    expect(Object.keys(calculator.example.outputs).sort()).toEqual(Object.keys(run.outputs).sort())
    for (const [name, expected] of Object.entries(calculator.example.outputs)) {
      expect(toSixFigures(run.outputs[name]), name).toEqual(expected)
    }
  })

  it.each(named)('%s starts from numbers it can compute, in both systems', (_id, calculator) => {
    for (const system of systems)
      expect(runCalculator(calculator, initials(calculator, system), system).ok).toBe(true)
  })

  it.each(named)('%s writes steps without holes, for its own outputs', (_id, calculator) => {
    for (const system of systems) {
      const run = runCalculator(calculator, initials(calculator, system), system)
      if (!run.ok) throw new Error('initial numbers are refused')
      expect(run.steps.length).toBeGreaterThan(1)
      for (const step of run.steps) {
        const { label, formula, numbers, result } = step
        expect([label, formula, numbers, result].join(' ')).not.toMatch(/NaN|undefined|–/)
        expect([label, formula, numbers, result].every((text) => text !== '')).toBe(true)
        if (step.output !== undefined)
          expect(calculator.outputs.map(({ name }) => name)).toContain(step.output)
      }
    }
  })

  it.each(named)('%s shows the same result in its steps as in its outputs', (_id, calculator) => {
    for (const system of systems) {
      for (const texts of [calculator.example.inputs, ...startAndEnds(calculator, system)]) {
        const run = runCalculator(calculator, texts, system)
        if (!run.ok) continue
        for (const step of run.steps) {
          const output = calculator.outputs.find(({ name }) => name === step.output)
          if (!output || run.outputs[output.name] === undefined) continue
          const shown = showOutput(output, run.outputs[output.name], system)
          expect([system, output.name, step.result]).toEqual([system, output.name, shown])
        }
      }
    }
  })

  it.each(named)(
    '%s has cautions, sources, names of its own and slips that belong to it',
    (_id, calculator) => {
      expect(calculator.cautions.length).toBeGreaterThan(0)
      expect(calculator.sources.length).toBeGreaterThan(0)
      for (const list of [calculator.inputs, calculator.outputs]) {
        expect(new Set(list.map(({ name }) => name)).size).toBe(list.length)
      }
      expect(new Set(calculator.slips.map(({ id }) => id)).size).toBe(calculator.slips.length)
      const outputs = calculator.outputs.map(({ name }) => name)
      for (const { output } of calculator.slips) expect(outputs).toContain(output)
    },
  )
})

describe('findCalculator', () => {
  it('finds by id, and nothing for a stranger', () => {
    expect(findCalculator('slab')?.title).toBe('Slab: concrete and bags')
    expect(findCalculator('toString')).toBeUndefined()
  })
})

describe('runCalculator', () => {
  const slab = findCalculator('slab')
  if (!slab) throw new Error('slab is missing')

  it('keeps what could be read beside the sentence for what could not', () => {
    const run = runCalculator(slab, { length: '3 m', width: 'wide', thickness: '' }, 'metric')
    expect(run.ok).toBe(false)
    if (run.ok) return
    expect(run.values['length']).toBe(3)
    expect(run.errors['width']).toContain('Width: “wide” cannot be read as a length.')
    expect(run.errors['thickness']).toMatch(/^Thickness is empty\. Give 20.mm to 1000.mm\.$/)
  })

  it('says that a field left out of a call is missing', () => {
    const run = runCalculator(slab, { length: '3 m', width: '2 m' }, 'metric')
    expect(run.ok ? {} : run.errors).toEqual({
      thickness: expect.stringMatching(/^Thickness is missing\./) as string,
    })
  })

  it('reads a choice by its value or its label', () => {
    const sound = { length: '3 m', width: '2 m', thickness: '100 mm' }
    for (const bag of ['80 lb', '80\u00a0LB', '80lb']) {
      const run = runCalculator(slab, { ...sound, bag }, 'metric')
      expect(run.ok && run.values['bag']).toBe('80 lb')
    }
    const run = runCalculator(slab, { ...sound, bag: 'b'.repeat(500) }, 'metric')
    expect(run.ok ? '' : run.errors['bag']).toContain('…” is not one of them. Give 80 lb, 60 lb,')
  })
})

describe('hideAnswer', () => {
  it('ends with the asked step, its result a question mark and nothing that tells it', () => {
    for (const calculator of calculators) {
      const run = runCalculator(calculator, calculator.example.inputs, 'metric')
      if (!run.ok) throw new Error('example is refused')
      for (const { output } of run.steps) {
        if (output === undefined) continue
        const shown = hideAnswer(run.steps, output)
        expect(shown.at(-1)).toMatchObject({ output, result: '?' })
        expect(shown.at(-1)?.numbers).not.toContain(' = ')
        expect(shown.filter((step) => step.output === output)).toHaveLength(1)
      }
    }
  })
})
