import fc from 'fast-check'
import { evaluate } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { coating } from '../../../shared/calculators/coating'
import { GALLON } from '../../../shared/calculators/coatingTin'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases, given } from '../../reference/referenceCases'

const usual = { area: '20 m²', coats: '2', coverage: '6 m²', coverageFor: 'L', roughness: '20' }
const input = (name: string) => {
  const found = coating.inputs.find((one) => one.name === name)
  if (!found) throw new Error(`no input ${name}`)
  return found
}
const inGallons = (feet: string, coverage: string) =>
  computeNumber('coating', 'volume', {
    area: feet,
    coats: '1',
    coverage,
    coverageFor: 'gal',
    roughness: '0',
  }) / GALLON

describe('coating against printed figures', () => {
  it.each(findCases('fastenersPaint', /^paint-example-primer/))(
    '$id: $expected gallons ($source)',
    (one) => {
      const [area, coverage] = ['areaFt2', 'ft2PerGal'].map((name) => given(one, name))
      const gallons = inGallons(`${String(area)} ft²`, `${String(coverage)} ft²`)
      expect(distance(one, gallons)).toBeLessThanOrEqual(allowed(one))
    },
  )

  it.each(findCases('fastenersPaint', /^(stain-decks|paint-350-primer)/))(
    '$id: a gallon of it covers its printed range, $expected ft² ($source)',
    (one) => {
      for (const feet of one.expected as number[])
        expect(inGallons(`${String(feet)} ft²`, `${String(feet)} ft²`)).toBeCloseTo(1, 12)
    },
  )

  it.each(findCases('fastenersPaint', /^paint-400/))(
    '$id: names the extras of the same article, 20, 10 and 33 %',
    (one) => {
      const said = [...one.note.matchAll(/\+(\d+) (?:percent )?(\w+)/g)]
      const extraOf = Object.fromEntries(said.map(([, extra, word]) => [word, extra]))
      const help = input('roughness').help ?? ''
      expect(help).toContain(`narrow lapped boards ${String(extraOf['narrow'])}`)
      expect(help).toContain(`rough or thirsty ${String(extraOf['rough'])}`)
      expect(help).toContain(`corrugated ${String(extraOf['corrugated'])}`)
      expect(input('roughness').initial.metric).toBe(extraOf['rough'])
    },
  )

  it('starts within the printed range of deck stain, in both systems', () => {
    const [stain] = findCases('fastenersPaint', /^stain-decks/)
    const [least = 0, most = 0] = stain?.expected as number[]
    const feet = Number(input('coverage').initial.imperial)
    const fromLitre = (Number(input('coverage').initial.metric) / 0.3048 ** 2) * (GALLON / 0.001)
    for (const value of [feet, fromLitre]) {
      expect(value).toBeGreaterThanOrEqual(least)
      expect(value).toBeLessThanOrEqual(most)
    }
    const help = input('coverage').help ?? ''
    expect(help).toContain(`${String(least)} to ${String(most)} ft² a gallon`)
    const [low, high] = [least, most].map((value) =>
      Math.round((value * 0.3048 ** 2) / (GALLON / 0.001)),
    )
    expect(help).toContain(`${String(low)} to ${String(high)} m² a litre`)
  })
})

