import { problemSchema } from '../../shared/contracts/errors'

/** The fields that a refusal names, in order; throws when the body is no problem of our contract. */
export const fieldsOf = (body: unknown): string[] =>
  (problemSchema.parse(body).errors ?? []).map(({ field }) => field)
