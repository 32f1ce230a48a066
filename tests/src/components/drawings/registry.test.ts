import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { calculators, runCalculator, showInput, showOutput } from '../../../../shared/calculators'
import type {
  Calculator,
  CalculatorInput,
  CalculatorOutput,
  Value,
} from '../../../../shared/calculators/calculator'
import type { UnitSystem } from '../../../../shared/contracts/exercises'
import type {
  CalculatorSheetSize,
  DrawCalculatorSheet,
} from '../../../../src/components/drawings/calculatorSheet'
import { CALCULATOR_SHEETS } from '../../../../src/components/drawings/registry'
import { formatDrawnLength } from '../../../../src/components/drawings/figures'
import { anyStep, numberAt } from './anyNumbers'
import { findFaults } from './labelFaults'

const sizes: CalculatorSheetSize[] = ['wide', 'narrow']
const systems = ['metric', 'imperial'] as const
/** How often the drawing of a calculator is tried with other numbers. */
const RUNS = 60
const layouts = sizes.flatMap((size) => systems.map((system) => ({ size, system })))
type Layout = (typeof layouts)[number]
type Texts = Record<string, string>

const escapeText = (text: string) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')

async function sheetOf(id: string): Promise<DrawCalculatorSheet> {
  const fetchSheet = CALCULATOR_SHEETS[id]
  if (!fetchSheet) throw new Error(`${id} has no drawing`)
  return fetchSheet()
}

/** What is wrong with the drawing of these texts; undefined where the calculator refuses them. */
function drawnFaults(
  calculator: Calculator,
  draw: DrawCalculatorSheet,
  texts: Texts,
  layout: Layout,
  asked?: string,
): string[] | undefined {
  const run = runCalculator(calculator, texts, layout.system)
  if (!run.ok) return undefined
  const sheet = draw({ ...layout, values: run.values, outputs: run.outputs, asked })
  if (!sheet) return ['nothing is drawn']
  const written = JSON.stringify([sheet.drawing.marks, sheet.drawing.labels, sheet.words])
  const holes = /NaN|Infinity|undefined|null/.exec(written)
  return [...findFaults(sheet.drawing), ...(holes ? [`says ${holes[0]}`] : [])]
}

/** Anything an input takes: small numbers as often as large ones, and both ends. */
function anyText(input: CalculatorInput, { system }: Layout): fc.Arbitrary<string> {
  if (input.quantity === 'choice')
    return fc.constantFrom(...input.choices.map(({ value }) => value))
  const text = anyStep.map((step) => showInput(input, numberAt(input, step), system))
  const given = input.isList
    ? fc.array(text, { minLength: 1, maxLength: 8 }).map((parts) => parts.join('; '))
    : text
  return input.optional ? fc.option(given, { nil: '' }) : given
}

/** Any texts of a calculator, and which of its outputs is asked for, in any layout. */
const anySheet = (calculator: Calculator) =>
  fc.constantFrom(...layouts).chain((layout) =>
    fc.record({
      layout: fc.constant(layout),
      asked: fc.constantFrom(undefined, ...calculator.outputs.map(({ name }) => name)),
      texts: fc.record(
        Object.fromEntries(calculator.inputs.map((one) => [one.name, anyText(one, layout)])),
      ),
    }),
  )

/**
 * These texts together, and each by itself beside the usual ones or beside those that cannot stay empty,
 * so that many of the mixtures can be worked.
 */
function mixtures(calculator: Calculator, texts: Texts, layout: Layout): Texts[] {
  const usual = initials(calculator, layout)
  const optional = calculator.inputs.filter((one) => one.optional).map(({ name }) => [name, ''])
  const bare = { ...usual, ...(Object.fromEntries(optional) as Texts) }
  const single = Object.entries(texts).map(([name, text]) => ({ [name]: text }))
  return [
    texts,
    ...single.flatMap((one) => [
      { ...usual, ...one },
      { ...bare, ...one },
    ]),
  ]
}

/** The bare figure of a value as a drawing letters it. */
function figureOf(
  field: CalculatorInput | CalculatorOutput,
  value: Value | undefined,
  system: UnitSystem,
): string {
  if (typeof value === 'number' && field.quantity === 'length')
    return formatDrawnLength(value, system)
  const shown = 'help' in field || 'initial' in field ? '' : showOutput(field, value, system)
  return /^[\d.,\s]*\d/.exec(shown)?.[0] ?? shown
}

const initials = ({ inputs }: Calculator, { system }: Layout): Texts =>
  Object.fromEntries(inputs.map(({ name, initial }) => [name, initial[system]]))

describe.each(calculators.map((calculator) => [calculator.id, calculator] as const))(
  'the drawing of %s',
  (id, calculator) => {
    it.each(layouts)('keeps its labels apart whatever is asked: $size, $system', async (layout) => {
      const draw = await sheetOf(id)
      for (const texts of [initials(calculator, layout), calculator.example.inputs]) {
        for (const asked of [undefined, ...calculator.outputs.map(({ name }) => name)]) {
          expect(drawnFaults(calculator, draw, texts, layout, asked), asked).toEqual([])
        }
      }
    })

    it('keeps them apart for any numbers that can be worked out', async () => {
      const draw = await sheetOf(id)
      let drawn = 0
      fc.assert(
        fc.property(anySheet(calculator), ({ layout, asked, texts }) => {
          for (const some of mixtures(calculator, texts, layout)) {
            const faults = drawnFaults(calculator, draw, some, layout, asked)
            if (faults) drawn += 1
            expect(faults ?? []).toEqual([])
          }
        }),
        { numRuns: RUNS },
      )
      expect(drawn).toBeGreaterThan(RUNS)
    })

    it.each(systems)('never tells what is asked for, %s', async (system) => {
      const draw = await sheetOf(id)
      const run = runCalculator(calculator, calculator.example.inputs, system)
      if (!run.ok) throw new Error('the example is refused')
      const figures = [...calculator.inputs, ...calculator.outputs].map((field) => ({
        name: field.name,
        figure: figureOf(field, run.outputs[field.name] ?? run.values[field.name], system),
      }))
      const askable = calculator.outputs.filter(({ isList }) => !isList).map(({ name }) => name)
      for (const { name, figure } of figures.slice(calculator.inputs.length)) {
        if (!askable.includes(name)) continue
        if (figures.some((other) => other.figure === figure && other.name !== name)) continue
        for (const size of sizes) {
          const sheet = draw({ size, system, ...run, asked: name })
          const said = [...(sheet?.drawing.labels ?? []).map(({ text }) => text), sheet?.words]
          const standsAlone = new RegExp(`(^|[^\\d.,'/-])${escapeText(figure)}($|[^\\d.,])`)
          expect(
            said.filter((text) => standsAlone.test(text ?? '')),
            name,
          ).toEqual([])
        }
      }
    })
  },
)
