import type { Calculator, CalculatorInput, Values } from '../calculators/calculator'
import { checkBounds, readInput } from '../calculators/readInputs'
import { fieldUnit, runCalculator, showInput } from '../calculators/index'
import type { CalculatorDefinition, ExerciseInput, UnitSystem } from '../contracts/exercises'
import { parseQuantity } from '../units/parse'
import { unitNames } from '../units/unit'
import { toleranceOf } from './tolerance'
import type { CalculatorExercise } from './calculatorExercise'
import { drawInputs } from './drawInputs'
import type { ExerciseProblem } from './grader'
import { findNearTie } from './nearTie'

/** Learners tried out, beside the ends of every range. */
const TRIED_SEEDS = 40
const block = (path: string, message: string): ExerciseProblem => ({
  path,
  message,
  blocking: true,
})
const mend = (path: string, message: string): ExerciseProblem => ({
  path,
  message,
  blocking: false,
})

/** What keeps an exercise made of this calculator from being used, and what is worth mending. */
export function findCalculatorProblems(
  { definition }: CalculatorExercise,
  calculator: Calculator | undefined,
): ExerciseProblem[] {
  if (!calculator)
    return [block('definition.calculator', `There is no calculator “${definition.calculator}”.`)]
  const inputs = calculator.inputs.flatMap((input) => {
    const given = definition.inputs[input.name]
    return given ? findInputProblems(input, given, `definition.inputs.${input.name}`) : []
  })
  const named = findNameProblems(calculator, definition)
  if ([...inputs, ...named].some(({ blocking }) => blocking)) return [...named, ...inputs]
  return [...named, ...inputs, ...findDrawProblems(calculator, definition)]
}

function findNameProblems(calculator: Calculator, definition: CalculatorDefinition) {
  const problems: ExerciseProblem[] = []
  const { asked, slips, inputs } = definition
  const output = calculator.outputs.find(({ name }) => name === asked)
  if (!output) {
    problems.push(block('definition.asked', `${calculator.title} has no answer “${asked}”.`))
  } else if (output.isList) {
    const message = `${output.label} is a row of numbers and cannot be asked for.`
    problems.push(block('definition.asked', message))
  }
  for (const name of Object.keys(inputs)) {
    if (calculator.inputs.some((input) => input.name === name)) continue
    problems.push(block(`definition.inputs.${name}`, `${calculator.title} has no input “${name}”.`))
  }
  slips.forEach((id, index) => {
    const slip = calculator.slips.find((candidate) => candidate.id === id)
    const path = `definition.slips.${String(index)}`
    if (!slip) problems.push(block(path, `${calculator.title} has no slip “${id}”.`))
    else if (slip.output !== asked) {
      problems.push(
        mend(path, `“${slip.title}” belongs to another answer and is never named here.`),
      )
    }
  })
  const known = output && output.quantity !== 'choice' ? unitNames(output.quantity) : []
  for (const unit of definition.acceptedUnits ?? []) {
    if (known.includes(unit)) continue
    problems.push(block('definition.acceptedUnits', `“${unit}” is no unit of this answer.`))
  }
  if (slips.length === 0) problems.push(mend('definition.slips', 'No slip is named.'))
  return problems
}

function findInputProblems(
  input: CalculatorInput,
  given: ExerciseInput,
  path: string,
): ExerciseProblem[] {
  if (given.mode === 'ranged') return findRangeProblems(input, given, path)
  if (input.quantity === 'choice') {
    const known = input.choices.some(({ value }) => value === given.value)
    return known ? [] : [block(path, `${input.label}: “${given.value}” is not one of its choices.`)]
  }
  if (given.value.trim() === '') {
    return input.optional ? [] : [block(path, `${input.label} is empty.`)]
  }
  if (input.isList) {
    const row = readInput(input, given.value, 'metric')
    return row.ok ? [] : [block(path, row.message)]
  }
  const unit = fieldUnit(input, 'metric')
  const read = parseQuantity(given.value, input.quantity, { system: 'metric', defaultUnit: unit })
  if (!read.ok) return [block(path, `${input.label}: ${read.message}`)]
  const bounds = checkBounds(input, read.value, 'metric')
  if (!bounds.ok) return [block(path, bounds.message)]
  if (!read.bare || unit === '' || unit === '%') return []
  return [mend(path, `${input.label}: “${given.value}” has no unit and is taken for ${unit}.`)]
}

