import type { CalculatorOutput } from './calculator'

/** Below these slopes (rise over run) metal sheets are not lapped dry, or not lapped at all: 3 in 12 and 1/2 in 12. */
export const LEAST_SLOPE = { dry: 3 / 12, sealed: 0.5 / 12 } as const

/** From 4 in 12 on a shorter end lap holds. */
const STEEP = 4 / 12

/** Least end lap at this slope (rise over run), in metres: 150 mm (6 in) from 4 in 12 on, 200 mm (8 in) below. */
export const leastEndLap = (slope: number): number => (slope >= STEEP - 1e-9 ? 0.15 : 0.2)

/** How the laps stand at a slope (rise over run): metres of end lap, and whether there is a lap up the slope at all. */
export function judgeLaps(slope: number, endLap: number, rows: number): string {
  if (slope < LEAST_SLOPE.sealed - 1e-9) return 'flat'
  if (slope < LEAST_SLOPE.dry - 1e-9) return 'sealant'
  return rows === 1 || endLap >= leastEndLap(slope) - 1e-9 ? 'yes' : 'no'
}

/** The verdict on the laps, as an output. */
export const lapsOutput: CalculatorOutput = {
  name: 'lapsHold',
  label: 'Laps at this slope',
  quantity: 'choice',
  choices: [
    { value: 'yes', label: 'Long enough' },
    { value: 'no', label: 'End lap too short' },
    { value: 'sealant', label: 'Only with sealant' },
    { value: 'flat', label: 'Too flat to lap' },
  ],
}
