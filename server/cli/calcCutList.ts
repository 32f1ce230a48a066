import loadHighs from 'highs'
import { z } from 'zod'
import { failure, type CalcFailure } from './calcJson'
import { CalculatorInputError, type Quantity } from '../../shared/calculators/calculator'
import type { UnitSystem } from '../../shared/contracts/exercises'
import { cutListCautions } from '../../shared/cutlist/cautions'
import type { CutBar, CutList } from '../../shared/cutlist/cutList'
import type { CutRequest } from '../../shared/cutlist/cutRequest'
import { highsSolver } from '../../shared/cutlist/highsSolver'
import { solveCutList } from '../../shared/cutlist/solveCutList'
import { formatQuantity } from '../../shared/units/format'
import { formatNumber } from '../../shared/units/number'
import { parseQuantity } from '../../shared/units/parse'

/** Longer than any list for one build takes; what is not proved then is told with its gap. */
const secondsLimit = 60
const perMetre = 1000

const measured = z.union([z.number(), z.string().max(80)])
const section = z.string().trim().max(40).default('')
const requestSchema = z.strictObject({
  parts: z.array(
    z.strictObject({
      label: z.string().max(80).default(''),
      length: measured,
      count: z.number(),
      section,
    }),
  ),
  stock: z.array(
    z.strictObject({
      length: measured,
      section,
      price: measured.optional(),
      available: z.number().optional(),
    }),
  ),
  kerf: measured.default(0),
  endTrim: measured.default(0),
})

/** A plain number is in metres or hundredths, a text is read as in the browser. */
function read(input: string, value: number | string, quantity: Quantity): number {
  if (typeof value === 'number') return value
  const found = parseQuantity(value, quantity, { system: 'metric' })
  if (!found.ok) throw new CalculatorInputError(input, found.message)
  return found.value
}
const millimetres = (input: string, value: number | string) =>
  read(input, value, 'length') * perMetre

/** The request a JSON object of inputs stands for; throws CalculatorInputError, naming the input. */
function readRequest(given: unknown): CutRequest {
  const parsed = requestSchema.safeParse(given)
  if (!parsed.success) {
    const { path, message } = parsed.error.issues[0] ?? { path: [], message: '' }
    throw new CalculatorInputError(path.map(String).join('.') || 'inputs', message)
  }
  const { parts, stock, kerf, endTrim } = parsed.data
  return {
    parts: parts.map(({ length, ...part }, index) => ({
      ...part,
      lengthMm: millimetres(`parts.${index}.length`, length),
    })),
    stock: stock.map(({ length, price, available, section: across }, index) => ({
      section: across,
      lengthMm: millimetres(`stock.${index}.length`, length),
      ...(price === undefined ? {} : { price: read(`stock.${index}.price`, price, 'money') }),
      ...(available === undefined ? {} : { available }),
    })),
    kerfMm: millimetres('kerf', kerf),
    endTrimMm: millimetres('endTrim', endTrim),
  }
}

type Shown = Record<UnitSystem, string>
const inBoth = (write: (system: UnitSystem) => string): Shown => ({
  metric: write('metric'),
  imperial: write('imperial'),
})
const length = (mm: number, system: UnitSystem) => formatQuantity(mm / perMetre, 'length', system)
const number = (count: number) => inBoth(() => formatNumber(count, 0))

function sayBar({ stock, section: across, cuts, offcutMm }: CutBar, system: UnitSystem): string {
  const pieces = cuts.map(({ label, lengthMm }) => `${length(lengthMm, system)} ${label}`.trim())
  const name = across === '' ? '' : `${across}, `
  return `${name}${length(stock.lengthMm, system)}: ${pieces.join(' + ')}, offcut ${length(offcutMm, system)}`
}

function sayProof({ proof }: CutList): string {
  return proof === 'optimal' ? 'proved' : `within ${formatNumber(proof.gapPercent, 3)} %`
}

