import type { MathNode } from 'mathjs'
import { FormulaError } from './formulaError'
import { parseTokens } from './syntax'
import { tokenise, type Token } from './tokens'
import { formulaFunctions, formulaUnits } from './vocabulary'
import { TokenWalk } from './tokenWalk'

interface Place {
  /** Of the sign or name that is meant, counted from 1. */
  column: number
  length: number
}
/** One part of a formula, with the place where it stands. */
export type FormulaNode = Place &
  (
    | { kind: 'number'; value: number }
    | { kind: 'unit'; name: string }
    | { kind: 'name'; name: string }
    | { kind: 'negative'; of: FormulaNode }
    | { kind: 'operation'; sign: string; left: FormulaNode; right: FormulaNode }
    | { kind: 'comparison'; sign: string; left: FormulaNode; right: FormulaNode }
    | { kind: 'call'; name: string; values: FormulaNode[] }
    | { kind: 'choice'; test: FormulaNode; yes: FormulaNode; no: FormulaNode }
  )

/** A formula that was read: its parts as a tree, and as they are written. */
export interface Formula {
  root: FormulaNode
  tokens: Token[]
}

const MOST_PARTS = 150
const SIGNS = new Set(['+', '-', '*', '/', '^'])
const COMPARISONS = new Set(['<', '<=', '>', '>=', '==', '!='])

/**
 * Reads a formula with mathjs and keeps of its tree only numbers, names, units, arithmetic, comparisons,
 * choices (a > b ? c : d) and the listed functions. Throws FormulaError, with the character, for anything else.
 */
export function readFormula(formula: string): Formula {
  const tokens = tokenise(formula)
  if (tokens.length === 0) {
    throw new FormulaError(1, 1, 'There is no formula yet.', 'Write how it is worked out.')
  }
  if (tokens.length > MOST_PARTS) {
    const { column, length } = tokens[MOST_PARTS] ?? { column: 1, length: 1 }
    const message = 'This formula has too many parts.'
    throw new FormulaError(column, length, message, 'Give a part of it an output of its own.')
  }
  const walk = new TokenWalk(tokens, formula.length)
  const root = readNode(parseTokens(tokens, formula), walk)
  walk.finish()
  return { root, tokens }
}

/** The shape of the nodes that are looked at; mathjs's own types leave their kinds open. */
interface ReadNode {
  type: string
  value?: unknown
  name?: string
  op?: string
  implicit?: boolean
  args?: ReadNode[]
  fn?: { type: string; name?: string }
  content?: ReadNode
  condition?: ReadNode
  trueExpr?: ReadNode
  falseExpr?: ReadNode
  params?: ReadNode[]
}

/** Goes through mathjs's tree in the order of the tokens, so that every part finds its place. */
function readNode(given: MathNode | ReadNode, walk: TokenWalk): FormulaNode {
  const node = given as ReadNode
  switch (node.type) {
    case 'ConstantNode':
      return readNumber(node, walk)
    case 'SymbolNode':
      return readName(walk)
    case 'ParenthesisNode': {
      walk.take('(')
      const inner = readNode(child(node.content), walk)
      walk.take(')')
      return inner
    }
    case 'OperatorNode':
      return readOperator(node, walk)
    case 'FunctionNode':
      return readCall(node, walk)
    case 'ConditionalNode':
      return readChoice(node, walk)
    case 'RelationalNode':
      throw refuseChain(node, walk)
    default:
      throw walk.refuse('This cannot be used in a formula.', 'Use + - * / ^, brackets and names.')
  }
}

function child(node: ReadNode | undefined): ReadNode {
  if (!node) throw new Error('mathjs left a part of its tree out')
  return node
}

function readNumber(node: ReadNode, walk: TokenWalk): FormulaNode {
  const { text, column, length } = walk.takeKind('number')
  if (typeof node.value !== 'number' || node.value !== Number(text)) {
    throw new FormulaError(column, length, 'This is no number.', 'Write it with digits.')
  }
  return { kind: 'number', value: node.value, column, length }
}

