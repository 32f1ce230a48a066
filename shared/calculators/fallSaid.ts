/** The ways to say a fall, by the name of their input. */
export const SAID = ['perMetre', 'perFoot', 'percent', 'ratio', 'angle'] as const

/** Drop over run from a fall said as this input says it; per metre and per foot are ratios already. */
export function ratioSaid(name: (typeof SAID)[number], value: number): number {
  if (name === 'angle') return Math.tan(value)
  return name === 'percent' ? value / 100 : value
}

/** Drop over run below which water stays: 1/8 in a foot in the open, taken as 10 mm a metre. */
export const LEAST_IN_THE_OPEN = 0.01
/** Drop over run of a hard surface within 10 ft of a building. */
export const LEAST_BESIDE_BUILDING = 0.02

/** The least fall for where the surface lies; the answer to “within 3 m of a building”. */
export const leastFall = (besideBuilding: string): number =>
  besideBuilding === 'yes' ? LEAST_BESIDE_BUILDING : LEAST_IN_THE_OPEN
