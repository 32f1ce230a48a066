import fc from 'fast-check'
import { evaluate } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { fixings } from '../../../shared/calculators/fixings'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases, given } from '../../reference/referenceCases'

const usual = { boards: '22', supports: '7', perCrossing: '2', boxSize: '100', spare: '10' }
const INCH = 0.0254

describe('fixings against printed nails', () => {
  it.each(findCases('fastenersPaint', /^nail-length-rule/))(
    '$id: a nail of $expected in ($source)',
    (one) => {
      const thickness = `${String(given(one, 'boardThicknessIn'))} in`
      const length = computeNumber('fixings', 'nailLength', { ...usual, thickness })
      expect(distance(one, length / INCH)).toBeLessThanOrEqual(allowed(one))
    },
  )
})

describe('fixings', () => {
  it.each([
    [{}, 308, 339, 4],
    [{ spare: '0' }, 308, 308, 4],
    [{ boxSize: '339' }, 308, 339, 1],
    [{ boxSize: '338' }, 308, 339, 2],
    [{ boxSize: '1' }, 308, 339, 339],
    [{ boards: '10', supports: '5' }, 100, 110, 2],
    [{ boards: '1', supports: '1', perCrossing: '1', spare: '0' }, 1, 1, 1],
    [{ boards: '1', supports: '1', perCrossing: '1' }, 1, 2, 1],
    [{ boards: '1000', supports: '100', perCrossing: '12' }, 1_200_000, 1_320_000, 13_200],
  ])('%j: %i go in, %i to buy, %i boxes', (texts: Record<string, string>, driven, buy, boxes) => {
    expect(compute('fixings', { ...usual, ...texts })).toMatchObject({
      driven,
      fixings: buy,
      boxes,
    })
  })

  it('counts 10 % of 110 pieces without a crumb of binary arithmetic', () => {
    // 1.1 × 110 is 121.00000000000001 in a computer.
    const texts = { ...usual, boards: '11', supports: '10', perCrossing: '1' }
    expect(computeNumber('fixings', 'fixings', texts)).toBe(121)
  })

  it('agrees with mathjs, up to whole ones', () => {
    const expected = evaluate('ceil(17 * 9 * 3 * 1.15 / 250)') as number
    const texts = { boards: '17', supports: '9', perCrossing: '3', boxSize: '250', spare: '15' }
    expect(computeNumber('fixings', 'boxes', texts)).toBe(expected)
  })

  it('takes 10 % spare where nothing is said, and no nail where no thickness is', () => {
    const { boards, supports, perCrossing, boxSize } = usual
    const outputs = compute('fixings', { boards, supports, perCrossing, boxSize })
    expect(outputs).toMatchObject({ fixings: 339, nailLength: undefined })
  })

  it('always buys enough, never a whole box too many', () => {
    const size = (max: number) => fc.integer({ min: 1, max })
    fc.assert(
      fc.property(
        size(1000),
        size(100),
        size(12),
        size(10_000),
        fc.integer({ min: 0, max: 50 }),
        (boards, supports, each, box, spare) => {
          const outputs = compute('fixings', {
            boards: String(boards),
            supports: String(supports),
            perCrossing: String(each),
            boxSize: String(box),
            spare: String(spare),
          })
          const [buy, boxes] = [Number(outputs['fixings']), Number(outputs['boxes'])]
          expect(buy * 100).toBeGreaterThanOrEqual(boards * supports * each * (100 + spare))
          expect((buy - 1) * 100).toBeLessThan(boards * supports * each * (100 + spare))
          expect(boxes * box).toBeGreaterThanOrEqual(buy)
          expect((boxes - 1) * box).toBeLessThan(buy)
        },
      ),
    )
  })
})

describe('fixings finds what first-timers do', () => {
  const values = {
    boards: 22,
    supports: 7,
    perCrossing: 2,
    boxSize: 100,
    spare: 10,
    thickness: 0.02,
  }
  it.each([
    ['one-at-a-crossing', 154],
    ['gaps-for-supports', 264],
    ['one-board', 14],
    ['spare-forgotten', 308],
    ['spare-rounded-down', 338],
    ['spare-as-a-count', 318],
    ['boxes-rounded-down', 3],
    ['boxes-without-spare', 4],
    ['twice-as-long', 0.04],
  ])('%s: %d', (id, expected) => {
    const slip = fixings.slips.find((one) => one.id === id)
    expect(slip?.wrong(values, compute('fixings', usual), 'metric')).toBe(expected)
  })

  it('looks for no slip where it gives the right number anyway', () => {
    const one = { ...values, boards: 1, perCrossing: 1 }
    const outputs = compute('fixings', { ...usual, boards: '1', perCrossing: '1' })
    for (const id of ['one-at-a-crossing', 'one-board'])
      expect(fixings.slips.find((slip) => slip.id === id)?.wrong(one, outputs, 'metric')).toBe(
        undefined,
      )
  })
})

describe('fixings refuses what cannot be', () => {
  it.each([
    ['boards', '4.5', 'Count whole ones'],
    ['supports', '2.5', 'Count whole ones'],
    ['perCrossing', '1.5', 'Count whole ones'],
    ['boxSize', '99.5', 'Count whole ones'],
    ['boards', '0', 'out of range'],
    ['boards', '1001', 'out of range'],
    ['supports', '-1', 'out of range'],
    ['perCrossing', '13', 'out of range'],
    ['boxSize', '0', 'out of range'],
    ['spare', '51', 'out of range'],
    ['thickness', '101 mm', 'out of range'],
  ])('%s of %s', (name, text, sentence) => {
    expect(refuse('fixings', { ...usual, [name]: text })[name]).toContain(sentence)
  })
})
