import { z } from 'zod'

/** Largest video that may be sent: 4 GiB. */
export const maxVideoBytes = 4 * 1024 ** 3
/** Largest caption file that may be sent: 2 MiB. */
export const maxCaptionBytes = 2 * 1024 ** 2
export const maxCues = 5000

export const videoSchema = z.object({
  id: z.number(),
  src: z.string(),
  contentType: z.string(),
  posterUrl: z.string().nullable(),
  durationMs: z.number(),
  captions: z.array(
    z.object({ src: z.string(), language: z.string(), label: z.string(), isOriginal: z.boolean() }),
  ),
})
export type Video = z.infer<typeof videoSchema>

export const captionTrackSchema = z.object({
  id: z.number(),
  language: z.string(),
  label: z.string(),
  isOriginal: z.boolean(),
  cues: z.number(),
  version: z.number(),
  savedAt: z.iso.datetime(),
})
export type CaptionTrack = z.infer<typeof captionTrackSchema>

export const cueSchema = z.strictObject({
  cueId: z.string().max(190),
  startMs: z.number().int().min(0),
  endMs: z.number().int().min(0),
  settings: z.string().max(255),
  text: z.string().min(1, 'An empty caption shows nothing: write it or take it out.').max(2000),
})
export type Cue = z.infer<typeof cueSchema>

/** One thing wrong in a caption file, where it stands and what to do. */
export const captionErrorSchema = z.object({
  line: z.number(),
  column: z.number(),
  message: z.string(),
})
export type CaptionError = z.infer<typeof captionErrorSchema>

export const uploadCaptionsQuerySchema = z.object({
  /** BCP 47. */
  language: z
    .string()
    .regex(/^[a-z]{2,3}(-[A-Za-z0-9]{2,8})*$/, 'A language code such as en or de.')
    .max(35),
  label: z.string().trim().min(1, 'Name the language.').max(60),
})
export type UploadCaptionsQuery = z.infer<typeof uploadCaptionsQuerySchema>

/** `stored` false: the errors say why, and what was there before is unchanged. */
export const captionUploadSchema = z.object({
  stored: z.boolean(),
  track: captionTrackSchema.nullable(),
  errors: z.array(captionErrorSchema),
  /** Worth mending, but stored. */
  marks: z.array(captionErrorSchema),
})
export type CaptionUpload = z.infer<typeof captionUploadSchema>

export const cuePageSchema = z.object({
  track: captionTrackSchema,
  items: z.array(cueSchema),
  nextCursor: z.string().nullable(),
})
export type CuePage = z.infer<typeof cuePageSchema>

export const saveCuesSchema = z.strictObject({
  version: z.number().int().min(1),
  cues: z.array(cueSchema).min(1, 'Keep at least one caption.').max(maxCues),
})
export type SaveCues = z.infer<typeof saveCuesSchema>
