import { invalid } from './errors'

/** The number a keyset cursor stands for, null on the first page; 400 for what was never given out. */
export function readCursor(cursor: string | undefined): number | null {
  if (cursor === undefined) return null
  if (/^\d{1,10}$/.test(cursor)) return Number(cursor)
  throw invalid([
    { field: 'cursor', message: 'Send the nextCursor of the page before, or leave it out.' },
  ])
}
