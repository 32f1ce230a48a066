import fc from 'fast-check'
import { evaluate } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { gravel } from '../../../shared/calculators/gravel'
import { findCalculator, runCalculator } from '../../../shared/calculators/index'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases } from '../../reference/referenceCases'

const plain = { overhang: '0', compaction: '1' }

describe('gravel', () => {
  it.each(findCases('controlJoints', /^slab-base-course/))(
    'starts from the printed $expected in ($source)',
    (one) => {
      const depth = gravel.inputs.find(({ name }) => name === 'depth')
      const inches = parseFloat(depth?.initial.imperial ?? '')
      expect(distance(one, inches)).toBeLessThanOrEqual(allowed(one))
    },
  )

  // The geometry is checked by mathjs; there is no published case of a loose volume.
  it.each([
    ['2600 mm', '1100 mm', '100 mm', '100 mm', '1.2', '2.8 * 1.3 * 0.1 * 1.2'],
    ['2600 mm', '1100 mm', '100 mm', '0', '1', '2.6 * 1.1 * 0.1'],
    ['3 m', '3 m', '150 mm', '50 mm', '1.35', '3.1^2 * 0.15 * 1.35'],
    ['100 mm', '100 mm', '20 mm', '1 m', '1.6', '2.1^2 * 0.02 * 1.6'],
  ])('%s × %s, %s deep, %s over, × %s', (length, width, depth, overhang, compaction, sum) => {
    const outputs = compute('gravel', { length, width, depth, overhang, compaction })
    expect(outputs['looseVolume']).toBeCloseTo(evaluate(sum) as number, 12)
    expect(outputs['mass']).toBeCloseTo((evaluate(sum) as number) * 1600, 8)
  })

  it('works in feet and yards as mathjs does', () => {
    const texts = { ...plain, length: "9'", width: "9'", depth: '4"', density: '100 lb/ft³' }
    const outputs = compute('gravel', texts, 'imperial')
    expect(outputs['looseVolume']).toBeCloseTo(evaluate('0.9144^3') as number, 9)
    expect(outputs['mass']).toBeCloseTo(evaluate('2700 * 0.45359237') as number, 6)
  })

  it('grows with every number and is never less than the hole', () => {
    const side = fc.integer({ min: 100, max: 15_000 })
    fc.assert(
      fc.property(side, side, fc.integer({ min: 20, max: 600 }), (length, width, depth) => {
        const mm = (value: number) => `${String(value)} mm`
        const texts = { length: mm(length), width: mm(width), depth: mm(depth) }
        const hole = computeNumber('gravel', 'looseVolume', { ...texts, ...plain })
        expect(hole).toBeCloseTo((length * width * depth) / 1e9, 9)
        const reaching = { ...texts, overhang: '50 mm' }
        expect(computeNumber('gravel', 'looseVolume', reaching)).toBeGreaterThan(hole * 1.2)
      }),
    )
  })

  it.each([
    ['depth', '10 mm'],
    ['depth', '0.7 m'],
    ['length', '400 m'],
    ['overhang', '-50 mm'],
    ['overhang', '2 m'],
    ['compaction', '0.8'],
    ['compaction', '2'],
    ['density', '500 kg/m³'],
    ['density', '3000 kg/m³'],
  ])('refuses %s of %s', (name, text) => {
    const sound = { length: '3 m', width: '2 m', depth: '100 mm', overhang: '0' }
    expect(Object.keys(refuse('gravel', { ...sound, [name]: text }))).toEqual([name])
  })

  it('says which numbers are missing', () => {
    expect(Object.keys(refuse('gravel', { length: '3 m' }))).toEqual(['width', 'depth', 'overhang'])
  })

  it.each([
    ['tamped-for-loose', 'metric', 0.364],
    ['divided-by-compaction', 'metric', 0.364 / 1.2],
    ['overhang-forgotten', 'metric', 0.3432],
    ['overhang-once', 'metric', 2.7 * 1.2 * 0.1 * 1.2],
    ['thickness-in-centimetres', 'metric', 4.368],
    ['inches-as-feet', 'metric', undefined],
    ['cubic-feet', 'imperial', 0.4368 * 27],
    ['tamped-weighed', 'metric', 582.4],
    ['as-light-as-water', 'metric', 436.8],
  ] as const)('knows the slip %s (%s)', (id, system, wrong) => {
    const calculator = findCalculator('gravel')
    const run = calculator && runCalculator(calculator, calculator.example.inputs, system)
    if (!run?.ok) throw new Error('refused')
    const slip = calculator?.slips.find((one) => one.id === id)
    const value = slip?.wrong(run.values, run.outputs, system)
    if (wrong === undefined) expect(value).toBeUndefined()
    else expect(value).toBeCloseTo(wrong, 9)
  })
})
