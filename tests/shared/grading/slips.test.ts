import { describe, expect, it, vi } from 'vitest'
import { calculators, findCalculator } from '../../../shared/calculators/index'
import type { UnitSystem } from '../../../shared/contracts/exercises'
import { buildCalculatorExercise, gradeTyped } from './exercises'

/** The slips in the tables beside the calculators’ tests, each as its calculator and its id. */
const inOtherTables = vi.hoisted((): string[] => [])
vi.mock('../calculators/slipCases', () => ({
  describeSlips: (id: string, _usual: unknown, rows: readonly { slip: string }[]) => {
    inOtherTables.push(...rows.map(({ slip }) => `${id} ${slip}`))
  },
}))

interface SlipCase {
  calculator: string
  texts: Record<string, string>
  asked: string
  slip: string
  /** What a person who slips so would type, worked out by hand. */
  typed: string
  /** What is right, by hand. */
  right: string
  /** Absolute, in SI. */
  within: number
  system?: UnitSystem
}

// 3 × 2 m on a level base, 100 mm at the front, falling 20 mm/m: mean 120 mm, 0.72 m³, with 10 % 0.792 m³; 11.5 L a bag: 68.87.
const pad = {
  length: '3 m',
  width: '2 m',
  thickness: '100 mm',
  fall: '20 mm/m',
  flatBase: 'yes',
  waste: '10',
  bag: '25 kg',
  bagYield: '11.5 L',
}
// 10 × 8 ft × 4 in: 26.667 ft³, 0.98765 yd³.
const feetPad = { length: "10'", width: "8'", thickness: '4"', waste: '10', bag: '80 lb' }
const slab = { calculator: 'slab', texts: pad }
const volume = { ...slab, asked: 'volume', right: '0.72', within: 0.001 }
const feetVolume = {
  calculator: 'slab',
  texts: feetPad,
  asked: 'volume',
  right: '0.988',
  within: 0.001,
  system: 'imperial' as const,
}
const bags = { ...slab, asked: 'bags', right: '69', within: 0 }

const corner = { calculator: 'square', texts: { sideA: '2600', sideB: '1100', unit: '300' } }
const across = { ...corner, asked: 'diagonal', right: '1500', within: 0.001 }

// 2827² − 2819.5² = 42 348.75; ÷ (4 × 2600) = 4.072.
const form = {
  calculator: 'diagonals',
  texts: { length: '2600', width: '1100', diagonal1: '2827', diagonal2: '2819.5' },
}
const expected = {
  ...form,
  texts: { ...form.texts, diagonal1: '2833', diagonal2: '2825' },
  asked: 'expected',
  right: '2823.12',
  within: 0.0002,
}
const apart = { ...form, asked: 'difference', right: '7.5', within: 0.0001 }
const slide = { ...form, asked: 'moveBy', right: '4.072', within: 0.0001 }
const judged = { ...form, asked: 'square', within: 0 }

const roof = { calculator: 'pitch', texts: { risePer12: '4' } }
const degrees = { ...roof, asked: 'degrees', right: '18.43', within: 0.001 }
const percent = { ...roof, asked: 'percent', right: '33.33', within: 0.01 }
const rise = { ...roof, asked: 'risePer12', right: '4', within: 0.001 }
const ratio = { ...roof, asked: 'ratio', right: '1:3', within: 0.0001 }
const rafter = { ...roof, asked: 'lengthPerRun', right: '1.0541', within: 0.0001 }
const hip = { ...roof, asked: 'hipPerRun', right: '1.453', within: 0.0001 }

// 2.8 kg ÷ (25 kg × 0.17) = 0.6588.
const bag = { calculator: 'mix', texts: { bag: '25 kg', waterAdded: '2.8' } }
const ratioOfWater = { ...bag, asked: 'waterCementRatio', right: '0.659', within: 0.001 }
const pounds = {
  calculator: 'mix',
  texts: { bag: '80 lb', waterAdded: '3.5' },
  within: 0.00001,
  system: 'imperial' as const,
}

