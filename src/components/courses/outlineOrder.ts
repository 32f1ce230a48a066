export interface OutlineStage {
  id: number
  lessonIds: number[]
}
/** What is picked up: a stage, or a lesson. */
export interface Picked {
  kind: 'stage' | 'lesson'
  id: number
}

const copy = (order: readonly OutlineStage[]) =>
  order.map((stage) => ({ ...stage, lessonIds: [...stage.lessonIds] }))

function moveStage(order: readonly OutlineStage[], id: number, by: -1 | 1): OutlineStage[] {
  const moved = copy(order)
  const index = moved.findIndex((stage) => stage.id === id)
  const target = index + by
  const [stage] = target < 0 || target >= moved.length ? [] : moved.splice(index, 1)
  if (stage) moved.splice(target, 0, stage)
  return moved
}

function moveLesson(order: readonly OutlineStage[], id: number, by: -1 | 1): OutlineStage[] {
  const moved = copy(order)
  const stageIndex = moved.findIndex((stage) => stage.lessonIds.includes(id))
  const stage = moved[stageIndex]
  if (!stage) return moved
  const index = stage.lessonIds.indexOf(id)
  const target = index + by
  if (target >= 0 && target < stage.lessonIds.length) {
    stage.lessonIds.splice(index, 1)
    stage.lessonIds.splice(target, 0, id)
    return moved
  }
  const neighbour = moved[stageIndex + by]
  if (!neighbour) return moved
  stage.lessonIds.splice(index, 1)
  if (by < 0) neighbour.lessonIds.push(id)
  else neighbour.lessonIds.unshift(id)
  return moved
}

/** The order with one thing moved a place up or down; a lesson goes over into the next stage at an end. */
export const moveInOutline = (order: readonly OutlineStage[], picked: Picked, by: -1 | 1) =>
  picked.kind === 'stage' ? moveStage(order, picked.id, by) : moveLesson(order, picked.id, by)
