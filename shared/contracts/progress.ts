import { z } from 'zod'

/** A watched stretch of a video, `[startMs, endMs)`. */
export const intervalSchema = z.tuple([z.number().int().min(0), z.number().int().min(0)])
export type Interval = z.infer<typeof intervalSchema>

export const lessonStateSchema = z.enum(['not-started', 'under-way', 'done'])
export type LessonState = z.infer<typeof lessonStateSchema>

export const reportProgressSchema = z.strictObject({
  intervals: z.array(intervalSchema).max(500),
  positionMs: z.number().int().min(0).max(86_400_000),
})
export type ReportProgress = z.infer<typeof reportProgressSchema>

export const lessonProgressSchema = z.object({
  intervals: z.array(intervalSchema),
  watchedMs: z.number(),
  positionMs: z.number(),
  state: lessonStateSchema,
})
export type LessonProgress = z.infer<typeof lessonProgressSchema>

export const tickKitSchema = z.strictObject({
  /** Keys of all items that are ticked now; ticks once kept stay. */
  ticked: z.array(z.string().max(40)).max(60),
})
export type TickKit = z.infer<typeof tickKitSchema>

export const kitStateSchema = z.object({ ticked: z.array(z.string()), isComplete: z.boolean() })
export type KitState = z.infer<typeof kitStateSchema>
