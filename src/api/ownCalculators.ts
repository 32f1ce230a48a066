import {
  copyableOwnCalculatorSchema,
  ownCalculatorRowSchema,
  ownCalculatorSchema,
  ownCalculatorVersionSchema,
  type ChangeOwnCalculator,
  type CopyOwnCalculator,
  type CreateOwnCalculator,
} from '../../shared/contracts/ownCalculators'
import { pageOf } from '../../shared/contracts/pagination'
import { queryString, request, requestNothing } from './client'

const rowPageSchema = pageOf(ownCalculatorRowSchema)
const versionPageSchema = pageOf(ownCalculatorVersionSchema)
const copyablePageSchema = pageOf(copyableOwnCalculatorSchema)
const course = (courseId: number, rest: string) => `/bench/courses/${courseId}${rest}`
const one = (courseId: number, key: string, rest = '') =>
  course(courseId, `/own-calculators/${encodeURIComponent(key)}${rest}`)

export const fetchOwnCalculators = (courseId: number, cursor: string | null = null, limit = 20) =>
  request(rowPageSchema, course(courseId, `/own-calculators${queryString({ cursor, limit })}`))
export const createOwnCalculator = (
  courseId: number,
  body: CreateOwnCalculator,
  idempotencyKey: string,
) =>
  request(ownCalculatorSchema, course(courseId, '/own-calculators'), {
    method: 'POST',
    body,
    idempotencyKey,
  })
export const fetchOwnCalculator = (courseId: number, key: string) =>
  request(ownCalculatorSchema, one(courseId, key))
export const changeOwnCalculator = (courseId: number, key: string, body: ChangeOwnCalculator) =>
  request(ownCalculatorSchema, one(courseId, key), { method: 'PATCH', body })
export const deleteOwnCalculator = (courseId: number, key: string) =>
  requestNothing(one(courseId, key), { method: 'DELETE' })
export const fetchOwnVersions = (courseId: number, key: string, cursor: string | null = null) =>
  request(versionPageSchema, one(courseId, key, `/versions${queryString({ cursor })}`))
export const fetchCopyable = (courseId: number, cursor: string | null = null) =>
  request(
    copyablePageSchema,
    course(courseId, `/copyable-own-calculators${queryString({ cursor })}`),
  )
export const copyOwnCalculator = (
  courseId: number,
  body: CopyOwnCalculator,
  idempotencyKey: string,
) =>
  request(ownCalculatorSchema, course(courseId, '/own-calculator-copies'), {
    method: 'POST',
    body,
    idempotencyKey,
  })
