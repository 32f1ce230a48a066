/**
 * Steps in a millimetre. One step is 0.00625 mm (1/4064 in), the longest length of which both a tenth of a
 * millimetre (16 steps) and a thirty-second of an inch (127 steps) are whole numbers, so that lists in either
 * system, or in both at once, are packed in whole numbers.
 */
const stepsInMm = 160
/** Closer than this to a whole step is a whole step: what is left of converting units. */
const roundingSteps = 1e-3

/** Whole steps of a part, a kerf or a trim; what lies between two steps goes up, so that room is never promised. */
export function stepsUp(lengthMm: number): number {
  // Adding 0 makes 0 of −0.
  return Math.ceil(lengthMm * stepsInMm - roundingSteps) + 0
}

/** Whole steps of a bar; what lies between two steps goes down, so that room is never promised. */
export function stepsDown(lengthMm: number): number {
  return Math.floor(lengthMm * stepsInMm + roundingSteps)
}

/** Millimetres of so many steps. */
export const stepsToMm = (steps: number): number => steps / stepsInMm

/** The largest whole number that divides all of them; 0 of none. */
export function commonDivisor(numbers: readonly number[]): number {
  return numbers.reduce((divisor, number) => {
    let [larger, smaller] = [divisor, number]
    while (smaller > 0) [larger, smaller] = [smaller, larger % smaller]
    return larger
  }, 0)
}
