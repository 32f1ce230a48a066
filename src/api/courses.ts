import type { z } from 'zod'
import { buildSchema } from '../../shared/contracts/builds'
import { sheetSchema, sheetSummarySchema } from '../../shared/contracts/courses'
import { watchedLessonSchema } from '../../shared/contracts/lessons'
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

export interface LessonPlace {
  slug: string
  lessonKey: string
  /** The draft, as staff see it before it is issued. */
  isDraft: boolean
}
/** The address of a lesson, or of something in it. */
export const lessonPath = ({ slug, lessonKey, isDraft }: LessonPlace, rest = '') =>
  `/courses/${slug}/lessons/${lessonKey}${rest}${queryString({ draft: isDraft ? 1 : null })}`

export const fetchLesson = (place: LessonPlace) => request(watchedLessonSchema, lessonPath(place))
