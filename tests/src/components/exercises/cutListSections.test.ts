import { describe, expect, it } from 'vitest'
import {
  nameSections,
  sectionOf,
  showSection,
} from '../../../../src/components/exercises/cutListSections'

describe('sections of a cut list', () => {
  // What the sizes measure dry: PS 20, American Softwood Lumber Standard, in whole millimetres.
  it.each([
    ['2x4', '38×89'],
    ['2 X 4', '38×89'],
    ['1 × 6', '19×140'],
    ['4x4', '89×89'],
    ['2x10', '38×235'],
    ['5/4x6', '25×140'],
    ['2"x4"', '38×89'],
  ])('takes %s in feet and inches for what it measures, %s', (text, section) => {
    expect(sectionOf(text, 'imperial')).toBe(section)
    expect(sectionOf(showSection(section, 'imperial'), 'imperial')).toBe(section)
  })

  it('leaves a size typed in millimetres what it says', () => {
    expect(sectionOf('2x4', 'metric')).toBe('2×4')
    expect(sectionOf('47 x 100', 'metric')).toBe('47×100')
    expect(showSection('47×100', 'imperial')).toBe('47×100')
  })

  it('takes any words, in capitals or not', () => {
    expect(sectionOf('  Round  75 ', 'metric')).toBe(sectionOf('round 75', 'imperial'))
    expect(sectionOf('', 'metric')).toBe('')
  })

  it('names them in a sentence as the reader does', () => {
    const parts = ['38×89', 'round 75', ''].map((section) => ({
      ...{ label: 'Rail', lengthMm: 900, count: 1, section },
    }))
    const sentence = 'The 38×89 stock you have is not enough for all its parts.'
    expect(nameSections(sentence, { parts }, 'imperial')).toBe(sentence.replace('38×89', '2x4'))
    expect(nameSections(sentence, { parts }, 'metric')).toBe(sentence)
  })
})
