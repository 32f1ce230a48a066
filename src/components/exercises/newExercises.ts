import type {
  Calculator,
  CalculatorInput,
  CalculatorOutput,
} from '../../../shared/calculators/calculator'
import { calculators, findCalculator } from '../../../shared/calculators'
import type { QuestionKind, UnitSystem } from '../../../shared/contracts/exercises'
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

const millimetre = 0.001

/** How near an answer must come at first: to the millimetre, exactly for what is counted, else 1 %. */
export function newTolerance({ quantity }: CalculatorOutput): ToleranceDraft {
  if (quantity === 'count' || quantity === 'choice') return { kind: 'absolute', value: 0 }
  if (quantity === 'length') return { kind: 'absolute', value: millimetre }
  return { kind: 'percent', value: 1 }
}

export const slipsOf = (calculator: Calculator, asked: string): string[] =>
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
export function newDefinition(id: string, system: UnitSystem): DefinitionDraft {
  const calculator = findCalculator(id)
  const output = calculator?.outputs.find(({ isList }) => !isList)
  return {
    calculator: id,
    inputs: Object.fromEntries(
      (calculator?.inputs ?? []).map((input) => [input.name, fixedInput(input, system)]),
    ),
    asked: output?.name ?? '',
    tolerance: output ? newTolerance(output) : { kind: 'percent', value: 1 },
    hints: [],
    slips: calculator && output ? slipsOf(calculator, output.name) : [],
  }
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
