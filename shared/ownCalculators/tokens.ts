import { FormulaError } from './formulaError'
import { reservedWords } from './vocabulary'

/** A part of a formula as it is written, and as mathjs reads it. */
export interface Token {
  kind: 'number' | 'name' | 'sign'
  text: string
  /** Counted from 1. */
  column: number
  length: number
}

const MOST_DIGITS = 15
/** Deeper than any formula a person can follow, far from what exhausts the reader. */
const DEEPEST_BRACKETS = 20

const SPACE = /\s+/y
const NUMBER = /(?:\d+(?:\.\d+)?|\.\d+)(?:[eE][+-]?\d+)?/y
const NAME = /[A-Za-z][A-Za-z0-9_]*/y
const SIGN = /<=|>=|==|!=|[-+*/^()?:,<>]/y
/** Signs a person may type, as mathjs writes them. */
const spelled: Record<string, string> = {
  '×': '*',
  '·': '*',
  '÷': '/',
  '−': '-',
  '–': '-',
  '≤': '<=',
  '≥': '>=',
  '≠': '!=',
}
const powers: Record<string, string> = { '²': '2', '³': '3' }

const refusals: Record<string, [message: string, wayOut: string]> = {
  '=': ['A formula has no = sign.', 'Write only what stands to the right of it; to compare, ==.'],
  '!': ['A factorial cannot be worked out here.', 'Take the ! out.'],
  '%': [
    'A formula does not know per cent.',
    'Write 0.1 for 10 %, or make it an input in per cent: it counts as 0.1.',
  ],
  '"': ['A formula holds no text.', 'Take it out; feet and inches are written ft and inch.'],
  "'": ['A formula holds no text.', 'Take it out; feet and inches are written ft and inch.'],
  '[': ['A formula holds no rows or tables.', 'Work with one number at a time.'],
  '{': ['A formula holds no rows or tables.', 'Work with one number at a time.'],
  ';': ['A formula is one line.', 'Give the rest an output of its own.'],
  '.': ['A point stands only inside a number.', 'Take it out, or write the number whole: 0.5.'],
}

function matchAt(pattern: RegExp, text: string, at: number): string | undefined {
  pattern.lastIndex = at
  return pattern.exec(text)?.[0]
}

/**
 * Cuts a formula into numbers, names and signs. Everything else is refused at its character, before
 * the reader of formulas sees it: text, rows, assignments, points after names, letters beyond a to z.
 */
export function tokenise(formula: string): Token[] {
  const tokens: Token[] = []
  let at = 0
  while (at < formula.length) {
    const space = matchAt(SPACE, formula, at)
    if (space !== undefined) at += space.length
    else at = addToken(tokens, formula, at)
  }
  checkBrackets(tokens)
  return tokens
}

/** Adds what stands at `at` and returns where the next begins. */
function addToken(tokens: Token[], formula: string, at: number): number {
  const column = at + 1
  const number = matchAt(NUMBER, formula, at)
  if (number !== undefined) {
    checkNumber(number, column)
    tokens.push({ kind: 'number', text: number, column, length: number.length })
    return at + number.length
  }
  const name = matchAt(NAME, formula, at)
  if (name !== undefined) {
    tokens.push(readName(name, column))
    return at + name.length
  }
  const sign = matchAt(SIGN, formula, at)
  if (sign !== undefined) {
    tokens.push({ kind: 'sign', text: sign, column, length: sign.length })
    return at + sign.length
  }
  const character = formula.charAt(at)
  const power = powers[character]
  const spelling = spelled[character]
  if (power !== undefined) {
    tokens.push({ kind: 'sign', text: '^', column, length: 1 })
    tokens.push({ kind: 'number', text: power, column, length: 1 })
  } else if (spelling !== undefined) {
    tokens.push({ kind: 'sign', text: spelling, column, length: 1 })
  } else {
    throw refuseCharacter(formula, at)
  }
  return at + 1
}

function checkNumber(text: string, column: number) {
  if (text.replace(/[eE].*$/, '').replace('.', '').length <= MOST_DIGITS) {
    const value = Number(text)
    if (value === 0 || (value >= 1e-15 && value <= 1e15)) return
  }
  throw new FormulaError(
    column,
    text.length,
    'This number is not a size anything has.',
    'Write it shorter.',
  )
}

function readName(name: string, column: number): Token {
  const instead = reservedWords.get(name)
  if (instead !== undefined) {
    throw new FormulaError(column, name.length, `“${name}” cannot be used in a formula.`, instead)
  }
  const text = name === 'in' ? 'inch' : name
  return { kind: 'name', text, column, length: name.length }
}

function refuseCharacter(formula: string, at: number): FormulaError {
  const character = String.fromCodePoint(formula.codePointAt(at) ?? 0)
  const known = refusals[character]
  if (known) return new FormulaError(at + 1, 1, ...known)
  if (/\p{L}/u.test(character)) {
    const message = `“${character}” is no letter a name can have here.`
    return new FormulaError(at + 1, character.length, message, 'Use plain letters from a to z.')
  }
  const message = `“${character}” cannot be used in a formula.`
  return new FormulaError(at + 1, character.length, message, 'Take it out.')
}

function checkBrackets(tokens: Token[]) {
  let depth = 0
  let choices = 0
  for (const { text, column } of tokens) {
    if (text === '(') depth++
    if (text === ')') depth--
    if (text === '?') choices++
    if (text === ':') choices--
    if (depth < 0) {
      const wayOut = 'Take it out, or put a ( before it.'
      throw new FormulaError(column, 1, 'This bracket was never opened.', wayOut)
    }
    if (choices < 0) {
      const wayOut = 'Write test ? one : other.'
      throw new FormulaError(column, 1, 'A colon only stands in a choice.', wayOut)
    }
    if (depth <= DEEPEST_BRACKETS) continue
    const message = 'These brackets stand too deep inside each other.'
    throw new FormulaError(column, 1, message, 'Give a part of it an output of its own.')
  }
}
