import type { Source } from './calculator'

/** One kind of bag of dry concrete mix: what it weighs (kg), makes (m³) and drinks (m³). */
export interface Bag {
  value: string
  mass: number
  /** Concrete one bag makes, m³. */
  yield: number
  waterMin: number
  waterMax: number
}

const POUND = 0.45359237
const FOOT3 = 0.3048 ** 3
const PINT = 231 * 0.0254 ** 3 * 0.125

/** Fresh concrete weighs about this much, kg/m³: the stated assumption behind the yield of a metric bag. */
export const FRESH_DENSITY = 2400
/** Water a metric bag takes, as a share of its mass. */
const WATER_SHARE = { least: 0.1, most: 0.12 }
/** An 80 lb bag takes 6 to 9 pints; smaller ones in proportion. */
const PINTS_PER_80_LB = { least: 6, most: 9 }

const poundBag = (pounds: number, cubicFeet: number): Bag => ({
  value: `${String(pounds)} lb`,
  mass: pounds * POUND,
  yield: cubicFeet * FOOT3,
  waterMin: (pounds / 80) * PINTS_PER_80_LB.least * PINT,
  waterMax: (pounds / 80) * PINTS_PER_80_LB.most * PINT,
})

const kilogramBag = (kilograms: number): Bag => ({
  value: `${String(kilograms)} kg`,
  mass: kilograms,
  yield: (kilograms * (1 + (WATER_SHARE.least + WATER_SHARE.most) / 2)) / FRESH_DENSITY,
  waterMin: (kilograms * WATER_SHARE.least) / 1000,
  waterMax: (kilograms * WATER_SHARE.most) / 1000,
})

/** Every bag the calculators know. */
export const bags: Bag[] = [
  poundBag(80, 0.6),
  poundBag(60, 0.45),
  poundBag(50, 0.375),
  poundBag(40, 0.3),
  kilogramBag(30),
  kilogramBag(25),
  kilogramBag(20),
]

/** The choices of a bag, for an input. */
export const bagChoices = bags.map(({ value }) => ({ value, label: value.replace(' ', '\u00a0') }))

/** The bag of this name; the input admits no other. */
export function findBag(value: string): Bag {
  const bag = bags.find((candidate) => candidate.value === value)
  if (bag === undefined) throw new Error(`No bag “${value}”`)
  return bag
}

/** Where the figures of the bags come from. */
export const bagSources: Source[] = [
  {
    title: 'Packaged dry concrete to ASTM C387, as commonly printed on the bag',
    detail: '0.60, 0.45, 0.375 and 0.30 ft³ for 80, 60, 50 and 40 lb',
    kind: 'published',
  },
  {
    title: 'Metric bags: an assumption, 2400 kg of fresh concrete in a cubic metre, water included',
    detail: 'ask your own bag for its yield',
    kind: 'common practice, no source',
  },
  {
    title:
      'Water: 6 to 9 US pints for 80 lb, others in proportion; 0.10 to 0.12 L a kilogram for metric bags',
    detail: 'the least for 80 lb stands on data sheets; ask your own bag',
    kind: 'from memory',
  },
]
