import fc from 'fast-check'
import { evaluate } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { lid, MOST_TO_LIFT } from '../../../shared/calculators/lid'
import { PCF, PSF } from '../../../shared/calculators/snowCover'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases, given } from '../../reference/referenceCases'

const bare = { weight: '14 kg', depth: '800 mm', handleDistance: '750 mm' }
const wide = { ...bare, width: '1200 mm' }
const snowy = { ...wide, snowDepth: '200 mm', snowDensity: '200 kg/m³' }
const POUND_FORCE = 0.45359237 * 9.80665

describe('lid by the law of the lever', () => {
  it.each([
    ['10 kg', '1 m', '1 m', 49.03325],
    ['10 kg', '1 m', '0.5 m', 98.0665],
    ['10 kg', '1 m', '0.25 m', 196.133],
    ['0.2 kg', '100 mm', '250 mm', 0.392266],
    ['200 kg', '3 m', '50 mm', 58839.9],
  ])('%s, %s deep, handle at %s: %d N', (weight, depth, handleDistance, newtons) => {
    expect(computeNumber('lid', 'liftForce', { weight, depth, handleDistance })).toBeCloseTo(
      newtons,
      6,
    )
  })

  it('takes half of the pounds at the front edge, whatever the size', () => {
    const texts = { weight: '30 lb', depth: '32 in', handleDistance: '32 in' }
    expect(computeNumber('lid', 'liftForce', texts) / POUND_FORCE).toBeCloseTo(15, 9)
  })

  it('agrees with mathjs in newtons, units and all', () => {
    const expected = evaluate('number(14 kg * 9.80665 m/s^2 * 400 mm / 750 mm, N)') as number
    expect(computeNumber('lid', 'liftForce', bare)).toBeCloseTo(expected, 9)
  })

  it('holds the moments about the hinge in balance, with snow too', () => {
    const size = (min: number, max: number) => fc.integer({ min, max })
    fc.assert(
      fc.property(
        size(1, 200),
        size(100, 3000),
        size(50, 3000),
        size(10, 3000),
        size(20, 950),
        (kilograms, depth, handle, snow, density) => {
          fc.pre(handle <= depth + 150)
          const outputs = compute('lid', {
            weight: `${String(kilograms)} kg`,
            depth: `${String(depth)} mm`,
            handleDistance: `${String(handle)} mm`,
            width: '1000 mm',
            snowDepth: `${String(snow)} mm`,
            snowDensity: `${String(density)} kg/m³`,
          })
          const [lift, snowMass, under] = ['liftForce', 'snowWeight', 'liftForceWithSnow'].map(
            (name) => Number(outputs[name]),
          ) as [number, number, number]
          expect((lift * handle) / (kilograms * 9.80665 * depth)).toBeCloseTo(0.5, 9)
          expect(under / lift).toBeCloseTo((kilograms + snowMass) / kilograms, 9)
          expect(snowMass).toBeCloseTo((depth / 1000) * (snow / 1000) * density, 6)
        },
      ),
    )
  })
})

describe('snow on the lid', () => {
  it.each([
    [snowy, 38.4, 274.063],
    [{ ...wide, groundSnowLoad: '1 kPa' }, 97.893, 585.223],
    [{ ...wide, groundSnowLoad: '1 kPa', snowDensity: '300 kg/m³' }, 97.893, 585.223],
    [wide, 0, 73.223],
  ])('%j: %d kg, %d N', (texts, kilograms, newtons) => {
    const outputs = compute('lid', texts)
    expect(outputs['snowWeight']).toBeCloseTo(kilograms, 3)
    expect(outputs['liftForceWithSnow']).toBeCloseTo(newtons, 3)
  })

  it('needs no width where there is no snow', () => {
    expect(refuse('lid', bare)).toEqual({})
  })

  it.each(findCases('snowLoad', /^asce-density-(20|25|40|70|cap)$/))(
    '$id: a foot of snow at the density of the place, $expected lb/ft³ ($source)',
    (one) => {
      const texts = {
        weight: '30 lb',
        depth: '2 ft',
        handleDistance: '2 ft',
        width: '3 ft',
        snowDepth: '1 ft',
        groundSnowLoad: `${String(given(one, 'groundSnowPsf'))} psf`,
      }
      const cubicFeet = 6
      const pounds = computeNumber('lid', 'snowWeight', texts) / 0.45359237
      expect(distance(one, pounds / cubicFeet)).toBeLessThanOrEqual(allowed(one))
    },
  )

  it('weighs a ground snow load as psf times square feet', () => {
    const texts = { ...bare, depth: '2 ft', handleDistance: '2 ft', width: '3 ft' }
    const load = `${String(25 * PSF)} Pa`
    const weight = computeNumber('lid', 'snowWeight', { ...texts, groundSnowLoad: load })
    expect(weight / 0.45359237).toBeCloseTo(150, 9)
    expect(PCF * 0.3048).toBeCloseTo(PSF / 9.80665, 12)
  })
})