describe('coating', () => {
  it.each([
    [{}, 8, 4],
    [{ coats: '1' }, 4, 4],
    [{ coats: '6' }, 24, 4],
    [{ roughness: '0' }, 6.666667, 3.333333],
    [{ roughness: '150' }, 16.666667, 8.333333],
    [{ area: '0.1 m²' }, 0.04, 0.02],
    [{ coverage: '12 m²' }, 4, 2],
  ])('%j: %d L, %d L a coat', (texts: Record<string, string>, litres, each) => {
    const outputs = compute('coating', { ...usual, ...texts })
    expect(Number(outputs['volume']) * 1000).toBeCloseTo(litres, 6)
    expect(Number(outputs['volumePerCoat']) * 1000).toBeCloseTo(each, 6)
  })

  it('agrees with mathjs, whose gallon is the US one', () => {
    const litres = evaluate('number(200 sqft * 1.2 / (250 sqft / gallon) * 2, L)') as number
    const texts = { ...usual, area: '200 ft²', coverage: '250 ft²', coverageFor: 'gal' }
    expect(computeNumber('coating', 'volume', texts) * 1000).toBeCloseTo(litres, 3)
  })

  it('takes a rough face of 20 % where nothing is said', () => {
    const { area, coats, coverage, coverageFor } = usual
    expect(computeNumber('coating', 'volume', { area, coats, coverage, coverageFor })).toBeCloseTo(
      0.008,
      12,
    )
  })

  it('reads a bare coverage by the litre in metric and by the gallon in feet', () => {
    const bare = { area: '20 m²', coats: '1', coverage: '6', roughness: '0' }
    expect(compute('coating', bare)['volume']).toBeCloseTo(0.02 / 6, 12)
    const feet = compute('coating', { ...bare, area: '250', coverage: '250' }, 'imperial')
    expect(Number(feet['volume']) / GALLON).toBeCloseTo(1, 12)
  })

  it('grows with area and coats, and halves where a tin covers twice as much', () => {
    const size = (min: number, max: number) => fc.integer({ min, max })
    fc.assert(
      fc.property(
        size(1, 1000),
        size(1, 6),
        size(1, 12),
        size(0, 150),
        (area, coats, m2, extra) => {
          const texts = {
            area: `${String(area)} m²`,
            coats: String(coats),
            coverage: `${String(m2)} m²`,
            coverageFor: 'L',
            roughness: String(extra),
          }
          const litres = computeNumber('coating', 'volume', texts) * 1000
          expect(litres * m2).toBeCloseTo(area * coats * (1 + extra / 100), 6)
          const farther = { ...texts, coverage: `${String(2 * m2)} m²` }
          expect(computeNumber('coating', 'volume', farther) * 2000).toBeCloseTo(litres, 6)
        },
      ),
    )
  })
})

describe('coating finds what first-timers do', () => {
  const values = { area: 20, coats: 2, coverage: 6, coverageFor: 'L', roughness: 20 }
  it.each([
    ['one-coat', 4],
    ['all-coats', 8],
    ['roughness-forgotten', 6.666667],
    ['roughness-forgotten-in-a-coat', 3.333333],
    ['roughness-taken-off', 5.333333],
    ['multiplied', 288],
    ['litre-for-gallon', 30.283294],
  ])('%s: %d L', (id, litres) => {
    const wrong = coating.slips.find((one) => one.id === id)?.wrong
    expect(Number(wrong?.(values, compute('coating', usual), 'metric')) * 1000).toBeCloseTo(
      litres,
      5,
    )
  })

  it('multiplied in feet and gallons', () => {
    const texts = { ...usual, area: '100 ft²', coverage: '250 ft²', coverageFor: 'gal' }
    const square = 0.3048 ** 2
    const feet = { ...values, area: 100 * square, coverage: 250 * square, coverageFor: 'gal' }
    const wrong = coating.slips.find(({ id }) => id === 'multiplied')?.wrong
    const gallons = Number(wrong?.(feet, compute('coating', texts), 'imperial')) / GALLON
    expect(gallons).toBeCloseTo(60_000, 6)
  })
})

describe('coating refuses what cannot be', () => {
  it.each([
    [{ coats: '1.5' }, 'coats', 'Coats are whole'],
    [{ coats: '0' }, 'coats', 'out of range'],
    [{ coats: '7' }, 'coats', 'out of range'],
    [{ coverage: '26 m²' }, 'coverage', 'for a litre or for a gallon?'],
    [{ coverage: '1.8 m²', coverageFor: 'gal' }, 'coverage', 'for a litre or for a gallon?'],
    [{ coverage: '0 m²' }, 'coverage', 'out of range'],
    [{ area: '-1 m²' }, 'area', 'out of range'],
    [{ area: '1001 m²' }, 'area', 'out of range'],
    [{ roughness: '151' }, 'roughness', 'out of range'],
  ])('%j', (texts: Record<string, string>, name, sentence) => {
    expect(refuse('coating', { ...usual, ...texts })[name]).toContain(sentence)
  })

  it.each(['0.5 m²', '25 m²'])('takes %s a litre, right at the bound', (coverage) => {
    expect(refuse('coating', { ...usual, coverage })).toEqual({})
  })

  it('warns of oily rags before anything else', () => {
    expect(coating.cautions[0]?.title).toBe('Oily rags catch fire by themselves')
  })
})