function readName(walk: TokenWalk): FormulaNode {
  const { text: name, column, length } = walk.takeKind('name')
  if (name === 'pi') return { kind: 'number', value: Math.PI, column, length }
  if (formulaUnits.has(name)) return { kind: 'unit', name, column, length }
  if (formulaFunctions.has(name)) {
    const wayOut = `Put its value in brackets: ${name}(…).`
    throw new FormulaError(column, length, `“${name}” is a function.`, wayOut)
  }
  return { kind: 'name', name, column, length }
}

function readOperator(node: ReadNode, walk: TokenWalk): FormulaNode {
  const [first, second] = node.args ?? []
  const sign = node.op ?? ''
  if (second === undefined) {
    const { column, length } = walk.peek()
    if (sign !== '-') throw walk.refuse(`“${sign}” cannot stand here.`, 'Take it out.')
    walk.take('-')
    return { kind: 'negative', of: readNode(child(first), walk), column, length }
  }
  const left = readNode(child(first), walk)
  if (node.implicit) return readImplicit(left, second, walk)
  const { column, length } = walk.take(sign)
  const right = readNode(second, walk)
  if (SIGNS.has(sign)) return { kind: 'operation', sign, left, right, column, length }
  if (COMPARISONS.has(sign)) return { kind: 'comparison', sign, left, right, column, length }
  throw new FormulaError(column, length, `“${sign}” cannot be used in a formula.`, 'Take it out.')
}

/** A number straight before its unit is multiplied with it; anything else side by side lacks its sign. */
function readImplicit(left: FormulaNode, second: ReadNode, walk: TokenWalk): FormulaNode {
  const { column, length } = walk.peek()
  const right = readNode(second, walk)
  if (!isBare(left) || !isUnit(right)) {
    const message = 'A sign is missing before this.'
    throw new FormulaError(column, length, message, 'Put + - * or / between the two.')
  }
  return { kind: 'operation', sign: '*', left, right, column, length }
}

/** Made of nothing but numbers. */
function isBare(node: FormulaNode): boolean {
  if (node.kind === 'number') return true
  if (node.kind === 'negative') return isBare(node.of)
  return node.kind === 'operation' && isBare(node.left) && isBare(node.right)
}
const isUnit = (node: FormulaNode): boolean =>
  node.kind === 'unit' ||
  (node.kind === 'operation' && node.sign === '^' && node.left.kind === 'unit')

function readCall(node: ReadNode, walk: TokenWalk): FormulaNode {
  const { text: name, column, length } = walk.takeKind('name')
  const known = formulaFunctions.get(name)
  if (!known) {
    const wayOut = `Functions are ${[...formulaFunctions.keys()].join(', ')}; to multiply, put * before the bracket.`
    throw new FormulaError(column, length, `“${name}” is no function here.`, wayOut)
  }
  walk.take('(')
  const values = (node.args ?? []).map((value, index) => {
    if (index > 0) walk.take(',')
    return readNode(value, walk)
  })
  walk.take(')')
  if (values.length < known.least || values.length > known.most) {
    const count =
      known.least === known.most ? String(known.least) : `${known.least} to ${known.most}`
    const values_ = known.most === 1 ? 'value' : 'values'
    const message = `${name} takes ${count} ${values_}.`
    throw new FormulaError(
      column,
      length,
      message,
      'Put them in its brackets, a comma between two.',
    )
  }
  return { kind: 'call', name, values, column, length }
}

/** a < b < c: the second sign is one too many. */
function refuseChain({ params = [] }: ReadNode, walk: TokenWalk): FormulaError {
  readNode(child(params[0]), walk)
  walk.takeKind('sign')
  readNode(child(params[1]), walk)
  return walk.refuse('Two values are compared at a time.', 'Write a < b ? (b < c ? 1 : 0) : 0.')
}

function readChoice(node: ReadNode, walk: TokenWalk): FormulaNode {
  const test = readNode(child(node.condition), walk)
  const { column, length } = walk.take('?')
  const yes = readNode(child(node.trueExpr), walk)
  walk.take(':')
  const no = readNode(child(node.falseExpr), walk)
  return { kind: 'choice', test, yes, no, column, length }
}
