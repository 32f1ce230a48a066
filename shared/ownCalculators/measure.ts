import {
  ANGLE,
  PLAIN,
  divided,
  isPlain,
  isSame,
  multiplied,
  nameDimension,
  nameUnit,
  raised,
  type Dimension,
} from './dimensions'
import type { FormulaNode } from './formula'
import { FormulaError } from './formulaError'
import { formulaFunctions, formulaUnits } from './vocabulary'

/** Finds what a name measures; throws FormulaError where nothing is called so. */
export type FindDimension = (name: string, column: number, length: number) => Dimension

type Of<Kind extends FormulaNode['kind']> = Extract<FormulaNode, { kind: Kind }>

/** Powers beyond this are no size of anything that is built. */
const HIGHEST_POWER = 6
const wordsOfSign: Record<string, string> = { '+': 'added', '-': 'taken off each other' }

/**
 * What a formula measures, found before it is worked out. Throws FormulaError at the sign or name where
 * units do not fit: a length and a volume added, the sine of a length, a root of what has none.
 */
export function measureFormula(node: FormulaNode, find: FindDimension): Dimension {
  switch (node.kind) {
    case 'number':
      return PLAIN
    case 'unit':
      return formulaUnits.get(node.name)?.dimension ?? PLAIN
    case 'name':
      return find(node.name, node.column, node.length)
    case 'negative':
      return measureFormula(node.of, find)
    case 'operation':
      return measureOperation(node, find)
    case 'call':
      return measureCall(node, find)
    case 'choice':
      return measureChoice(node, find)
    case 'comparison':
      throw refuse(node, 'A comparison gives no number.', 'Make it a choice: a > b ? one : other.')
  }
}

const refuse = ({ column, length }: FormulaNode, message: string, wayOut: string) =>
  new FormulaError(column, length, message, wayOut)

const unitOf = (dimension: Dimension) => nameUnit(dimension) || 'a plain number'
const sides = (node: { sign: string }, left: Dimension, right: Dimension) =>
  `Left of the ${node.sign} is ${unitOf(left)}, right of it ${unitOf(right)}.`
const both = (a: Dimension, b: Dimension) => {
  const [first = '', ...rest] = `${nameDimension(a)} and ${nameDimension(b)}`
  return first.toUpperCase() + rest.join('')
}

function measureOperation(node: Of<'operation'>, find: FindDimension): Dimension {
  const left = measureFormula(node.left, find)
  if (node.sign === '^') return measurePower(node, left, find)
  const right = measureFormula(node.right, find)
  if (node.sign === '*') return checkSize(node, multiplied(left, right))
  if (node.sign === '/') return checkSize(node, divided(left, right))
  if (isSame(left, right)) return left
  const done = wordsOfSign[node.sign] ?? 'put together'
  throw refuse(node, `${both(left, right)} cannot be ${done}.`, sides(node, left, right))
}

function measurePower(node: Of<'operation'>, base: Dimension, find: FindDimension): Dimension {
  if (!isPlain(measureFormula(node.right, find))) {
    throw refuse(node, 'A power is a plain number.', 'Write it like length^2.')
  }
  const power = readPower(node.right)
  if (power === undefined || Math.abs(power) > HIGHEST_POWER) {
    const message = `A power is a number from −${HIGHEST_POWER} to ${HIGHEST_POWER}, written out.`
    throw refuse(node, message, 'Write it like length^2, or multiply.')
  }
  return checkSize(node, raised(base, power))
}

/** A power as it is written: 2, -1, 0.5 or (1/3); anything that is worked out from names is none. */
function readPower(node: FormulaNode): number | undefined {
  if (node.kind === 'number') return node.value
  if (node.kind === 'negative') {
    const of = readPower(node.of)
    return of === undefined ? undefined : -of
  }
  if (node.kind !== 'operation' || node.sign !== '/') return undefined
  const over = readPower(node.left)
  const under = readPower(node.right)
  return over === undefined || under === undefined || under === 0 ? undefined : over / under
}

function checkSize(node: FormulaNode, dimension: Dimension): Dimension {
  if (dimension.every((power) => Math.abs(power) <= 2 * HIGHEST_POWER)) return dimension
  throw refuse(node, 'Nothing that is built is measured like this.', 'Look at the units again.')
}

function measureChoice(node: Of<'choice'>, find: FindDimension): Dimension {
  const { test } = node
  if (test.kind !== 'comparison') {
    throw refuse(node, 'A choice begins with a comparison.', 'Write it like a > b ? one : other.')
  }
  const left = measureFormula(test.left, find)
  const right = measureFormula(test.right, find)
  if (!isSame(left, right)) {
    throw refuse(test, `${both(left, right)} cannot be compared.`, sides(test, left, right))
  }
  const yes = measureFormula(node.yes, find)
  const no = measureFormula(node.no, find)
  if (isSame(yes, no)) return yes
  const wayOut = `Before the colon is ${unitOf(yes)}, after it ${unitOf(no)}.`
  throw refuse(node, 'The two sides of a choice must measure the same.', wayOut)
}

function measureCall(node: Of<'call'>, find: FindDimension): Dimension {
  const values = node.values.map((value) => measureFormula(value, find))
  const first = values[0] ?? PLAIN
  const { kind } = formulaFunctions.get(node.name) ?? { kind: 'plain' }
  const isAngled = kind === 'angle' && isSame(first, ANGLE)
  if (
    (kind === 'plain' || kind === 'inverse' || kind === 'angle') &&
    !isPlain(first) &&
    !isAngled
  ) {
    throw refuse(node, wrongValue(node.name, kind, first), wayToPlain(node.name, kind))
  }
  if (kind === 'alike' || kind === 'direction') {
    const other = values.find((value) => !isSame(value, first))
    if (other) {
      const message = `${both(first, other)} cannot stand together in ${node.name}.`
      throw refuse(node, message, `One is ${unitOf(first)}, another ${unitOf(other)}.`)
    }
  }
  if (kind === 'alike') return first
  if (kind === 'root') return raised(first, node.name === 'sqrt' ? 1 / 2 : 1 / 3)
  return kind === 'inverse' || kind === 'direction' ? ANGLE : PLAIN
}

const wrongValue = (name: string, kind: string, given: Dimension) =>
  kind === 'angle'
    ? `${name} takes an angle, not ${nameDimension(given)}.`
    : `${name} takes a plain number, not ${nameDimension(given)}.`

function wayToPlain(name: string, kind: string): string {
  if (kind === 'angle') return 'Give it an angle: an input, 30 deg, or atan(…).'
  if (kind === 'inverse') return 'Divide like by like first: a height by a length.'
  return `Divide by what you count in: ${name}(x / (50 mm)) * 50 mm.`
}
