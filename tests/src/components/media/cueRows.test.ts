import { describe, expect, it } from 'vitest'
import { errorsByRow, readRows, rowBetween, toRow } from '../../../../src/components/media/cueRows'

const row = (startMs: number, endMs: number, text = 'Words.') =>
  toRow({ cueId: '', settings: '', startMs, endMs, text })

describe('readRows', () => {
  it('gives the captions as they are to be kept, with their names and settings', () => {
    const cue = { cueId: 'one', settings: 'line:0', startMs: 1000, endMs: 2000, text: 'Words.' }
    expect(readRows([toRow(cue)])).toEqual({ ok: true, cues: [cue] })
  })
  it('puts a time that cannot be read to its own field and row', () => {
    const first = row(0, 1000)
    const second = { ...row(2000, 3000), end: 'soon' }
    const read = readRows([first, second])
    expect(read.ok).toBe(false)
    if (read.ok) return
    expect([...read.errors.keys()]).toEqual([second.id])
    expect(read.errors.get(second.id)?.end).toContain('minutes and seconds')
  })
  it.each([
    ['end', [row(2000, 1000)]],
    ['text', [row(0, 1000, '  ')]],
    ['start', [row(5000, 6000), row(1000, 2000)]],
  ])('names the %s that keeps a list from being saved', (field, rows) => {
    const read = readRows(rows)
    if (read.ok) throw new Error('expected a refusal')
    expect(Object.keys(read.errors.get(rows.at(-1)!.id) ?? {})).toEqual([field])
  })
})

describe('rowBetween', () => {
  it('stands between its neighbours, no longer than there is room', () => {
    const before = row(0, 1000)
    const after = row(2000, 3000)
    const added = rowBetween(before, after)
    expect(added.start).toBeGreaterThan(1000)
    expect(added.end).toBeLessThan(2000)
    expect(readRows([before, { ...added, text: 'New.' }, after]).ok).toBe(true)
  })
  it('comes first where there is nothing before it', () => {
    expect(rowBetween(undefined, undefined)).toMatchObject({ start: 0, end: 2000, text: '' })
  })
})

describe('errorsByRow', () => {
  it('finds the row of an error of the server', () => {
    const rows = [row(0, 1000), row(1000, 2000)]
    const errors = errorsByRow(rows, [{ field: 'cues.1.text', message: 'Too long.' }])
    expect(errors.get(rows[1]!.id)).toEqual({ text: 'Too long.' })
  })
})
