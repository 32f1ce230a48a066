import { AMOUNT, readAmount } from './number'
import { findUnit } from './unit'

/** A slope as it was read: rise over run, or an angle in radians where it was written as one. */
export type ReadSlope = { ratio: number; unit: string } | { radians: number; unit: string }

const RISE_OVER_RUN = new RegExp(String.raw`^(${AMOUNT}) ?(?::|in|/) ?(${AMOUNT})$`, 'i')
const LENGTH_OVER_LENGTH = new RegExp(
  String.raw`^(${AMOUNT}) ?([a-z]+|['"]) ?(?:/|per) ?([a-z]+|['"])$`,
  'i',
)
const WITH_UNIT = new RegExp(
  String.raw`^(${AMOUNT}) ?(%|percent|per cent|°|deg|degrees?|rad|radians?)$`,
  'i',
)

/**
 * Reads one slope in any of its spellings: 1:48, 4/12, 4 in 12, 1/4 in/ft, 20 mm/m, 2 %, 20 deg.
 * A plain fraction such as 1/4 stands for rise over run; the caller reads it otherwise where its field has a unit.
 */
export function readSlope(text: string): ReadSlope | undefined {
  return readOver(text) ?? readLengths(text) ?? readWithUnit(text)
}

function readOver(text: string): ReadSlope | undefined {
  const match = RISE_OVER_RUN.exec(text) ?? /^(\d+)\/(\d+)$/.exec(text)
  const rise = readAmount(match?.[1] ?? '')
  const run = readAmount(match?.[2] ?? '')
  if (rise === undefined || run === undefined || run === 0) return undefined
  return { ratio: rise / run, unit: ':' }
}

function readLengths(text: string): ReadSlope | undefined {
  const match = LENGTH_OVER_LENGTH.exec(text)
  const amount = readAmount(match?.[1] ?? '')
  const rise = findUnit('length', match?.[2] ?? '')
  const run = findUnit('length', match?.[3] ?? '')
  if (amount === undefined || rise === undefined || run === undefined) return undefined
  return { ratio: (amount * rise.factor) / run.factor, unit: `${rise.name}/${run.name}` }
}

function readWithUnit(text: string): ReadSlope | undefined {
  const match = WITH_UNIT.exec(text)
  const amount = readAmount(match?.[1] ?? '')
  if (amount === undefined) return undefined
  const angle = findUnit('angle', match?.[2] ?? '')
  if (angle) return { radians: amount * angle.factor, unit: angle.name }
  return { ratio: amount / 100, unit: '%' }
}
