import { z } from 'zod'

/** Keyset paging: `cursor` is what the last answer gave as `nextCursor`. */
export const pageQuerySchema = z.object({
  cursor: z.string().max(120).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(20),
})
export type PageQuery = z.infer<typeof pageQuerySchema>

/** A page of items with the cursor of the next, null on the last. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.object({ items: z.array(item), nextCursor: z.string().nullable() })

export interface Page<T> {
  items: T[]
  nextCursor: string | null
}
