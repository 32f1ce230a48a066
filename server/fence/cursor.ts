import { z } from 'zod'
import { invalid } from '../errors'

const placeSchema = z.tuple([z.string().max(40), z.number().int().nullable(), z.number().int()])

/** Where a page ended: the lesson's key (empty in a list of one lesson), the moment in ms, the question's id. */
export type Place = z.infer<typeof placeSchema>

/** A place as an opaque text that a client hands back. */
export const encodeCursor = (place: Place) =>
  Buffer.from(JSON.stringify(place)).toString('base64url')

/** The place behind a cursor, null without one; 400 when it is none of ours. */
export function decodeCursor(cursor: string | undefined): Place | null {
  if (cursor === undefined) return null
  try {
    return placeSchema.parse(JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8')))
  } catch {
    throw invalid([{ field: 'cursor', message: 'Start again from the first page.' }])
  }
}

/** The first `limit` of rows that were read one further, and the cursor of what follows. */
export function cutPage<T>(rows: T[], limit: number, placeOf: (row: T) => Place) {
  const items = rows.slice(0, limit)
  const last = items.at(-1)
  return { items, nextCursor: rows.length > limit && last ? encodeCursor(placeOf(last)) : null }
}
