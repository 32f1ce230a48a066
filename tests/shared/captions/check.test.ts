import { describe, expect, it } from 'vitest'
import { findCueProblems } from '../../../shared/captions/check'
import type { Cue } from '../../../shared/contracts/media'

const cue = (values: Partial<Cue> = {}): Cue => ({
  cueId: '',
  startMs: 1000,
  endMs: 3000,
  settings: '',
  text: 'Set the string.',
  ...values,
})

describe('findCueProblems', () => {
  it('finds nothing in captions that are in order', () => {
    expect(
      findCueProblems([cue(), cue({ startMs: 1000 }), cue({ settings: 'align:start' })]),
    ).toEqual([])
  })

  it.each([
    ['an end at its start', [cue({ endMs: 1000 })], '0.endMs'],
    ['an end after a day', [cue({ endMs: 86_400_001 })], '0.endMs'],
    ['times that go back', [cue(), cue({ startMs: 999 })], '1.startMs'],
    ['nothing but blanks', [cue({ text: ' \n ' })], '0.text'],
    ['nothing but tags', [cue({ text: '<b></b>' })], '0.text'],
    ['a name with an arrow', [cue({ cueId: 'a --> b' })], '0.cueId'],
    ['a name that begins a comment', [cue({ cueId: 'NOTE x' })], '0.cueId'],
    ['settings that are none', [cue({ settings: 'colour:red' })], '0.settings'],
    ['settings that begin another line', [cue({ settings: 'align:start\nx' })], '0.settings'],
  ])('names the field of %s', (_what, cues, field) => {
    expect(findCueProblems(cues).map((problem) => problem.field)).toEqual([field])
  })
})
