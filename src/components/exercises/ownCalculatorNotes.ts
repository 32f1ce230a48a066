import type { FieldError } from '../../../shared/contracts/errors'
import type { OwnProblem } from '../../../shared/contracts/ownCalculators'

/** What is said of a calculator that is being written, by the dotted path of its place. */
export interface OwnNotes {
  /** At a field: nothing while it is empty, for then the list beside says what is still to be done. */
  at: (path: string, text: string) => string
  /** The problem itself, with its character. */
  problem: (path: string) => OwnProblem | undefined
}

const asProblem = ({ field, message }: FieldError): OwnProblem => ({
  path: field,
  output: null,
  column: null,
  length: 0,
  message,
  wayOut: '',
})

/** All that is left to put right: what cannot be read here, what the check found, then what the server refused. */
export function gatherProblems(
  unread: readonly FieldError[],
  found: readonly OwnProblem[],
): OwnProblem[] {
  const isUnread = (path: string) => unread.some(({ field }) => field === path)
  return [...unread.map(asProblem), ...found.filter(({ path }) => !isUnread(path))]
}

const sentence = ({ message, wayOut }: OwnProblem) => `${message} ${wayOut}`.trim()

export function ownNotesOf(
  problems: readonly OwnProblem[],
  serverError: (path: string) => string,
): OwnNotes {
  const problem = (path: string) => problems.find((one) => one.path === path)
  return {
    problem,
    at: (path, text) => {
      const found = problem(path)
      if (text.trim() === '') return ''
      return found ? sentence(found) : serverError(path)
    },
  }
}

const lists: Record<string, string> = {
  inputs: 'Input',
  outputs: 'Answer',
  examples: 'Example',
  slips: 'Slip',
  cautions: 'Caution',
  sources: 'Source',
}

/** Where a problem stands, in words: Answer 3, Example 1; empty for the calculator as a whole. */
export function placeOfProblem({ path, column }: OwnProblem): string {
  const [list = '', index] = path.split('.')
  const word = lists[list]
  if (!word || index === undefined) return ''
  const place = `${word} ${Number(index) + 1}`
  return column === null ? place : `${place}, character ${column}`
}
