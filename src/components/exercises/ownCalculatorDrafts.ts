import type { FieldError } from '../../../shared/contracts/errors'
import type {
  OwnCalculatorDefinition,
  OwnExample,
  OwnInput,
  OwnOutput,
  OwnQuantity,
  OwnSlip,
} from '../../../shared/contracts/ownCalculators'
import { fieldUnit } from '../../../shared/calculators/fields'
import type { UnitSystem } from '../../../shared/contracts/exercises'
import { ownCalculatorLimits } from '../../../shared/ownCalculators/limits'
import { parseQuantity } from '../../../shared/units/parse'
import { unitIn } from '../../../shared/units/unit'
import { refuseName } from '../../../shared/ownCalculators/vocabulary'
import type { Typed } from './exerciseDrafts'

/** An input while it is written: bounds that cannot be read yet stand in it as they were typed. */
export interface OwnInputDraft extends Omit<OwnInput, 'min' | 'max'> {
  min: Typed
  max: Typed
}
/** A calculator while it is written. */
export interface OwnDraft extends Omit<OwnCalculatorDefinition, 'inputs'> {
  inputs: OwnInputDraft[]
}

/** Wide enough for anything; stands where a bound cannot be read yet. */
const WIDEST = 1e12

/** The draft as it is checked and tried out; a bound that cannot be read bounds nothing. */
export const readOwnDraft = (draft: OwnDraft): OwnCalculatorDefinition => ({
  ...draft,
  inputs: draft.inputs.map((input) => ({
    ...input,
    min: typeof input.min === 'number' ? input.min : -WIDEST,
    max: typeof input.max === 'number' ? input.max : WIDEST,
  })),
})

/** What keeps inputs from being sent: bounds that cannot be read, each by its path. */
export const findUnreadBounds = (inputs: readonly OwnInputDraft[]): FieldError[] =>
  inputs.flatMap((input, index) =>
    (['min', 'max'] as const).flatMap((end) => {
      const value = input[end]
      if (typeof value === 'number') return []
      const message =
        value === '' ? 'Write a number here.' : `“${value}” cannot be read as a number here.`
      return [{ field: `inputs.${index}.${end}`, message }]
    }),
  )

/** Bounds to begin with, in SI: what a garden job may need. */
const firstBounds: Record<OwnQuantity, [min: number, max: number]> = {
  length: [0.01, 30],
  area: [0.01, 500],
  volume: [0.001, 50],
  angle: [0, (85 * Math.PI) / 180],
  ratio: [0, 2],
  mass: [0.1, 5000],
  massDensity: [10, 8000],
  pressure: [0, 50_000],
  force: [0, 50_000],
  count: [1, 1000],
  money: [0, 1_000_000],
  percent: [0, 100],
  time: [60, 864_000],
}

/** What depends on what an input measures, at the beginning and after that was changed. */
export function measuredAs(quantity: OwnQuantity): Pick<OwnInput, 'quantity' | 'min' | 'max'> & {
  initial: OwnInput['initial']
  unit: OwnInput['unit']
} {
  const [min, max] = firstBounds[quantity]
  return { quantity, min, max, initial: { metric: '', imperial: '' }, unit: undefined }
}

type Named = Pick<OwnDraft, 'inputs' | 'outputs'>
const namesOf = ({ inputs, outputs }: Named) => [...inputs, ...outputs].map(({ name }) => name)

/** A name made of a label: Length of trench becomes length_of_trench; numbered where it is taken. */
export function suggestName(label: string, taken: readonly string[], fallback: string): string {
  const plain = label
    .normalize('NFD')
    .replace(/[\u0300-\u036f]/g, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '_')
    .replace(/^[_0-9]+|_+$/g, '')
  const room = ownCalculatorLimits.nameCharacters - 3
  const base = plain.slice(0, room).replace(/_+$/, '') || fallback
  for (let number = 1; ; number++) {
    const name = number === 1 ? base : `${base}_${number}`
    if (refuseName(name) === undefined && !taken.includes(name)) return name
  }
}

/** Why something cannot be called so, or nothing. */
export function refuseNewName(name: string, taken: readonly string[]): string {
  return (
    refuseName(name) ?? (taken.includes(name) ? `Something else is called ${name} already.` : '')
  )
}

const asWord = (name: string) => new RegExp(`(?<![A-Za-z0-9_])${name}(?![A-Za-z0-9_])`, 'g')
const renameKey = (record: Record<string, string>, from: string, to: string) =>
  Object.fromEntries(Object.entries(record).map(([key, text]) => [key === from ? to : key, text]))

