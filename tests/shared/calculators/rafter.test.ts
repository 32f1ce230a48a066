import fc from 'fast-check'
import { atan, cos, evaluate, sqrt } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { rafter } from '../../../shared/calculators/rafter'
import { compute, computeNumber, refuse } from './compute'
import {
  allowed,
  distance,
  findCases,
  given,
  type ReferenceCase,
} from '../../reference/referenceCases'

const INCH = 0.0254
const DEGREE = Math.PI / 180
const usual = {
  run: '1500 mm',
  pitch: '4',
  overhang: '200 mm',
  ridge: '30 mm',
  depth: '140 mm',
  seat: '75 mm',
}
const outputsOf = (changed: Record<string, string> = {}) =>
  compute('rafter', { ...usual, ...changed })
const inches = (value: number) => `${String(value)} in`

const runOf = (one: ReferenceCase): number => {
  if (one.inputs['spanFt'] !== undefined) return given(one, 'spanFt') * 6
  if (one.inputs['totalRunFt'] !== undefined) return given(one, 'totalRunFt') * 12
  return given(one, 'totalRunIn')
}

describe('rafter against printed rafters', () => {
  it.each(
    findCases('pitchRafter', /^(navy-rafter|army-rafter|griffith-half-pitch|navy-stepoff-8$)/),
  )('$id: line length $expected in ($source)', (one) => {
    const texts = { run: inches(runOf(one)), pitch: String(given(one, 'risePer12')) }
    expect(distance(one, computeNumber('rafter', 'lineLength', texts) / INCH)).toBeLessThanOrEqual(
      allowed(one),
    )
  })

  it.each(findCases('pitchRafter', /^navy-stepoff-8-tail$/))(
    '$id: the tail is $expected in along the slope ($source)',
    (one) => {
      const texts = { run: '69 in', pitch: String(given(one, 'risePer12')) }
      const overhang = inches(given(one, 'projectionIn'))
      const outputs = compute('rafter', { ...texts, overhang })
      const tail = Number(outputs['totalLength']) - Number(outputs['lineLength'])
      expect(distance(one, tail / INCH)).toBeLessThanOrEqual(allowed(one))
    },
  )

  it.each(findCases('pitchRafter', /^pitch-deg/))('$id: plumb cut $expected° ($source)', (one) => {
    const pitch = String(given(one, 'risePer12'))
    const outputs = outputsOf({ pitch, seat: '10 mm' })
    expect(distance(one, Number(outputs['plumbCut']) / DEGREE)).toBeLessThanOrEqual(allowed(one))
    expect(Number(outputs['plumbCut']) + Number(outputs['levelCut'])).toBeCloseTo(Math.PI / 2, 12)
  })

  it.each(findCases('pitchRafter', /^common-per-foot/))(
    '$id: $expected in a foot of run ($source)',
    (one) => {
      const texts = { run: '1 ft', pitch: String(given(one, 'risePer12')), seat: '0' }
      expect(
        distance(one, computeNumber('rafter', 'lineLength', texts) / INCH),
      ).toBeLessThanOrEqual(allowed(one))
    },
  )

  // The pitch as a fraction of the span: rise over twice the run.
  it.each(findCases('pitchRafter', /^pitch-fraction/))('$id: $expected ($source)', (one) => {
    const texts = { run: '10 ft', pitch: String(given(one, 'risePer12')), seat: '0' }
    const rise = computeNumber('rafter', 'rise', texts) / (12 * INCH)
    expect(distance(one, rise / 20)).toBeLessThanOrEqual(allowed(one))
  })
})

