import type { FormulaNode } from './formula'
import { FormulaError } from './formulaError'
import { comparisons, functions, operations } from './math'
import { formulaUnits } from './vocabulary'

type Of<Kind extends FormulaNode['kind']> = Extract<FormulaNode, { kind: Kind }>

/** The value of every name in SI: angles in radians, per cent as a part of one. */
export type Scope = ReadonlyMap<string, number>

/** Larger than anything that is built, in any SI unit. */
const LARGEST = 1e15

/**
 * Works out a formula in SI that was measured before. Throws FormulaError at the sign where it cannot go
 * on: a division by zero, the root of a negative number, a number without end.
 */
export function evaluateFormula(node: FormulaNode, scope: Scope): number {
  switch (node.kind) {
    case 'number':
      return node.value
    case 'unit':
      return formulaUnits.get(node.name)?.factor ?? Number.NaN
    case 'name':
      return findValue(node, scope)
    case 'negative':
      return -evaluateFormula(node.of, scope)
    case 'operation':
      return evaluateOperation(node, scope)
    case 'call':
      return evaluateCall(node, scope)
    case 'choice':
      return evaluateFormula(isTrue(node.test, scope) ? node.yes : node.no, scope)
    case 'comparison':
      return Number(isTrue(node, scope))
  }
}

const refuse = ({ column, length }: FormulaNode, message: string, wayOut: string) =>
  new FormulaError(column, length, message, wayOut)

function findValue(node: Of<'name'>, scope: Scope): number {
  const value = scope.get(node.name)
  if (value !== undefined) return value
  throw refuse(node, `Nothing is called ${node.name}.`, 'Use a name from above.')
}

function evaluateOperation(node: Of<'operation'>, scope: Scope): number {
  const left = evaluateFormula(node.left, scope)
  const right = evaluateFormula(node.right, scope)
  const isByZero =
    (node.sign === '/' && right === 0) || (node.sign === '^' && left === 0 && right < 0)
  if (isByZero) {
    const wayOut = 'Give numbers, or bounds, with which it never becomes 0.'
    throw refuse(node, 'With these numbers this divides by 0.', wayOut)
  }
  return checkNumber(node, operations.get(node.sign)?.(left, right))
}

function evaluateCall(node: Of<'call'>, scope: Scope): number {
  const values = node.values.map((value) => evaluateFormula(value, scope))
  return checkNumber(node, functions.get(node.name)?.(...values))
}

function checkNumber(node: FormulaNode, value: number | undefined): number {
  if (value !== undefined && Math.abs(value) < LARGEST) return value
  const isRoot = node.kind === 'call' && node.name === 'sqrt'
  const message = isRoot
    ? 'With these numbers this is the root of a negative number.'
    : 'With these numbers this has no value.'
  throw refuse(node, message, 'Give numbers, or bounds, with which it has one.')
}

function isTrue(node: FormulaNode, scope: Scope): boolean {
  if (node.kind !== 'comparison') throw refuse(node, 'This is no comparison.', 'Write a > b.')
  const left = evaluateFormula(node.left, scope)
  const right = evaluateFormula(node.right, scope)
  return comparisons.get(node.sign)?.(left, right) ?? false
}
