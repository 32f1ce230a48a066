import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import { findCalculator, runCalculator } from '../../../../shared/calculators'
import CalculatorSheetDrawing from '../../../../src/components/drawings/CalculatorSheetDrawing.vue'
import { drawSlabSheet } from '../../../../src/components/drawings/slabSheet'
import { drawSquareSheet } from '../../../../src/components/drawings/squareSheet'

const pad = { length: 2.6, width: 1.1, thickness: 0.1 }

describe('CalculatorSheetDrawing', () => {
  it('draws again when a number or the system changes', async () => {
    const wrapper = mount(CalculatorSheetDrawing, {
      props: { draw: drawSlabSheet, values: pad, outputs: null, system: 'metric', size: 'narrow' },
    })
    expect(wrapper.text()).toContain('2600')
    await wrapper.setProps({ values: { ...pad, length: 3 } })
    expect(wrapper.text()).toContain('3000')
    await wrapper.setProps({ system: 'imperial' })
    expect(wrapper.text()).toContain(`9' 10-1/8"`)
  })

  it('keeps the last drawing that fitted, and says so', async () => {
    const wrapper = mount(CalculatorSheetDrawing, {
      props: { draw: drawSlabSheet, values: pad, outputs: null, system: 'metric', size: 'wide' },
    })
    await wrapper.setProps({ values: { ...pad, width: undefined } })
    expect(wrapper.text()).toContain('1100')
    expect(wrapper.text()).toContain('Drawn from the last numbers that fit.')
  })

  it('says that it waits while there are no numbers yet', () => {
    const wrapper = mount(CalculatorSheetDrawing, {
      props: { draw: drawSlabSheet, values: {}, outputs: null, system: 'metric' },
    })
    expect(wrapper.find('svg').exists()).toBe(false)
    expect(wrapper.text()).toContain('Drawn once the numbers are in.')
  })

  it('says in words what the calculator worked out', () => {
    const square = findCalculator('square')
    const run = square && runCalculator(square, square.example.inputs, 'metric')
    if (!run?.ok) throw new Error('the example of the 3-4-5 does not run')
    const { values, outputs } = run
    const wrapper = mount(CalculatorSheetDrawing, {
      props: { draw: drawSquareSheet, values, outputs, system: 'metric' },
    })
    expect(wrapper.get('svg').attributes('aria-label')).toContain('the tape reads 1500')
  })
})
