import type {
  LearnerQuestion,
  QuestionAnswer,
  QuestionKind,
  QuestionVerdict,
  UnitSystem,
} from '../contracts/exercises'

/** Something that keeps an exercise from being used, or that is worth mending; `path` says where it stands. */
export interface ExerciseProblem {
  path: string
  message: string
  blocking: boolean
}

/** What a learner needs to see of a question; nothing in it tells the answer. */
export type LearnerParts = Pick<LearnerQuestion, 'choices' | 'items' | 'quantity' | 'unit'>

/** One kind of question: grades it, hides its answer, shows it at last, and finds what is wrong with it. */
export interface QuestionGrader<Definition> {
  kind: QuestionKind
  /** `unread` where the answer is of another kind or cannot be read: it costs no try. */
  gradeAnswer: (
    definition: Definition,
    answer: QuestionAnswer,
  ) => QuestionVerdict & { unread?: true }
  /** Parts for the learner; the order comes from the seed and is never the right one. */
  toLearner: (definition: Definition, seed: number) => LearnerParts
  /** The right answer as text in a person's system. */
  showAnswer: (definition: Definition, system: UnitSystem) => string
  findProblems: (definition: Definition) => ExerciseProblem[]
}

/** A verdict that nothing holds yet, with one sentence. */
export const notRight = (message: string): QuestionVerdict => ({
  right: false,
  message,
  feedback: {},
  rightIds: [],
})

/** The verdict on an answer that could not be read. */
export const unread = (message: string): QuestionVerdict & { unread: true } => ({
  ...notRight(message),
  unread: true,
})
