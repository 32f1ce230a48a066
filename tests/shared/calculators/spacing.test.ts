import fc from 'fast-check'
import { ceil, evaluate } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { spacing } from '../../../shared/calculators/spacing'
import { compute, refuse } from './compute'

// Common practice without a published table; checked against mathjs and by walking the run again.
const mm = (value: number) => `${String(value)} mm`
const place = (run: number, most: number, width: number) =>
  compute('spacing', { run: mm(run), maxCentres: mm(most), memberWidth: mm(width) })
const millimetres = (value: unknown) => Number(value) * 1000

describe('spacing takes the least that keeps the centres', () => {
  it.each([
    [3600, 400, 45, 10, '(3600 - 45) / 9'],
    [3645, 400, 45, 10, '400'],
    [3646, 400, 45, 11, '3601 / 10'],
    [2000, 2000, 100, 2, '1900'],
    [2100, 2000, 100, 2, '2000'],
    [2101, 2000, 100, 3, '2001 / 2'],
    [200, 6000, 100, 2, '100'],
    [1845, 90, 45, 21, '90'],
  ])('%d mm, at most %d, %d wide: %d', (run, most, width, count, centres) => {
    const outputs = place(run, most, width)
    expect(outputs['count']).toBe(count)
    expect(millimetres(outputs['centres'])).toBeCloseTo(evaluate(centres) as number, 9)
  })

  it('keeps 16 in centres for a run of 12 ft and an inch and a half', () => {
    const texts = { run: `12' 1-1/2"`, maxCentres: '16"', memberWidth: '1-1/2"' }
    const outputs = compute('spacing', texts, 'imperial')
    expect(outputs['count']).toBe(10)
    expect(Number(outputs['centres']) / 0.0254).toBeCloseTo(16, 9)
    expect(Number(outputs['clear']) / 0.0254).toBeCloseTo(14.5, 9)
  })

  it('marks the near edge of each from one end', () => {
    expect(place(1045, 500, 45)['marks']).toEqual([0, 0.5, 1])
  })
})

describe('spacing of any run', () => {
  it('fills it from outside to outside, and one fewer would stand too far apart', () => {
    const width = fc.integer({ min: 10, max: 150 })
    const run = fc.integer({ min: 400, max: 20_000 })
    fc.assert(
      fc.property(run, width, fc.integer({ min: 160, max: 2400 }), (length, wide, most) => {
        const outputs = place(length, most, wide)
        const count = Number(outputs['count'])
        const centres = millimetres(outputs['centres'])
        expect(count).toBe(Math.max(1, ceil((length - wide) / most)) + 1)
        expect((count - 1) * centres + wide).toBeCloseTo(length, 6)
        expect(count * wide + (count - 1) * millimetres(outputs['clear'])).toBeCloseTo(length, 6)
        expect(centres).toBeLessThanOrEqual(most + 1e-6)
        if (count > 2) expect((length - wide) / (count - 2)).toBeGreaterThan(most)
        const marks = outputs['marks'] as readonly number[]
        expect(millimetres(marks.at(-1)) + wide).toBeCloseTo(length, 6)
      }),
    )
  })
})

describe('spacing refuses', () => {
  it.each([
    ['a run that two fill', { run: '180 mm', memberWidth: '100 mm' }, 'run', 'wider than the run'],
    ['centres inside the member', { maxCentres: '45 mm' }, 'maxCentres', 'nothing is left'],
    ['more than anyone sets', { run: '60 m', maxCentres: '50 mm' }, 'run', 'more than 200'],
    ['no width', { memberWidth: '0' }, 'memberWidth', 'out of range'],
  ])('%s', (_name, changed, input, words) => {
    const usual = { run: '3600 mm', maxCentres: '400 mm', memberWidth: '45 mm' }
    const texts = { ...usual, ...(changed as Record<string, string>) }
    expect(refuse('spacing', texts)[input]).toContain(words)
  })
})

describe('the slips of spacing', () => {
  const values = { run: 3.6, maxCentres: 0.4, memberWidth: 0.045 }
  it.each([
    ['spaces-for-members', '9'],
    ['by-the-clear-space', '9'],
    ['by-members', '3.555 / 10'],
    ['run-by-spaces', '3.6 / 9'],
    ['half-a-width', '0.395 - 0.0225'],
  ])('%s', (id, formula) => {
    const slip = spacing.slips.find((one) => one.id === id)
    expect(slip?.wrong(values, place(3600, 400, 45), 'metric')).toBeCloseTo(
      evaluate(formula) as number,
      9,
    )
  })
})
