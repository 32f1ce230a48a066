import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Interval } from '../../../shared/contracts/progress'
import {
  clampIntervals,
  coverageOf,
  isWatchedThrough,
  measureIntervals,
  mergeIntervals,
} from '../../../shared/progress/intervals'

const length = 200
const intervalsOf = fc.array(
  fc
    .tuple(fc.nat(length), fc.nat(length))
    .map(([a, b]): Interval => [Math.min(a, b), Math.max(a, b)]),
  { maxLength: 30 },
)

/** The same question asked the slow way: which milliseconds were seen. */
function seen(intervals: readonly Interval[]): Set<number> {
  const moments = new Set<number>()
  for (const [start, end] of intervals) for (let at = start; at < end; at++) moments.add(at)
  return moments
}

describe('mergeIntervals', () => {
  it.each<[string, Interval[], Interval[]]>([
    ['nothing', [], []],
    ['an empty stretch', [[5, 5]], []],
    ['a stretch the wrong way round', [[9, 4]], []],
    [
      'two apart',
      [
        [10, 20],
        [0, 5],
      ],
      [
        [0, 5],
        [10, 20],
      ],
    ],
    [
      'two that touch',
      [
        [0, 5],
        [5, 9],
      ],
      [[0, 9]],
    ],
    [
      'two a millisecond apart',
      [
        [0, 5],
        [6, 9],
      ],
      [
        [0, 5],
        [6, 9],
      ],
    ],
    [
      'one within another',
      [
        [0, 50],
        [10, 20],
      ],
      [[0, 50]],
    ],
    [
      'a bridge over a gap',
      [
        [0, 5],
        [8, 12],
        [4, 9],
      ],
      [[0, 12]],
    ],
  ])('merges %s', (_name, given, expected) => {
    expect(mergeIntervals(given)).toEqual(expected)
  })

  it('covers exactly the moments that any list covers', () => {
    fc.assert(
      fc.property(intervalsOf, intervalsOf, (a, b) => {
        expect(seen(mergeIntervals(a, b))).toEqual(new Set([...seen(a), ...seen(b)]))
      }),
    )
  })

  it('changes nothing when merged again', () => {
    fc.assert(
      fc.property(intervalsOf, (a) => {
        const once = mergeIntervals(a)
        expect(mergeIntervals(once)).toEqual(once)
        expect(mergeIntervals(once, a)).toEqual(once)
      }),
    )
  })

  it('gives the same whatever comes first', () => {
    fc.assert(
      fc.property(intervalsOf, intervalsOf, intervalsOf, (a, b, c) => {
        const all = mergeIntervals(a, b, c)
        expect(mergeIntervals(c, a, b)).toEqual(all)
        expect(mergeIntervals(mergeIntervals(c, b), a)).toEqual(all)
      }),
    )
  })

  it('leaves stretches in order with a gap between each two', () => {
    fc.assert(
      fc.property(intervalsOf, (a) => {
        const merged = mergeIntervals(a)
        merged
          .slice(1)
          .forEach(([start], index) => expect(start).toBeGreaterThan(merged[index]![1]))
      }),
    )
  })

  it('leaves what it was given as it was', () => {
    const given: Interval[] = [
      [0, 5],
      [4, 9],
    ]
    mergeIntervals(given)
    expect(given).toEqual([
      [0, 5],
      [4, 9],
    ])
  })
})

describe('clampIntervals', () => {
  it('keeps only what lies within the video', () => {
    fc.assert(
      fc.property(intervalsOf, fc.nat(length), (a, durationMs) => {
        const expected = new Set([...seen(a)].filter((at) => at < durationMs))
        expect(seen(clampIntervals(a, durationMs))).toEqual(expected)
      }),
    )
  })
})

describe('measureIntervals', () => {
  it('counts each moment once', () => {
    fc.assert(fc.property(intervalsOf, (a) => measureIntervals(a) === seen(a).size))
  })
})

describe('coverageOf and isWatchedThrough', () => {
  it.each<[Interval[], number, number, boolean]>([
    [[], 100, 0, false],
    [[[0, 89]], 100, 0.89, false],
    [[[0, 90]], 100, 0.9, true],
    [
      [
        [0, 50],
        [60, 100],
      ],
      100,
      0.9,
      true,
    ],
    [
      [
        [0, 50],
        [0, 50],
      ],
      100,
      0.5,
      false,
    ],
    [[[0, 500]], 100, 1, true],
    [[[0, 10]], 0, 0, false],
  ])('of %j in %i ms is %d', (intervals, durationMs, coverage, isThrough) => {
    expect(coverageOf(intervals, durationMs)).toBeCloseTo(coverage, 12)
    expect(isWatchedThrough(intervals, durationMs)).toBe(isThrough)
  })

  it('never grows by a jump: only stretches count', () => {
    expect(
      coverageOf(
        [
          [0, 1],
          [99_999, 100_000],
        ],
        100_000,
      ),
    ).toBeCloseTo(0.00002, 12)
  })
})
