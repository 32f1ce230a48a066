import { z } from 'zod'
import { coverDrawingSchema, hazardSchema, stageKindSchema } from './courses'
import { exerciseSchema, stableKeySchema } from './exercises'
import { captionTrackSchema } from './media'
import { kitItemSchema } from './lessons'

const titleSchema = z.string().trim().min(1, 'Give it a name.').max(90, 'At most 90 characters.')
const versionSchema = z.number().int().min(1)

export const snagSchema = z.object({
  /** `must` keeps the revision from being issued. */
  weight: z.enum(['must', 'worth-mending']),
  code: z.string(),
  message: z.string(),
  /** Where to mend it. */
  place: z.object({
    kind: z.enum(['course', 'lesson', 'stop']),
    lessonId: z.number().nullable(),
    stopId: z.number().nullable(),
  }),
})
export type Snag = z.infer<typeof snagSchema>

export const benchLessonRowSchema = z.object({
  id: z.number(),
  key: stableKeySchema,
  title: z.string(),
  video: z.object({
    state: z.enum(['none', 'checking', 'ready', 'refused']),
    durationMs: z.number().nullable(),
    refusal: z.string().nullable(),
  }),
  captions: z.number(),
  stops: z.number(),
  musts: z.number(),
  isSample: z.boolean(),
})
export type BenchLessonRow = z.infer<typeof benchLessonRowSchema>
export const benchStageSchema = z.object({
  id: z.number(),
  key: stableKeySchema,
  kind: stageKindSchema,
  title: z.string(),
  lessons: z.array(benchLessonRowSchema),
})
export type BenchStage = z.infer<typeof benchStageSchema>

export const benchCourseSchema = z.object({
  id: z.number(),
  slug: z.string(),
  sheetNumber: z.number(),
  state: z.enum(['draft', 'issued', 'closed']),
  revision: z.string(),
  isIssued: z.boolean(),
  issuedAt: z.iso.datetime().nullable(),
  title: z.string(),
  outcome: z.string(),
  weekends: z.number(),
  tools: z.array(z.string()),
  hazards: z.array(hazardSchema),
  coverDrawing: coverDrawingSchema,
  facts: z.array(z.object({ label: z.string(), value: z.string() })),
  notCovered: z.string(),
  changeNote: z.string(),
  version: versionSchema,
  savedAt: z.iso.datetime(),
  stages: z.array(benchStageSchema),
  snags: z.array(snagSchema),
  staff: z.array(z.object({ name: z.string(), role: z.enum(['owner', 'helper']) })),
  /** Own calculators are written for the next revision too, while nothing else of an issued one is. */
  can: z.object({ edit: z.boolean(), issue: z.boolean(), writeCalculators: z.boolean() }),
})
export type BenchCourse = z.infer<typeof benchCourseSchema>
/** The outline after a stage or lesson was added to it, with the new row's id. */
export const extendedBenchCourseSchema = benchCourseSchema.extend({ createdId: z.number() })
export type ExtendedBenchCourse = z.infer<typeof extendedBenchCourseSchema>

export const benchCourseRowSchema = z.object({
  id: z.number(),
  slug: z.string(),
  sheetNumber: z.number(),
  title: z.string(),
  revision: z.string(),
  state: z.enum(['draft', 'issued', 'closed']),
  coverDrawing: coverDrawingSchema,
  lessons: z.number(),
  learners: z.number(),
  openQuestions: z.number(),
  savedAt: z.iso.datetime(),
  role: z.enum(['owner', 'helper']),
})
export type BenchCourseRow = z.infer<typeof benchCourseRowSchema>

export const createCourseSchema = z.strictObject({
  title: titleSchema,
  outcome: z.string().trim().max(600, 'At most 600 characters.'),
  coverDrawing: coverDrawingSchema,
  weekends: z.number().int().min(1, 'At least one weekend.').max(52, 'At most 52 weekends.'),
  /** Stages to begin with, in order. */
  stages: z.array(stageKindSchema).min(1, 'Choose at least one stage.').max(6),
})
export type CreateCourse = z.infer<typeof createCourseSchema>

