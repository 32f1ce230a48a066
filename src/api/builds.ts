import {
  buildRowSchema,
  buildSchema,
  fieldBookEntrySchema,
  type PutInFieldBook,
} from '../../shared/contracts/builds'
import { pageOf } from '../../shared/contracts/pagination'
import { queryString, request } from './client'

const buildPageSchema = pageOf(buildRowSchema)

export const fetchBuilds = (cursor: string | null = null) =>
  request(buildPageSchema, `/builds${queryString({ cursor })}`)

export const fetchBuild = (slug: string) => request(buildSchema, `/courses/${slug}/build`)

export const putInFieldBook = (slug: string, body: PutInFieldBook, idempotencyKey: string) =>
  request(fieldBookEntrySchema, `/courses/${slug}/field-book-entries`, {
    method: 'POST',
    body,
    idempotencyKey,
  })
