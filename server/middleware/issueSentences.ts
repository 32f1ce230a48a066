import type { z } from 'zod'

const kinds: Record<string, string> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  array: 'a list',
  tuple: 'a list',
  object: 'an object with named fields',
  record: 'an object with named fields',
  null: 'null',
}
const units: Record<string, string> = { string: ' characters', array: ' entries' }

/**
 * The sentence for what a contract refuses, where the contract has none of its own: what is wrong,
 * in words for a person and without the value that was sent.
 */
export const sayIssue: z.core.$ZodErrorMap = (issue) => {
  switch (issue.code) {
    case 'invalid_type':
      if (issue.input === undefined) return 'This is missing.'
      return `This must be ${kinds[issue.expected] ?? issue.expected}.`
    case 'too_big':
      return `At most ${issue.maximum}${units[issue.origin] ?? ''}.`
    case 'too_small':
      return `At least ${issue.minimum}${units[issue.origin] ?? ''}.`
    case 'invalid_value':
      return issue.input === undefined
        ? 'This is missing.'
        : `This must be one of: ${issue.values.map(String).join(', ')}.`
    case 'unrecognized_keys':
      return 'Nothing of this name is taken here.'
    case 'invalid_union':
      return 'This fits none of the forms that are taken here.'
    case 'invalid_format':
      return 'This is not written the way it has to be.'
    default:
      return 'This cannot be taken as it is.'
  }
}
