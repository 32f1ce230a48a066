import type { Step, Values } from '../calculators/calculator'
import { showInput, showOutput } from '../calculators/fields'
import type { OwnCalculatorSheet } from '../contracts/ownCalculators'
import type { UnitSystem } from '../contracts/unitSystem'
import type { ReadFormula } from './formulas'
import type { Token } from './tokens'
import { formulaFunctions, formulaUnits } from './vocabulary'

interface Worked {
  values: Values
  outputs: Values
  system: UnitSystem
}

/** The worked solution: one step an output, its formula as it is written, then with the numbers put in. */
export function writeSteps(
  definition: OwnCalculatorSheet,
  formulas: ReadFormula[],
  { values, outputs, system }: Worked,
): Step[] {
  const shown = new Map<string, string>()
  for (const input of definition.inputs) {
    shown.set(input.name, showInput(input, values[input.name] ?? 0, system))
  }
  return definition.outputs.flatMap((output, index) => {
    const read = formulas[index]
    if (!read?.ok) return []
    const { tokens } = read.formula
    const result = showOutput(output, outputs[output.name], system)
    shown.set(output.name, result)
    return {
      label: output.label,
      formula: writeFormula(tokens, (name) => name.replaceAll('_', ' ')),
      numbers: writeFormula(tokens, (name) => shown.get(name) ?? name, true),
      result,
      output: output.name,
    }
  })
}

const signs: Record<string, string> = {
  '+': ' + ',
  '-': ' − ',
  '*': ' × ',
  '/': ' ÷ ',
  '^': '^',
  ',': '; ',
  '?': ' ? ',
  ':': ' : ',
  '<': ' < ',
  '>': ' > ',
  '<=': ' ≤ ',
  '>=': ' ≥ ',
  '==': ' is ',
  '!=': ' is not ',
}
const functionWords: Record<string, string> = {
  sqrt: '√',
  cbrt: '∛',
  ceil: 'round up',
  floor: 'round down',
  min: 'smallest of',
  max: 'largest of',
}
const powers: Record<string, string> = { '2': '²', '3': '³' }

/** Writes a formula with signs a person reads; `isFilled` sets brackets around numbers that need them. */
function writeFormula(tokens: Token[], nameOf: (name: string) => string, isFilled = false): string {
  let text = ''
  for (const [at, token] of tokens.entries()) {
    const before = tokens[at - 1]
    const after = tokens[at + 1]
    if (token.kind === 'name') {
      const isBeforePower = after?.text === '^'
      text += writeName(token.text, before, (name) => {
        const said = nameOf(name)
        return isFilled && (isBeforePower || said.startsWith('−')) ? `(${said})` : said
      })
    } else if (token.kind === 'number') {
      text += before?.text === '^' ? (powers[token.text] ?? `^${token.text}`) : token.text
    } else if (token.text === '^') {
      text += after?.kind === 'number' ? '' : '^'
    } else if (token.text === '/' && isUnit(after) && isUnitEnd(tokens, at)) {
      text += '/'
    } else if (token.text === '-' && isUnary(before)) {
      text += '−'
    } else {
      text += signs[token.text] ?? token.text
    }
  }
  return text
}

const isUnary = (before: Token | undefined) =>
  before === undefined || (before.kind === 'sign' && before.text !== ')')

const isUnit = (token: Token | undefined) => token?.kind === 'name' && formulaUnits.has(token.text)
/** A unit, or a power of one, ends before this token. */
const isUnitEnd = (tokens: Token[], at: number) =>
  isUnit(tokens[at - 1]) || (tokens[at - 2]?.text === '^' && isUnit(tokens[at - 3]))

function writeName(name: string, before: Token | undefined, nameOf: (name: string) => string) {
  if (name === 'pi') return 'π'
  if (formulaFunctions.has(name)) return functionWords[name] ?? name
  if (!formulaUnits.has(name)) return nameOf(name)
  const unit = name === 'inch' ? 'in' : name
  return isUnary(before) ? unit : `\u00a0${unit}`
}
