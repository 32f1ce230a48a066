import { describe, expect, it } from 'vitest'
import { readTypedMoment, showTypedMoment } from '../../../../src/components/media/typedMoment'

describe('readTypedMoment', () => {
  it.each([
    ['6:20', 380_000],
    ['6:20.5', 380_500],
    ['6:20,5', 380_500],
    ['0:05.077', 5077],
    ['75', 75_000],
    ['1:02:03', 3_723_000],
    ['99:59.9', 5_999_900],
  ])('reads %s', (text, ms) => {
    expect(readTypedMoment(text)).toBe(ms)
  })
  it.each(['', 'soon', '6:60', '1:60:00', '-1', '6:20.1234', '6.20:1', '1e3'])(
    'refuses %j',
    (text) => {
      expect(readTypedMoment(text)).toBeUndefined()
    },
  )
})

describe('showTypedMoment', () => {
  it.each([
    [0, '0:00.0'],
    [380_000, '6:20.0'],
    [5077, '0:05.077'],
    [59_999, '0:59.999'],
    [3_723_400, '62:03.4'],
  ])('shows %i', (ms, text) => {
    expect(showTypedMoment(ms)).toBe(text)
  })
  it('reads back what it shows, to the millisecond', () => {
    for (let ms = 0; ms < 200_000; ms += 977) {
      expect(readTypedMoment(showTypedMoment(ms))).toBe(ms)
    }
  })
})
