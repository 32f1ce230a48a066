import { z } from 'zod'
import { buildSchema } from '../../shared/contracts/builds'
import { sheetSchema, sheetSummarySchema } from '../../shared/contracts/courses'
import { pageOf } from '../../shared/contracts/pagination'
import { queryString, request } from './client'

const registerPageSchema = pageOf(sheetSummarySchema)
export type RegisterPage = z.infer<typeof registerPageSchema>

export const fetchRegister = (query: {
  weekends?: number | null
  cover?: string | null
  cursor?: string | null
}) => request(registerPageSchema, `/courses${queryString(query)}`)

export const fetchSheet = (slug: string) => request(sheetSchema, `/courses/${slug}`)

export const enrol = (slug: string) =>
  request(buildSchema, `/courses/${slug}/enrolments`, { method: 'POST', body: {} })
