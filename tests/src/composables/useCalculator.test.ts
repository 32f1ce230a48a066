import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it } from 'vitest'
import { nextTick } from 'vue'
import { findCalculator } from '../../../shared/calculators'
import { useCalculator } from '../../../src/composables/useCalculator'
import { useAccountsStore } from '../../../src/stores/accounts'

const square = findCalculator('square')
if (!square) throw new Error('the calculator is not there')

describe('useCalculator', () => {
  beforeEach(() => {
    localStorage.clear()
    setActivePinia(createPinia())
  })

  it('starts from numbers that are round in the person’s units, also after they change', async () => {
    const { texts } = useCalculator(square)
    expect(texts.value['sideA']).toBe('2600')
    useAccountsStore().units = 'imperial'
    await nextTick()
    expect(texts.value['sideA']).toBe(`8' 6"`)
  })

  it('shows what was typed converted, and as it was typed on the way back', async () => {
    const accounts = useAccountsStore()
    const { texts, textOf, run } = useCalculator(square)
    textOf('sideA').value = '2.6 m'
    accounts.units = 'imperial'
    await nextTick()
    expect(texts.value['sideA']).toBe(`8' 6-3/8"`)
    expect(run.value.ok && run.value.values['sideA']).toBeCloseTo(2.6, 3)
    accounts.units = 'metric'
    await nextTick()
    expect(texts.value['sideA']).toBe('2.6 m')
  })

  it('keeps the last good run while a number is half typed', () => {
    const { textOf, errors, worked } = useCalculator(square)
    const before = worked.value
    textOf('sideA').value = 'lots'
    expect(errors.value).toHaveProperty('sideA')
    expect(worked.value).toEqual(before)
  })

  it('opens with the numbers of a link, in the units of who opens it', () => {
    useAccountsStore().units = 'metric'
    const texts = { sideA: '10 ft', sideB: '5', unit: '' }
    const opened = useCalculator(square, { system: 'imperial', texts })
    expect(opened.texts.value).toEqual({ sideA: '3048', sideB: '127', unit: '' })
  })
})
