import type {
  Calculator,
  CalculatorInput,
  CalculatorOutput,
  Quantity,
} from '../../../shared/calculators/calculator'
import { convertText, fieldUnit, showOutput } from '../../../shared/calculators/fields'
import type { LearnerQuestion, UnitSystem } from '../../../shared/contracts/exercises'
import { parseQuantity } from '../../../shared/units/parse'

/** A number without the unit that stands beside its field anyway: 2600 for 2600 mm. */
export function withoutUnit(text: string, unit: string): string {
  const bare = unit && text.endsWith(unit) ? text.slice(0, -unit.length).trim() : text
  return /^[\d.,\s]+$/.test(bare) ? bare : text
}

/** Inputs typed in one system as they read in another; in the same one they stay as they were typed. */
export function convertInputs(
  calculator: Pick<Calculator, 'inputs'>,
  texts: Record<string, string>,
  from: UnitSystem,
  to: UnitSystem,
): Record<string, string> {
  const read = calculator.inputs.map((input) => {
    const text = convertText(input, texts[input.name] ?? '', from, to)
    return [input.name, from === to ? text : withoutUnit(text, fieldUnit(input, to))]
  })
  return { ...texts, ...(Object.fromEntries(read) as Record<string, string>) }
}

/** An answer typed in one system as it reads in another; what cannot be read stays. */
export function convertAnswer(
  output: CalculatorOutput,
  text: string,
  from: UnitSystem,
  to: UnitSystem,
): string {
  if (from === to || !text.trim() || output.quantity === 'choice') return text
  const unit = { system: from, defaultUnit: fieldUnit(output, from) }
  const read = parseQuantity(text, output.quantity, unit)
  return read.ok ? withoutUnit(showOutput(output, read.value, to), fieldUnit(output, to)) : text
}

/** The field of a number question, described as a calculator describes its inputs. */
export function numberField(question: LearnerQuestion): CalculatorInput {
  return {
    name: question.key,
    label: question.prompt,
    quantity: (question.quantity ?? 'count') as Quantity,
    ...(question.unit ? { unit: question.unit } : {}),
    min: -Infinity,
    max: Infinity,
    initial: { metric: '', imperial: '' },
  }
}
