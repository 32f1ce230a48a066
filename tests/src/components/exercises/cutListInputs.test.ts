import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it } from 'vitest'
import { useCutListInputs } from '../../../../src/components/exercises/cutListInputs'
import { cellOf } from '../../../../src/components/exercises/cutListTyped'
import { useAccountsStore } from '../../../../src/stores/accounts'

beforeEach(() => {
  localStorage.clear()
  setActivePinia(createPinia())
})

describe('useCutListInputs', () => {
  it('starts from a round list in either system, until something is typed', () => {
    const accounts = useAccountsStore()
    const { list, reading, typed } = useCutListInputs(null)
    expect(list.value.kerf.text).toBe('3')
    accounts.units = 'imperial'
    expect(list.value.kerf.text).toBe('1/8')
    expect(reading.value.request?.kerfMm).toBeCloseTo(3.175, 9)
    expect(typed.value).toBeNull()
  })

  it('keeps what was typed, and works it out the same in the other units', () => {
    const accounts = useAccountsStore()
    const { write, setting, reading, isRounded } = useCutListInputs(null)
    write('parts', 'parts-6', 'length', '0.9 m')
    const trim = setting('endTrim')
    trim.value = '12'
    const before = reading.value.request
    accounts.units = 'imperial'
    expect(reading.value.request).toEqual(before)
    expect(isRounded.value).toBe(true)
    expect(trim.value).toBe('1/2"')
    trim.value = '1'
    expect(reading.value.request?.endTrimMm).toBeCloseTo(25.4, 9)
    expect(reading.value.request?.parts.at(-1)?.lengthMm).toBeCloseTo(900, 9)
    accounts.units = 'metric'
    expect(isRounded.value).toBe(true)
    expect(trim.value).toBe('25')
  })

  it('adds a line of the section of the last one, and takes lines out', () => {
    const { addRow, takeOut, list, reading } = useCutListInputs(null)
    const id = addRow('stock')
    const added = list.value.stock.at(-1)
    expect(added?.id).toBe(id)
    expect(added && cellOf(added, 'section').text).toBe('19×140')
    expect(reading.value.errors).toEqual({})
    takeOut('stock', id)
    takeOut('parts', 'parts-0')
    expect(list.value.stock).toHaveLength(6)
    expect(list.value.parts).toHaveLength(6)
  })

  it('makes room for a list of one’s own, and comes back', () => {
    const { clear, startAgain, list, reading } = useCutListInputs(null)
    clear()
    expect([list.value.parts.length, list.value.stock.length]).toEqual([1, 1])
    expect(Object.keys(reading.value.errors)).toEqual(['parts', 'stock'])
    startAgain()
    expect(list.value.parts).toHaveLength(7)
  })
})
