import type { CalculatorInput, CalculatorOutput } from '../../../shared/calculators/calculator'
import { calculators, findCalculator } from '../../../shared/calculators'
import type { QuestionKind, UnitSystem } from '../../../shared/contracts/exercises'
import type { OwnSnapshot } from '../../../shared/contracts/ownCalculators'
import { parseQuantity } from '../../../shared/units/parse'
import type {
  CalculatorDraft,
  DefinitionDraft,
  ExerciseDraft,
  InputDraft,
  QuestionDraft,
  RangeDraft,
  ToleranceDraft,
} from './exerciseDrafts'
import { inputField, withUnit } from './numberFields'
import { findBenchFace, ownId, type BenchFace } from './ownCalculatorChoice'

const millimetre = 0.001

/** How near an answer must come at first: to the millimetre, exactly for what is counted, else 1 %. */
export function newTolerance({ quantity }: CalculatorOutput): ToleranceDraft {
  if (quantity === 'count' || quantity === 'choice') return { kind: 'absolute', value: 0 }
  if (quantity === 'length') return { kind: 'absolute', value: millimetre }
  return { kind: 'percent', value: 1 }
}

export const slipsOf = (calculator: Pick<BenchFace, 'slips'>, asked: string): string[] =>
  calculator.slips.filter(({ output }) => output === asked).map(({ id }) => id)

export const fixedInput = (input: CalculatorInput, system: UnitSystem): InputDraft => ({
  mode: 'fixed',
  value: withUnit(input.initial[system], input, system),
})

const inch = 0.0254
/** Two figures in the unit of the tape measure that is used. */
function roundly(
  value: number,
  figures: number,
  input: CalculatorInput,
  system: UnitSystem,
): number {
  const unit = system === 'imperial' && input.quantity === 'length' ? inch : 1
  return Number((Number((value / unit).toPrecision(figures)) * unit).toPrecision(9))
}

/** A range about the value that stood there before. */
export function rangeAbout(input: CalculatorInput, text: string, system: UnitSystem): RangeDraft {
  const read =
    input.quantity === 'choice'
      ? null
      : parseQuantity(text, input.quantity, { system, defaultUnit: inputField(input, system).unit })
  if (!read?.ok) return { mode: 'ranged', min: '', max: '', step: '' }
  const { value } = read
  return {
    mode: 'ranged',
    min: roundly(value * 0.8, 2, input, system),
    max: roundly(value * 1.2, 2, input, system),
    step: roundly(value * 0.05, 1, input, system),
  }
}

/** A calculator's exercise to begin with: the numbers it starts with itself, its first answer asked for. */
export function newDefinitionOf(
  calculator: BenchFace | undefined,
  system: UnitSystem,
  own?: OwnSnapshot,
): DefinitionDraft {
  const output = calculator?.outputs.find(({ isList }) => !isList)
  return {
    calculator: calculator?.id ?? '',
    ...(own ? { own } : {}),
    inputs: Object.fromEntries(
      (calculator?.inputs ?? []).map((input) => [input.name, fixedInput(input, system)]),
    ),
    asked: output?.name ?? '',
    tolerance: output ? newTolerance(output) : { kind: 'percent', value: 1 },
    hints: [],
    slips: calculator && output ? slipsOf(calculator, output.name) : [],
  }
}
export const newDefinition = (id: string, system: UnitSystem): DefinitionDraft =>
  newDefinitionOf(findCalculator(id), system)

/** The same for a version of an own calculator. */
export const newOwnExercise = (own: OwnSnapshot, system: UnitSystem): DefinitionDraft =>
  newDefinitionOf(findBenchFace({ calculator: ownId(own.key), own }), system, own)

/** An exercise made of another version of its own calculator; what the new one still has stays as it was written. */
export function takeVersion(
  draft: DefinitionDraft,
  own: OwnSnapshot,
  system: UnitSystem,
): DefinitionDraft {
  const fresh = newOwnExercise(own, system)
  const before = draft.own?.definition
  /** What a name stands for, so that nothing is kept for a thing that only has its name. */
  const isSame = (name: string, list: 'inputs' | 'outputs') => {
    const find = (from: OwnSnapshot['definition'] | undefined) =>
      from?.[list].find((one) => one.name === name)?.quantity
    const quantity = find(own.definition)
    return quantity !== undefined && quantity === find(before)
  }
  const inputs = Object.fromEntries(
    Object.entries(fresh.inputs).map(([name, given]) => {
      const written = draft.inputs[name]
      return [name, written && isSame(name, 'inputs') ? written : given]
    }),
  )
  if (!isSame(draft.asked, 'outputs')) return { ...fresh, inputs, hints: draft.hints }
  const known = new Set(own.definition.slips.map(({ id }) => id))
  const added = own.definition.slips.filter(
    ({ id, output }) => output === draft.asked && !before?.slips.some((slip) => slip.id === id),
  )
  const slips = [...draft.slips.filter((id) => known.has(id)), ...added.map(({ id }) => id)]
  return { ...draft, own, inputs, slips }
}

const triesAtFirst = 3
export const newCalculatorExercise = (system: UnitSystem): CalculatorDraft => ({
  kind: 'calculator',
  prompt: '',
  tries: triesAtFirst,
  definition: newDefinition(calculators[0]?.id ?? '', system),
})

const twoChoices = () => [
  { id: 'a', text: '', right: false, feedback: '' },
  { id: 'b', text: '', right: false, feedback: '' },
]

/** An empty question of a kind, with a key of its own that lives on from revision to revision. */
export function newQuestion(kind: QuestionKind): QuestionDraft {
  const base = { key: `q-${crypto.randomUUID().slice(0, 8)}`, prompt: '' }
  if (kind === 'number') {
    const tolerance = { kind: 'absolute' as const, value: millimetre }
    const definition = { answer: '', quantity: 'length' as const, tolerance, feedback: '' }
    return { ...base, kind, definition }
  }
  if (kind === 'order') {
    const items = ['a', 'b', 'c'].map((id) => ({ id, text: '', feedback: '' }))
    return { ...base, kind, definition: { items } }
  }
  return { ...base, kind, definition: { choices: twoChoices() } }
}

export const newQuizExercise = (): ExerciseDraft => ({
  kind: 'quiz',
  prompt: '',
  tries: triesAtFirst,
  passMark: 100,
  questions: [newQuestion('single')],
})
