import type { FieldError } from '../../../shared/contracts/errors'
import type {
  CalculatorDefinition,
  Exercise,
  ExerciseInput,
  NumberQuestion,
  QuizQuestion,
} from '../../../shared/contracts/exercises'

/** A number once it could be read, else what was typed. */
export type Typed = number | string

export interface ToleranceDraft {
  kind: 'absolute' | 'percent'
  value: Typed
}
export type RangeDraft = { mode: 'ranged'; min: Typed; max: Typed; step: Typed }
export type InputDraft = Exclude<ExerciseInput, { mode: 'ranged' }> | RangeDraft

export interface DefinitionDraft extends Omit<CalculatorDefinition, 'inputs' | 'tolerance'> {
  inputs: Record<string, InputDraft>
  tolerance: ToleranceDraft
}
export interface NumberDraft extends Omit<NumberQuestion, 'tolerance'> {
  tolerance: ToleranceDraft
}
type NumberQuestionDraft = Omit<Extract<QuizQuestion, { kind: 'number' }>, 'definition'> & {
  definition: NumberDraft
}
export type QuestionDraft = Exclude<QuizQuestion, { kind: 'number' }> | NumberQuestionDraft

interface Base {
  prompt: string
  tries: Typed | null
}
export interface CalculatorDraft extends Base {
  kind: 'calculator'
  definition: DefinitionDraft
}
export interface QuizDraft extends Base {
  kind: 'quiz'
  passMark: Typed
  questions: QuestionDraft[]
}
/** An exercise while it is written: numbers that cannot be read yet stand in it as they were typed. */
export type ExerciseDraft = CalculatorDraft | QuizDraft

type Place = [path: string, value: Typed | null]

function numbersOf(draft: ExerciseDraft): Place[] {
  const tries: Place = ['tries', draft.tries]
  if (draft.kind === 'quiz') {
    const tolerances = draft.questions.flatMap((question, index): Place[] =>
      question.kind === 'number'
        ? [[`questions.${index}.definition.tolerance.value`, question.definition.tolerance.value]]
        : [],
    )
    return [tries, ['passMark', draft.passMark], ...tolerances]
  }
  const ranges = Object.entries(draft.definition.inputs).flatMap(([name, given]): Place[] =>
    given.mode === 'ranged'
      ? (['min', 'max', 'step'] as const).map((end) => [
          `definition.inputs.${name}.${end}`,
          given[end],
        ])
      : [],
  )
  return [tries, ['definition.tolerance.value', draft.definition.tolerance.value], ...ranges]
}

const findUnread = (draft: ExerciseDraft): FieldError[] =>
  numbersOf(draft)
    .filter(([, value]) => typeof value === 'string')
    .map(([field, value]) => ({
      field,
      message:
        value === '' ? 'Write a number here.' : `“${value ?? ''}” cannot be read as a number here.`,
    }))

function textsOf(question: QuestionDraft): { name: string; texts: string[]; what: string } {
  if (question.kind === 'number') {
    return { name: 'answer', texts: [question.definition.answer], what: 'Write the right value' }
  }
  if (question.kind === 'order') {
    const texts = question.definition.items.map(({ text }) => text)
    return { name: 'items', texts, what: 'Write this line, or take it out' }
  }
  const texts = question.definition.choices.map(({ text }) => text)
  return { name: 'choices', texts, what: 'Write this choice, or take it out' }
}

function findEmpty(draft: ExerciseDraft): FieldError[] {
  if (draft.kind === 'calculator') return []
  return draft.questions.flatMap((question, index) => {
    const { name, texts, what } = textsOf(question)
    const path = `questions.${index}.definition.${name}`
    return texts.flatMap((text, at) => {
      const field = question.kind === 'number' ? path : `${path}.${at}.text`
      return text.trim() === '' ? [{ field, message: `${what}.` }] : []
    })
  })
}

/** What keeps a draft from being sent: numbers that cannot be read and lines that are still empty, each by its path. */
export const findUnfinished = (draft: ExerciseDraft): FieldError[] => [
  ...findUnread(draft),
  ...findEmpty(draft),
]

/** The draft as an exercise once all its numbers can be read; hints that are still empty are left out. */
export function readDraft(draft: ExerciseDraft): Exercise | null {
  if (findUnread(draft).length > 0) return null
  if (draft.kind === 'quiz') return draft as Exercise
  const hints = draft.definition.hints.filter((hint) => hint.trim() !== '')
  return { ...draft, definition: { ...draft.definition, hints } } as Exercise
}
