/** Widths of Nunito's letters in thousandths of their height, at the heaviest weight used in a drawing. */
const WIDTHS: readonly (readonly [letters: string, width: number])[] = [
  ["'.,:ij", 270],
  [' \u00a0\u202f', 280],
  ['I/l', 330],
  ['J°f³²tr-', 420],
  ['?"czs–', 500],
  ['vye≤akxFL', 570],
  ['hnou0123456789−×E=bdgpqZ', 610],
  ['TYSPCXBKRV', 730],
  ['GUANDHOQ', 800],
  ['wMm%', 930],
]
const OTHER = 700

const widthOf = new Map(
  WIDTHS.flatMap(([letters, width]) =>
    Array.from(letters).map((letter) => [letter, width] as const),
  ),
)

/** Width of a label in pixels at a height in pixels, a little generous, so that boxes can be kept apart. */
export function measureText(text: string, size: number): number {
  const thousandths = Array.from(text).reduce(
    (sum, letter) => sum + (widthOf.get(letter) ?? OTHER),
    0,
  )
  return (thousandths * size) / 1000
}
