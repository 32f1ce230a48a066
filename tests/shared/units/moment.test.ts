import fc from 'fast-check'
import { describe, expect, it, vi } from 'vitest'
import {
  countOf,
  formatClock,
  formatDay,
  formatDuration,
  formatMoment,
} from '../../../shared/units/moment'

describe('formatDay', () => {
  it('reads as the platform writes the same day in British English', () => {
    const days = fc.date({
      min: new Date(2000, 0, 1),
      max: new Date(2040, 11, 31),
      noInvalidDate: true,
    })
    fc.assert(
      fc.property(days, (date) => {
        const isThisYear = date.getFullYear() === new Date().getFullYear()
        const year = isThisYear ? {} : { year: 'numeric' as const }
        const expected = date.toLocaleDateString('en-GB', {
          day: 'numeric',
          month: 'long',
          ...year,
        })
        expect(formatDay(date.toISOString())).toBe(expected)
      }),
    )
  })

  it('names the year only when it is another one', () => {
    vi.useFakeTimers({ now: new Date(2026, 4, 20) })
    expect(formatDay(new Date(2026, 4, 12).toISOString())).toBe('12 May')
    expect(formatDay(new Date(2025, 4, 12).toISOString())).toBe('12 May 2025')
    vi.useRealTimers()
  })
})

describe('moments and lengths of time', () => {
  it.each([
    [0, '0:00'],
    [380_000, '6:20'],
    [59_999, '0:59'],
    [3_600_000, '1:00:00'],
    [3_725_500, '1:02:05'],
  ])('%i ms is at %s', (ms, text) => expect(formatMoment(ms)).toBe(text))

  it.each([
    [1000, '1 min'],
    [37 * 60_000, '37 min'],
    [209 * 60_000, '3 h 29 min'],
  ])('%i ms lasts %s', (ms, text) => expect(formatDuration(ms)).toBe(text))

  it('tells the time of day with two figures each', () => {
    expect(formatClock(new Date(2026, 4, 12, 8, 5))).toBe('08:05')
    expect(formatClock(new Date(2026, 4, 12, 15, 45, 59))).toBe('15:45')
  })

  it('counts one and many', () => {
    expect([countOf(1, 'lesson'), countOf(0, 'lesson'), countOf(2, 'try', 'tries')]).toEqual([
      '1 lesson',
      '0 lessons',
      '2 tries',
    ])
  })
})