const cases: SlipCase[] = [
  { ...feetVolume, slip: 'inches-as-feet', typed: '11.852' },
  { ...feetVolume, slip: 'cubic-feet', typed: '26.667' },
  { ...volume, slip: 'litres', typed: '720' },
  { ...volume, slip: 'thickness-in-centimetres', typed: '7.2' },
  { ...volume, slip: 'fall-forgotten', typed: '0.6' },
  { ...volume, slip: 'waste-given-too-early', typed: '0.792' },
  {
    ...slab,
    asked: 'volumeWithWaste',
    right: '0.792',
    within: 0.001,
    slip: 'waste-left-out',
    typed: '720 L',
  },
  {
    ...slab,
    asked: 'volumeWithWaste',
    right: '0.792',
    within: 0.001,
    slip: 'waste-taken-off',
    typed: '0.648',
  },
  { ...bags, slip: 'bags-rounded-down', typed: '68' },
  { ...bags, slip: 'bags-without-waste', typed: '63 bags' },
  { ...bags, slip: 'bags-by-weight', typed: '32' },
  {
    ...slab,
    asked: 'readyMix',
    right: '0.8',
    within: 0.001,
    slip: 'ready-mix-nearest',
    typed: '0.792',
  },
  {
    ...slab,
    asked: 'mass',
    right: '1725',
    within: 0.5,
    slip: 'mass-without-bags',
    typed: '1721.7',
  },
  {
    ...slab,
    asked: 'meanThickness',
    right: '120',
    within: 0.001,
    slip: 'whole-fall-added',
    typed: '140',
  },
  {
    ...slab,
    asked: 'drop',
    right: '40',
    within: 0.001,
    slip: 'fall-along-the-length',
    typed: '60',
  },
  { ...across, slip: 'round-the-corner', typed: '2100' },
  { ...across, slip: 'no-root', typed: '2 250 000' },
  {
    ...across,
    slip: 'no-root',
    typed: '3600',
    right: `5'`,
    texts: { sideA: "8'", sideB: "4'", unit: "1'" },
    system: 'imperial',
  },
  { ...across, slip: 'centimetres', typed: '150' },
  {
    ...across,
    slip: 'feet-for-inches',
    typed: '5',
    right: '60',
    texts: { sideA: "8'", sideB: "4'", unit: "1'" },
    system: 'imperial',
  },
  { ...across, slip: 'outside-inside', typed: '1523.1' },
  { ...across, slip: 'squares-subtracted', typed: '793.7' },
  {
    ...corner,
    asked: 'legShort',
    right: '900',
    within: 0.001,
    slip: 'legs-swapped-short',
    typed: '1200',
  },
  {
    ...corner,
    asked: 'legLong',
    right: '1200',
    within: 0.001,
    slip: 'legs-swapped-long',
    typed: '900',
  },
  {
    ...corner,
    asked: 'largestUnit',
    right: '366.7',
    within: 0.001,
    slip: 'short-by-four',
    typed: '275',
  },
  {
    ...corner,
    asked: 'largestUnit',
    right: '366.7',
    within: 0.001,
    slip: 'long-side-only',
    typed: '650',
  },
  { ...expected, slip: 'round-the-corner', typed: '3700' },
  { ...expected, slip: 'no-root', typed: '7 970 000' },
  { ...expected, slip: 'mean-taken', typed: '2829' },
  { ...apart, slip: 'half-difference', typed: '3.75' },
  { ...apart, slip: 'off-the-drawn-size', typed: '3.88' },
  { ...slide, slip: 'moved-by-the-difference', typed: '7.5' },
  { ...slide, slip: 'two-for-four', typed: '8.144' },
  {
    ...form,
    asked: 'cornerError',
    right: '0.2121',
    within: 0.0001,
    slip: 'difference-over-side',
    typed: '0.1653',
  },
  { ...judged, right: 'no', slip: 'judged-by-the-drawn-size', typed: 'Yes' },
  {
    ...judged,
    texts: { ...form.texts, diagonal1: '2824', diagonal2: '2822' },
    right: 'yes',
    slip: 'limit-turned-round',
    typed: 'no',
  },
  { ...degrees, slip: 'percent-as-degrees', typed: '33.33' },
  { ...degrees, slip: 'sine-for-tangent', typed: '19.47' },
  { ...degrees, slip: 'from-the-plumb-line', typed: '71.57' },
  { ...percent, slip: 'degrees-as-percent', typed: '18.43' },
  { ...percent, slip: 'rise-over-slope', typed: '31.62' },
  { ...percent, slip: 'ratio-for-percent', typed: '0.3333' },
  { ...rise, slip: 'rise-in-10', typed: '3.333' },
  { ...rise, slip: 'sine-in-12', typed: '3.795' },
  { ...ratio, slip: 'ratio-upside-down', typed: '3:1' },
  { ...ratio, slip: 'span-for-run', typed: '1:6' },
  { ...rafter, slip: 'rise-and-run-added', typed: '1.3333' },
  { ...rafter, slip: 'no-root', typed: '1.1111' },
  { ...hip, slip: 'common-for-hip', typed: '1.0541' },
  { ...hip, slip: 'root-two-times-common', typed: '1.4907' },
  { ...ratioOfWater, slip: 'whole-bag', typed: '0.112' },
  { ...ratioOfWater, slip: 'upside-down', typed: '1.518' },
  { ...pounds, asked: 'waterMin', right: '3', slip: 'pints-least', typed: '6' },
  { ...pounds, asked: 'waterMax', right: '4.5', slip: 'pints-most', typed: '9' },
  { ...bag, asked: 'waterMin', right: '2.5', within: 0.00001, slip: 'most-for-least', typed: '3' },
  { ...bag, asked: 'waterMax', right: '3', within: 0.00001, slip: 'least-for-most', typed: '2.5' },
  {
    ...bag,
    texts: { ...bag.texts, waterAdded: '3.5', slump: '70' },
    asked: 'verdict',
    right: 'wet',
    within: 0,
    slip: 'judged-by-the-cone',
    typed: 'Right',
  },
  {
    ...bag,
    texts: { ...bag.texts, slump: '30' },
    asked: 'verdict',
    right: 'Too stiff',
    within: 0,
    slip: 'judged-by-the-jug',
    typed: 'right',
  },
]

