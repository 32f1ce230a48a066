import type { Drawing } from '../../../../src/components/drawings/drawing'
import { labelsOverlap } from '../../../../src/components/drawings/marks'

/** Every label that touches another or leaves its sheet, in words. */
export function findFaults(drawing: Drawing): string[] {
  const { labels, width, height } = drawing
  const off = labels
    .filter((box) => box.left < 0 || box.top < 0 || box.right > width || box.bottom > height)
    .map((box) => `“${box.text}” leaves the sheet`)
  const pairs = labels.flatMap((box, index) =>
    labels
      .slice(index + 1)
      .filter((other) => labelsOverlap(box, other))
      .map((other) => `“${box.text}” touches “${other.text}”`),
  )
  return [...off, ...pairs]
}