/** A draft in which an input or output is called otherwise, everywhere: in formulas, slips and examples too. */
export function renameInDraft(draft: OwnDraft, from: string, to: string): OwnDraft {
  if (from === to) return draft
  const inFormula = (text: string) => (from === '' ? text : text.replace(asWord(from), to))
  const named = <T extends { name: string }>(row: T): T =>
    row.name === from ? { ...row, name: to } : row
  return {
    ...draft,
    inputs: draft.inputs.map(named),
    outputs: draft.outputs.map((output) => ({
      ...named(output),
      expression: inFormula(output.expression),
    })),
    slips: draft.slips.map((slip) => ({
      ...slip,
      output: slip.output === from ? to : slip.output,
      expression: inFormula(slip.expression),
    })),
    examples: draft.examples.map(({ inputs, expected }) => ({
      inputs: renameKey(inputs, from, to),
      expected: renameKey(expected, from, to),
    })),
  }
}

const without = (record: Record<string, string>, name: string) =>
  Object.fromEntries(Object.entries(record).filter(([key]) => key !== name))

/** A draft without an input or output; its numbers leave the examples with it. */
export function takeOutNamed(draft: OwnDraft, name: string): OwnDraft {
  return {
    ...draft,
    inputs: draft.inputs.filter((input) => input.name !== name),
    outputs: draft.outputs.filter((output) => output.name !== name),
    examples: draft.examples.map(({ inputs, expected }) => ({
      inputs: without(inputs, name),
      expected: without(expected, name),
    })),
  }
}

/** An input with its parts in the order of the contract, so that the same always reads the same. */
export function orderInput(input: OwnInputDraft): OwnInputDraft {
  const { name, label, quantity, help, unit, min, max, initial, optional } = input
  return {
    name,
    label,
    quantity,
    help,
    ...(unit ? { unit } : {}),
    min,
    max,
    initial,
    ...(optional ? { optional } : {}),
  }
}
/** The same for an output. */
export function orderOutput({ name, label, quantity, unit, expression }: OwnOutput): OwnOutput {
  return { name, label, quantity, ...(unit ? { unit } : {}), expression }
}

const fallbacks = { inputs: 'input', outputs: 'answer' } as const
/** The two lists whose rows have names. */
export type NamedList = keyof typeof fallbacks

/** Names of everything but one row. */
export function otherNames(draft: Named, list: NamedList, index: number): string[] {
  const own = list === 'inputs' ? index : draft.inputs.length + index
  return namesOf(draft).toSpliced(own, 1)
}

/** A draft in which a row has another label; its name follows until somebody has chosen one. */
export function relabel(draft: OwnDraft, list: NamedList, index: number, label: string): OwnDraft {
  const row = draft[list][index]
  if (!row) return draft
  const others = otherNames(draft, list, index)
  const suggested = (from: string) => suggestName(from, others, fallbacks[list])
  const follows = row.name === '' || row.name === suggested(row.label)
  const named = follows ? renameInDraft(draft, row.name, suggested(label)) : draft
  return {
    ...named,
    [list]: named[list].map((one, at) => (at === index ? { ...one, label } : one)),
  }
}

export function newInput(draft: Named): OwnInputDraft {
  const name = suggestName('', namesOf(draft), fallbacks.inputs)
  return orderInput({ name, label: '', help: '', ...measuredAs('length') })
}
export function newOutput(draft: Named): OwnOutput {
  const name = suggestName('', namesOf(draft), fallbacks.outputs)
  return { name, label: '', quantity: 'length', expression: '' }
}
export const newExample = (): OwnExample => ({ inputs: {}, expected: {} })
export const newSlip = ({ outputs }: Pick<OwnDraft, 'outputs'>): OwnSlip => ({
  id: `slip-${crypto.randomUUID().slice(0, 8)}`,
  title: '',
  output: outputs.at(-1)?.name ?? '',
  expression: '',
  sentence: '',
  wayBack: '',
})

/** The system of the unit that something was written with; metric where there is none, or it is of both. */
export function systemOfText(output: OwnOutput, text: string): UnitSystem {
  const options = { system: 'metric', defaultUnit: fieldUnit(output, 'metric') } as const
  const read = parseQuantity(text, output.quantity, options)
  return read.ok && unitIn(read.unit, 'metric') !== read.unit ? 'imperial' : 'metric'
}

/** A calculator to begin with: one number in, one out, and two examples to work. */
export function newOwnDefinition(title: string): OwnCalculatorDefinition {
  const nothing: Named = { inputs: [], outputs: [] }
  const input = newInput(nothing) as OwnInput
  return {
    title,
    question: '',
    help: '',
    inputs: [input],
    outputs: [newOutput({ inputs: [input], outputs: [] })],
    cautions: [],
    sources: [{ title: '', kind: 'common practice, no source' }],
    examples: [newExample(), newExample()],
    slips: [],
  }
}
