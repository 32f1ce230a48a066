const UNIT = 300
/** The sides of the triangle in millimetres. */
export const [SHORT, LONG, ACROSS] = [3 * UNIT, 4 * UNIT, 5 * UNIT] as const
/** Leans are too small to see at their own scale; the drawing says so. */
export const LARGER = 6
