import type { MathNode } from 'mathjs'
import { FormulaError } from './formulaError'
import { parseFormula } from './math'
import type { Token } from './tokens'

/**
 * The tree that mathjs reads in these tokens; throws FormulaError, at the token it stumbled over in what was
 * typed, where it can read none.
 */
export function parseTokens(tokens: Token[], formula: string): MathNode {
  const starts: number[] = []
  let text = ''
  for (const token of tokens) {
    starts.push(text.length + 1)
    text += `${token.text} `
  }
  try {
    return parseFormula(text.trimEnd())
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error
    const { char = 1 } = error as SyntaxError & { char?: number }
    const index = starts.findIndex((start, at) => char < start + (tokens[at]?.text.length ?? 0))
    throw explain(error.message, tokens[index], formula)
  }
}

const sentences: [pattern: RegExp, message: string, wayOut: string][] = [
  [/Parenthesis \)/, 'A bracket is not closed.', 'Put a ) where it ends.'],
  [
    /operator ,/,
    'A comma only stands between the values of a function.',
    'Write decimals with a point.',
  ],
  [/False part/, 'A choice has two sides.', 'Write test ? one : other.'],
  [/end of expression/, 'Something is missing at the end.', 'Write what comes next.'],
  [/Value expected/, 'Something is missing before this.', 'Put a number or a name there.'],
  [/Unexpected part/, 'A sign is missing before this.', 'Put + - * or / between the two.'],
]

function explain(said: string, at: Token | undefined, formula: string): FormulaError {
  const { column, length } = at ?? { column: formula.trimEnd().length + 1, length: 1 }
  const known = sentences.find(([pattern]) => pattern.test(said))
  if (!known) {
    return new FormulaError(column, length, 'This cannot be read.', 'Look at what stands here.')
  }
  return new FormulaError(column, length, known[1], known[2])
}
