import type { Request } from 'express'
import type { z } from 'zod'
import type { FieldError } from '../../shared/contracts/errors'
import { AppError } from '../errors'
import { sayIssue } from './issueSentences'

const mostErrors = 50

/** One error for each field; a name that the contract does not know is a field of its own. */
const toErrors = (issue: z.core.$ZodIssue): FieldError[] => {
  const paths = issue.code === 'unrecognized_keys' ? issue.keys : [null]
  return paths.map((key) => ({
    field: [...issue.path, ...(key === null ? [] : [key])].map(String).join('.').slice(0, 200),
    message: issue.message,
  }))
}

function read<T extends z.ZodType>(schema: T, value: unknown, status: number): z.output<T> {
  const result = schema.safeParse(value, { error: sayIssue })
  if (result.success) return result.data
  throw new AppError(status, 'invalid', 'Some of this cannot be taken as it is.', {
    errors: result.error.issues.flatMap(toErrors).slice(0, mostErrors),
  })
}

/** The request's JSON body, checked by its contract; 400 with an error for each field otherwise. */
export const readBody = <T extends z.ZodType>(request: Request, schema: T) =>
  read(schema, request.body ?? {}, 400)

/** The request's query string, checked by its contract; 400 otherwise. */
export const readQuery = <T extends z.ZodType>(request: Request, schema: T) =>
  read(schema, request.query, 400)

/** The parts of the request's path; a path that cannot name anything is a 404. */
export const readParams = <T extends z.ZodType>(request: Request, schema: T) =>
  read(schema, request.params, 404)
