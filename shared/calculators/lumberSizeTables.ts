/** Metres in an inch. */
export const INCH = 0.0254

/** A named size in inches. */
export interface Nominal {
  thickness: number
  width: number
}

/** Named and dressed sizes in inches: dry, green. */
type Dressed = Readonly<Record<number, readonly [dry: number, green: number]>>

/** Boards, thinner than a named 2 in. Green figures are from memory. */
const BOARD_THICKNESS: Dressed = {
  0.375: [5 / 16, 11 / 32],
  0.5: [7 / 16, 15 / 32],
  1: [3 / 4, 25 / 32],
  1.25: [1, 1 + 1 / 32],
  1.5: [1.25, 1 + 9 / 32],
}
/** Dimension lumber, named 2 to under 5 in. Green figures beyond 2 in are from memory. */
const DIMENSION_THICKNESS: Dressed = {
  2: [1.5, 1 + 9 / 16],
  3: [2.5, 2 + 9 / 16],
  3.5: [3, 3 + 1 / 16],
  4: [3.5, 3 + 9 / 16],
}
/** Widths of boards and dimension lumber; green 3 to 6 in are from memory. */
const NARROW_WIDTH: Dressed = {
  2: [1.5, 1 + 9 / 16],
  3: [2.5, 2 + 9 / 16],
  4: [3.5, 3 + 9 / 16],
  5: [4.5, 4 + 5 / 8],
  6: [5.5, 5 + 5 / 8],
  7: [6.5, 6 + 5 / 8],
}

/** Thinnest side of a timber by its name, in inches. */
const TIMBER = 5

/** From 8 in on boards and dimension lumber lose three quarters dry, half an inch green. */
function dressedWidth(nominal: number, isGreen: boolean): number {
  const narrow = NARROW_WIDTH[nominal]
  if (narrow) return narrow[isGreen ? 1 : 0]
  return nominal - (isGreen ? 1 / 2 : 3 / 4)
}

/** Timbers lose half an inch green; dry 1/2 in to 6 in, 3/4 in to 15 in, 1 in beyond. */
function dressedTimber(nominal: number, isGreen: boolean): number {
  if (isGreen || nominal < 7) return nominal - 1 / 2
  return nominal - (nominal < 16 ? 3 / 4 : 1)
}

/** What a named size measures, in inches. */
export function dressedSize({ thickness, width }: Nominal, isGreen: boolean): Nominal {
  if (thickness >= TIMBER) {
    return { thickness: dressedTimber(thickness, isGreen), width: dressedTimber(width, isGreen) }
  }
  const table = thickness < 2 ? BOARD_THICKNESS : DIMENSION_THICKNESS
  const row = table[thickness]
  if (!row) throw new Error(`No dressed size for ${String(thickness)} in`)
  return { thickness: row[isGreen ? 1 : 0], width: dressedWidth(width, isGreen) }
}

/** Named thickness as board feet count it: never under an inch. */
export const countedThickness = ({ thickness }: Nominal): number => Math.max(1, thickness)

/** Widths in inches by named thickness, as yards keep them. */
const SIZES: readonly (readonly [thickness: string, widths: readonly number[]])[] = [
  ['3/8', [4, 6]],
  ['1/2', [4, 6]],
  ['1', [2, 3, 4, 5, 6, 7, 8, 9, 10, 12, 14]],
  ['5/4', [3, 4, 5, 6, 8, 10, 12]],
  ['6/4', [4, 6, 8, 10, 12]],
  ['2', [2, 3, 4, 5, 6, 8, 10, 12, 14, 16]],
  ['3', [3, 4, 6, 8, 10, 12]],
  ['4', [4, 5, 6, 8, 10, 12, 14, 16]],
  ['5', [5]],
  ['6', [6, 8, 10, 12, 14, 16]],
  ['8', [8, 10, 12, 14, 16]],
]

/** Every named size to choose from: value `2x4`, shown as 2 × 4. */
export const nominalChoices = SIZES.flatMap(([thickness, widths]) =>
  widths.map((width) => ({
    value: `${thickness}x${String(width)}`,
    label: `${thickness} × ${String(width)}`,
  })),
)

/** Reads a named size such as `2x4` or `5/4x6`; the quarters of thick boards are inches. */
export function readNominal(name: string): Nominal {
  const [thickness = '', width = ''] = name.split('x')
  const [over = '', under = '1'] = thickness.split('/')
  return { thickness: Number(over) / Number(under), width: Number(width) }
}
