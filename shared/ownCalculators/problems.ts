import type { OwnProblem } from '../contracts/ownCalculators'
import type { FormulaError } from './formulaError'

/** A problem of a definition that is not inside a formula. */
export const problemAt = (path: string, message: string, wayOut: string): OwnProblem => ({
  path,
  output: null,
  column: null,
  length: 0,
  message,
  wayOut,
})

/** A problem at a character of a formula. */
export const formulaProblem = (
  path: string,
  output: string,
  { column, length, message, wayOut }: FormulaError,
): OwnProblem => ({ path, output, column, length, message, wayOut })
