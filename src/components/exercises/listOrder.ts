/** A list with one row moved by a place; the same list where there is no such place. */
export function moveRow<T>(rows: readonly T[], index: number, by: -1 | 1): T[] {
  const row = rows[index]
  const target = index + by
  if (row === undefined || target < 0 || target >= rows.length) return [...rows]
  return rows.toSpliced(index, 1).toSpliced(target, 0, row)
}

/** A list with a part of one row changed. */
export const changeRow = <T extends object>(
  rows: readonly T[],
  index: number,
  part: Partial<T>,
): T[] => rows.map((row, at) => (at === index ? { ...row, ...part } : row))

const letters = Array.from('abcdefghijklmnopqrstuvwxyz')

/** The first letter that no row has as its id. */
export const freeId = (rows: readonly { id: string }[]): string =>
  letters.find((letter) => !rows.some(({ id }) => id === letter)) ?? crypto.randomUUID().slice(0, 8)
