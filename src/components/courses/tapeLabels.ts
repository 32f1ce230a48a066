/** Where the label of a stop stands, so that none runs into the next or off the end of the tape. */
export interface TapeLabel {
  /** Only the number is shown. */
  isShort: boolean
  /** How far its left edge stands left of the stop, in pixels. */
  overhang: number
}
interface LabelledStop {
  key: string
  name: string
  atMs: number
}

/** Left of the stem, as drawn. */
const overhang = 14
const shortWidth = 44
const gap = 8
/** The labels may stand over the end of the tape by this much. */
const pastEnd = 10
const letterWidth = 7.6
const frameWidth = 44

/** Labels of the stops of a tape `width` pixels long, by key. */
export function placeLabels(
  stops: readonly LabelledStop[],
  durationMs: number,
  width: number,
): Map<string, TapeLabel> {
  const placed = new Map<string, TapeLabel>()
  if (!width || !durationMs) return placed
  const inOrder = [...stops].sort((a, b) => b.atMs - a.atMs)
  let limit = width + pastEnd
  for (const { key, name, atMs } of inOrder) {
    const x = (atMs / durationMs) * width
    const full = frameWidth + name.length * letterWidth
    const isFirst = limit > width
    const isShort = isFirst ? x > limit : x - overhang + full + gap > limit
    const labelWidth = isShort ? shortWidth : full
    const left = Math.min(x - overhang, limit - labelWidth - (isFirst ? 0 : gap))
    placed.set(key, { isShort, overhang: x - left })
    limit = left
  }
  return placed
}
