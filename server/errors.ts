import type { FieldError } from '../shared/contracts/errors'

interface Details {
  errors?: FieldError[]
  current?: unknown
}

/** A refusal that a person can act on; becomes problem+json in the error handler. */
export class AppError extends Error {
  readonly errors: FieldError[] | undefined
  readonly current: unknown

  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
    details: Details = {},
  ) {
    super(message)
    this.name = 'AppError'
    this.errors = details.errors
    this.current = details.current
  }
}

/** 400 or 422: fields that cannot be taken as they are. */
export const invalid = (errors: FieldError[], detail = 'Some of this cannot be taken as it is.') =>
  new AppError(400, 'invalid', detail, { errors })

/** 401: whoever asks has to sign in first. */
export const signInFirst = () => new AppError(401, 'sign-in-first', 'Sign in to do this.')

/** 403: signed in, but not theirs to do. */
export const notAllowed = (detail = 'This is not yours to do.') =>
  new AppError(403, 'not-allowed', detail)

/** 404: nothing there, or nothing that may be seen. */
export const notFound = (what: string) =>
  new AppError(404, 'not-found', `There is no such ${what}.`)

/** 409: somebody changed it meanwhile, or its state forbids it. */
export const conflict = (code: string, detail: string, current?: unknown) =>
  new AppError(409, code, detail, { current })
