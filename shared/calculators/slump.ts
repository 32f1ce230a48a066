/** Slump classes of EN 206 in mm, least and most; S5 has no upper limit. */
export const slumpClasses = [
  { value: 'below-S1', label: 'below S1, hardly drops', from: 0 },
  { value: 'S1', label: 'S1, 10 to 40 mm', from: 10 },
  { value: 'S2', label: 'S2, 50 to 90 mm', from: 50 },
  { value: 'S3', label: 'S3, 100 to 150 mm', from: 100 },
  { value: 'S4', label: 'S4, 160 to 210 mm', from: 160 },
  { value: 'S5', label: 'S5, 220 mm and more', from: 220 },
]

/** Share of the bag's mass that is cement: an assumption. */
export const CEMENT_SHARE = 0.17

/** A hand-placed pad: data sheets aim at 2 to 3 in; ACI 211.1 allows 3 in, 1 in more without a vibrator. In mm. */
export const RIGHT_SLUMP = { least: 50, most: 100 }

/** Slump in m to the nearest 10 mm, as it is reported; that closes the gaps between the classes. */
export const reportedSlump = (metres: number): number => Math.round(metres * 100 + 1e-9) * 10

/** The EN 206 class of a slump in m. */
export function classifySlump(metres: number): string {
  const slump = reportedSlump(metres)
  return slumpClasses.findLast((candidate) => slump >= candidate.from)?.value ?? 'below-S1'
}

/** The verdict by the slump alone. */
export function judgeSlump(metres: number): 'stiff' | 'right' | 'wet' {
  const slump = reportedSlump(metres)
  if (slump < RIGHT_SLUMP.least) return 'stiff'
  return slump > RIGHT_SLUMP.most ? 'wet' : 'right'
}

/** Water a bag in m³, the range it may have, and the slump in m where it was measured. */
export interface MixReading {
  waterAdded: number
  waterMin: number
  waterMax: number
  slump: number | undefined
}

/** The verdict by the water alone. */
export function judgeWater({ waterAdded, waterMin, waterMax }: MixReading) {
  if (waterAdded > waterMax + 1e-9) return 'wet'
  return waterAdded < waterMin - 1e-9 ? 'stiff' : 'right'
}

/**
 * Too much water is too wet whatever the cone says, for it weakens the concrete;
 * otherwise the cone decides where there is one, for sand and stone bring water of their own.
 */
export function judgeMix(reading: MixReading): 'stiff' | 'right' | 'wet' {
  const byWater = judgeWater(reading)
  if (byWater === 'wet' || reading.slump === undefined) return byWater
  return judgeSlump(reading.slump)
}
