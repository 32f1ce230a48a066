import { z } from 'zod'

/** One field that cannot be taken as it is, with what to do. */
export const fieldErrorSchema = z.object({
  /** Dotted path into the payload, `` for the whole. */
  field: z.string(),
  message: z.string(),
})
export type FieldError = z.infer<typeof fieldErrorSchema>

/** RFC 9457 problem details with a stable code and per-field errors. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  code: z.string(),
  detail: z.string(),
  errors: z.array(fieldErrorSchema).optional(),
  /** What the server holds now, when a version was out of date. */
  current: z.unknown().optional(),
})
export type Problem = z.infer<typeof problemSchema>
