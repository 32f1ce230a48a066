import { computed, nextTick, ref, watch } from 'vue'
import type { BenchCourse, BenchLessonRow, BenchStage } from '../../shared/contracts/benchCourses'
import { asProblem } from '../api/client'
import { moveInOutline, type OutlineStage, type Picked } from '../components/courses/outlineOrder'

export type OutlineLesson = BenchLessonRow & { number: number }
export type OutlineRow = BenchStage & { number: number; rows: OutlineLesson[] }
export type Outline = ReturnType<typeof useOutline>

const orderOf = (course: BenchCourse): OutlineStage[] =>
  course.stages.map((stage) => ({
    id: stage.id,
    lessonIds: stage.lessons.map((lesson) => lesson.id),
  }))
const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b)

/**
 * The order of stages and lessons while it is changed: picked up and moved by keys, or dragged.
 * It is saved at once; an order that is refused is put back, with the reason in `message`.
 */
export function useOutline(
  course: () => BenchCourse,
  save: (order: OutlineStage[]) => Promise<void>,
) {
  const order = ref<OutlineStage[]>(orderOf(course()))
  const picked = ref<Picked | null>(null)
  const said = ref('')
  const message = ref('')
  let before: OutlineStage[] = []
  let isSaving = false
  let isWaiting = false

  watch(course, (changed) => {
    if (!picked.value && !isWaiting) order.value = orderOf(changed)
  })

  /** Stages and lessons in the order of this moment, numbered through. */
  const stages = computed<OutlineRow[]>(() => {
    const all = course().stages
    const lessons = new Map(all.flatMap((stage) => stage.lessons).map((row) => [row.id, row]))
    let number = 0
    return order.value.flatMap(({ id, lessonIds }, index) => {
      const stage = all.find((candidate) => candidate.id === id)
      const rows = lessonIds.flatMap((lessonId) => lessons.get(lessonId) ?? [])
      if (!stage) return []
      return [
        { ...stage, number: index + 1, rows: rows.map((row) => ({ ...row, number: ++number })) },
      ]
    })
  })

  function placeOf({ kind, id }: Picked) {
    if (kind === 'stage') {
      const stage = stages.value.find((candidate) => candidate.id === id)
      return `stage ${stage?.number ?? 0} of ${stages.value.length}`
    }
    const stage = stages.value.find(({ rows }) => rows.some((row) => row.id === id))
    const row = stage?.rows.find((candidate) => candidate.id === id)
    const inAll = stages.value.reduce((sum, { rows }) => sum + rows.length, 0)
    return `lesson ${row?.number ?? 0} of ${inAll}, ${stage?.title ?? ''}`
  }
  const isHeld = (kind: Picked['kind'], id: number) =>
    picked.value?.kind === kind && picked.value.id === id

  async function keepFocus({ kind, id }: Picked) {
    await nextTick()
    document.querySelector<HTMLElement>(`[data-grip="${kind}-${id}"]`)?.focus()
  }

  /** Saves the order as it stands, one save after the other. */
  async function keep(): Promise<void> {
    if (same(order.value, orderOf(course()))) return
    isWaiting = isSaving
    if (isSaving) return
    isSaving = true
    message.value = ''
    try {
      await save(order.value)
    } catch (error) {
      isWaiting = false
      order.value = orderOf(course())
      message.value = `The order was put back. ${asProblem(error).message}`
    } finally {
      isSaving = false
    }
    if (isWaiting) {
      isWaiting = false
      await keep()
    }
  }

  function pickUp(what: Picked) {
    before = order.value
    picked.value = what
    said.value = `Picked up: ${placeOf(what)}.`
  }
  function move(by: -1 | 1) {
    if (!picked.value) return
    order.value = moveInOutline(order.value, picked.value, by)
    said.value = `Now ${placeOf(picked.value)}.`
    void keepFocus(picked.value)
  }
  async function putDown() {
    const what = picked.value
    if (!what) return
    said.value = `Put down: ${placeOf(what)}.`
    picked.value = null
    await keepFocus(what)
    await keep()
  }
  function putBack() {
    const what = picked.value
    if (!what) return
    order.value = before
    picked.value = null
    said.value = 'Put back where it was.'
    void keepFocus(what)
  }

  /** A press of the grip, by Space, Enter, mouse or finger. */
  async function press(what: Picked) {
    if (isHeld(what.kind, what.id)) return putDown()
    await putDown()
    pickUp(what)
  }
  function onKey(event: KeyboardEvent, what: Picked) {
    if (!isHeld(what.kind, what.id)) return
    if (event.key === 'ArrowUp') move(-1)
    else if (event.key === 'ArrowDown') move(1)
    else if (event.key === 'Escape') putBack()
    else return
    event.preventDefault()
  }

  /** What a drag has left: a list of the lessons of one stage, or of the stages. */
  function setLessons(stageId: number, lessonIds: number[]) {
    order.value = order.value.map((stage) =>
      stage.id === stageId ? { ...stage, lessonIds } : stage,
    )
  }
  function setStages(ids: number[]) {
    order.value = ids.flatMap((id) => order.value.find((stage) => stage.id === id) ?? [])
  }
  const lessonIdsOf = (stageId: number) =>
    order.value.find((stage) => stage.id === stageId)?.lessonIds ?? []

  return {
    ...{ order, stages, picked, said, message, isHeld, placeOf, lessonIdsOf },
    ...{ press, move, putDown, putBack, onKey, setLessons, setStages, keep },
  }
}
