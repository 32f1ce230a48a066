import { evaluate } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { compute, computeNumber, refuse } from './compute'
import {
  allowed,
  distance,
  findCases,
  given,
  type ReferenceCase,
} from '../../reference/referenceCases'

const of = (one: ReferenceCase, output: string) =>
  computeNumber('pitch', output, { risePer12: String(given(one, 'risePer12')) })
const degreesOf = (radians: number) => (radians * 180) / Math.PI
/** The flattest slope the calculator takes; its hip differs from a level one by less than 1e-6. */
const nearlyLevel = { risePer12: '0.01' }

describe('pitch against printed tables', () => {
  it.each(findCases('pitchRafter', /^(pitch-deg|deg-3)/))('$id: $expected° ($source)', (one) => {
    expect(distance(one, degreesOf(of(one, 'degrees')))).toBeLessThanOrEqual(allowed(one))
  })

  // The code rounds 2.08 to 2 per cent; the tolerance of these cases is its rounding.
  it.each(findCases('pitchRafter', /^(pitch-percent|ibc-percent)/))(
    '$id: $expected % ($source)',
    (one) => {
      expect(distance(one, of(one, 'percent'))).toBeLessThanOrEqual(allowed(one))
    },
  )

  // Three in twelve is printed as 1.4362 and fifteen as 1.8874; exact are 1.43614 and 1.88746: the table's last digit is off.
  it.each(findCases('pitchRafter', /^hip-factor/))('$id: $expected ($source)', (one) => {
    expect(distance(one, of(one, 'hipPerRun'))).toBeLessThanOrEqual(allowed(one))
  })

  it.each(findCases('pitchRafter', /^(common-per-foot|navy-bridge)/))(
    '$id: $expected in a foot ($source)',
    (one) => {
      expect(distance(one, 12 * of(one, 'lengthPerRun'))).toBeLessThanOrEqual(allowed(one))
    },
  )

  it.each(findCases('pitchRafter', /^(hip-per-foot|navy-hip-bridge)/))(
    '$id: $expected in a foot of common run ($source)',
    (one) => {
      expect(distance(one, 12 * of(one, 'hipPerRun'))).toBeLessThanOrEqual(allowed(one))
    },
  )

  it.each(findCases('pitchRafter', /^jack-diff/))('$id: $expected in ($source)', (one) => {
    expect(distance(one, given(one, 'spacingIn') * of(one, 'lengthPerRun'))).toBeLessThanOrEqual(
      allowed(one),
    )
  })

  // Cheek cut of a jack: 12 on the tongue, 144 ÷ unit length on the blade.
  it.each(findCases('pitchRafter', /^(navy-sidecut|sidecut)/))(
    '$id: $expected in ($source)',
    (one) => {
      expect(distance(one, 12 / of(one, 'lengthPerRun'))).toBeLessThanOrEqual(allowed(one))
    },
  )
})

describe('pitch against printed rafters', () => {
  const runInches = (one: ReferenceCase): number => {
    if (one.inputs['spanFt'] !== undefined) return given(one, 'spanFt') * 6
    if (one.inputs['totalRunFt'] !== undefined) return given(one, 'totalRunFt') * 12
    return one.inputs['totalRunIn'] === undefined
      ? given(one, 'projectionIn')
      : given(one, 'totalRunIn')
  }

  it.each(findCases('pitchRafter', /^(navy-rafter|army-rafter|griffith-half|navy-stepoff)/))(
    '$id: $expected in ($source)',
    (one) => {
      expect(distance(one, runInches(one) * of(one, 'lengthPerRun'))).toBeLessThanOrEqual(
        allowed(one),
      )
    },
  )

  it.each(findCases('pitchRafter', /^hodgson/))(
    '$id: nearly $expected in a foot ($source)',
    (one) => {
      expect(distance(one, 12 * of(one, 'lengthPerRun'))).toBeLessThanOrEqual(allowed(one))
    },
  )

  it.each(findCases('pitchRafter', /^navy-hip-8/))('$id: $expected ft ($source)', (one) => {
    expect(
      distance(one, given(one, 'commonTotalRunFt') * of(one, 'hipPerRun')),
    ).toBeLessThanOrEqual(allowed(one))
  })

  // Level hips: the run alone, √2 of the common one.
  it.each([
    ['hip-unit-run', 'commonUnitRun'],
    ['navy-hip-total-run', 'commonTotalRunFt'],
    ['cyclopedia-hip-run-6in', 'commonRunIn'],
    ['griffith-hip-fraction-run', 'fractionOfFootIn'],
  ])('%s: the run of a hip', (id, input) => {
    const [one] = findCases('pitchRafter', new RegExp(`^${id}$`))
    if (!one) throw new Error('case is missing')
    const run = given(one, input) * computeNumber('pitch', 'hipPerRun', nearlyLevel)
    expect(distance(one, run)).toBeLessThanOrEqual(allowed(one))
  })
})

describe('pitch says one slope in every way', () => {
  it.each(findCases('drainageFall', /^slope-pct/))('$id: $expected % ($source)', (one) => {
    const texts = { risePer12: `${String(given(one, 'slopeInPerFt'))} in/ft` }
    expect(distance(one, computeNumber('pitch', 'percent', texts))).toBeLessThanOrEqual(
      allowed(one),
    )
  })

  it.each(findCases('drainageFall', /^slope-ratio/))('$id: 1 in $expected ($source)', (one) => {
    const texts = { percent: String(given(one, 'percent')) }
    expect(distance(one, 1 / computeNumber('pitch', 'ratio', texts))).toBeLessThanOrEqual(
      allowed(one),
    )
  })

  it.each<Record<string, string>>([
    { risePer12: '6' },
    { degrees: '26.565051177078 deg' },
    { percent: '50 %' },
    { ratio: '1:2' },
    { rise: '500 mm', run: '1 m' },
    { rise: `1'`, run: `2'` },
  ])('%o is 6 in 12', (texts) => {
    const outputs = compute('pitch', texts)
    expect(outputs['risePer12']).toBeCloseTo(6, 9)
    expect(outputs['lengthPerRun']).toBeCloseTo(evaluate('sqrt(1 + 0.5^2)') as number, 9)
    expect(outputs['hipPerRun']).toBeCloseTo(evaluate('sqrt(2 + 0.5^2)') as number, 9)
    expect(outputs['degrees']).toBeCloseTo(evaluate('atan(0.5)') as number, 9)
  })

  it.each([
    ['nothing at all', {}, 'risePer12'],
    ['two ways at once', { risePer12: '4', percent: '33' }, 'percent'],
    ['a way and a rise', { risePer12: '4', rise: '1 m', run: '3 m' }, 'rise'],
    ['a rise without a run', { rise: '1 m' }, 'run'],
    ['a run without a rise', { run: '1 m' }, 'rise'],
    ['90°', { degrees: '90' }, 'degrees'],
    ['a wall', { rise: '10 m', run: '1 m' }, 'rise'],
    ['a falling roof', { percent: '-5' }, 'percent'],
  ])('refuses %s', (_case, texts, input) => {
    expect(refuse('pitch', texts as Record<string, string>)).toHaveProperty(input)
  })

  it('takes 80° and not a hair more', () => {
    expect(refuse('pitch', { degrees: '80' })).toEqual({})
    expect(refuse('pitch', { degrees: '80.01' })).toHaveProperty('degrees')
  })
})
