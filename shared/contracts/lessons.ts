import { z } from 'zod'
import { coverDrawingSchema, hazardSchema, sheetStageSchema, stageKindSchema } from './courses'
import { stableKeySchema } from './stableKey'
import { videoSchema } from './media'
import { kitStateSchema, lessonProgressSchema } from './progress'

export const kitItemSchema = z.object({
  key: stableKeySchema,
  kind: z.enum(['on-you', 'to-hand', 'caution']),
  icon: z.string().max(30),
  title: z.string().trim().min(1, 'Name it.').max(90, 'At most 90 characters.'),
  detail: z.string().trim().max(300, 'At most 300 characters.'),
})
export type KitItem = z.infer<typeof kitItemSchema>

export const tapeStopSchema = z.object({
  key: stableKeySchema,
  name: z.string(),
  atMs: z.number(),
  isRequired: z.boolean(),
  isSolved: z.boolean(),
  exerciseKind: z.enum(['calculator', 'quiz']),
})
export type TapeStop = z.infer<typeof tapeStopSchema>

export const hindsightSchema = z.object({
  id: z.number(),
  atMs: z.number(),
  text: z.string(),
  by: z.string(),
  createdAt: z.iso.datetime(),
})
export type Hindsight = z.infer<typeof hindsightSchema>

export const watchedLessonSchema = z.object({
  course: z.object({
    id: z.number(),
    slug: z.string(),
    title: z.string(),
    sheetNumber: z.number(),
    coverDrawing: coverDrawingSchema,
    drawnBy: z.string(),
    revision: z.string(),
    issuedAt: z.iso.datetime().nullable(),
  }),
  stages: z.array(sheetStageSchema),
  key: stableKeySchema,
  number: z.number(),
  stageKind: stageKindSchema,
  stageTitle: z.string(),
  title: z.string(),
  summary: z.string(),
  youWillWant: z.string(),
  hazards: z.array(hazardSchema),
  isSample: z.boolean(),
  kit: z.array(kitItemSchema),
  kitState: kitStateSchema,
  /** Null while the kit check is open or no video is in; `durationMs` is there all the same. */
  video: videoSchema.nullable(),
  durationMs: z.number(),
  posterUrl: z.string().nullable(),
  stops: z.array(tapeStopSchema),
  hindsight: z.array(hindsightSchema),
  progress: lessonProgressSchema,
  /** A draft shown to staff as a learner would see it; nothing of it is kept. */
  isPreview: z.boolean(),
  can: z.object({ keepProgress: z.boolean(), writeFence: z.boolean(), enrol: z.boolean() }),
})
export type WatchedLesson = z.infer<typeof watchedLessonSchema>
