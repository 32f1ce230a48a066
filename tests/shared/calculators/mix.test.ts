import { describe, expect, it } from 'vitest'
import { findBag } from '../../../shared/calculators/bags'
import { RIGHT_SLUMP } from '../../../shared/calculators/slump'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases, given } from '../../reference/referenceCases'

const bag = { bag: '25 kg', waterAdded: '2.8 L' }
const classOf = (slump: string) => compute('mix', { ...bag, slump })['slumpClass']
const verdictOf = (texts: Record<string, string>) =>
  compute('mix', { bag: '25 kg', ...texts })['verdict']

describe('mix against the slump classes of EN 206', () => {
  it.each(findCases('mixConsistency', /^en206-S/))('$id: $expected mm ($source)', (one) => {
    const [least, most] = Array.isArray(one.expected) ? one.expected : []
    expect(classOf(`${String(least)} mm`)).toBe(one.inputs['class'])
    expect(classOf(most === null ? '300 mm' : `${String(most)} mm`)).toBe(one.inputs['class'])
  })

  it.each(findCases('mixConsistency', /^en206-classify/))('$id: $expected ($source)', (one) => {
    expect(classOf(`${String(given(one, 'slumpMm'))} mm`)).toBe(one.expected)
  })

  // EN 206 leaves gaps of 10 mm between its classes; EN 12350-2 reports to the nearest 10 mm (from memory), which closes them.
  it.each([
    ['0 mm', 'below-S1'],
    ['4.9 mm', 'below-S1'],
    ['5 mm', 'S1'],
    ['44 mm', 'S1'],
    ['45 mm', 'S2'],
    ['95 mm', 'S3'],
    ['154 mm', 'S3'],
    ['155 mm', 'S4'],
    ['215 mm', 'S5'],
  ])('a slump of %s is %s', (slump, expected) => {
    expect(classOf(slump)).toBe(expected)
  })
})

describe('mix against data sheets and tables', () => {
  it.each(findCases('mixConsistency', /^water-80lb-start/))('$id: $expected L ($source)', (one) => {
    const litres = computeNumber('mix', 'waterMin', { bag: '80 lb', waterAdded: '3 qt' }) * 1000
    expect(distance(one, litres)).toBeLessThanOrEqual(allowed(one))
  })

  it.each(findCases('mixConsistency', /^bag-target-slump/))(
    '$id: $expected in is right ($source)',
    (one) => {
      const inches = Array.isArray(one.expected) ? one.expected : []
      expect(inches).toHaveLength(2)
      for (const slump of inches)
        expect(verdictOf({ waterAdded: '2.8 L', slump: `${String(slump)} in` })).toBe('right')
    },
  )

  it.each(findCases('mixConsistency', /^tm-general-slump/))(
    '$id: $expected in is right ($source)',
    (one) => {
      expect(verdictOf({ waterAdded: '2.8 L', slump: `${String(one.expected)} in` })).toBe('right')
    },
  )

  // The table's upper end may be raised by 1 in (25 mm) where no vibrator is used: a hand-placed pad.
  it.each(findCases('mixConsistency', /^slump-range-pavements/))(
    '$id: $expected mm, 25 more by hand ($source)',
    (one) => {
      const [, most] = Array.isArray(one.expected) ? one.expected : []
      expect(RIGHT_SLUMP.most).toBe(Number(most) + 25)
    },
  )
})

describe('mix judges', () => {
  it.each([
    ['below the least', { waterAdded: '2.4 L' }, 'stiff'],
    ['the least', { waterAdded: '2.5 L' }, 'right'],
    ['the most', { waterAdded: '3 L' }, 'right'],
    ['above the most', { waterAdded: '3.01 L' }, 'wet'],
    ['damp sand: little water, good cone', { waterAdded: '2 L', slump: '70 mm' }, 'right'],
    ['little drop within the range', { waterAdded: '2.8 L', slump: '40 mm' }, 'stiff'],
    ['45 mm, reported as 50', { waterAdded: '2.8 L', slump: '45 mm' }, 'right'],
    ['104 mm, reported as 100', { waterAdded: '2.8 L', slump: '104 mm' }, 'right'],
    ['105 mm, reported as 110', { waterAdded: '2.8 L', slump: '105 mm' }, 'wet'],
    ['too much water, good cone', { waterAdded: '3.5 L', slump: '70 mm' }, 'wet'],
    [
      'the bag’s own range',
      { waterAdded: '3.5 L', bagWaterMin: '3 L', bagWaterMax: '4 L' },
      'right',
    ],
  ])('%s', (_case, texts, verdict) => {
    expect(verdictOf(texts as Record<string, string>)).toBe(verdict)
  })

  it('divides the water by the assumed cement', () => {
    const expected = 2.8 / (25 * 0.17)
    expect(computeNumber('mix', 'waterCementRatio', bag)).toBeCloseTo(expected, 12)
    expect(findBag('25 kg').mass).toBe(25)
  })

  it('leaves the class out where no cone was measured', () => {
    expect(compute('mix', bag)['slumpClass']).toBeUndefined()
  })

  it('refuses a least that is more than the most', () => {
    expect(refuse('mix', { ...bag, bagWaterMin: '4 L' })['bagWaterMin']).toContain(
      'more than the most',
    )
    expect(
      refuse('mix', { ...bag, bagWaterMin: '4 L', bagWaterMax: '3 L' })['bagWaterMax'],
    ).toContain('more than the most')
  })

  it.each([
    ['waterAdded', '25 L'],
    ['waterAdded', '-1 L'],
    ['slump', '400 mm'],
    ['bag', '35 kg'],
  ])('refuses %s of %s', (name, text) => {
    expect(refuse('mix', { ...bag, [name]: text })).toHaveProperty(name)
  })
})
