/** One problem of a file of one-dimensional bin packing in the OR-Library's text format. */
export interface PackingFileProblem {
  id: string
  /** All lengths times the same power of ten, so that decimals become whole numbers. */
  capacity: number
  lengths: number[]
  bestKnown: number
}

const decimalsOf = (text: string) => text.split('.')[1]?.length ?? 0

/**
 * Reads the OR-Library's format: the number of problems, then for each an identifier beginning with u or t, a line
 * `capacity items best-known`, and one length a line. Throws with the line at which the file is something else.
 */
export function readPackingFile(text: string): PackingFileProblem[] {
  const lines = text.split('\n').map((line) => line.trim())
  let next = 0
  const takeLine = () => {
    while (lines[next] === '') next++
    const line = lines[next++]
    if (line === undefined) throw new Error('The file ends before its last problem does.')
    return line
  }
  const takeNumbers = (count: number) => {
    const words = takeLine().split(/\s+/)
    if (words.length !== count || words.some((word) => !/^\d+(\.\d+)?$/.test(word))) {
      throw new Error(
        `Line ${next} is “${words.join(' ')}”; expected there: ${count} plain numbers.`,
      )
    }
    return words
  }
  const takeProblem = (): PackingFileProblem => {
    const id = takeLine()
    if (!/^[ut]\S*$/.test(id)) {
      throw new Error(
        `Line ${next} is “${id}”; an identifier beginning with u or t is expected there.`,
      )
    }
    const [capacity = '', items, bestKnown] = takeNumbers(3)
    const lengths = Array.from({ length: Number(items) }, () => takeNumbers(1)[0] ?? '')
    const factor = 10 ** Math.max(...[capacity, ...lengths].map(decimalsOf))
    const whole = (word: string) => Math.round(Number(word) * factor)
    return {
      id,
      capacity: whole(capacity),
      lengths: lengths.map(whole),
      bestKnown: Number(bestKnown),
    }
  }
  return Array.from({ length: Number(takeNumbers(1)[0]) }, takeProblem)
}
