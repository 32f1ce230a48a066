import fc from 'fast-check'
import { atan, evaluate } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { fall } from '../../../shared/calculators/fall'
import { LEAST_BESIDE_BUILDING, LEAST_IN_THE_OPEN } from '../../../shared/calculators/fallSaid'
import { findCalculator, runCalculator } from '../../../shared/calculators/index'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases, given } from '../../reference/referenceCases'

const INCH = 0.0254

describe('fall against published drops', () => {
  it.each(findCases('drainageFall', /^fall-/))('$id: lower by $expected in ($source)', (one) => {
    const said: Record<string, string> =
      one.inputs['percent'] === undefined
        ? { perFoot: `${String(given(one, 'slopeInPerFt'))} in/ft` }
        : { percent: `${String(given(one, 'percent'))} %` }
    const texts = { run: `${String(given(one, 'runFt'))} ft`, ...said }
    expect(distance(one, computeNumber('fall', 'drop', texts) / INCH)).toBeLessThanOrEqual(
      allowed(one),
    )
  })

  it.each(findCases('drainageFall', /^irc-6in/))('$id: $expected mm ($source)', (one) => {
    // The code asks for 6 in within the first 10 ft of soil, which is 5 %.
    const texts = { run: '10 ft', percent: '5 %' }
    expect(given(one, 'fallIn')).toBe(6)
    expect(distance(one, computeNumber('fall', 'drop', texts) * 1000)).toBeLessThanOrEqual(
      allowed(one),
    )
  })

  it.each(findCases('drainageFall', /^slope-pct-quarter/))('$id: $expected % ($source)', (one) => {
    const texts = { run: '1 m', perFoot: `${String(given(one, 'slopeInPerFt'))} in/ft` }
    expect(distance(one, computeNumber('fall', 'percent', texts))).toBeLessThanOrEqual(allowed(one))
  })

  it.each(findCases('drainageFall', /^slope-ratio-2pct/))('$id: 1 in $expected', (one) => {
    const texts = { run: '1 m', ratio: `1:${String(one.expected)}` }
    expect(computeNumber('fall', 'percent', texts)).toBeCloseTo(given(one, 'percent'), 12)
  })
})

describe('fall judges by the published least', () => {
  it.each(findCases('drainageFall', /^irc-impervious/))('$id: $expected % ($source)', (one) => {
    expect(LEAST_BESIDE_BUILDING * 100).toBe(one.expected)
  })

  // The guide prints 1/8 in a foot, 1.04 %; metric tapes set off its round neighbour, 10 mm a metre.
  it.each(findCases('drainageFall', /^slab-slope-min/))('$id: $expected in/ft ($source)', (one) => {
    const texts = { run: '8 ft', perFoot: `${String(one.expected)} in/ft` }
    expect(compute('fall', texts)['enoughToDrain']).toBe('yes')
    expect(LEAST_IN_THE_OPEN).toBeLessThanOrEqual(Number(one.expected) / 12)
    expect(compute('fall', { run: '8 ft', perFoot: '1/16 in/ft' })['enoughToDrain']).toBe('no')
  })

  it.each(findCases('drainageFall', /^slab-slope-pref/))(
    '$id: $expected in/ft ($source)',
    (one) => {
      const texts = { run: '8 ft', perFoot: `${String(one.expected)} in/ft`, besideBuilding: 'yes' }
      expect(compute('fall', texts)['enoughToDrain']).toBe('yes')
    },
  )

  it.each(findCases('drainageFall', /^cmhc-/))('$id: $expected mm ($source)', (one) => {
    expect(fall.cautions.map(({ text }) => text).join(' ')).toContain(`${String(one.expected)} mm`)
  })

  it.each([
    ['0 %', 'no', 'no'],
    ['0.99 %', 'no', 'no'],
    ['1 %', 'yes', 'no'],
    ['1.99 %', 'yes', 'no'],
    ['2 %', 'yes', 'yes'],
    ['10 %', 'yes', 'yes'],
  ])('%s: in the open %s, beside a building %s', (percent, open, beside) => {
    const texts = { run: '2 m', percent }
    expect(compute('fall', texts)['enoughToDrain']).toBe(open)
    expect(compute('fall', { ...texts, besideBuilding: 'yes' })['enoughToDrain']).toBe(beside)
  })
})

describe('fall says one slope in every way', () => {
  it.each([
    ['perMetre', '20 mm/m'],
    ['perFoot', '0.24 in/ft'],
    ['percent', '2 %'],
    ['ratio', '1:50'],
    ['ratio', '1 in 50'],
    ['angle', '1.1457628381751035 deg'],
  ])('%s of %s over 3 m', (name, text) => {
    const outputs = compute('fall', { run: '3 m', [name]: text })
    expect(outputs['drop']).toBeCloseTo(evaluate('3 * 0.02') as number, 9)
    expect(outputs['percent']).toBeCloseTo(2, 9)
    expect(outputs['angle']).toBeCloseTo(atan(0.02), 9)
  })

  it.each([
    ['perMetre', '20', 'metric', 0.06],
    ['perFoot', '1/4', 'metric', 0.0625],
    ['perFoot', '1/4', 'imperial', 0.0625],
    ['percent', '2', 'imperial', 0.06],
    ['angle', '1', 'metric', 0.05236519],
  ] as const)('a bare %s of %s (%s)', (name, text, system, drop) => {
    expect(compute('fall', { run: '3 m', [name]: text }, system)['drop']).toBeCloseTo(drop, 7)
  })

  it('doubles with the run and never turns uphill', () => {
    const run = fc.integer({ min: 100, max: 15_000 })
    const slope = fc.double({ min: 0, max: 10, noNaN: true })
    fc.assert(
      fc.property(run, slope, (mm, percent) => {
        const texts = (times: number) => ({
          run: `${String(mm * times)} mm`,
          percent: percent.toFixed(6),
        })
        const once = computeNumber('fall', 'drop', texts(1))
        expect(computeNumber('fall', 'drop', texts(2))).toBeCloseTo(2 * once, 9)
        expect(once).toBeGreaterThanOrEqual(0)
        const angle = Number(compute('fall', texts(1))['angle'])
        expect((Math.tan(angle) * mm) / 1000).toBeCloseTo(once, 9)
      }),
    )
  })
})

