/** Largest stone of each column, in m. */
const SIZES = [0.0095, 0.0125, 0.019, 0.025, 0.0375, 0.05]
/** Highest slump of each row, in m: 1 to 2, 3 to 4 and 6 to 7 in; what lies between takes the wetter row. */
const SLUMPS = [0.051, 0.102, 0.178]
/** A little less than a column still is it: a stone of 1 in is 25.4 mm, one of 20 mm passes for 19. */
const DUST = 1e-9

/** Mixing water in kg a cubic metre, a row for each slump, and air in per cent, by the largest stone. */
interface Table {
  water: number[][]
  air: number[]
}

const plain: Table = {
  water: [
    [207, 199, 190, 179, 166, 154],
    [228, 216, 205, 193, 181, 169],
    [243, 228, 216, 202, 190, 178],
  ],
  air: [3, 2.5, 2, 1.5, 1, 0.5],
}
/** Air for moderate exposure. */
const entrained: Table = {
  water: [
    [181, 175, 168, 160, 150, 142],
    [202, 193, 184, 175, 165, 157],
    [216, 205, 197, 184, 174, 166],
  ],
  air: [6, 5.5, 5, 4.5, 4.5, 4],
}

/** What the mixing-water table says: water in kg/m³, air in per cent. */
export function readTable(maxAggregate: number, slump: number, isEntrained: boolean) {
  const { water, air } = isEntrained ? entrained : plain
  const column = Math.max(
    0,
    SIZES.findLastIndex((size) => size <= maxAggregate + DUST),
  )
  const row = Math.max(
    0,
    SLUMPS.findIndex((most) => slump <= most + DUST),
  )
  return { waterContent: water[row]?.[column] ?? NaN, airTarget: air[column] ?? NaN }
}

/** Water to cement by mass, and the strength after 28 days in MPa that it stands for. */
const STRENGTHS: Record<'plain' | 'entrained', readonly (readonly [ratio: number, mpa: number])[]> =
  {
    plain: [
      [0.42, 40],
      [0.47, 35],
      [0.54, 30],
      [0.61, 25],
      [0.69, 20],
      [0.79, 15],
    ],
    entrained: [
      [0.39, 35],
      [0.45, 30],
      [0.52, 25],
      [0.6, 20],
      [0.71, 15],
    ],
  }

/**
 * Strength in Pa for a water-cement ratio, straight between the rows of the table; the strongest row for less water,
 * undefined for more water than the table knows.
 */
export function estimateStrength(ratio: number, isEntrained: boolean): number | undefined {
  const rows = STRENGTHS[isEntrained ? 'entrained' : 'plain']
  const after = rows.findIndex(([most]) => ratio <= most + DUST)
  const next = rows[after]
  if (next === undefined) return undefined
  const before = rows[after - 1] ?? next
  const share = before === next ? 0 : (ratio - before[0]) / (next[0] - before[0])
  return (before[1] + share * (next[1] - before[1])) * 1e6
}

/** Loose cement, sand and stone that make one of concrete: the rule of two thirds. */
export const LOOSE_FOR_ONE = 1.5
/** Loose cement in kg/m³: 50 kg are a thirtieth of a cubic metre. */
export const CEMENT_DENSITY = 1500

const mixes = ['1:1.5:3', '1:2:2', '1:2:3', '1:2:4', '1:2.5:3.5', '1:2.5:5', '1:3:5', '1:3:6']
/** The mixes, richest in cement first, by volume: cement, sand, stone. */
export const proportionChoices = mixes.map((value) => ({
  value,
  label: value.replaceAll(':', '\u00a0:\u00a0'),
}))

/** Parts of cement, sand and stone of a mix such as 1:2:3, and all of them together. */
export function readParts(proportions: string) {
  const [cement = NaN, sand = NaN, stone = NaN] = proportions.split(':').map(Number)
  return { cement, sand, stone, all: cement + sand + stone }
}