function findRangeProblems(
  input: CalculatorInput,
  range: Extract<ExerciseInput, { mode: 'ranged' }>,
  path: string,
): ExerciseProblem[] {
  if (input.quantity === 'choice')
    return [block(path, `${input.label} is chosen and has no range.`)]
  if (input.isList) return [block(path, `${input.label} is a row of numbers and has no range.`)]
  if (range.min > range.max) return [block(path, `${input.label}: “from” is more than “to”.`)]
  for (const end of [range.min, range.max]) {
    const bounds = checkBounds(input, end, 'metric')
    if (!bounds.ok) return [block(path, bounds.message)]
  }
  return range.step > range.max - range.min
    ? [mend(path, `${input.label}: the step is wider than the range, every learner gets the same.`)]
    : []
}

/** Tries the ends of every range and some learners' draws, in both systems. */
function findDrawProblems(
  calculator: Calculator,
  definition: CalculatorDefinition,
): ExerciseProblem[] {
  /** Nobody reads the steps of what is only tried out. */
  const tried = { ...calculator, steps: () => [] }
  const draws = [...drawCorners(calculator, definition), ...drawSeeds(calculator, definition)]
  const runs: TriedRun[] = []
  for (const { texts, system } of draws) {
    const run = runCalculator(tried, texts, system)
    if (run.ok) runs.push({ texts, system, values: run.values })
    if (!run.ok) {
      const [name = '', message = ''] = Object.entries(run.errors)[0] ?? []
      const numbers = describeRanged(definition, texts)
      return [
        block(
          `definition.inputs.${name}`,
          numbers === '' ? message : `With ${numbers}: ${message}`,
        ),
      ]
    }
    if (run.outputs[definition.asked] === undefined) {
      return [block('definition.asked', 'With these inputs there is no such answer to work out.')]
    }
  }
  return [
    ...findToleranceProblems(calculator, definition),
    ...findTieProblems(tried, definition, runs),
  ]
}

interface TriedRun {
  texts: Record<string, string>
  system: UnitSystem
  values: Values
}
/** Each is worked a dozen times over, so fewer are tried. */
const TRIED_FOR_TIES = 20

/** Learners whose answer a hair decides: two careful people would differ. */
function findTieProblems(
  calculator: Calculator,
  definition: CalculatorDefinition,
  runs: TriedRun[],
): ExerciseProblem[] {
  const tried = runs.slice(0, TRIED_FOR_TIES)
  const ties = tried.filter(
    ({ values, system }) => findNearTie(calculator, values, definition.asked, system) !== undefined,
  )
  if (ties.length === 0) return []
  const numbers = describeRanged(definition, ties[0]?.texts ?? {})
  const of = numbers === '' ? '' : `, as with ${numbers}`
  const message = `${String(ties.length)} of ${String(tried.length)} tried learners stand on an edge${of}: a hair more or less gives another answer. Move the range or its step.`
  return [mend('definition.asked', message)]
}

const systems = ['metric', 'imperial'] as const

const drawSeeds = (calculator: Calculator, definition: CalculatorDefinition) =>
  Array.from({ length: TRIED_SEEDS }, (_, seed) =>
    systems.map((system) => ({ system, texts: drawInputs(definition, calculator, seed, system) })),
  ).flat()

/** Every mixture of the two ends of the ranges. */
function drawCorners(calculator: Calculator, definition: CalculatorDefinition) {
  const base = drawInputs(definition, calculator, 0, 'metric')
  let corners: Record<string, string>[] = [base]
  for (const input of calculator.inputs) {
    const range = definition.inputs[input.name]
    if (range?.mode !== 'ranged') continue
    corners = corners.flatMap((texts) =>
      [range.min, range.max].map((end) => ({
        ...texts,
        [input.name]: showInput(input, end, 'metric'),
      })),
    )
  }
  return corners.map((texts) => ({ texts, system: 'metric' as const }))
}

const describeRanged = (definition: CalculatorDefinition, texts: Record<string, string>) =>
  Object.entries(definition.inputs)
    .filter(([, given]) => given.mode === 'ranged')
    .map(([name]) => `${name} ${texts[name] ?? ''}`)
    .join(', ')

/** A tolerance so narrow that the rounded answer itself would be refused, or so wide that nothing is. */
function findToleranceProblems(calculator: Calculator, definition: CalculatorDefinition) {
  const run = runCalculator(calculator, drawInputs(definition, calculator, 0, 'metric'), 'metric')
  const right = run.ok ? run.outputs[definition.asked] : undefined
  if (typeof right !== 'number' || right === 0) return []
  return toleranceOf(right, definition.tolerance) >= Math.abs(right)
    ? [
        block(
          'definition.tolerance',
          'The tolerance is as wide as the answer: even 0 would be right.',
        ),
      ]
    : []
}
