import type { OwnQuantity } from '../contracts/ownCalculators'

/** What a number measures, as powers of length, mass, time, angle and money; all zero is a plain number. */
export type Dimension = readonly [
  length: number,
  mass: number,
  time: number,
  angle: number,
  money: number,
]

export const PLAIN: Dimension = [0, 0, 0, 0, 0]
export const ANGLE: Dimension = [0, 0, 0, 1, 0]

/** The dimension of every quantity; ratio, count and per cent are plain numbers. */
export const quantityDimensions: Record<OwnQuantity, Dimension> = {
  length: [1, 0, 0, 0, 0],
  area: [2, 0, 0, 0, 0],
  volume: [3, 0, 0, 0, 0],
  angle: ANGLE,
  ratio: PLAIN,
  mass: [0, 1, 0, 0, 0],
  massDensity: [-3, 1, 0, 0, 0],
  pressure: [-1, 1, -2, 0, 0],
  force: [1, 1, -2, 0, 0],
  count: PLAIN,
  money: [0, 0, 0, 0, 1],
  percent: PLAIN,
  time: [0, 0, 1, 0, 0],
}

/** Powers out of roots are compared with this much room for binary dust. */
const DUST = 1e-9
const combine = (a: Dimension, b: Dimension, sign: 1 | -1): Dimension => [
  a[0] + sign * b[0],
  a[1] + sign * b[1],
  a[2] + sign * b[2],
  a[3] + sign * b[3],
  a[4] + sign * b[4],
]

/** The dimension of a product. */
export const multiplied = (a: Dimension, b: Dimension): Dimension => combine(a, b, 1)
/** The dimension of a quotient. */
export const divided = (a: Dimension, b: Dimension): Dimension => combine(a, b, -1)
/** The dimension of a power or a root. */
export const raised = (a: Dimension, power: number): Dimension => [
  a[0] * power,
  a[1] * power,
  a[2] * power,
  a[3] * power,
  a[4] * power,
]
/** True when both measure the same, so that they can be added and compared. */
export const isSame = (a: Dimension, b: Dimension): boolean =>
  a.every((power, index) => Math.abs(power - (b[index] ?? 0)) < DUST)
/** True for a number without a unit. */
export const isPlain = (a: Dimension): boolean => isSame(a, PLAIN)

const quantityWords: [OwnQuantity, string][] = [
  ['length', 'a length'],
  ['area', 'an area'],
  ['volume', 'a volume'],
  ['angle', 'an angle'],
  ['mass', 'a mass'],
  ['massDensity', 'a density'],
  ['pressure', 'a pressure'],
  ['force', 'a force'],
  ['money', 'an amount of money'],
  ['time', 'a time'],
  ['ratio', 'a plain number'],
]
const baseUnits = ['m', 'kg', 's', 'rad', 'money']
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹'

/** The unit of a dimension in SI: m³, kg/m³, m²·kg; empty for a plain number. */
export function nameUnit(dimension: Dimension): string {
  const part = (sign: 1 | -1) =>
    dimension
      .flatMap((power, index) =>
        power * sign > DUST ? [`${baseUnits[index] ?? ''}${showPower(power * sign)}`] : [],
      )
      .join('·')
  const above = part(1)
  const below = part(-1)
  if (below === '') return above
  return `${above === '' ? '1' : above}/${below.includes('·') ? `(${below})` : below}`
}

function showPower(power: number): string {
  if (Math.abs(power - 1) < DUST) return ''
  const rounded = Math.round(power)
  if (Math.abs(power - rounded) > DUST) return `^${String(Number(power.toFixed(3)))}`
  return String(rounded).replace(/\d/g, (digit) => superscripts[Number(digit)] ?? digit)
}

/** What a dimension measures in words: a volume, a plain number, something in m²·kg. */
export function nameDimension(dimension: Dimension): string {
  const known = quantityWords.find(([quantity]) => isSame(quantityDimensions[quantity], dimension))
  return known?.[1] ?? `something in ${nameUnit(dimension)}`
}
