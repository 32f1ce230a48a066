import fc from 'fast-check'
import { evaluate } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { findCalculator, runCalculator } from '../../../shared/calculators/index'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases, given } from '../../reference/referenceCases'

const ID = 'posts-on-fall'
const INCH = 0.0254
const sound = { run: '1100 mm', fall: '10 mm/m', positions: '50; 550; 1050', topHeight: '1480 mm' }
const lengthsOf = (texts: Record<string, string>, system: 'metric' | 'imperial' = 'metric') =>
  compute(ID, { ...sound, ...texts }, system)['lengths'] as number[]

describe('posts-on-fall against published drops', () => {
  // Under a level top the last post is longer than the first by what the surface falls.
  it.each(findCases('drainageFall', /^fall-/))('$id: $expected in longer ($source)', (one) => {
    const run = `${String(given(one, 'runFt'))} ft`
    const fall =
      one.inputs['percent'] === undefined
        ? `${String(given(one, 'slopeInPerFt'))} in/ft`
        : `${String(given(one, 'percent'))} %`
    const texts = { run, fall, positions: `0; ${run}`, topHeight: '6 ft' }
    expect(distance(one, computeNumber(ID, 'difference', texts) / INCH)).toBeLessThanOrEqual(
      allowed(one),
    )
    expect(lengthsOf(texts)[0]).toBeCloseTo(72 * INCH, 12)
  })
})

describe('posts-on-fall', () => {
  it.each([
    ['level top', {}, [1480.5, 1485.5, 1490.5]],
    ['level surface', { fall: '0' }, [1480, 1480, 1480]],
    ['at both edges', { positions: '0; 1100' }, [1480, 1491]],
    ['out of order', { positions: '1050; 50' }, [1490.5, 1480.5]],
    ['one post', { positions: '550' }, [1485.5]],
  ])('%s', (_name, texts, expected) => {
    expect(lengthsOf(texts).map((metres) => Number((metres * 1000).toFixed(6)))).toEqual(expected)
  })

  it.each([
    ['with', '1.48 + 1.05 * (0.01 - tan(5 / 180 * pi))'],
    ['against', '1.48 + 1.05 * (0.01 + tan(5 / 180 * pi))'],
  ])('a top of 5° that falls %s the water, as mathjs has it', (roofFalls, sum) => {
    const lengths = lengthsOf({ roofPitch: '5 deg', roofFalls })
    expect(lengths[2]).toBeCloseTo(evaluate(sum) as number, 12)
  })

  it('has posts of one length where the top falls as the surface does', () => {
    const lengths = lengthsOf({ fall: '5 %', roofPitch: '2.862405226111748 deg' })
    for (const length of lengths) expect(length).toBeCloseTo(1.48, 12)
  })

  it('reads bare numbers in the units of the person', () => {
    const texts = { run: `3' 6"`, fall: '1/8', positions: '2; 40', topHeight: `4' 10"` }
    const lengths = lengthsOf(texts, 'imperial').map((metres) => metres / INCH)
    expect(lengths[0]).toBeCloseTo(58 + 2 / 96, 9)
    expect(lengths[1]).toBeCloseTo(58 + 40 / 96, 9)
  })

  it('puts every top on one straight line', () => {
    const position = fc.integer({ min: 0, max: 3000 })
    const pitch = fc.double({ min: 0, max: 20, noNaN: true })
    fc.assert(
      fc.property(
        fc.array(position, { minLength: 3, maxLength: 8 }),
        fc.integer({ min: 0, max: 100 }),
        pitch,
        fc.constantFrom('with', 'against'),
        (positions, fall, degrees, roofFalls) => {
          const outputs = compute(ID, {
            run: '3 m',
            fall: `${String(fall)} mm/m`,
            positions: positions.join('; '),
            topHeight: '2000 mm',
            roofPitch: `${degrees.toFixed(6)} deg`,
            roofFalls,
          })
          const lengths = outputs['lengths'] as number[]
          const slope = Math.tan((Number(degrees.toFixed(6)) * Math.PI) / 180)
          const sign = roofFalls === 'with' ? -1 : 1
          lengths.forEach((length, index) => {
            const at = (positions[index] ?? 0) / 1000
            // The foot lies on the surface, the head on the top.
            expect(length - (at * fall) / 1000).toBeCloseTo(2 + sign * at * slope, 9)
          })
          expect(outputs['longest']).toBe(Math.max(...lengths))
          expect(outputs['shortest']).toBe(Math.min(...lengths))
        },
      ),
    )
  })
})

describe('posts-on-fall refuses', () => {
  it('a post past the end of the run', () => {
    const message = refuse(ID, { ...sound, positions: '50; 1200' })['positions'] ?? ''
    expect(message.replaceAll(/\s/g, ' ')).toContain('A post at 1200 mm stands past the end')
    expect(refuse(ID, { ...sound, positions: '0; 1100' })).toEqual({})
  })

  it('a top that comes down to the surface, or rises out of reach', () => {
    const low = { run: '6 m', positions: '0; 6 m', roofPitch: '20 deg' }
    expect(refuse(ID, { ...sound, ...low })['roofPitch']).toContain('comes down to the surface')
    const high = { ...low, run: '30 m', positions: '0; 30 m', roofFalls: 'against' }
    expect(refuse(ID, { ...sound, ...high })['roofPitch']).toContain('too tall')
  })

  it.each([
    ['run', '0.1 m'],
    ['fall', '200 mm/m'],
    ['fall', '-10 mm/m'],
    ['positions', '-50; 100'],
    ['positions', '50; twelve'],
    ['topHeight', '6 m'],
    ['roofPitch', '60 deg'],
  ])('%s of %s', (name, text) => {
    expect(Object.keys(refuse(ID, { ...sound, [name]: text }))).toEqual([name])
  })
})

describe('posts-on-fall knows its slips', () => {
  const roof = Math.tan(Math.PI / 36)
  it.each([
    ['longest-fall-forgotten', {}, 1.48],
    ['longest-fall-taken-off', {}, 1.4695],
    ['longest-whole-run', {}, 1.491],
    ['longest-roof-forgotten', {}, undefined],
    ['difference-whole-run', {}, 0.011],
    ['difference-roof-forgotten', {}, undefined],
    ['shortest-roof-forgotten', { roofPitch: '5 deg' }, 1.4905],
    ['shortest-roof-turned', { roofPitch: '5 deg' }, 1.4905 + 1.05 * roof],
    ['shortest-fall-forgotten', { roofPitch: '5 deg' }, 1.48 - 1.05 * roof],
    ['difference-roof-forgotten', { roofPitch: '5 deg' }, 0.01],
    ['difference-fall-forgotten', { roofPitch: '5 deg' }, roof],
  ])('%s with %o', (id, texts, wrong) => {
    const calculator = findCalculator(ID)
    const run = calculator && runCalculator(calculator, { ...sound, ...texts }, 'metric')
    if (!run?.ok) throw new Error('refused')
    const slip = calculator?.slips.find((one) => one.id === id)
    const value = slip?.wrong(run.values, run.outputs, 'metric')
    if (wrong === undefined) expect(value).toBeUndefined()
    else expect(value).toBeCloseTo(wrong, 9)
  })

  it('writes the row of lengths as it is shown', () => {
    const calculator = findCalculator(ID)
    const run = calculator && runCalculator(calculator, sound, 'metric')
    const step = run?.ok ? run.steps.find(({ output }) => output === 'lengths') : undefined
    expect(step?.result.replaceAll(/[^\d.; m]/g, ' ')).toBe('1481 mm; 1486 mm; 1491 mm')
  })
})
