import { findCueProblems } from '../../../shared/captions/check'
import type { Cue } from '../../../shared/contracts/media'
import { momentHelp, type Typed } from './typedMoment'

/** A caption while it is edited; a time that cannot be read stays as it was typed. */
export interface CueRow {
  /** Of this row on this page alone. */
  id: number
  cueId: string
  settings: string
  start: Typed
  end: Typed
  text: string
}

export type CueErrors = Partial<Record<'start' | 'end' | 'text', string>>

let lastId = 0

export const toRow = ({ startMs, endMs, ...rest }: Cue): CueRow => ({
  ...rest,
  id: ++lastId,
  start: startMs,
  end: endMs,
})

/** A row that was kept on the device, with an id of this page. */
export const renewRow = (row: CueRow): CueRow => ({ ...row, id: ++lastId })

const newCueMs = 2000
const betweenMs = 83

/** An empty caption after `before`, ending where `after` begins if that is sooner. */
export function rowBetween(before: CueRow | undefined, after: CueRow | undefined): CueRow {
  const end = typeof before?.end === 'number' ? before.end : 0
  const startMs = before ? end + betweenMs : 0
  const next = typeof after?.start === 'number' ? after.start - betweenMs : Infinity
  const endMs = next > startMs ? Math.min(startMs + newCueMs, next) : startMs + newCueMs
  return toRow({ cueId: '', settings: '', text: '', startMs, endMs })
}

const fieldNames: Record<string, keyof CueErrors> = {
  startMs: 'start',
  endMs: 'end',
  text: 'text',
  cueId: 'text',
  settings: 'text',
}

/** Errors by field such as `12.endMs`, put to the rows they belong to. */
export function errorsByRow(
  rows: readonly CueRow[],
  problems: readonly { field: string; message: string }[],
): Map<number, CueErrors> {
  const errors = new Map<number, CueErrors>()
  for (const { field, message } of problems) {
    const [index = '', name = ''] = field.replace(/^cues\./, '').split('.')
    const row = rows[Number(index)]
    const at = fieldNames[name]
    if (row && at) errors.set(row.id, { [at]: message, ...errors.get(row.id) })
  }
  return errors
}

/** The rows as captions to be kept, or what keeps them from it. */
export function readRows(
  rows: readonly CueRow[],
): { ok: true; cues: Cue[] } | { ok: false; errors: Map<number, CueErrors> } {
  const unread = rows.flatMap(({ start, end }, index) => [
    ...(typeof start === 'number' ? [] : [{ field: `${index}.startMs`, message: momentHelp }]),
    ...(typeof end === 'number' ? [] : [{ field: `${index}.endMs`, message: momentHelp }]),
  ])
  const cues = rows.map(({ cueId, settings, text, start, end }) => ({
    ...{ cueId, settings, text },
    startMs: typeof start === 'number' ? start : 0,
    endMs: typeof end === 'number' ? end : 0,
  }))
  const problems = unread.length > 0 ? unread : findCueProblems(cues)
  return problems.length > 0
    ? { ok: false, errors: errorsByRow(rows, problems) }
    : { ok: true, cues }
}
