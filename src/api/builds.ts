import { buildRowSchema, buildSchema } from '../../shared/contracts/builds'
import { pageOf } from '../../shared/contracts/pagination'
import { queryString, request } from './client'

const buildPageSchema = pageOf(buildRowSchema)

export const fetchBuilds = (cursor: string | null = null) =>
  request(buildPageSchema, `/builds${queryString({ cursor })}`)

export const fetchBuild = (slug: string) => request(buildSchema, `/courses/${slug}/build`)
