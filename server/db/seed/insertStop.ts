import type { Exercise } from '../../../shared/contracts/exercises'
import type { Transaction } from '../client'
import { exercises, quizQuestions, stops } from '../schema'
import { insertedId } from './insertedId'
import type { StopSeed } from './shapes'

export interface InsertedStop {
  atMs: number
  isRequired: boolean
  exerciseId: number | null
  exercise: Exercise | null
}

/** Adds a stop with its exercise and the questions of its quiz. */
export async function insertStop(
  { key, name, byTheWay, exercise }: StopSeed,
  lessonId: number,
  atMs: number,
  tx: Transaction,
): Promise<InsertedStop> {
  const isRequired = !byTheWay
  const stopId = await insertedId(
    tx.insert(stops).values({ lessonId, key, name, atMs, isRequired }).$returningId(),
  )
  const exerciseId = exercise && (await insertExercise(exercise, stopId, key, tx))
  return { atMs, isRequired, exerciseId, exercise }
}

async function insertExercise(exercise: Exercise, stopId: number, key: string, tx: Transaction) {
  const { kind, prompt, tries } = exercise
  const exerciseId = await insertedId(
    tx
      .insert(exercises)
      .values({
        stopId,
        key,
        kind,
        prompt,
        tries,
        definition: exercise.kind === 'calculator' ? exercise.definition : null,
        passMark: exercise.kind === 'quiz' ? exercise.passMark : null,
      })
      .$returningId(),
  )
  if (exercise.kind === 'quiz') {
    await tx
      .insert(quizQuestions)
      .values(
        exercise.questions.map((question, position) => ({ ...question, exerciseId, position })),
      )
  }
  return exerciseId
}
