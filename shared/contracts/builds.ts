import { z } from 'zod'
import { coverDrawingSchema, sheetStageSchema } from './courses'
import { stableKeySchema } from './stableKey'

export const stageStateSchema = z.enum(['pencil', 'ink', 'signed'])
export type StageState = z.infer<typeof stageStateSchema>

/** One learner's build: the drawing that fills in, and the next thing to do. */
export const buildSchema = z.object({
  id: z.number(),
  name: z.string(),
  startedAt: z.iso.datetime(),
  course: z.object({
    slug: z.string(),
    title: z.string(),
    sheetNumber: z.number(),
    revision: z.string(),
    drawnBy: z.string(),
    coverDrawing: coverDrawingSchema,
  }),
  stages: z.array(sheetStageSchema.extend({ state: stageStateSchema })),
  lessonsDone: z.number(),
  lessonsInAll: z.number(),
  next: z
    .object({ lessonKey: stableKeySchema, lessonTitle: z.string(), positionMs: z.number() })
    .nullable(),
  lately: z.array(
    z.object({ at: z.iso.datetime(), text: z.string(), lessonKey: z.string().nullable() }),
  ),
})
export type Build = z.infer<typeof buildSchema>

export const buildRowSchema = z.object({
  id: z.number(),
  name: z.string(),
  courseSlug: z.string(),
  courseTitle: z.string(),
  coverDrawing: coverDrawingSchema,
  lessonsDone: z.number(),
  lessonsInAll: z.number(),
})
export type BuildRow = z.infer<typeof buildRowSchema>

export const putInFieldBookSchema = z.strictObject({
  lessonKey: stableKeySchema.nullable(),
  stopKey: stableKeySchema.nullable(),
  atMs: z.number().int().min(0).nullable(),
  calculator: z.string().max(40),
  /** As typed. */
  inputs: z.record(z.string().max(40), z.string().max(80)),
  units: z.enum(['metric', 'imperial']),
})
export type PutInFieldBook = z.infer<typeof putInFieldBookSchema>

export const fieldBookEntrySchema = z.object({
  id: z.number(),
  lessonKey: stableKeySchema.nullable(),
  stopKey: stableKeySchema.nullable(),
  atMs: z.number().nullable(),
  calculator: z.string(),
  calculatorVersion: z.number(),
  inputs: z.record(z.string(), z.string()),
  outputs: z.record(
    z.string(),
    z.union([z.number(), z.string(), z.boolean(), z.array(z.number()).readonly()]),
  ),
  createdAt: z.iso.datetime(),
})
export type FieldBookEntry = z.infer<typeof fieldBookEntrySchema>
