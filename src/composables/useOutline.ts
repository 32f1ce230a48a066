import { computed, nextTick, ref, watch } from 'vue'
import type { BenchCourse, BenchLessonRow } from '../../shared/contracts/benchCourses'
import { moveInOutline, type OutlineStage, type Picked } from '../components/courses/outlineOrder'

const orderOf = (course: BenchCourse): OutlineStage[] =>
  course.stages.map((stage) => ({
    id: stage.id,
    lessonIds: stage.lessons.map((lesson) => lesson.id),
  }))

/** The order of stages and lessons while it is changed: picked up and moved by keys, or dragged. */
export function useOutline(
  course: () => BenchCourse,
  save: (order: OutlineStage[]) => Promise<void>,
) {
  const order = ref<OutlineStage[]>(orderOf(course()))
  const picked = ref<Picked | null>(null)
  const said = ref('')
  let before: OutlineStage[] = []

  watch(course, (changed) => {
    if (!picked.value) order.value = orderOf(changed)
  })

  const lessons = computed(() => {
    const rows = new Map<number, BenchLessonRow>()
    for (const stage of course().stages) {
      for (const lesson of stage.lessons) rows.set(lesson.id, lesson)
    }
    return rows
  })
  /** Stages and lessons in the order of this moment, numbered through. */
  const stages = computed(() => {
    let number = 0
    return order.value.flatMap(({ id, lessonIds }) => {
      const stage = course().stages.find((candidate) => candidate.id === id)
      if (!stage) return []
      const rows = lessonIds.flatMap((lessonId) => lessons.value.get(lessonId) ?? [])
      return [{ ...stage, rows: rows.map((row) => ({ ...row, number: ++number })) }]
    })
  })
  const placeOf = ({ kind, id }: Picked) => {
    if (kind === 'stage') {
      const index = order.value.findIndex((stage) => stage.id === id)
      return `stage ${index + 1} of ${order.value.length}`
    }
    const stage = stages.value.find(({ rows }) => rows.some((row) => row.id === id))
    const row = stage?.rows.find((candidate) => candidate.id === id)
    return `lesson ${row?.number ?? 0} of ${lessons.value.size}, ${stage?.title ?? ''}`
  }
  async function keepFocus({ kind, id }: Picked) {
    await nextTick()
    document.querySelector<HTMLElement>(`[data-grip="${kind}-${id}"]`)?.focus()
  }

  function pickUp(what: Picked) {
    before = order.value
    picked.value = what
    said.value = `Picked up: ${placeOf(what)}.`
  }
  function move(by: -1 | 1) {
    if (!picked.value) return
    order.value = moveInOutline(order.value, picked.value, by)
    said.value = placeOf(picked.value)
    void keepFocus(picked.value)
  }
  async function putDown() {
    const what = picked.value
    if (!what) return
    said.value = `Put down: ${placeOf(what)}.`
    picked.value = null
    await save(order.value)
    await keepFocus(what)
  }
  function putBack() {
    const what = picked.value
    if (!what) return
    order.value = before
    picked.value = null
    said.value = 'Put back where it was.'
    void keepFocus(what)
  }
  function onKey(event: KeyboardEvent, what: Picked) {
    const isHeld = picked.value?.kind === what.kind && picked.value.id === what.id
    if (event.key === ' ' || (event.key === 'Enter' && isHeld)) {
      if (isHeld) void putDown()
      else pickUp(what)
    } else if (isHeld && event.key === 'ArrowUp') move(-1)
    else if (isHeld && event.key === 'ArrowDown') move(1)
    else if (isHeld && event.key === 'Escape') putBack()
    else return
    event.preventDefault()
  }
  /** After a drag the lists already stand as they were dropped. */
  const drop = () => save(order.value)

  return { order, stages, picked, said, placeOf, pickUp, move, putDown, putBack, onKey, drop }
}
