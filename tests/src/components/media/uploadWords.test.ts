import { describe, expect, it } from 'vitest'
import { showAmount, showTimeLeft } from '../../../../src/components/media/uploadWords'

describe('showAmount', () => {
  it.each([
    [1.2e9, 1.9e9, '1.2 of 1.9 GB'],
    [7e6, 94e6, '7 of 94 MB'],
    [0, 307_409, '0 of 307 kB'],
    [10e6, 2e9, '0.0 of 2.0 GB'],
  ])('says %i of %i', (sent, all, words) => {
    expect(showAmount(sent, all)).toBe(words)
  })
})

describe('showTimeLeft', () => {
  it('says nothing before the speed is known', () => {
    expect(showTimeLeft(1e9, 1e6, 2000)).toBe('')
    expect(showTimeLeft(1e9, 0, 60_000)).toBe('')
  })
  it.each([
    [10e6, 10e6, 10_000, 'less than a minute left'],
    [60e6, 10e6, 10_000, 'about one minute left'],
    [360e6, 10e6, 10_000, 'about six minutes left'],
    [1200e6, 10e6, 10_000, 'about 20 minutes left'],
    [7200e6, 10e6, 10_000, 'about two hours left'],
  ])('with %i left, %i moved in %i ms', (left, moved, ms, words) => {
    expect(showTimeLeft(left, moved, ms)).toBe(words)
  })
})
