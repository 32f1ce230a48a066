import type { Source } from './calculator'
import { CalculatorInputError } from './calculator'

/** Newtons that a kilogram presses with. */
export const GRAVITY = 9.80665
/** One psf in Pa and one lb/ft³ in kg/m³. */
export const PSF = (0.45359237 * GRAVITY) / 0.3048 ** 2
export const PCF = 0.45359237 / 0.3048 ** 3
/** A thousand of these is water, kg/m³. */
export const WATER = 1000

/** Density of settled snow in kg/m³ from the ground snow load in Pa: 0.13 × psf + 14, at most 30 lb/ft³ (ASCE 7). */
export const snowDensity = (groundSnowLoad: number): number =>
  Math.min(30, 0.13 * (groundSnowLoad / PSF) + 14) * PCF

/** Snow of each kind, kg/m³ from least to most. */
export const snowKinds = {
  fresh: [30, 50],
  settled: [200, 400],
  wet: [300, 500],
} as const

/** What to write where nobody weighed the snow: the heavy end of each kind. */
export const densityHelp = `Fresh and dry ${String(snowKinds.fresh[1])} kg/m³ (3 lb/ft³), settled ${String(snowKinds.settled[1])} (25), old and wet ${String(snowKinds.wet[1])} (31).`

/** Snow as it was said: ground load in Pa, depth in m, density in kg/m³. */
export interface SnowSaid {
  groundSnowLoad?: number
  depth?: number
  density?: number
}
/** Snow that lies: what it presses with (Pa), how deep (m) and how dense (kg/m³) it is. */
export interface SnowCover {
  load: number
  depth: number
  density: number
}

/** The names under which a calculator asks for its snow. */
export interface SnowNames {
  depth: string
  density: string
}

/**
 * Snow from the ground snow load alone, from depth and density, or from a depth at the density that the ground load gives;
 * undefined where none was said. Throws where a part is missing or all three are given.
 */
export function readSnow(said: SnowSaid, names: SnowNames): SnowCover | undefined {
  const { groundSnowLoad, depth, density } = said
  if (groundSnowLoad === undefined) return snowOfDepth(depth, density, names)
  if (depth !== undefined && density !== undefined) {
    throw new CalculatorInputError(
      'groundSnowLoad',
      'The snow is said in two ways. Keep the ground snow load, or depth and density, and empty the others.',
    )
  }
  const dense = density ?? snowDensity(groundSnowLoad)
  if (depth !== undefined) return { load: depth * dense * GRAVITY, depth, density: dense }
  return { load: groundSnowLoad, depth: groundSnowLoad / (dense * GRAVITY), density: dense }
}

function snowOfDepth(
  depth: number | undefined,
  density: number | undefined,
  names: SnowNames,
): SnowCover | undefined {
  if (depth === undefined && density === undefined) return undefined
  if (depth === undefined) {
    throw new CalculatorInputError(
      names.depth,
      'The depth of the snow is empty: a density alone weighs nothing.',
    )
  }
  if (density === undefined) {
    throw new CalculatorInputError(
      names.density,
      'How dense the snow is, is empty. Give it, or the ground snow load of your place.',
    )
  }
  return { load: depth * density * GRAVITY, depth, density }
}

/** Where the figures of the snow come from. */
export const snowSources: Source[] = [
  {
    title: 'ASCE 7, Minimum Design Loads (7-05 section 7.7.1; the same in 7-16)',
    detail: 'density 0.13 × ground snow load + 14, at most 30 lb/ft³',
    kind: 'published',
  },
  {
    title: 'Snow weight table of a snow-guard glossary (Oberstdorf)',
    detail: 'fresh 30 to 50, settled 200 to 400, old and wet 300 to 500 kg/m³',
    kind: 'published',
  },
]