export const changeCourseSchema = z.strictObject({
  version: versionSchema,
  title: titleSchema.optional(),
  outcome: z.string().trim().max(600, 'At most 600 characters.').optional(),
  weekends: z.number().int().min(1, 'At least one weekend.').max(52, 'At most 52.').optional(),
  tools: z.array(z.string().trim().min(1).max(60, 'At most 60 characters.')).max(40).optional(),
  hazards: z.array(hazardSchema).max(20).optional(),
  coverDrawing: coverDrawingSchema.optional(),
  facts: z
    .array(
      z.strictObject({
        label: z.string().trim().min(1).max(40),
        value: z.string().trim().min(1).max(60),
      }),
    )
    .max(12)
    .optional(),
  notCovered: z.string().trim().max(1000, 'At most 1000 characters.').optional(),
  changeNote: z.string().trim().max(300, 'At most 300 characters.').optional(),
})
export type ChangeCourse = z.infer<typeof changeCourseSchema>
/** What a save answers: the version to send with the next one. */
export const savedSchema = z.object({ version: versionSchema, savedAt: z.iso.datetime() })
export type Saved = z.infer<typeof savedSchema>

export const createStageSchema = z.strictObject({
  kind: stageKindSchema,
  title: titleSchema.max(60, 'At most 60 characters.'),
})
export type CreateStage = z.infer<typeof createStageSchema>
export const changeStageSchema = createStageSchema.partial()
export type ChangeStage = z.infer<typeof changeStageSchema>

export const createLessonSchema = z.strictObject({ title: titleSchema })
export type CreateLesson = z.infer<typeof createLessonSchema>

/** The whole order at once: every stage and every lesson of the draft, each once. */
export const orderCourseSchema = z.strictObject({
  stages: z
    .array(z.strictObject({ id: z.number().int(), lessonIds: z.array(z.number().int()).max(200) }))
    .max(30),
})
export type OrderCourse = z.infer<typeof orderCourseSchema>

export const changeLessonSchema = z.strictObject({
  version: versionSchema,
  title: titleSchema.optional(),
  summary: z.string().trim().max(600, 'At most 600 characters.').optional(),
  youWillWant: z.string().trim().max(300, 'At most 300 characters.').optional(),
  hazards: z.array(hazardSchema).max(12).optional(),
  isSample: z.boolean().optional(),
  /** The whole kit check, in order. */
  kit: z.array(kitItemSchema.strict()).max(40).optional(),
})
export type ChangeLesson = z.infer<typeof changeLessonSchema>

export const benchStopSchema = z.object({
  id: z.number(),
  key: stableKeySchema,
  name: z.string(),
  atMs: z.number(),
  isRequired: z.boolean(),
  version: versionSchema,
  exercise: exerciseSchema.nullable(),
})
export type BenchStop = z.infer<typeof benchStopSchema>

export const benchLessonSchema = z.object({
  id: z.number(),
  courseId: z.number(),
  courseSlug: z.string(),
  courseTitle: z.string(),
  revision: z.string(),
  isIssued: z.boolean(),
  key: stableKeySchema,
  number: z.number(),
  lessonsInCourse: z.number(),
  stageTitle: z.string(),
  title: z.string(),
  summary: z.string(),
  youWillWant: z.string(),
  hazards: z.array(hazardSchema),
  isSample: z.boolean(),
  kit: z.array(kitItemSchema),
  version: versionSchema,
  savedAt: z.iso.datetime(),
  /** The one that is shown, or the newest while none is shown or one is being checked. */
  video: z
    .object({
      id: z.number(),
      state: z.enum(['checking', 'ready', 'refused']),
      refusal: z.string().nullable(),
      originalName: z.string(),
      bytes: z.number(),
      durationMs: z.number().nullable(),
      src: z.string().nullable(),
      contentType: z.string(),
      posterUrl: z.string().nullable(),
    })
    .nullable(),
  /** The newest, when it was refused and another is still shown. */
  refusedVideo: z.object({ originalName: z.string(), refusal: z.string() }).nullable(),
  captions: z.array(captionTrackSchema),
  stops: z.array(benchStopSchema),
  snags: z.array(snagSchema),
  can: z.object({ edit: z.boolean() }),
})
export type BenchLesson = z.infer<typeof benchLessonSchema>

const stopNameSchema = z.string().trim().min(1, 'Name the stop.').max(40, 'At most 40 characters.')
const atMsSchema = z.number().int().min(0).max(86_400_000)
export const createStopSchema = z.strictObject({
  name: stopNameSchema,
  atMs: atMsSchema,
  isRequired: z.boolean(),
})
export type CreateStop = z.infer<typeof createStopSchema>
export const changeStopSchema = z.strictObject({
  version: versionSchema,
  name: stopNameSchema.optional(),
  atMs: atMsSchema.optional(),
  isRequired: z.boolean().optional(),
  /** Null takes the exercise off. */
  exercise: exerciseSchema.nullable().optional(),
})
export type ChangeStop = z.infer<typeof changeStopSchema>

export const issueCourseSchema = z.strictObject({
  changeNote: z.string().trim().max(300, 'At most 300 characters.'),
})
export type IssueCourse = z.infer<typeof issueCourseSchema>
