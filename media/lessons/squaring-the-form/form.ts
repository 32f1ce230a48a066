/** The inside of the form, in millimetres, and what follows from it. */
export const FORM = { length: 2600, width: 1100 }
const UNIT = 300
export const [SHORT, LONG, ACROSS] = [3 * UNIT, 4 * UNIT, 5 * UNIT] as const
/** Where the pegs stand along the boards; the far one of the short board is tapped. */
export const TAPPED = 960
export const PEGS = { long: [300, 1300, 2300], short: [160, TAPPED] }
/** Leans are too small to see at their own scale; the drawing says so. */
export const LARGER = 6