describe('cautions of the lid', () => {
  it('name the published most to lift, in both units, after the code and the engineer', () => {
    const [kilograms] = findCases('safety', /^lift-constant-kg/)
    const [pounds] = findCases('safety', /^lift-constant-lb/)
    const text = lid.cautions.map((caution) => caution.text).join(' ')
    expect(kilograms && distance(kilograms, MOST_TO_LIFT)).toBe(0)
    expect(pounds && distance(pounds, MOST_TO_LIFT / 0.45359237)).toBeLessThanOrEqual(0.5)
    expect(text).toContain(`${String(kilograms?.expected)} kg (${String(pounds?.expected)} lb)`)
    expect(lid.cautions[0]?.text).toMatch(/local code.*building department.*licensed engineer/s)
  })
})

describe('lid finds what first-timers do', () => {
  const wrong = (id: string, system: 'metric' | 'imperial' = 'metric', snow = true) => {
    const values = {
      weight: 14,
      depth: 0.8,
      handleDistance: 0.75,
      width: 1.2,
      ...(snow ? { snowDepth: 0.2, snowDensity: 200 } : {}),
    }
    const outputs = compute('lid', snow ? snowy : wide)
    return lid.slips.find((one) => one.id === id)?.wrong(values, outputs, system)
  }

  it.each([
    ['whole-weight', 137.2931],
    ['always-half', 68.64655],
    ['weight-at-the-edge', 146.445973],
    ['lever-upside-down', 257.424562],
    ['kilograms-as-newtons', 7.466667],
    ['snow-as-water', 192],
    ['snow-a-square', 40],
    ['snow-forgotten', 73.222987],
    ['snow-alone', 200.840192],
    ['snow-without-the-lever', 449.798347],
  ])('%s', (id, expected) => {
    expect(wrong(id)).toBeCloseTo(expected, 5)
  })

  it('looks for no slip of snow where there is none, nor for newtons in pounds', () => {
    for (const id of ['snow-as-water', 'snow-a-square', 'snow-forgotten', 'snow-alone'])
      expect(wrong(id, 'metric', false)).toBeUndefined()
    expect(wrong('kilograms-as-newtons', 'imperial')).toBeUndefined()
  })
})

describe('lid refuses what contradicts itself or is absurd', () => {
  it.each([
    [{ ...bare, handleDistance: '951 mm' }, 'handleDistance', 'past the front edge'],
    [{ ...bare, snowDepth: '200 mm', snowDensity: '200 kg/m³' }, 'width', 'Width is empty'],
    [{ ...wide, snowDepth: '200 mm' }, 'snowDensity', 'is empty'],
    [{ ...wide, snowDensity: '200 kg/m³' }, 'snowDepth', 'is empty'],
    [{ ...snowy, groundSnowLoad: '1 kPa' }, 'groundSnowLoad', 'said in two ways'],
    [{ ...bare, weight: '0 kg' }, 'weight', 'out of range'],
    [{ ...bare, weight: '201 kg' }, 'weight', 'out of range'],
    [{ ...bare, depth: '4 m' }, 'depth', 'out of range'],
    [{ ...bare, handleDistance: '-750 mm' }, 'handleDistance', 'out of range'],
  ])('%j', (texts: Record<string, string>, input, sentence) => {
    expect(refuse('lid', texts)[input]).toContain(sentence)
  })

  it('takes a handle that stands out by 150 mm', () => {
    expect(refuse('lid', { ...bare, handleDistance: '950 mm' })).toEqual({})
  })
})
