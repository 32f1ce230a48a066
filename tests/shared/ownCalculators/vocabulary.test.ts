import { unit } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { quantityDimensions } from '../../../shared/ownCalculators/dimensions'
import { formulaUnits, refuseName } from '../../../shared/ownCalculators/vocabulary'

/** mathjs's own table of units is the source: what one of each is in SI. */
describe('the units of formulas, checked against mathjs', () => {
  const siNames = { length: 'm', volume: 'm^3', mass: 'kg', force: 'N', pressure: 'Pa', time: 's' }
  const nameOf = (dimension: unknown) =>
    Object.entries(siNames).find(
      ([quantity]) =>
        quantityDimensions[quantity as keyof typeof quantityDimensions].join() ===
        (dimension as number[]).join(),
    )?.[1] ?? 'rad'

  it.each([...formulaUnits])('%s', (name, { dimension, factor }) => {
    // mathjs has psi rounded (6894.75729276459 Pa, off by 6e-11); by definition it is one lbf/in².
    const known = name === 'psi' ? unit('1 lbf/inch^2') : unit(1, name)
    const expected = known.toNumber(nameOf(dimension))
    expect(Math.abs(factor / expected - 1)).toBeLessThan(1e-12)
  })

  it('leaves out units that mean two things on site', () => {
    for (const name of ['ton', 'tons', 't', 'cup', 'degC', 'degF', 'psf', 'sqft', 'acre', 'mil']) {
      expect([name, formulaUnits.has(name)]).toEqual([name, false])
    }
  })
})

describe('refuseName', () => {
  it.each(['length', 'stack_height', 'n1', 'Width', 'gap'])('takes %s', (name) => {
    expect(refuseName(name)).toBeUndefined()
  })
  it.each([
    ['', 'needs a name'],
    ['2x', 'no name'],
    ['_x', 'no name'],
    ['stack height', 'no name'],
    ['höhe', 'no name'],
    ['h', 'unit'],
    ['in', 'unit'],
    ['m', 'unit'],
    ['min', 'unit'],
    ['max', 'function'],
    ['pi', 'number'],
    ['mod', 'cannot be used'],
    ['constructor', 'cannot be used'],
    ['toString', 'cannot be used'],
    ['hasOwnProperty', 'cannot be used'],
  ])('refuses %j', (name, why) => {
    expect(refuseName(name)).toContain(why)
  })
})