describe('fall refuses', () => {
  it('no slope at all, at the field of the system', () => {
    expect(refuse('fall', { run: '3 m' })['perMetre']).toContain('Say the fall in one way')
    expect(refuse('fall', { run: '3 m' }, 'imperial')['perFoot']).toContain('Say the fall')
  })

  it('a slope that is said twice, at the second', () => {
    const errors = refuse('fall', { run: '3 m', perMetre: '20', percent: '2' })
    expect(errors).toEqual({
      percent: 'The fall is said in two ways. Keep one and empty the other.',
    })
  })

  it.each([
    ['run', '0.05 m', 'Run: 50 mm is out of range. Give 100 mm to 30 000 mm.'],
    ['run', '400 m', 'Run: 400 000 mm is out of range. Give 100 mm to 30 000 mm.'],
    ['percent', '11', 'Per cent: 11 % is out of range. Give 0 % to 10 %.'],
    ['percent', '-1', 'Per cent: −1 % is out of range. Give 0 % to 10 %.'],
    ['perMetre', '200', 'Fall for each metre: 200 mm/m is out of range. Give 0 mm/m to 100 mm/m.'],
    ['ratio', '1:5', 'Ratio, drop to run: 1:5 is out of range. Give 0 to 1:10.'],
    ['angle', '90 deg', 'Angle: 90° is out of range. Give 0° to 5.71°.'],
  ])('%s of %s', (name, text, message) => {
    const other: Record<string, string> = name === 'run' ? { percent: '2' } : { run: '3 m' }
    const errors = refuse('fall', { ...other, [name]: text })
    expect(errors[name]?.replaceAll(/\s/g, ' ')).toBe(message)
  })

  it('takes both ends of what it permits', () => {
    for (const run of ['100 mm', '30 m'])
      for (const ratio of ['0', '1:10']) expect(refuse('fall', { run, ratio })).toEqual({})
  })
})

describe('fall knows its slips', () => {
  const wrongOf = (id: string, texts: Record<string, string>, system: 'metric' | 'imperial') => {
    const calculator = findCalculator('fall')
    const run = calculator && runCalculator(calculator, texts, system)
    if (!run?.ok) throw new Error('refused')
    return calculator?.slips.find((slip) => slip.id === id)?.wrong(run.values, run.outputs, system)
  }

  it.each([
    // 1/4 in for each foot over 8 ft, which is 2.4384 m: 0.6096 in.
    ['per-foot-as-per-metre', { run: '8 ft', perFoot: '1/4' }, 0.6096 * INCH],
    // 20 mm for each metre over 3 m, which is 9.8425 ft: 196.85 mm.
    ['per-metre-as-per-foot', { run: '3 m', perMetre: '20' }, 0.19685],
    ['run-left-out', { run: '3 m', perMetre: '20' }, 0.02],
    ['run-left-out', { run: '8 ft', perFoot: '1/4' }, 0.25 * INCH],
    ['run-in-inches', { run: '8 ft', perFoot: '1/4' }, 24 * INCH],
    ['percent-not-divided', { run: '3 m', percent: '2' }, 6],
    ['degrees-as-percent', { run: '3 m', angle: '2' }, 0.06],
    ['inches-as-percent', { run: '3 m', perFoot: '1/4' }, 0.25],
    ['ten-inches', { run: '3 m', perFoot: '1/4' }, 2.5],
    ['millimetres-as-percent', { run: '3 m', perMetre: '15' }, 15],
    ['percent-as-degrees', { run: '3 m', percent: '2' }, Math.PI / 90],
  ])('%s', (id, texts, wrong) => {
    expect(wrongOf(id, texts, 'metric')).toBeCloseTo(wrong, 5)
  })

  it.each([
    ['judged-in-the-open', { percent: '1.5', besideBuilding: 'yes' }, 'yes'],
    ['judged-in-the-open', { percent: '1.5' }, undefined],
    ['judged-beside-a-building', { percent: '1.5' }, 'no'],
    ['judged-beside-a-building', { percent: '2.5' }, undefined],
    ['judged-by-the-drop', { percent: '0.5' }, 'yes'],
    ['per-foot-as-per-metre', { percent: '0.5' }, undefined],
  ])('%s with %o: %s', (id, texts, wrong) => {
    expect(wrongOf(id, { run: '3 m', ...texts }, 'metric')).toBe(wrong)
  })
})
