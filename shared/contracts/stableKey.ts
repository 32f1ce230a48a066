import { z } from 'zod'

/** A key that names the same stage, lesson, stop, exercise or question in every revision of a course. */
export const stableKeySchema = z.string().regex(/^[a-z0-9-]{3,40}$/)
