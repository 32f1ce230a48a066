import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { initialCutList } from '../../../../src/components/exercises/cutListInitial'
import { readCutListLink, writeCutListLink } from '../../../../src/components/exercises/cutListLink'
import { readCutList } from '../../../../src/components/exercises/cutListReading'
import { rowOf, showTyped } from '../../../../src/components/exercises/cutListTyped'

describe('the link of a cut list', () => {
  it('carries a list as it was typed', () => {
    const list = initialCutList('imperial')
    expect(readCutListLink(writeCutListLink(list, 'imperial'))).toEqual(list)
    expect(writeCutListLink(list, 'imperial')['stock']).toBe(
      `4x4*8'~4x4*12'~2x4*12'~2x4*16'~1x6*8'~1x6*12'`,
    )
  })

  it('is bare while nothing was typed', () => {
    expect(writeCutListLink(null, 'metric')).toEqual({})
    expect(readCutListLink({})).toBeNull()
    expect(readCutListLink({ parts: ['a', 'b'] })).toBeNull()
  })

  it('means the same where parts of it were typed in the other units', () => {
    const list = initialCutList('metric')
    const mixed = {
      ...list,
      parts: [...list.parts, rowOf('parts', 'x', ['Shelf', '35', '2', '2x4'], 'imperial')],
    }
    for (const system of ['metric', 'imperial'] as const) {
      const carried = readCutListLink(writeCutListLink(mixed, system))
      expect(carried && readCutList(carried, system)).toEqual(readCutList(mixed, system))
    }
    const length = readCutListLink(writeCutListLink(mixed, 'metric'))?.parts.at(-1)?.cells['length']
    expect(length && showTyped(length, 'length', 'metric')).toBe('35 in')
  })

  it('stays within the size of a list, whatever a link says', () => {
    fc.assert(
      fc.property(fc.string(), fc.string(), fc.nat(2000), (parts, stock, times) => {
        const long = `${parts}~${stock}*`.repeat(times)
        const list = readCutListLink({ parts: long, stock: long, kerf: parts, units: stock })
        const again = list && writeCutListLink(list, 'metric')
        expect(list?.parts.length ?? 0).toBeLessThanOrEqual(40)
        expect(list?.stock.length ?? 0).toBeLessThanOrEqual(12)
        expect(JSON.stringify(again ?? '').length).toBeLessThan(14_000)
      }),
    )
  })

  it('writes what stands between its cells as a space', () => {
    const list = {
      ...initialCutList('metric'),
      parts: [rowOf('parts', 'a', ['A*B~C', '895', '1'], 'metric')],
    }
    expect(writeCutListLink(list, 'metric')['parts']).toBe('A B C*895*1')
  })
})
