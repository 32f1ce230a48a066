import fc from 'fast-check'
import { evaluate } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { posthole } from '../../../shared/calculators/posthole'
import { findCalculator, runCalculator } from '../../../shared/calculators/index'
import { compute, computeNumber, refuse } from './compute'
import {
  allowed,
  distance,
  findCases,
  given,
  type ReferenceCase,
} from '../../reference/referenceCases'

const INCH = 0.0254
const FOOT3 = 0.3048 ** 3
const sound = {
  count: '4',
  diameter: '300 mm',
  depth: '600 mm',
  postWidth: '90 mm',
  postDepth: '90 mm',
  bag: '25 kg',
}

/** The cases give both sides of the post as a pair. */
const textsOf = (one: ReferenceCase) => {
  const [wide, thick] = one.inputs['postActualIn'] as unknown as [number, number]
  return {
    count: '1',
    diameter: `${String(given(one, 'diameterIn'))} in`,
    depth: `${String(given(one, 'depthIn'))} in`,
    postWidth: `${String(wide)} in`,
    postDepth: `${String(thick)} in`,
    bag: '80 lb',
  }
}
const initialOf = (name: string) =>
  parseFloat(posthole.inputs.find((input) => input.name === name)?.initial.imperial ?? '')

describe('posthole against worked volumes', () => {
  it.each(findCases('postFooting', /^hole-/))('$id: $expected ft³ ($source)', (one) => {
    const each = computeNumber('posthole', 'volumeEach', textsOf(one))
    expect(distance(one, each / FOOT3)).toBeLessThanOrEqual(allowed(one))
  })

  it.each(findCases('postFooting', /^post-hole-dia-concrete/))(
    'starts from a hole of at least $expected posts ($source)',
    (one) => {
      expect(initialOf('diameter')).toBeGreaterThanOrEqual(
        Number(one.expected) * initialOf('postWidth'),
      )
    },
  )

  it.each(findCases('postFooting', /^irc-footing-min-depth/))(
    'starts deeper than $expected in ($source)',
    (one) => {
      expect(initialOf('depth')).toBeGreaterThanOrEqual(Number(one.expected))
    },
  )

  it('agrees with mathjs for a post that is not square', () => {
    const texts = { ...sound, postWidth: '38 mm', postDepth: '89 mm', waste: '0' }
    const each = evaluate('(pi / 4 * 0.3^2 - 0.038 * 0.089) * 0.6') as number
    const outputs = compute('posthole', texts)
    expect(outputs['volumeEach']).toBeCloseTo(each, 12)
    expect(outputs['volume']).toBeCloseTo(4 * each, 12)
    expect(outputs['volumeWithWaste']).toBeCloseTo(4 * each, 12)
  })
})

describe('posthole buys whole bags', () => {
  it.each([
    // One hole, (π ÷ 4 × 0.3² − 0.09²) × 0.6 m, takes 37.5515 L: one bag of just that, two of a hair less.
    ['1', '37.551500823462', 1],
    ['2', '37.551500823462', 2],
    ['1', '37.5', 2],
    ['3', '50', 3],
    ['4', '50', 4],
    ['4', '10', 16],
  ])('%s holes with bags of %s L: %i', (count, litres, bags) => {
    const texts = { ...sound, count, bagYield: `${litres} L`, waste: '0' }
    expect(computeNumber('posthole', 'bags', texts)).toBe(bags)
  })

  it('rounds up once for all holes, never in each', () => {
    const counts = fc.integer({ min: 1, max: 60 })
    fc.assert(
      fc.property(counts, fc.integer({ min: 100, max: 2500 }), (count, depth) => {
        const texts = { ...sound, depth: `${String(depth)} mm` }
        const one = computeNumber('posthole', 'bags', { ...texts, count: '1' })
        const all = computeNumber('posthole', 'bags', { ...texts, count: String(count) })
        expect(all).toBeLessThanOrEqual(count * one)
        const volume = computeNumber('posthole', 'volumeEach', texts)
        expect(volume).toBeLessThan((Math.PI / 4) * 0.09 * (depth / 1000))
        expect(volume).toBeGreaterThan(0)
      }),
    )
  })
})

describe('posthole refuses', () => {
  it('a post that does not fit, corner to corner', () => {
    const message = refuse('posthole', { ...sound, diameter: '120 mm' })['diameter'] ?? ''
    expect(message.replaceAll(/\s/g, ' ')).toContain('corner to corner it measures 127 mm')
    expect(refuse('posthole', { ...sound, diameter: '128 mm' })).toEqual({})
  })

  it('half a hole', () => {
    expect(refuse('posthole', { ...sound, count: '2.5' })['count']).toContain('counted whole')
  })

  it.each([
    ['count', '0'],
    ['count', '500'],
    ['diameter', '2 m'],
    ['depth', '-600 mm'],
    ['depth', '3 m'],
    ['postWidth', '10 mm'],
    ['bag', 'a sack'],
  ])('%s of %s', (name, text) => {
    expect(Object.keys(refuse('posthole', { ...sound, [name]: text }))).toEqual([name])
  })
})

describe('posthole knows its slips', () => {
  const inches = {
    count: '3',
    diameter: '12 in',
    depth: '36 in',
    postWidth: '3.5 in',
    postDepth: '3.5 in',
    bag: '80 lb',
  }
  const hole = (Math.PI / 4) * 12 * 12 * 36
  const post = 3.5 * 3.5 * 36

  it.each([
    ['post-not-taken-off', hole],
    ['diameter-for-radius', 4 * hole - post],
    ['square-hole', 12 * 12 * 36 - post],
    ['nominal-post', hole - 16 * 36],
    ['one-hole-only', hole - post],
    ['waste-left-out', 3 * (hole - post)],
    ['posts-left-in', 3 * hole],
  ])('%s', (id, cubicInches) => {
    expect(wrongOf(id, inches)).toBeCloseTo(cubicInches * INCH ** 3, 9)
  })

  it.each([
    // Three holes of 2.101 ft³ with 10 % waste are 6.933 ft³, 11.56 bags of 0.60 ft³.
    ['bags-rounded-down', 11],
    ['bags-without-waste', 11],
    ['bags-a-hole', 12],
    ['bags-post-left-in', 13],
  ])('%s', (id, bags) => {
    expect(wrongOf(id, inches)).toBe(bags)
  })

  it('has no name for a post that is not called otherwise', () => {
    expect(wrongOf('nominal-post', sound)).toBeUndefined()
  })

  function wrongOf(id: string, texts: Record<string, string>) {
    const calculator = findCalculator('posthole')
    const run = calculator && runCalculator(calculator, texts, 'imperial')
    if (!run?.ok) throw new Error('refused')
    return calculator?.slips
      .find((one) => one.id === id)
      ?.wrong(run.values, run.outputs, 'imperial')
  }
})
