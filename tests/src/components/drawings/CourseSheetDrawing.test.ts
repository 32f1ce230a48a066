import { mount } from '@vue/test-utils'
import { nextTick } from 'vue'
import { afterEach, describe, expect, it, vi } from 'vitest'
import DeckDrawing from '../../../../src/components/drawings/DeckDrawing.vue'
import LogStoreDrawing from '../../../../src/components/drawings/LogStoreDrawing.vue'
import PicketFenceDrawing from '../../../../src/components/drawings/PicketFenceDrawing.vue'
import CourseSheetDrawing from '../../../../src/components/drawings/CourseSheetDrawing.vue'
import { drawLogStoreSheet } from '../../../../src/components/drawings/logStoreSheet'
import { STAGES, type CourseBubble } from '../../../../src/components/drawings/stages'

const bubbles: CourseBubble[] = STAGES.map((stage, index) => ({
  stage,
  number: index + 1,
  state: index < 2 ? 'done' : index === 2 ? 'here' : 'to-do',
}))

afterEach(() => vi.useRealTimers())

describe('CourseSheetDrawing', () => {
  it('says in words how far every stage has come', () => {
    const wrapper = mount(CourseSheetDrawing, {
      props: { draw: drawLogStoreSheet, stageStates: { ground: 'signed', frame: 'ink' }, bubbles },
    })
    const label = wrapper.get('svg').attributes('aria-label')
    expect(label).toBe(
      'Log store with a sloping roof, front and side elevation. 1 Ground: signed off. 2 Base: in pencil. ' +
        '3 Frame: inked, you are here. 4 Cladding: in pencil. 5 Roof: in pencil. 6 Finish: in pencil.',
    )
    expect(wrapper.get('svg').attributes('role')).toBe('img')
  })

  it('is hidden from those who cannot see it where the words beside it say the same', () => {
    const wrapper = mount(CourseSheetDrawing, {
      props: { draw: drawLogStoreSheet, stageStates: {}, decorative: true },
    })
    expect(wrapper.get('svg').attributes('aria-hidden')).toBe('true')
    expect(wrapper.get('svg').attributes('aria-label')).toBeUndefined()
  })

  it('draws a layer over its pencil while it is inked, and then leaves it', async () => {
    vi.useFakeTimers()
    const wrapper = mount(CourseSheetDrawing, {
      props: { draw: drawLogStoreSheet, stageStates: { ground: 'signed' } },
    })
    expect(wrapper.findAll('.is-inking')).toHaveLength(0)
    await wrapper.setProps({ stageStates: { ground: 'signed', base: 'ink' } })
    await nextTick()
    expect(wrapper.findAll('.l-base.is-ink.is-inking.from-pencil').length).toBeGreaterThan(0)
    expect(wrapper.findAll('.l-base.is-pencil').length).toBeGreaterThan(0)
    vi.advanceTimersByTime(900)
    await nextTick()
    expect(wrapper.findAll('.is-inking')).toHaveLength(0)
    expect(wrapper.findAll('.l-base.is-pencil')).toHaveLength(0)
  })

  it('changes at once for those who asked for less motion', async () => {
    vi.spyOn(window, 'matchMedia').mockImplementation(
      (query) =>
        Object.assign(new EventTarget(), {
          matches: query.includes('reduced-motion'),
        }) as MediaQueryList,
    )
    const wrapper = mount(CourseSheetDrawing, {
      props: { draw: drawLogStoreSheet, stageStates: {}, size: 'wide' },
    })
    await wrapper.setProps({ stageStates: { base: 'ink' } })
    await nextTick()
    expect(wrapper.findAll('.is-inking')).toHaveLength(0)
    expect(wrapper.findAll('.l-base.is-ink').length).toBeGreaterThan(0)
  })

  it('gives two drawings on one page clips of their own', () => {
    const page = mount({
      components: { CourseSheetDrawing },
      setup: () => ({ drawLogStoreSheet }),
      template: `<div><CourseSheetDrawing v-for="n in 2" :key="n" :draw="drawLogStoreSheet" :stage-states="{}" size="wide" /></div>`,
    })
    const ids = page.findAll('clipPath').map((clip) => clip.attributes('id'))
    expect(new Set(ids).size).toBe(2)
  })

  it.each([
    ['log store', LogStoreDrawing, 6],
    ['deck', DeckDrawing, 5],
    ['picket fence', PicketFenceDrawing, 6],
  ])('numbers the parts of the %s that it has', (_name, component, count) => {
    for (const size of ['wide', 'narrow'] as const) {
      const wrapper = mount(component, { props: { stageStates: {}, bubbles, size } })
      expect(wrapper.findAll('.bub')).toHaveLength(count)
      expect(wrapper.findAll('.b-done')).toHaveLength(2)
      expect(wrapper.findAll('.b-here')).toHaveLength(1)
    }
  })
})
