import { describe, expect, it } from 'vitest'
import { lintCue } from '../../../shared/captions/lint'

// Limits as printed in the guides that the module names.
const at = (startMs: number, endMs: number, text: string) => ({ startMs, endMs, text })
const characters = (count: number) => 'x'.repeat(count)

describe('lintCue', () => {
  it.each([
    [37, null],
    [38, /up to 37/],
    [42, /up to 37/],
    [43, /more than 42/],
  ])('judges a line of %i characters', (count, message) => {
    const marks = lintCue(at(0, 5000, characters(count)))
    if (message) expect(marks).toEqual([expect.stringMatching(message)])
    else expect(marks).toEqual([])
  })

  it.each([
    [17, null],
    [18, /up to 17/],
    [20, /up to 17/],
    [21, /more than 20/],
  ])('judges %i characters a second', (count, message) => {
    const marks = lintCue(at(0, 2000, `${characters(count)}\n${characters(count - 1)}`))
    if (message) expect(marks).toEqual([expect.stringMatching(message)])
    else expect(marks).toEqual([])
  })

  it.each([
    [832, /gone before/],
    [833, /a second is better/],
    [999, /a second is better/],
    [1000, null],
    [6000, null],
    [6001, /is better/],
    [7000, /is better/],
    [7001, /Make two/],
  ])('judges a caption that stands for %i ms', (ms, message) => {
    const marks = lintCue(at(0, ms, 'Hold it'))
    if (message) expect(marks).toEqual([expect.stringMatching(message)])
    else expect(marks).toEqual([])
  })

  it.each([
    [-1, /still stands/],
    [0, null],
    [1, /flickers/],
    [82, /flickers/],
    [83, null],
  ])('judges a gap of %i ms', (gapMs, message) => {
    const marks = lintCue(at(0, 3000, 'Hold it'), at(3000 + gapMs, 9000, 'Now'))
    if (message) expect(marks).toEqual([expect.stringMatching(message)])
    else expect(marks).toEqual([])
  })

  it('counts words a minute and lines', () => {
    const tooFast = 'a b c d e f g h i'
    expect(lintCue(at(0, 3000, tooFast))).toEqual([expect.stringMatching(/180 words a minute/)])
    expect(lintCue(at(0, 5000, 'one\ntwo\nthree'))).toEqual([expect.stringMatching(/3 lines/)])
  })

  it('does not count tags', () => {
    expect(lintCue(at(0, 5000, `<v Maren Tolley>${characters(37)}</v>`))).toEqual([])
  })
})
