import { z } from 'zod'
import { learnerOwnSnapshotSchema, ownSnapshotSchema } from './ownCalculators'
import { stableKeySchema } from './stableKey'
import { unitSystemSchema } from './unitSystem'

export { stableKeySchema }
export { unitSystemSchema, type UnitSystem } from './unitSystem'

/** What a person typed into a field, kept as typed: `2.4 m`, `7' 10-1/2"`, `300`. */
const typedValueSchema = z.string().trim().max(80)

/** How one input of a calculator is given to the learner. Numbers of a range are in the input's SI unit. */
export const exerciseInputSchema = z.discriminatedUnion('mode', [
  z.strictObject({ mode: z.literal('fixed'), value: typedValueSchema }),
  z.strictObject({
    mode: z.literal('ranged'),
    min: z.number(),
    max: z.number(),
    step: z.number().positive(),
  }),
  z.strictObject({ mode: z.literal('own'), value: typedValueSchema }),
])
export type ExerciseInput = z.infer<typeof exerciseInputSchema>

/** Absolute tolerances are in the asked output's SI unit, percentages in per cent of the right answer. */
export const toleranceSchema = z.strictObject({
  kind: z.enum(['absolute', 'percent']),
  value: z.number().min(0),
})
export type Tolerance = z.infer<typeof toleranceSchema>

export const calculatorDefinitionSchema = z.strictObject({
  /** Of a built-in one, or `own:` with the key of `own`. */
  calculator: z.string().min(1).max(40),
  /** The instructor's own calculator as it was when it was attached, so that every attempt keeps its version. */
  own: ownSnapshotSchema.optional(),
  inputs: z.record(z.string(), exerciseInputSchema),
  asked: z.string().min(1).max(40),
  tolerance: toleranceSchema,
  hints: z.array(z.string().trim().min(1).max(300)).max(5),
  /** Ids of the calculator's slips that this stop names. */
  slips: z.array(z.string()).max(20),
  /** The units an answer may be written in; none means any. A bare number is always taken in the field's own unit. */
  acceptedUnits: z.array(z.string().min(1).max(20)).max(12).optional(),
})
export type CalculatorDefinition = z.infer<typeof calculatorDefinitionSchema>

/** Drawings a choice may show; the names tell what is seen, not which is right. */
export const choiceDrawingSchema = z.enum([
  'furrow-falls-in',
  'furrow-rough-top',
  'furrow-closed-top',
  'furrow-water-shows',
])
export type ChoiceDrawing = z.infer<typeof choiceDrawingSchema>

const choiceSchema = z.strictObject({
  id: z.string().min(1).max(20),
  text: z.string().trim().min(1).max(300),
  right: z.boolean(),
  /** What this choice would do on site, shown once it was tried. */
  feedback: z.string().trim().max(400),
  drawing: choiceDrawingSchema.optional(),
})
const choiceQuestionSchema = z.strictObject({
  choices: z.array(choiceSchema).min(2).max(8),
  /** The choices stay in the order they are written, as where the video letters them; otherwise each learner gets an order of their own. */
  keepsOrder: z.boolean().optional(),
})
export const singleQuestionSchema = choiceQuestionSchema
export const severalQuestionSchema = choiceQuestionSchema
export const numberQuestionSchema = z.strictObject({
  /** The right value as the instructor typed it, with its unit. */
  answer: typedValueSchema.min(1),
  quantity: z.enum([
    'length',
    'area',
    'volume',
    'angle',
    'ratio',
    'mass',
    'count',
    'percent',
    'time',
  ]),
  tolerance: toleranceSchema,
  feedback: z.string().trim().max(400),
})
export const orderQuestionSchema = z.strictObject({
  /** In the right order; shown to the learner shuffled. */
  items: z
    .array(
      z.strictObject({
        id: z.string().min(1).max(20),
        text: z.string().trim().min(1).max(200),
        /** Why it stands where it does, shown when it was put elsewhere. */
        feedback: z.string().trim().max(300),
      }),
    )
    .min(2)
    .max(10),
})
export type SingleQuestion = z.infer<typeof singleQuestionSchema>
export type SeveralQuestion = z.infer<typeof severalQuestionSchema>
export type NumberQuestion = z.infer<typeof numberQuestionSchema>
export type OrderQuestion = z.infer<typeof orderQuestionSchema>

export const questionKindSchema = z.enum(['single', 'several', 'number', 'order'])
export type QuestionKind = z.infer<typeof questionKindSchema>

const questionBase = { key: stableKeySchema, prompt: z.string().trim().max(500) }
/** A question of a quiz as staff see it, with its right answers. */
export const quizQuestionSchema = z.discriminatedUnion('kind', [
  z.strictObject({ ...questionBase, kind: z.literal('single'), definition: singleQuestionSchema }),
  z.strictObject({
    ...questionBase,
    kind: z.literal('several'),
    definition: severalQuestionSchema,
  }),
  z.strictObject({ ...questionBase, kind: z.literal('number'), definition: numberQuestionSchema }),
  z.strictObject({ ...questionBase, kind: z.literal('order'), definition: orderQuestionSchema }),
])
export type QuizQuestion = z.infer<typeof quizQuestionSchema>

