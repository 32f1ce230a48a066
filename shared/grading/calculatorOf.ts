import type { Calculator } from '../calculators/calculator'
import { findCalculator } from '../calculators/index'
import type { CalculatorDefinition } from '../contracts/exercises'
import { OWN_PREFIX, type OwnSnapshot } from '../contracts/ownCalculators'
import { buildOwnCalculator, describeOwnCalculator, type CalculatorFace } from '../ownCalculators'

type Which = Pick<CalculatorDefinition, 'calculator' | 'own'>

const built = new WeakMap<OwnSnapshot, Calculator>()

/** The calculator of an exercise: a built-in one, or the instructor's own as it was when it was attached. */
export function calculatorOf({ calculator: id, own }: Which): Calculator | undefined {
  if (!own) return findCalculator(id)
  if (id !== `${OWN_PREFIX}${own.key}`) return undefined
  const known = built.get(own)
  if (known) return known
  const made = buildOwnCalculator(own.definition, own)
  built.set(own, made)
  return made
}

/** Its words and fields alone, which cost no reading of formulas. */
export function faceOf({ calculator: id, own }: Which): CalculatorFace | undefined {
  if (!own) return findCalculator(id)
  return id === `${OWN_PREFIX}${own.key}` ? describeOwnCalculator(own.definition, own) : undefined
}
