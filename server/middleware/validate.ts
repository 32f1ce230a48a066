import type { Request } from 'express'
import type { z } from 'zod'
import { AppError } from '../errors'

function read<T extends z.ZodType>(schema: T, value: unknown, status: number): z.output<T> {
  const result = schema.safeParse(value)
  if (result.success) return result.data
  throw new AppError(status, 'invalid', 'Some of this cannot be taken as it is.', {
    errors: result.error.issues.slice(0, 50).map((issue) => ({
      field: issue.path.map(String).join('.'),
      message: issue.message,
    })),
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
