/** A formula that cannot be taken: where it is wrong, what is wrong there, and what to do. */
export class FormulaError extends Error {
  constructor(
    /** The first character that is meant, counted from 1. */
    readonly column: number,
    /** How many characters are meant. */
    readonly length: number,
    message: string,
    readonly wayOut: string,
  ) {
    super(message)
    this.name = 'FormulaError'
  }
}
