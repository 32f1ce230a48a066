import { flushPromises } from '@vue/test-utils'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { effectScope, nextTick, shallowRef } from 'vue'
import type { BenchCourse } from '../../../shared/contracts/benchCourses'
import { ApiProblem } from '../../../src/api/client'
import type { OutlineStage } from '../../../src/components/courses/outlineOrder'
import { useOutline } from '../../../src/composables/useOutline'

const lesson = (id: number) => ({ id, title: `Lesson ${id}` })
function courseOf(order: OutlineStage[]): BenchCourse {
  const stages = order.map(({ id, lessonIds }) => ({
    id,
    title: `Stage ${id}`,
    lessons: lessonIds.map(lesson),
  }))
  return { stages } as unknown as BenchCourse
}
const first: OutlineStage[] = [
  { id: 1, lessonIds: [11, 12] },
  { id: 2, lessonIds: [21] },
]
const save = vi.fn<(order: OutlineStage[]) => Promise<void>>()
const course = shallowRef(courseOf(first))
const key = (name: string) => new KeyboardEvent('keydown', { key: name, cancelable: true })
const open = () => effectScope().run(() => useOutline(() => course.value, save))!
const held = { kind: 'lesson', id: 12 } as const

beforeEach(() => {
  course.value = courseOf(first)
  save.mockReset()
  save.mockImplementation(async (order) => {
    course.value = courseOf(order)
  })
})

describe('useOutline', () => {
  it('numbers lessons through all stages', () => {
    const { stages } = open()
    expect(stages.value.map(({ rows }) => rows.map(({ number }) => number))).toEqual([[1, 2], [3]])
  })

  it('moves what is picked up by arrows over the end of a stage, and saves when it is put down', async () => {
    const { press, onKey, said, order } = open()
    await press(held)
    expect(said.value).toBe('Picked up: lesson 2 of 3, Stage 1.')
    onKey(key('ArrowDown'), held)
    expect(said.value).toBe('Now lesson 2 of 3, Stage 2.')
    expect(save).not.toHaveBeenCalled()
    await press(held)
    const moved = [
      { id: 1, lessonIds: [11] },
      { id: 2, lessonIds: [12, 21] },
    ]
    expect(save.mock.calls).toEqual([[moved]])
    expect(order.value).toEqual(moved)
  })

  it('moves a stage with its lessons', async () => {
    const { press, onKey } = open()
    const stage = { kind: 'stage', id: 2 } as const
    await press(stage)
    onKey(key('ArrowUp'), stage)
    await press(stage)
    expect(save.mock.calls[0]?.[0].map(({ id }) => id)).toEqual([2, 1])
  })

  it('puts back on Escape and saves nothing', async () => {
    const { press, onKey, order, picked } = open()
    await press(held)
    onKey(key('ArrowUp'), held)
    onKey(key('Escape'), held)
    expect([order.value, picked.value]).toEqual([first, null])
    expect(save).not.toHaveBeenCalled()
  })

  it('leaves the arrows to the page while nothing is picked up', () => {
    const event = key('ArrowDown')
    const { onKey, order } = open()
    onKey(event, held)
    expect([event.defaultPrevented, order.value]).toEqual([false, first])
  })

  it('saves a drag from one list to another once, with both lists', async () => {
    const { setLessons, keep } = open()
    setLessons(2, [21, 11])
    setLessons(1, [12])
    await keep()
    expect(save.mock.calls).toEqual([
      [
        [
          { id: 1, lessonIds: [12] },
          { id: 2, lessonIds: [21, 11] },
        ],
      ],
    ])
  })

  it('saves nothing when all was dropped where it had been', async () => {
    const { setLessons, keep } = open()
    setLessons(1, [11, 12])
    await keep()
    expect(save).not.toHaveBeenCalled()
  })

  it('puts a refused order back, with the reason', async () => {
    const detail = 'Rev A is issued: its order is frozen.'
    save.mockRejectedValueOnce(
      new ApiProblem({ type: 'about:blank', title: 'frozen', status: 409, code: 'frozen', detail }),
    )
    const { setStages, keep, order, message } = open()
    setStages([2, 1])
    await keep()
    expect(order.value).toEqual(first)
    expect(message.value).toBe(`The order was put back. ${detail}`)
  })

  it('saves a second move after the first was answered, and loses neither', async () => {
    let answer: () => void = () => undefined
    save.mockImplementationOnce(
      (order) =>
        new Promise((resolve) => {
          answer = () => {
            course.value = courseOf(order)
            resolve()
          }
        }),
    )
    const { setStages, setLessons, keep, order } = open()
    setStages([2, 1])
    const going = keep()
    setLessons(1, [12, 11])
    await keep()
    expect(save).toHaveBeenCalledTimes(1)
    answer()
    await going
    await flushPromises()
    const both = [
      { id: 2, lessonIds: [21] },
      { id: 1, lessonIds: [12, 11] },
    ]
    expect(save.mock.lastCall).toEqual([both])
    expect(order.value).toEqual(both)
  })

  it('shows a lesson that was added meanwhile', async () => {
    const { stages } = open()
    course.value = courseOf([...first, { id: 3, lessonIds: [31] }])
    await nextTick()
    expect(stages.value.at(-1)?.rows.map(({ title }) => title)).toEqual(['Lesson 31'])
  })
})