function describe(list: CutList) {
  const bars = list.bars.map(({ stock, section: across, cuts, offcutMm }) => ({
    stock: { length: stock.lengthMm / perMetre, section: across, price: stock.price ?? null },
    cuts: cuts.map(({ label, lengthMm }) => ({ label, length: lengthMm / perMetre })),
    offcut: offcutMm / perMetre,
  }))
  const proof = sayProof(list)
  const { cost } = list
  return {
    bars: {
      value: bars,
      unit: 'm',
      shown: inBoth((system) => list.bars.map((bar) => sayBar(bar, system)).join('; ')),
    },
    count: { value: list.count, unit: '1', shown: number(list.count) },
    waste: {
      value: list.wasteMm / perMetre,
      unit: 'm',
      shown: inBoth((system) => length(list.wasteMm, system)),
    },
    ...(cost === null
      ? {}
      : {
          cost: {
            value: cost,
            unit: 'hundredths',
            shown: inBoth((system) => formatQuantity(cost, 'money', system)),
          },
        }),
    optimal: {
      value: list.proof === 'optimal' ? 'optimal' : list.proof.gapPercent,
      unit: list.proof === 'optimal' ? 'choice' : '%',
      shown: inBoth(() => proof),
    },
  }
}

function writeSteps(list: CutList) {
  const { boughtMm, wasteMm, count } = list
  const say = (mm: number) => length(mm, 'metric')
  return [
    {
      label: 'All parts, end to end',
      formula: 'length × how many, added up',
      numbers: `${formatNumber(
        list.bars.reduce((sum, { cuts }) => sum + cuts.length, 0),
        0,
      )} pieces`,
      result: say(boughtMm - wasteMm),
    },
    {
      label: 'Bars to buy',
      formula: 'the cheapest, then the least waste, then few settings of the saw',
      numbers: `${say(boughtMm)} in all, ${sayProof(list)}`,
      result: formatNumber(count, 0),
      output: 'count',
    },
    {
      label: 'Waste: offcuts, end trims, saw dust',
      formula: 'bought − parts',
      numbers: `${say(boughtMm)} − ${say(boughtMm - wasteMm)}`,
      result: say(wasteMm),
      output: 'waste',
    },
  ]
}

/** What `list` prints of the cut list. */
export const cutListDescription = {
  id: 'cutlist',
  title: 'Cut list',
  question: 'Which lengths to buy, and how to cut them?',
  inputs: [
    { name: 'parts', label: 'Parts: label, length, count, section', quantity: 'table', unit: 'm' },
    {
      name: 'stock',
      label: 'Stock: length, section, price (hundredths, optional), available (optional)',
      quantity: 'table',
      unit: 'm',
    },
    { name: 'kerf', label: 'Saw cut', quantity: 'length', unit: 'm', optional: true },
    {
      name: 'endTrim',
      label: 'Trimmed off one end',
      quantity: 'length',
      unit: 'm',
      optional: true,
    },
  ],
  outputs: [
    { name: 'bars', label: 'Bars and their cuts', quantity: 'table', unit: 'm' },
    { name: 'count', label: 'Bars in all', quantity: 'count', unit: '1' },
    { name: 'waste', label: 'Waste', quantity: 'length', unit: 'm' },
    { name: 'cost', label: 'Cost', quantity: 'money', unit: 'hundredths' },
    { name: 'optimal', label: 'Proved, or the gap that is left', quantity: 'percent', unit: '%' },
  ],
}

/** The cut list for a JSON object of inputs, in the form of the other calculators. */
export async function computeCutList(json: string): Promise<object | CalcFailure> {
  let given: unknown
  try {
    given = JSON.parse(json)
  } catch {
    return failure('inputs', 'The inputs are not JSON. Write them like {"parts": [], "stock": []}.')
  }
  try {
    const request = readRequest(given)
    const highs = await loadHighs()
    const list = solveCutList(request, {
      openSolver: (deadline) => highsSolver(highs, deadline),
      millisecondsLimit: secondsLimit * 1000,
    })
    return {
      id: 'cutlist',
      outputs: describe(list),
      steps: writeSteps(list),
      cautions: cutListCautions,
    }
  } catch (error) {
    if (!(error instanceof CalculatorInputError)) throw error
    return failure(error.input, error.message)
  }
}
