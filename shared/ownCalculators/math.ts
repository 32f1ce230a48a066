import {
  type FactoryFunctionMap,
  create,
  absDependencies,
  acosDependencies,
  addDependencies,
  asinDependencies,
  atan2Dependencies,
  atanDependencies,
  cbrtDependencies,
  ceilDependencies,
  cosDependencies,
  divideDependencies,
  equalDependencies,
  floorDependencies,
  hypotDependencies,
  largerDependencies,
  largerEqDependencies,
  maxDependencies,
  minDependencies,
  multiplyDependencies,
  parseDependencies,
  powDependencies,
  roundDependencies,
  sinDependencies,
  smallerDependencies,
  smallerEqDependencies,
  sqrtDependencies,
  subtractDependencies,
  tanDependencies,
  unequalDependencies,
} from 'mathjs/number'
import { formulaFunctions } from './vocabulary'

/**
 * The parts of mathjs that formulas are read and worked with, and nothing else: its reader and the
 * functions of plain numbers below. There are no units to create, no matrices, no texts and no solver in it.
 */
const parts = {
  parseDependencies,
  addDependencies,
  subtractDependencies,
  multiplyDependencies,
  divideDependencies,
  powDependencies,
  sqrtDependencies,
  cbrtDependencies,
  absDependencies,
  minDependencies,
  maxDependencies,
  hypotDependencies,
  roundDependencies,
  ceilDependencies,
  floorDependencies,
  sinDependencies,
  cosDependencies,
  tanDependencies,
  asinDependencies,
  acosDependencies,
  atanDependencies,
  atan2Dependencies,
  smallerDependencies,
  smallerEqDependencies,
  largerDependencies,
  largerEqDependencies,
  equalDependencies,
  unequalDependencies,
}
const built = create(parts as FactoryFunctionMap)

type Numbers = (...numbers: number[]) => number
type Comparison = (a: number, b: number) => boolean

const numbers = built as unknown as Readonly<Record<string, Numbers>>
const answers = built as unknown as Readonly<Record<string, Comparison>>
const pick = <T>(from: Readonly<Record<string, T>>, names: Record<string, string>) =>
  new Map(
    Object.entries(names).flatMap(([sign, name]) =>
      from[name] ? [[sign, from[name]] as const] : [],
    ),
  )

/** Reads a formula; the tree it gives is walked by us and never evaluated by itself. */
export const parseFormula = (text: string) => built.parse(text)

/** The signs between two numbers. */
export const operations: ReadonlyMap<string, Numbers> = pick(numbers, {
  '+': 'add',
  '-': 'subtract',
  '*': 'multiply',
  '/': 'divide',
  '^': 'pow',
})

/** The signs that compare two numbers; what differs by binary dust only is equal. */
export const comparisons: ReadonlyMap<string, Comparison> = pick(answers, {
  '<': 'smaller',
  '<=': 'smallerEq',
  '>': 'larger',
  '>=': 'largerEq',
  '==': 'equal',
  '!=': 'unequal',
})

/** The functions of a formula by name. */
export const functions: ReadonlyMap<string, Numbers> = pick(
  numbers,
  Object.fromEntries([...formulaFunctions.keys()].map((name) => [name, name])),
)
