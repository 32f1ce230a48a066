import { describe, expect, it } from 'vitest'
import type { UnitSystem } from '../../../../shared/contracts/exercises'
import { readCutList } from '../../../../src/components/exercises/cutListReading'
import { rowOf, type TypedCutList } from '../../../../src/components/exercises/cutListTyped'

const listOf = (
  parts: string[][],
  stock: string[][],
  system: UnitSystem = 'metric',
  [kerf, endTrim]: readonly [string, string] = ['3', '10'],
): TypedCutList => ({
  parts: parts.map((texts, at) => rowOf('parts', `p${at}`, texts, system)),
  stock: stock.map((texts, at) => rowOf('stock', `s${at}`, texts, system)),
  kerf: { text: kerf, system },
  endTrim: { text: endTrim, system },
})
const slat = ['Slat', '895', '8', '19×140']
const bar = ['19 x 140', '3.6 m']
const errorsOf = (list: TypedCutList, system: UnitSystem = 'metric') =>
  readCutList(list, system).errors

describe('reading a cut list', () => {
  it('reads lengths, counts, sections and prices as they are typed', () => {
    const { request } = readCutList(listOf([slat], [[...bar, '12,50', '4']]), 'metric')
    expect(request).toEqual({
      parts: [{ label: 'Slat', lengthMm: 895, count: 8, section: '19×140' }],
      stock: [{ lengthMm: 3600, section: '19×140', price: 1250, available: 4 }],
      ...{ kerfMm: 3, endTrimMm: 10 },
    })
  })

  it('reads each cell in the system it was typed in', () => {
    const list = listOf([['Rail', `7' 10-1/2"`, '2', '2x4']], [['2x4', `8'`]], 'imperial', [
      '1/8',
      '0',
    ])
    const { request } = readCutList(list, 'metric')
    expect(request?.parts[0]).toEqual({
      label: 'Rail',
      lengthMm: 2400.3,
      count: 2,
      section: '38×89',
    })
    expect(request?.stock[0]?.lengthMm).toBeCloseTo(2438.4, 9)
    expect(request?.kerfMm).toBeCloseTo(3.175, 9)
    expect(readCutList(list, 'imperial').request).toEqual(request)
  })

  it('names a part without a name, and overlooks lines that were only added', () => {
    const list = listOf(
      [
        ['', '895', '8', '19×140'],
        ['', '', '1', '19×140'],
      ],
      [bar, ['19×140']],
    )
    expect(readCutList(list, 'metric').request).toMatchObject({
      parts: [{ label: 'Part 1' }],
      stock: [{ lengthMm: 3600 }],
    })
  })

  it.each([
    [
      'a length that is none',
      [['Slat', 'long', '8', '19×140']],
      [bar],
      'p0.length',
      /“long” cannot be read/,
    ],
    [
      'a length that was left out',
      [['Slat', '', '8', '19×140']],
      [bar],
      'p0.length',
      /Nothing was written/,
    ],
    [
      'a length of 4 mm',
      [['Slat', '4', '8', '19×140']],
      [bar],
      'p0.length',
      /from 5.mm to 30.000.mm/,
    ],
    [
      'half a piece',
      [['Slat', '895', '1.5', '19×140']],
      [bar],
      'p0.count',
      /whole number from 1 to 400/,
    ],
    ['no piece', [['Slat', '895', '0', '19×140']], [bar], 'p0.count', /whole number/],
    [
      'more pieces than a list holds',
      [[...slat], ['Rail', '500', '393', '19×140']],
      [bar],
      'parts',
      /401 pieces/,
    ],
    [
      'a section of which there is no stock',
      [['Slat', '895', '8', '38×89']],
      [bar],
      'p0.section',
      /no 38×89 among/,
    ],
    [
      'a part longer than every bar',
      [['Rail', '3591', '1', '19×140']],
      [bar],
      'p0.length',
      /Longer than every 19×140 bar once 10.mm/,
    ],
    [
      'a price on one length only',
      [slat],
      [
        [...bar, '9'],
        ['19×140', '2400'],
      ],
      's1.price',
      /has a price/,
    ],
    [
      'a price that is none',
      [slat],
      [
        [...bar, 'dear'],
        ['19×140', '2400', '9'],
      ],
      's0.price',
      /“dear” cannot be read/,
    ],
    ['half a bar at hand', [slat], [[...bar, '', '0.5']], 's0.available', /whole number/],
    ['no parts', [], [bar], 'parts', /at least one part/],
    ['no stock', [slat], [], 'stock', /at least one length/],
  ] as const)('refuses %s where it stands', (_what, parts, stock, key, sentence) => {
    const list = listOf(
      parts.map((row) => [...row]),
      stock.map((row) => [...row]),
    )
    const { request, errors } = readCutList(list, 'metric')
    expect(request).toBeNull()
    expect(errors[key]).toMatch(sentence)
    expect(Object.keys(errors)).toHaveLength(1)
  })

  it('takes a part as long as the bar less its trim', () => {
    expect(errorsOf(listOf([['Rail', '3590', '1', '19×140']], [bar]))).toEqual({})
  })

  it('refuses a saw wider than any', () => {
    const list = listOf([slat], [bar], 'metric', ['26', '-1'])
    expect(errorsOf(list)['kerf']).toMatch(/from 0.mm to 25.mm/)
    expect(errorsOf(list)['endTrim']).toMatch(/from 0.mm/)
  })

  it('says lengths in the units of the reader', () => {
    const list = listOf([['Rail', '13 ft', '1', '2x4']], [['2x4', `12'`]], 'imperial', [
      '1/8',
      '1/2',
    ])
    expect(errorsOf(list, 'imperial')['p0.length']).toBe(
      'Longer than every 2x4 bar once 1/2" is trimmed off its end. Add a longer stock length, or join two pieces where the plan allows it.',
    )
  })
})
