import type { CutRequest } from './cutRequest'
import { commonDivisor, stepsDown, stepsUp } from './lengthSteps'

/** One length to be cut, kerf included; the unit of width is the common divisor of the section. */
export interface Size {
  width: number
  demand: number
}

/** One stock length as the search sees it: room, what a bar costs and how long a bar is, all whole numbers. */
export interface Offer {
  /** Room for widths: the bar less end trim plus one kerf, since no cut follows the last piece. */
  capacity: number
  cost: number
  length: number
  /** Null where there are as many as pieces, so that the limit cannot bind. */
  available: number | null
}

/** One section as a packing problem in whole numbers, sizes from the widest down. */
export interface PackingProblem {
  sizes: readonly Size[]
  offers: readonly Offer[]
}

/** A section, with the way back from sizes and offers to parts and stock. */
export interface SectionProblem extends PackingProblem {
  section: string
  isPriced: boolean
  /** What the costs and lengths were divided by. */
  costUnit: number
  lengthUnit: number
  /** For each size the indices of the parts that share it. */
  partsOfSize: readonly (readonly number[])[]
  /** For each offer the index of the stock. */
  stockOfOffer: readonly number[]
}

const divided = (numbers: readonly number[], divisor: number) =>
  numbers.map((number) => (divisor > 1 ? number / divisor : number))

/** Parts of the same length are one size. */
function gatherSizes(request: CutRequest, section: string) {
  const partsByWidth = new Map<number, number[]>()
  const kerf = stepsUp(request.kerfMm)
  request.parts.forEach((part, index) => {
    if (part.section !== section) return
    const width = stepsUp(part.lengthMm) + kerf
    partsByWidth.set(width, [...(partsByWidth.get(width) ?? []), index])
  })
  const widest = [...partsByWidth].sort(([one], [other]) => other - one)
  return widest.map(([width, parts]) => ({
    width,
    parts,
    demand: parts.reduce((sum, index) => sum + (request.parts[index]?.count ?? 0), 0),
  }))
}

/** A checked request as one packing problem a section, in the order in which sections are first named. */
export function splitSections(request: CutRequest): SectionProblem[] {
  const sections = [...new Set(request.parts.map(({ section }) => section))]
  return sections.map((section) => sectionProblem(request, section))
}

function sectionProblem(request: CutRequest, section: string): SectionProblem {
  const gathered = gatherSizes(request, section)
  const pieces = gathered.reduce((sum, { demand }) => sum + demand, 0)
  const widthUnit = commonDivisor(gathered.map(({ width }) => width))
  const stock = request.stock
    .map((one, index) => ({ ...one, index }))
    .filter((one) => one.section === section)
  const isPriced = stock.some(({ price }) => price !== undefined)
  const lengths = stock.map(({ lengthMm }) => stepsDown(lengthMm))
  const costs = isPriced ? stock.map(({ price }) => price ?? 0) : lengths
  const lengthUnit = Math.max(1, commonDivisor(lengths))
  const costUnit = Math.max(1, commonDivisor(costs))
  const spare = stepsUp(request.kerfMm) - stepsUp(request.endTrimMm)
  const costsInUnits = divided(costs, costUnit)
  const lengthsInUnits = divided(lengths, lengthUnit)
  const offers = stock.map(({ available }, index) => ({
    capacity: Math.floor(((lengths[index] ?? 0) + spare) / widthUnit),
    cost: costsInUnits[index] ?? 0,
    length: lengthsInUnits[index] ?? 0,
    available: available === undefined || available >= pieces ? null : available,
  }))
  return {
    section,
    isPriced,
    costUnit,
    lengthUnit,
    sizes: gathered.map(({ width, demand }) => ({ width: width / widthUnit, demand })),
    offers,
    partsOfSize: gathered.map(({ parts }) => parts),
    stockOfOffer: stock.map(({ index }) => index),
  }
}
