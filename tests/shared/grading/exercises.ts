import type {
  CalculatorDefinition,
  Exercise,
  QuizQuestion,
  UnitSystem,
  Verdict,
} from '../../../shared/contracts/exercises'
import { gradeExercise } from '../../../shared/grading/index'

type CalculatorExercise = Extract<Exercise, { kind: 'calculator' }>
type QuizExercise = Extract<Exercise, { kind: 'quiz' }>

/** A stop that asks for the diagonal of a 3-4-5 triangle with units of 300 mm: 1500 mm. */
export const buildCalculatorExercise = (
  changes: Partial<CalculatorDefinition> = {},
): CalculatorExercise => ({
  kind: 'calculator',
  prompt: 'What must the tape read between the two marks?',
  tries: 3,
  definition: {
    calculator: 'square',
    asked: 'diagonal',
    inputs: {
      sideA: { mode: 'fixed', value: '2600 mm' },
      sideB: { mode: 'fixed', value: '1100 mm' },
      unit: { mode: 'fixed', value: '300 mm' },
    },
    tolerance: { kind: 'absolute', value: 0.001 },
    hints: ['Square each leg first.', 'Then take the root.'],
    slips: ['round-the-corner', 'no-root', 'centimetres'],
    ...changes,
  },
})

/** A quiz of these questions. */
export const buildQuiz = (questions: QuizQuestion[], passMark = 100): QuizExercise => ({
  kind: 'quiz',
  prompt: 'Before you pour',
  tries: null,
  passMark,
  questions,
})

/** Grades a typed answer with seed 1. */
export const gradeTyped = (
  exercise: Exercise,
  answer: string,
  units: UnitSystem = 'metric',
  inputs: Record<string, string> = {},
): Verdict => gradeExercise(exercise, { kind: 'calculator', inputs, answer, units }, 1)

/** One question of every kind, the first choice or item being right. */
export const questions = {
  single: {
    kind: 'single',
    key: 'which-mix',
    prompt: 'Which of these goes into the form?',
    definition: {
      choices: [
        { id: 'a', text: 'Stands, top closes', right: true, feedback: 'The float can finish it.' },
        {
          id: 'b',
          text: 'Furrow falls in',
          right: false,
          feedback: 'It leaves hollows along the form.',
        },
        {
          id: 'c',
          text: 'Closes, water shows',
          right: false,
          feedback: 'It runs to the low side.',
        },
      ],
    },
  },
  several: {
    kind: 'several',
    key: 'what-to-wear',
    prompt: 'What do you wear?',
    definition: {
      choices: [
        { id: 'a', text: 'Waterproof gloves', right: true, feedback: 'Wet cement burns.' },
        { id: 'b', text: 'Eye protection', right: true, feedback: '' },
        { id: 'c', text: 'Sandals', right: false, feedback: 'Cement in a shoe burns unseen.' },
      ],
    },
  },
  number: {
    kind: 'number',
    key: 'how-much-water',
    prompt: 'How much water goes into the first bag?',
    definition: {
      answer: '2.5 L',
      quantity: 'volume',
      tolerance: { kind: 'percent', value: 2 },
      feedback: 'Begin with the least the bag says.',
    },
  },
  order: {
    kind: 'order',
    key: 'the-pour',
    prompt: 'Put the pour in order.',
    definition: {
      items: [
        { id: 'wet', text: 'Wet the stone', feedback: 'Dry stone drinks from the mix.' },
        { id: 'tip', text: 'Tip from the far corner', feedback: '' },
        { id: 'strike', text: 'Strike off', feedback: 'It comes before the float.' },
        { id: 'float', text: 'Float', feedback: 'The board would open the surface again.' },
      ],
    },
  },
} satisfies Record<string, QuizQuestion>
