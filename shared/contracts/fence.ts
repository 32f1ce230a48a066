import { z } from 'zod'
import { stableKeySchema } from './stableKey'

const markdownSchema = z
  .string()
  .trim()
  .min(1, 'Write something first.')
  .max(10_000, 'At most 10 000 characters.')
const questionTitleSchema = z
  .string()
  .trim()
  .min(1, 'Ask it in one sentence.')
  .max(160, 'At most 160 characters.')

/** Who wrote a post; `name` is "a former member" once the account is gone. */
export const writerSchema = z.object({
  id: z.number().nullable(),
  name: z.string(),
  place: z.enum(['owner', 'helper', 'learner']),
})
export type Writer = z.infer<typeof writerSchema>

export const fenceAnswerSchema = z.object({
  id: z.number(),
  questionId: z.number(),
  writer: writerSchema,
  /** As written, for its writer to edit. */
  markdown: z.string(),
  /** Rendered and sanitised on the server. */
  html: z.string(),
  createdAt: z.iso.datetime(),
  editedAt: z.iso.datetime().nullable(),
  version: z.number(),
})
export type FenceAnswer = z.infer<typeof fenceAnswerSchema>

export const questionSchema = z.object({
  id: z.number(),
  courseSlug: z.string(),
  lessonKey: stableKeySchema,
  atMs: z.number().nullable(),
  title: z.string(),
  writer: writerSchema,
  markdown: z.string(),
  html: z.string(),
  state: z.enum(['open', 'settled', 'hidden']),
  settledAnswerId: z.number().nullable(),
  settledBy: z.string().nullable(),
  answerCount: z.number(),
  createdAt: z.iso.datetime(),
  editedAt: z.iso.datetime().nullable(),
  /** Deleted posts are sent once, so that readers take them away. */
  isDeleted: z.boolean(),
  version: z.number(),
})
export type Question = z.infer<typeof questionSchema>

/** As many answers as one question takes. */
export const answersLimit = 500

/** A question with its answers, the settled one first, then oldest first. */
export const threadSchema = questionSchema.extend({
  answers: z.array(fenceAnswerSchema).max(answersLimit),
  /** The room's number when the thread was read: of two states the one with the higher number is newer. */
  asOf: z.number(),
})
export type Thread = z.infer<typeof threadSchema>

/** A row of the page over all lessons of a course. */
export const questionRowSchema = questionSchema.extend({
  lessonTitle: z.string(),
  lessonNumber: z.number(),
})
export type QuestionRow = z.infer<typeof questionRowSchema>

export const createQuestionSchema = z.strictObject({
  title: questionTitleSchema,
  markdown: z.string().trim().max(10_000, 'At most 10 000 characters.'),
  atMs: z.number().int().min(0).max(86_400_000).nullable(),
})
export type CreateQuestion = z.infer<typeof createQuestionSchema>
export const changeQuestionSchema = z.strictObject({
  version: z.number().int().min(1),
  title: questionTitleSchema,
  markdown: z.string().trim().max(10_000, 'At most 10 000 characters.'),
})
export type ChangeQuestion = z.infer<typeof changeQuestionSchema>
export const createAnswerSchema = z.strictObject({ markdown: markdownSchema })
export type CreateAnswer = z.infer<typeof createAnswerSchema>
export const changeAnswerSchema = z.strictObject({
  version: z.number().int().min(1),
  markdown: markdownSchema,
})
export type ChangeAnswer = z.infer<typeof changeAnswerSchema>
export const settleQuestionSchema = z.strictObject({ answerId: z.number().int() })
export type SettleQuestion = z.infer<typeof settleQuestionSchema>

export const questionsQuerySchema = z.object({
  cursor: z.string().max(120).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(20),
  state: z.enum(['all', 'open', 'unanswered', 'settled', 'mine']).default('all'),
  order: z.enum(['newest', 'moment']).default('newest'),
  stage: stableKeySchema.optional(),
  /** Stands in the title or the text. */
  words: z.string().trim().max(80, 'At most 80 characters.').optional(),
})
export type QuestionsQuery = z.infer<typeof questionsQuerySchema>

/** The last number a reader saw of a room. */
export const eventsQuerySchema = z.object({
  after: z.coerce.number().int().min(0).max(4_294_967_295),
})
export type EventsQuery = z.infer<typeof eventsQuerySchema>

export const fenceEventKindSchema = z.enum([
  'asked',
  'answered',
  'edited',
  'deleted',
  'settled',
  'unsettled',
])
export type FenceEventKind = z.infer<typeof fenceEventKindSchema>

/** One change in a room, with the whole thread as it stands now; numbers rise by one. */
export const fenceEventSchema = z.object({
  number: z.number(),
  kind: fenceEventKindSchema,
  thread: threadSchema,
})
export type FenceEvent = z.infer<typeof fenceEventSchema>

/** What followed the number a reader saw last. `isComplete` false: fetch the threads anew, too much was missed. */
export const catchUpSchema = z.object({
  lastNumber: z.number(),
  isComplete: z.boolean(),
  events: z.array(fenceEventSchema),
})
export type CatchUp = z.infer<typeof catchUpSchema>

/** The threads of one lesson in the order of their moments, with the room's running number. */
export const lessonThreadsSchema = z.object({
  items: z.array(threadSchema),
  nextCursor: z.string().nullable(),
  lastNumber: z.number(),
  can: z.object({ write: z.boolean(), settleAny: z.boolean() }),
})
export type LessonThreads = z.infer<typeof lessonThreadsSchema>
