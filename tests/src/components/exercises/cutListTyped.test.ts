import { describe, expect, it } from 'vitest'
import { cutListAtOnce } from '../../../../shared/cutlist/solveCutList'
import { initialCutList } from '../../../../src/components/exercises/cutListInitial'
import { readCutList } from '../../../../src/components/exercises/cutListReading'
import {
  isShownRounded,
  isUntouched,
  rowOf,
  showTyped,
} from '../../../../src/components/exercises/cutListTyped'

describe('what is typed into a cut list', () => {
  it.each([
    ['895', 'metric', 'imperial', `2' 11-1/4"`],
    ['2.4 m', 'metric', 'imperial', `7' 10-1/2"`],
    [`7' 10-1/2"`, 'imperial', 'metric', '2400'],
    ['1/8', 'imperial', 'metric', '3.2'],
    ['long', 'metric', 'imperial', 'long'],
    ['', 'metric', 'imperial', ''],
  ] as const)('shows the length %s of %s in %s as %s', (text, system, to, shown) => {
    expect(showTyped({ text, system }, 'length', to)).toBe(shown)
    expect(showTyped({ text, system }, 'length', system)).toBe(text)
  })

  it('shows a known section by the other name, and any other as it was typed', () => {
    expect(showTyped({ text: '2x4', system: 'imperial' }, 'section', 'metric')).toBe('38×89')
    expect(showTyped({ text: '38 x 89', system: 'metric' }, 'section', 'imperial')).toBe('2x4')
    expect(showTyped({ text: 'Round 75', system: 'metric' }, 'section', 'imperial')).toBe(
      'Round 75',
    )
  })

  it('leaves words, counts and prices alone', () => {
    for (const kind of ['words', 'count', 'money'] as const) {
      expect(showTyped({ text: '12', system: 'metric' }, kind, 'imperial')).toBe('12')
    }
  })

  it('asks nothing of a line that was only added', () => {
    expect(isUntouched(rowOf('parts', 'a', ['', '', '1', '38×89'], 'metric'), 'parts')).toBe(true)
    expect(isUntouched(rowOf('parts', 'a', ['Slat', '', '1'], 'metric'), 'parts')).toBe(false)
    expect(isUntouched(rowOf('stock', 'a', ['38×89'], 'metric'), 'stock')).toBe(true)
  })

  it.each([
    ['35-3/4', 'imperial', false],
    ['35-23/32', 'imperial', true],
    ['895.5', 'metric', false],
    ['895.55', 'metric', true],
  ] as const)('knows that %s in %s is shown rounded: %s', (text, system, rounded) => {
    const list = { ...initialCutList(system), endTrim: { text, system } }
    expect(isShownRounded(list, system)).toBe(rounded)
  })

  it.each(['metric', 'imperial'] as const)('starts from a list that can be cut, %s', (system) => {
    const list = initialCutList(system)
    expect(isShownRounded(list, system)).toBe(false)
    const { request, errors } = readCutList(list, system)
    expect(errors).toEqual({})
    expect(request?.parts[0]?.section).toBe('89×89')
    // Proved at once, so that nothing heavy is fetched for those who only look.
    expect(request && cutListAtOnce(request)?.proof).toBe('optimal')
  })
})
