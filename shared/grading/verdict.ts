import type { Verdict } from '../contracts/exercises'

/** The verdict on an answer that could not be read; it costs no try. `field` is an input, a question's key or `answer`. */
export const unreadVerdict = (message: string, field: string): Verdict => ({
  right: false,
  outcome: 'unread',
  slip: null,
  message,
  wayBack: 'This costs no try.',
  field,
  questions: {},
})
