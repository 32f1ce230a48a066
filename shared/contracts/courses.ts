import { z } from 'zod'
import { stableKeySchema } from './stableKey'
import { lessonStateSchema } from './progress'

export const stageKindSchema = z.enum(['ground', 'base', 'frame', 'cladding', 'roof', 'finish'])
export type StageKind = z.infer<typeof stageKindSchema>
export const coverDrawingSchema = z.enum(['log-store', 'deck', 'picket-fence'])
export type CoverDrawing = z.infer<typeof coverDrawingSchema>
export const hazardKindSchema = z.enum(['cement', 'lift', 'saw', 'dust', 'dig', 'drop'])
export type HazardKind = z.infer<typeof hazardKindSchema>

/** A hazard is always pictogram plus words. */
export const hazardSchema = z.strictObject({
  kind: hazardKindSchema,
  label: z.string().trim().min(1, 'Say the hazard in words.').max(60, 'At most 60 characters.'),
})
export type Hazard = z.infer<typeof hazardSchema>

// ---- The register and a sheet, as visitors and learners see them

export const sheetLessonSchema = z.object({
  key: stableKeySchema,
  number: z.number(),
  title: z.string(),
  summary: z.string(),
  durationMs: z.number(),
  stops: z.number(),
  hazards: z.array(hazardSchema),
  isSample: z.boolean(),
  /** Of the person who asks; not-started for visitors. */
  state: lessonStateSchema,
})
export type SheetLesson = z.infer<typeof sheetLessonSchema>
export const sheetStageSchema = z.object({
  key: stableKeySchema,
  kind: stageKindSchema,
  title: z.string(),
  lessons: z.array(sheetLessonSchema),
})
export type SheetStage = z.infer<typeof sheetStageSchema>

/** A course as a line and a drawing of the register. */
export const sheetSummarySchema = z.object({
  slug: z.string(),
  sheetNumber: z.number(),
  title: z.string(),
  outcome: z.string(),
  drawnBy: z.string(),
  /** `A`, `B`, …; `draft` on the bench. */
  revision: z.string(),
  issuedAt: z.iso.datetime().nullable(),
  changeNote: z.string(),
  weekends: z.number(),
  lessons: z.number(),
  tools: z.array(z.string()),
  hazards: z.array(hazardSchema),
  coverDrawing: coverDrawingSchema,
  priceCents: z.number(),
  currency: z.string(),
  state: z.enum(['draft', 'issued', 'closed']),
  isEnrolled: z.boolean(),
})
export type SheetSummary = z.infer<typeof sheetSummarySchema>

export const registerQuerySchema = z.object({
  cursor: z.string().max(120).optional(),
  limit: z.coerce.number().int().min(1).max(50).default(20),
  /** At most so many weekends. */
  weekends: z.coerce.number().int().min(1).max(52).optional(),
  cover: coverDrawingSchema.optional(),
})
export type RegisterQuery = z.infer<typeof registerQuerySchema>

export const sheetSchema = sheetSummarySchema.extend({
  id: z.number(),
  facts: z.array(z.object({ label: z.string(), value: z.string() })),
  notCovered: z.string(),
  stages: z.array(sheetStageSchema),
  staff: z.array(
    z.object({ name: z.string(), role: z.enum(['owner', 'helper']), about: z.string() }),
  ),
  revisions: z.array(
    z.object({ revision: z.string(), issuedAt: z.iso.datetime(), changeNote: z.string() }),
  ),
  can: z.object({ enrol: z.boolean(), seeBench: z.boolean(), writeFence: z.boolean() }),
})
export type Sheet = z.infer<typeof sheetSchema>
