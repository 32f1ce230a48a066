import type {
  CalculatorDefinition,
  ChoiceDrawing,
  Exercise,
  ExerciseInput,
  QuizQuestion,
} from '../../../shared/contracts/exercises'

export const fixed = (value: string): ExerciseInput => ({ mode: 'fixed', value })
export const own = (value: string): ExerciseInput => ({ mode: 'own', value })
/** In the input's SI unit. */
export const ranged = (min: number, max: number, step: number): ExerciseInput => ({
  mode: 'ranged',
  min,
  max,
  step,
})
/** In metres, square metres, cubic metres or radians. */
export const within = (value: number) => ({ kind: 'absolute', value }) as const
export const withinPercent = (value: number) => ({ kind: 'percent', value }) as const
export const exactly = within(0)
export const degree = Math.PI / 180

/** An exercise at a stop that a calculator draws, works and grades. */
export const worked = (
  prompt: string,
  tries: number | null,
  definition: CalculatorDefinition,
): Exercise => ({ kind: 'calculator', prompt, tries, definition })

/** An exercise at a stop made of questions. */
export const quiz = (
  prompt: string,
  passMark: number,
  tries: number | null,
  questions: QuizQuestion[],
): Exercise => ({ kind: 'quiz', prompt, passMark, tries, questions })

/** What it says, and what it would do on site. */
type ChoiceText = [text: string, feedback: string]

const ids = 'abcdefgh'
const choices = (texts: { text: ChoiceText; right: boolean }[]) =>
  texts.map(({ text: [text, feedback], right }, index) => ({
    id: ids.charAt(index),
    text,
    right,
    feedback,
  }))
const mark = (right: boolean) => (text: ChoiceText) => ({ text, right })

/** One right choice; `place` is where it stands among the wrong ones, counted from 0. */
export function single(
  key: string,
  prompt: string,
  right: ChoiceText,
  wrong: ChoiceText[],
  place: number,
): QuizQuestion {
  const all = wrong.map(mark(false))
  all.splice(place, 0, mark(true)(right))
  return { key, kind: 'single', prompt, definition: { choices: choices(all) } }
}

/** The same question with its choices drawn and lettered as the video shows them. */
export function drawn(question: QuizQuestion, drawings: ChoiceDrawing[]): QuizQuestion {
  if (question.kind !== 'single') throw new Error(`${question.key} has no single choice to draw`)
  const shown = question.definition.choices.map((choice, index) => {
    const drawing = drawings[index]
    return drawing ? { ...choice, drawing } : choice
  })
  return { ...question, definition: { choices: shown, keepsOrder: true } }
}

/** Several right choices, told apart by their first word: true or false. */
export const several = (
  key: string,
  prompt: string,
  texts: [right: boolean, text: string, feedback: string][],
): QuizQuestion => ({
  key,
  kind: 'several',
  prompt,
  definition: {
    choices: choices(texts.map(([right, text, feedback]) => ({ text: [text, feedback], right }))),
  },
})

/** A length with its unit; the tolerance in metres. */
export const length = (
  key: string,
  prompt: string,
  answer: string,
  toleranceMetres: number,
  feedback: string,
): QuizQuestion => ({
  key,
  kind: 'number',
  prompt,
  definition: { answer, quantity: 'length', tolerance: within(toleranceMetres), feedback },
})

/** A number of whole things. */
export const count = (
  key: string,
  prompt: string,
  answer: string,
  feedback: string,
): QuizQuestion => ({
  key,
  kind: 'number',
  prompt,
  definition: { answer, quantity: 'count', tolerance: exactly, feedback },
})

/** Items in their right order. */
export const inOrder = (key: string, prompt: string, items: ChoiceText[]): QuizQuestion => ({
  key,
  kind: 'order',
  prompt,
  definition: {
    items: items.map(([text, feedback], index) => ({ id: ids.charAt(index), text, feedback })),
  },
})

/** The tape across a corner, right within 2 mm. */
export const square345 = (inputs: CalculatorDefinition['inputs']): CalculatorDefinition => ({
  calculator: 'square',
  inputs,
  asked: 'diagonal',
  tolerance: within(0.002),
  hints: [
    'Square each leg first. Which two numbers do you add?',
    'The root key of your calculator turns the sum back into a length.',
  ],
  slips: ['round-the-corner', 'no-root', 'centimetres', 'feet-for-inches', 'outside-inside'],
})

/** What both diagonals of a rectangle must read, right within 3 mm. */
export const bothDiagonals = (inputs: CalculatorDefinition['inputs']): CalculatorDefinition => ({
  calculator: 'diagonals',
  inputs,
  asked: 'expected',
  tolerance: within(0.003),
  hints: [
    'Length and width are the two legs of a triangle; the diagonal is its long side.',
    'Square both, add, take the root.',
  ],
  slips: ['round-the-corner', 'no-root', 'mean-taken'],
})
