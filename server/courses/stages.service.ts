import type { StageKind } from '../../shared/contracts/courses'
import type { ChangeStage, CreateStage, OrderCourse } from '../../shared/contracts/benchCourses'
import type { Transaction } from '../db/client'
import { conflict, invalid, notFound } from '../errors'
import { listLessons } from './benchLessons.queries'
import { changeDraft, changeDraftOf } from './drafts.service'
import { makeStableKey } from './stableKeys.service'
import {
  deleteStage,
  findNextStagePosition,
  findStage,
  insertStages,
  listStages,
  updatePositions,
  updateStage,
} from './stages.queries'

const mostStages = 30

const titles: Record<StageKind, string> = {
  ground: 'Ground',
  base: 'Base',
  frame: 'Frame',
  cladding: 'Cladding',
  roof: 'Roof',
  finish: 'Finish',
}

/** Begins a new draft with one stage of each kind, in this order. */
export async function beginStages(revisionId: number, kinds: StageKind[], tx: Transaction) {
  const rows = kinds.map((kind, index) => ({
    revisionId,
    kind,
    title: titles[kind],
    key: makeStableKey(titles[kind]),
    position: index + 1,
  }))
  await insertStages(rows, tx)
}

/** Adds a stage at the end of a course's draft and returns its id. */
export const addStage = (courseId: number, input: CreateStage): Promise<number> =>
  changeDraftOf(courseId, async (tx, { id: revisionId }) => {
    if ((await listStages(revisionId, tx)).length >= mostStages) {
      throw conflict('too-many', `A course has at most ${mostStages} stages.`)
    }
    const position = await findNextStagePosition(revisionId, tx)
    const key = makeStableKey(input.title)
    return insertStages([{ ...input, revisionId, key, position }], tx)
  })

/** Renames a stage or makes it one of another kind. */
export const changeStage = (stageId: number, revisionId: number, input: ChangeStage) =>
  changeDraft(revisionId, async (tx) => {
    if (!(await findStage(stageId, tx))) throw notFound('stage')
    await updateStage(stageId, input, tx)
  })

/** Takes a stage out of the draft, with its lessons. */
export const removeStage = (stageId: number, revisionId: number) =>
  changeDraft(revisionId, (tx) => deleteStage(stageId, tx))

const areSame = (given: number[], held: number[]) => {
  const ids = new Set(given)
  return ids.size === given.length && ids.size === held.length && held.every((id) => ids.has(id))
}

/** Puts all stages and lessons of a draft into a new order; 400 unless each is named exactly once. */
export const orderCourse = (courseId: number, { stages: order }: OrderCourse) =>
  changeDraftOf(courseId, async (tx, { id: revisionId }) => {
    const stageIds = (await listStages(revisionId, tx)).map(({ id }) => id)
    const lessonIds = (await listLessons(revisionId, tx)).map(({ id }) => id)
    const isWhole =
      areSame(
        order.map(({ id }) => id),
        stageIds,
      ) &&
      areSame(
        order.flatMap((stage) => stage.lessonIds),
        lessonIds,
      )
    if (!isWhole) {
      throw invalid([
        {
          field: 'stages',
          message:
            'Name every stage and every lesson of the draft exactly once. Load the outline again if someone else has changed it.',
        },
      ])
    }
    await updatePositions(revisionId, order, tx)
  })
