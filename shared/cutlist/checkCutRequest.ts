import { CalculatorInputError } from '../calculators/calculator'
import {
  homeLimits,
  longestMm,
  shortestMm,
  widestKerfMm,
  type CutLimits,
  type CutRequest,
  type CutStock,
} from './cutRequest'
import { formatQuantity } from '../units/format'
import { stepsDown, stepsUp } from './lengthSteps'

const refuse = (input: string, sentence: string): never => {
  throw new CalculatorInputError(input, sentence)
}
/** To the hundredth of a millimetre, or to 1/16 in. */
const sayLength = (lengthMm: number, { units = 'metric' }: Pick<CutRequest, 'units'>) =>
  units === 'metric'
    ? `${Math.round(lengthMm * 100) / 100} mm`
    : formatQuantity(lengthMm / 1000, 'length', units)
const isBetween = (number: number, least: number, most: number) =>
  Number.isFinite(number) && number >= least && number <= most
const isWhole = (number: number, least: number, most: number) =>
  Number.isInteger(number) && isBetween(number, least, most)

/**
 * Throws CalculatorInputError with a sentence where a list is beyond the limits or cannot be cut: the input is
 * `parts`, `stock`, `kerf` or `endTrim`.
 */
export function checkCutRequest(request: CutRequest, limits: CutLimits = homeLimits): void {
  checkSaw(request)
  checkParts(request, limits)
  checkStock(request, limits)
  for (const section of new Set(request.parts.map((part) => part.section))) {
    checkSection(request, section)
  }
}

function checkSaw(request: CutRequest) {
  const { kerfMm, endTrimMm } = request
  const say = (lengthMm: number) => sayLength(lengthMm, request)
  if (!isBetween(kerfMm, 0, widestKerfMm)) {
    const range = `from 0 to ${say(widestKerfMm)}`
    refuse('kerf', `The saw cut is ${say(kerfMm)} wide; give a width ${range}.`)
  }
  if (!isBetween(endTrimMm, 0, longestMm)) {
    const range = `from 0 to ${say(longestMm)}`
    refuse('endTrim', `The end trim is ${say(endTrimMm)}; give a length ${range}.`)
  }
}

function checkParts(request: CutRequest, limits: CutLimits) {
  const { parts } = request
  const say = (lengthMm: number) => sayLength(lengthMm, request)
  if (parts.length === 0) refuse('parts', 'List at least one part to cut.')
  if (parts.length > limits.parts) {
    refuse(
      'parts',
      `There are ${parts.length} different parts; a list holds up to ${limits.parts}.`,
    )
  }
  for (const { label, lengthMm, count } of parts) {
    if (!isBetween(lengthMm, shortestMm, longestMm)) {
      const range = `from ${say(shortestMm)} to ${say(longestMm)}`
      refuse('parts', `“${label}” is ${say(lengthMm)} long; give a length ${range}.`)
    }
    if (!isWhole(count, 1, limits.pieces)) {
      const range = `from 1 to ${limits.pieces}`
      refuse('parts', `“${label}” is wanted ${count} times; give a whole number ${range}.`)
    }
  }
  const pieces = parts.reduce((sum, { count }) => sum + count, 0)
  if (pieces > limits.pieces) {
    refuse('parts', `There are ${pieces} pieces in all; a list holds up to ${limits.pieces}.`)
  }
}

function checkStock(request: CutRequest, limits: CutLimits) {
  const { stock } = request
  const say = (lengthMm: number) => sayLength(lengthMm, request)
  if (stock.length === 0) refuse('stock', 'List at least one length that you can buy or have.')
  if (stock.length > limits.stockLengths) {
    const most = `a list holds up to ${limits.stockLengths}`
    refuse('stock', `There are ${stock.length} stock lengths; ${most}.`)
  }
  for (const { lengthMm, price, available } of stock) {
    if (!isBetween(lengthMm, shortestMm, longestMm)) {
      const range = `from ${say(shortestMm)} to ${say(longestMm)}`
      refuse('stock', `A stock length is ${say(lengthMm)}; give a length ${range}.`)
    }
    if (price !== undefined && !isWhole(price, 0, 10_000_000)) {
      refuse(
        'stock',
        `The ${say(lengthMm)} bar costs ${price}; give a whole number of cents or pence.`,
      )
    }
    if (available !== undefined && !isWhole(available, 0, 1_000_000)) {
      refuse('stock', `There are ${available} of the ${say(lengthMm)} bars; give a whole number.`)
    }
  }
}

/** What can be said of a section without searching. */
function checkSection(request: CutRequest, section: string) {
  const stock = request.stock.filter((one) => one.section === section)
  if (stock.length === 0) {
    refuse(
      'stock',
      `There is no stock of section ${section}; add a length that you can buy or have.`,
    )
  }
  const priced = stock.filter(({ price }) => price !== undefined)
  if (priced.length > 0 && priced.length < stock.length) {
    refuse(
      'stock',
      `Some stock of section ${section} has a price and some has none; give all or none.`,
    )
  }
  checkLengths(request, section, stock)
  checkAmount(request, section, stock)
}

const roomOf = ({ endTrimMm }: CutRequest, { lengthMm }: CutStock) =>
  stepsDown(lengthMm) - stepsUp(endTrimMm)

function checkLengths(request: CutRequest, section: string, stock: readonly CutStock[]) {
  const usable = stock.filter(({ available }) => available !== 0)
  const room = Math.max(0, ...usable.map((one) => roomOf(request, one)))
  const part = request.parts.find((one) => one.section === section && stepsUp(one.lengthMm) > room)
  if (!part) return
  const trim = request.endTrimMm > 0 ? ' once its end is trimmed' : ''
  refuse(
    'parts',
    `“${part.label}” is ${sayLength(part.lengthMm, request)} long, longer than every ${section} bar${trim}; ` +
      'add a longer stock length, or join two pieces where the plan allows it.',
  )
}

function checkAmount(request: CutRequest, section: string, stock: readonly CutStock[]) {
  if (stock.some(({ available }) => available === undefined)) return
  const kerf = stepsUp(request.kerfMm)
  const needed = request.parts
    .filter((part) => part.section === section)
    .reduce((sum, { lengthMm, count }) => sum + count * (stepsUp(lengthMm) + kerf), 0)
  const room = stock.reduce(
    (sum, one) => sum + (one.available ?? 0) * Math.max(0, roomOf(request, one) + kerf),
    0,
  )
  if (room < needed) refuse('stock', notEnough(section))
}

/** The sentence for a section of which there are too few bars. */
export const notEnough = (section: string): string =>
  `The ${section} stock you have is not enough for all its parts; add bars or another length.`