const exerciseBase = {
  prompt: z.string().trim().max(600),
  /** Tries before the answer may be shown; null means no limit. */
  tries: z.number().int().min(1).max(20).nullable(),
}
/** An exercise as staff write it. */
export const exerciseSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    ...exerciseBase,
    kind: z.literal('calculator'),
    definition: calculatorDefinitionSchema,
  }),
  z.strictObject({
    ...exerciseBase,
    kind: z.literal('quiz'),
    /** Per cent of the questions that must be right. */
    passMark: z.number().int().min(1).max(100),
    questions: z.array(quizQuestionSchema).max(20),
  }),
])
export type Exercise = z.infer<typeof exerciseSchema>

/** A question as a learner sees it before answering: nothing in it tells the answer. */
export const learnerQuestionSchema = z.object({
  key: stableKeySchema,
  kind: questionKindSchema,
  prompt: z.string(),
  choices: z
    .array(z.object({ id: z.string(), text: z.string(), drawing: choiceDrawingSchema.optional() }))
    .optional(),
  items: z.array(z.object({ id: z.string(), text: z.string() })).optional(),
  quantity: z.string().optional(),
  /** The unit a bare number takes, and which the field shows, in either system. */
  unit: z.object({ metric: z.string(), imperial: z.string() }).optional(),
})
export type LearnerQuestion = z.infer<typeof learnerQuestionSchema>

/** An exercise as a learner sees it: own numbers drawn from the stored seed, hints earned so far. */
export const learnerExerciseSchema = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('calculator'),
    prompt: z.string(),
    tries: z.number().nullable(),
    calculator: z.string(),
    /** What an own calculator is worked with here; it holds no examples and no slips. */
    own: learnerOwnSnapshotSchema.optional(),
    asked: z.string(),
    /** Each input's text; `own` inputs may be changed by the learner. */
    inputs: z.record(z.string(), z.object({ mode: z.enum(['given', 'own']), value: z.string() })),
    hints: z.array(z.string()),
  }),
  z.object({
    kind: z.literal('quiz'),
    prompt: z.string(),
    tries: z.number().nullable(),
    passMark: z.number(),
    questions: z.array(learnerQuestionSchema),
  }),
])
export type LearnerExercise = z.infer<typeof learnerExerciseSchema>

const calculatorAnswerSchema = z.strictObject({
  kind: z.literal('calculator'),
  /** The learner's own inputs as typed; given ones are ignored. */
  inputs: z.record(z.string().max(40), z.string().max(10_000)),
  answer: z.string().max(10_000),
  units: unitSystemSchema,
})
const questionAnswerSchema = z.union([
  z.strictObject({ choice: z.string().max(20) }),
  z.strictObject({ choices: z.array(z.string().max(20)).max(8) }),
  z.strictObject({ value: z.string().max(10_000), units: unitSystemSchema }),
  z.strictObject({ order: z.array(z.string().max(20)).max(10) }),
])
export type QuestionAnswer = z.infer<typeof questionAnswerSchema>
const quizAnswerSchema = z.strictObject({
  kind: z.literal('quiz'),
  answers: z.record(z.string().max(40), questionAnswerSchema),
})
/** What a learner hands in at a stop. */
export const answerSchema = z.discriminatedUnion('kind', [calculatorAnswerSchema, quizAnswerSchema])
export type Answer = z.infer<typeof answerSchema>

/** The verdict on one question of a quiz. */
export const questionVerdictSchema = z.object({
  right: z.boolean(),
  /** One bold sentence. */
  message: z.string(),
  /** Feedback per choice or item that was tried, never for the others. */
  feedback: z.record(z.string(), z.string()),
  /** Ids that were rightly chosen or stand in their place. */
  rightIds: z.array(z.string()),
})
export type QuestionVerdict = z.infer<typeof questionVerdictSchema>

/** The verdict on an answer; `answer` appears only when solved or when the tries are used. */
export const verdictSchema = z.object({
  right: z.boolean(),
  /** `unread`: the answer could not be read and costs no try. */
  outcome: z.enum(['right', 'slip', 'wrong', 'unread']),
  slip: z.object({ id: z.string(), title: z.string() }).nullable(),
  /** One bold sentence, then the way back in one plain sentence. */
  message: z.string(),
  wayBack: z.string(),
  /** Where an unread answer is wrong: the input's name, or `answer`. */
  field: z.string().nullable(),
  questions: z.record(z.string(), questionVerdictSchema),
})
export type Verdict = z.infer<typeof verdictSchema>

/** How one learner stands at one stop. */
export const stopStateSchema = z.object({
  stopKey: stableKeySchema,
  solved: z.boolean(),
  triesUsed: z.number(),
  exercise: learnerExerciseSchema,
  lastAnswer: answerSchema.nullable(),
  lastVerdict: verdictSchema.nullable(),
  /** The right answer as text in both systems, only once solved or out of tries. */
  shownAnswer: z.object({ metric: z.string(), imperial: z.string() }).nullable(),
})
export type StopState = z.infer<typeof stopStateSchema>

export const gradedAttemptSchema = z.object({ verdict: verdictSchema, state: stopStateSchema })
export type GradedAttempt = z.infer<typeof gradedAttemptSchema>
