import type { OwnInput, OwnQuantity } from '../../../shared/contracts/ownCalculators'
import { siteUnit } from '../../../shared/units/unit'

type UnitPair = NonNullable<OwnInput['unit']>

/** What an own calculator can measure, as it is called on site. */
export const quantityChoices: { value: OwnQuantity; label: string }[] = [
  { value: 'length', label: 'a length' },
  { value: 'area', label: 'an area' },
  { value: 'volume', label: 'a volume' },
  { value: 'mass', label: 'a weight' },
  { value: 'count', label: 'a number of things' },
  { value: 'percent', label: 'a percentage' },
  { value: 'angle', label: 'an angle' },
  { value: 'ratio', label: 'a slope' },
  { value: 'massDensity', label: 'a weight by volume' },
  { value: 'pressure', label: 'a load by area' },
  { value: 'force', label: 'a force' },
  { value: 'money', label: 'money' },
  { value: 'time', label: 'a time' },
]

/** Units a field may show, metric and imperial beside each other; the first is what the site uses. */
const unitPairs: Partial<Record<OwnQuantity, [metric: string, imperial: string][]>> = {
  length: [
    ['mm', 'in'],
    ['m', 'ft'],
    ['cm', 'in'],
  ],
  area: [
    ['m²', 'ft²'],
    ['cm²', 'in²'],
    ['m²', 'yd²'],
  ],
  volume: [
    ['m³', 'yd³'],
    ['m³', 'ft³'],
    ['L', 'gal'],
    ['L', 'ft³'],
    ['L', 'qt'],
    ['ml', 'in³'],
  ],
  mass: [
    ['kg', 'lb'],
    ['g', 'oz'],
    ['t', 'lb'],
  ],
  ratio: [
    ['%', '%'],
    ['mm/m', 'in/ft'],
  ],
  massDensity: [
    ['kg/m³', 'lb/ft³'],
    ['kg/m³', 'lb/yd³'],
    ['kg/L', 'lb/ft³'],
  ],
  pressure: [
    ['kPa', 'psf'],
    ['MPa', 'psi'],
  ],
  force: [
    ['N', 'lbf'],
    ['kN', 'lbf'],
  ],
  time: [
    ['min', 'min'],
    ['h', 'h'],
    ['d', 'd'],
    ['s', 's'],
  ],
}

const sitePair = (quantity: OwnQuantity): UnitPair => ({
  metric: siteUnit(quantity, 'metric'),
  imperial: siteUnit(quantity, 'imperial'),
})
const write = ({ metric, imperial }: UnitPair) => `${metric}|${imperial}`
const say = ({ metric, imperial }: UnitPair) =>
  metric === imperial ? metric || 'a plain number' : `${metric}, or ${imperial}`

/** The pair of units a field shows, as a value of a choice. */
export const unitValue = (quantity: OwnQuantity, unit: UnitPair | undefined): string =>
  write(unit ?? sitePair(quantity))

/** The choices of it; a pair that was written otherwise is one of them too. */
export function unitChoices(quantity: OwnQuantity, unit: UnitPair | undefined) {
  const listed = (unitPairs[quantity] ?? []).map(([metric, imperial]) => ({ metric, imperial }))
  const pairs = [sitePair(quantity), ...listed, ...(unit ? [unit] : [])]
  const unique = new Map(pairs.map((pair) => [write(pair), say(pair)]))
  return [...unique].map(([value, label]) => ({ value, label }))
}

/** The pair that was chosen; undefined where it is what the site uses anyway. */
export function readUnitValue(quantity: OwnQuantity, value: string): UnitPair | undefined {
  const [metric = '', imperial = ''] = value.split('|')
  return value === write(sitePair(quantity)) ? undefined : { metric, imperial }
}