/** An exercise with every slip of the calculator named. */
function exerciseOf({ calculator, texts, asked, within }: SlipCase) {
  const own = Object.entries(texts).map(([name, value]) => [name, { mode: 'own' as const, value }])
  return buildCalculatorExercise({
    calculator,
    asked,
    inputs: Object.fromEntries(own) as Record<string, { mode: 'own'; value: string }>,
    tolerance: { kind: 'absolute', value: within },
    slips: findCalculator(calculator)?.slips.map(({ id }) => id) ?? [],
  })
}

describe('every slip', () => {
  it.each(cases)('$calculator $slip: $typed instead of $right', (one) => {
    const verdict = gradeTyped(exerciseOf(one), one.typed, one.system, one.texts)
    expect(verdict).toMatchObject({ right: false, outcome: 'slip', slip: { id: one.slip } })
    const slip = findCalculator(one.calculator)?.slips.find(({ id }) => id === one.slip)
    expect([verdict.message, verdict.wayBack]).toEqual([slip?.sentence, slip?.wayBack])
  })

  it.each(cases)('$calculator $slip never fires for the right $right', (one) => {
    const verdict = gradeTyped(exerciseOf(one), one.right, one.system, one.texts)
    expect(verdict).toMatchObject({ right: true, outcome: 'right', slip: null })
  })

  it('is in this table or in that of its calculator, and in no other', async () => {
    const tables = import.meta.glob('../calculators/*Slips.test.ts')
    await Promise.all(Object.values(tables).map((read) => read()))
    const here = cases.map(({ calculator, slip }) => `${calculator} ${slip}`)
    const tried = [...here, ...inOtherTables]
    const all = calculators.flatMap(({ id, slips }) => slips.map((slip) => `${id} ${slip.id}`))
    expect(all.filter((name) => !tried.includes(name))).toEqual([])
    expect(tried.filter((name) => !all.includes(name))).toEqual([])
  })

  // Rounding down is rounding up: 100 L ÷ 10 L, and 144 L ÷ 12 L, which binary arithmetic does not make quite 12.
  it.each([
    { side: '1 m', bagYield: '10 L', right: '10', fewer: '9' },
    { side: '1.2 m', bagYield: '12 L', right: '12', fewer: '11' },
  ])('is silent where it gives the right $right by chance', ({ side, bagYield, right, fewer }) => {
    const texts = { length: side, width: side, thickness: '100 mm', waste: '0', bagYield }
    const exercise = exerciseOf({ ...bags, texts, slip: '', typed: fewer, right })
    expect(gradeTyped(exercise, right, 'metric', texts).outcome).toBe('right')
    expect(gradeTyped(exercise, fewer, 'metric', texts).outcome).toBe('wrong')
  })

  it('is silent where it comes within the tolerance of the right number', () => {
    // The mean of the readings, 2823.25, lies 0.13 mm from the right 2823.12; 2823.4 is within 0.2 mm of the mean alone.
    const one = { ...expected, texts: form.texts, slip: 'mean-taken', typed: '2823.4' }
    expect(gradeTyped(exerciseOf(one), one.typed, 'metric', one.texts).outcome).toBe('wrong')
  })

  it('is named only where the stop names it', () => {
    const exercise = buildCalculatorExercise({ slips: ['no-root'] })
    expect(gradeTyped(exercise, '2100').outcome).toBe('wrong')
    expect(gradeTyped(exercise, '2 250 000').slip?.id).toBe('no-root')
  })
})
