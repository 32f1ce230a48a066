import { describe, expect, it } from 'vitest'
import {
  answersInWords,
  presenceWords,
  stateWords,
  timeAgo,
  writerWords,
  writingWords,
} from '../../../../src/components/fence/fenceWords'

const people = (...names: string[]) => names.map((name, index) => ({ id: index + 1, name }))

describe('presenceWords', () => {
  it.each([
    [people('Petra', 'Anke', 'Sunil'), 3, null, 'Petra, Anke and Sunil are at this lesson now.'],
    [people('Jo'), 1, 1, ''],
    [people('Jo', 'Anke'), 2, 1, 'Anke is at this lesson now.'],
    [people('Jo', 'Anke', 'Sunil'), 3, 1, 'Anke and Sunil are at this lesson now.'],
    [people('Jo', 'Anke'), 5, 1, 'Anke and 3 more are at this lesson now.'],
    [people('Jo'), 2, 1, '1 more is at this lesson now.'],
    [people('Jo'), 2, null, 'Jo is at this lesson now.'],
    [[], 1, null, ''],
  ])('%j of %s, read by %s', (here, count, meId, words) => {
    expect(presenceWords(here, count, meId)).toContain(words)
    if (!words) expect(presenceWords(here, count, meId)).toBe('')
  })
})

describe('timeAgo', () => {
  const now = new Date(2026, 11, 1, 12, 0)
  it.each([
    [new Date(2026, 11, 1, 11, 59, 40), 'just now'],
    [new Date(2026, 11, 1, 11, 59), '1 minute ago'],
    [new Date(2026, 11, 1, 11, 20), '40 minutes ago'],
    [new Date(2026, 11, 1, 7, 40), 'today 7:40'],
    [new Date(2026, 10, 30, 7, 40), 'yesterday 7:40'],
    [new Date(2026, 4, 12, 7, 40), '12 May'],
  ])('%s is %s', (then, words) => {
    expect(timeAgo(then.toISOString(), now)).toBe(words)
  })
})

describe('states, writers and counts in words', () => {
  it('says the state of a question', () => {
    expect(stateWords({ state: 'open', answerCount: 0 }).words).toBe('Open, no answer')
    expect(stateWords({ state: 'open', answerCount: 2 }).words).toBe('Answered, open')
    expect(stateWords({ state: 'settled', answerCount: 2 }).words).toBe('Settled')
  })
  it('says who wrote and who writes', () => {
    expect(writerWords({ id: 1, name: 'Petra', place: 'helper' })).toBe('Petra, helper')
    expect(writerWords({ id: 2, name: 'Maren', place: 'owner' })).toBe('Maren, who drew this sheet')
    expect(writingWords(people('Anke'))).toBe('Anke is writing')
    expect(writingWords(people('Anke', 'Jo'))).toBe('Anke and Jo are writing')
  })
  it('counts answers', () => {
    expect(answersInWords(0)).toBe('No answer yet')
    expect(answersInWords(1)).toBe('One answer')
    expect(answersInWords(12)).toBe('12 answers')
  })
})
