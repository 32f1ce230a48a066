export interface TapeStopMark {
  key: string
  name: string
  atMs: number
  state: 'to-do' | 'here' | 'done'
}
export interface TapeHindsightMark {
  id: number
  atMs: number
  text: string
}
export interface TapeQuestionMark {
  atMs: number
  count: number
  state: 'open' | 'settled'
}

export type TapeMark =
  | ({ kind: 'stop'; number: number } & TapeStopMark)
  | ({ kind: 'hindsight' } & TapeHindsightMark)
  | ({ kind: 'question'; isHere: boolean } & TapeQuestionMark)

/** All marks in the order of time, which is the order of the Tab key. */
export function orderMarks(
  stops: readonly TapeStopMark[],
  hindsight: readonly TapeHindsightMark[],
  questions: readonly TapeQuestionMark[],
  positionMs: number,
): TapeMark[] {
  const ordered = [...stops].sort((a, b) => a.atMs - b.atMs)
  return [
    ...ordered.map((stop, index) => ({ kind: 'stop' as const, number: index + 1, ...stop })),
    ...hindsight.map((note) => ({ kind: 'hindsight' as const, ...note })),
    ...questions.map((flag) => ({
      kind: 'question' as const,
      isHere: Math.abs(flag.atMs - positionMs) < 5000,
      ...flag,
    })),
  ].sort((a, b) => a.atMs - b.atMs)
}