describe('rafter stops at the face of the ridge and at the end of the tail', () => {
  it.each([
    [{ ridge: '0', overhang: '' }, 'sqrt(10) / 3 * 1500'],
    [{ ridge: '0' }, 'sqrt(10) / 3 * 1700'],
    [{}, 'sqrt(10) / 3 * 1685'],
    [{ ridge: '40 mm', overhang: '0' }, 'sqrt(10) / 3 * 1480'],
  ])('%o: %s mm', (changed, formula) => {
    expect(Number(outputsOf(changed as Record<string, string>)['totalLength']) * 1000).toBeCloseTo(
      evaluate(formula) as number,
      9,
    )
  })

  it('reads the pitch in degrees and as a ratio too', () => {
    for (const pitch of ['18.434948822922 deg', '1:3', '4/12', '33.3333333333333 %'])
      expect(Number(outputsOf({ pitch })['lineLength'])).toBeCloseTo(1.5811388, 6)
  })
})

describe('rafter cuts its notch', () => {
  it('heel and notch follow from seat and pitch, as mathjs reckons them', () => {
    const outputs = outputsOf({ pitch: '8', seat: '60 mm' })
    expect(Number(outputs['heelCut']) * 1000).toBeCloseTo(40, 9)
    expect(Number(outputs['birdsmouthDepth']) * 1000).toBeCloseTo(
      evaluate('60 * sin(atan(8 / 12))') as number,
      9,
    )
  })

  // At 12 in 12 the sine is 0.70711: a third of 120 mm is reached by a seat of 56.57 mm.
  it.each([
    ['56 mm', 'yes'],
    ['56.5 mm', 'yes'],
    ['56.6 mm', 'no'],
    ['90 mm', 'no'],
    ['0', 'yes'],
  ])('a seat of %s in 120 mm at 12 in 12: %s', (seat, fits) => {
    expect(outputsOf({ pitch: '12', depth: '120 mm', seat })['notchFits']).toBe(fits)
  })
})

describe('rafter of any size', () => {
  it('closes its triangle', () => {
    const run = fc.integer({ min: 200, max: 12_000 })
    const pitch = fc.integer({ min: 1, max: 500 })
    fc.assert(
      fc.property(run, pitch, (level, tenths) => {
        const texts = { run: `${String(level)} mm`, pitch: String(tenths / 10), seat: '0' }
        const outputs = compute('rafter', texts)
        const rise = Number(outputs['rise'])
        const line = Number(outputs['lineLength'])
        expect(line).toBeCloseTo(Number(sqrt(rise ** 2 + (level / 1000) ** 2)), 9)
        expect(line * cos(atan(tenths / 120))).toBeCloseTo(level / 1000, 9)
        expect(outputs['totalLength']).toBe(line)
      }),
    )
  })
})

describe('rafter refuses', () => {
  it.each([
    ['a seat that cuts it through', { pitch: '24', seat: '200 mm' }, 'seat'],
    ['no run', { run: '' }, 'run'],
    ['a level roof', { pitch: '0' }, 'pitch'],
    ['a wall', { pitch: '85 deg' }, 'pitch'],
    ['an overhang below nothing', { overhang: '-1' }, 'overhang'],
  ])('%s', (_name, changed, input) => {
    expect(refuse('rafter', { ...usual, ...(changed as Record<string, string>) })).toHaveProperty(
      input,
    )
  })
})

describe('the slips of rafter', () => {
  const values = { run: 1.5, pitch: 4, overhang: 0.2, ridge: 0.03, depth: 0.14, seat: 0.075 }
  it.each([
    ['overhang-level', 'sqrt(10) / 3 * 1485 + 200'],
    ['overhang-forgotten', 'sqrt(10) / 3 * 1485'],
    ['ridge-whole', 'sqrt(10) / 3 * 1670'],
    ['run-and-rise-added', '2000'],
    ['rise-by-sine', '1500 * sin(atan(1 / 3))'],
    ['heel-upside-down', '225'],
  ])('%s', (id, formula) => {
    const slip = rafter.slips.find((one) => one.id === id)
    const wrong = slip?.wrong(values, outputsOf(), 'metric')
    expect(Number(wrong) * 1000).toBeCloseTo(evaluate(formula) as number, 6)
  })
})
