import { FormulaError } from './formulaError'
import type { Token } from './tokens'

/**
 * Hands out the tokens of a formula one after another. The reader's tree must use up exactly what was
 * written, in its order: whatever it understood otherwise is refused where the two part.
 */
export class TokenWalk {
  private at = 0

  constructor(
    private readonly tokens: Token[],
    private readonly formulaLength: number,
  ) {}

  /** The token that comes next; at the end the place after the last character. */
  peek(): Token {
    const end = { kind: 'sign', text: '', column: this.formulaLength + 1, length: 1 } as const
    return this.tokens[this.at] ?? end
  }

  /** The next token, which must be this one. */
  take(text: string): Token {
    const token = this.peek()
    if (token.text !== text) throw this.refuse('This cannot be read.', 'Look at what stands here.')
    this.at++
    return token
  }

  /** The next token, which must be of this kind. */
  takeKind(kind: Token['kind']): Token {
    const token = this.peek()
    if (token.kind !== kind) throw this.refuse('This cannot be read.', 'Look at what stands here.')
    this.at++
    return token
  }

  /** Throws when something is left over. */
  finish() {
    if (this.at < this.tokens.length) {
      throw this.refuse('This cannot be read.', 'Look at what stands here.')
    }
  }

  /** A refusal of the token that comes next. */
  refuse(message: string, wayOut: string): FormulaError {
    const { column, length } = this.peek()
    return new FormulaError(column, length, message, wayOut)
  }
}
