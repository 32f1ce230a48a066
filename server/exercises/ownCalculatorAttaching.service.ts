import type { Exercise } from '../../shared/contracts/exercises'
import { OWN_PREFIX, type OwnSnapshot } from '../../shared/contracts/ownCalculators'
import type { Transaction } from '../db/client'
import { invalid } from '../errors'
import {
  findCalculatorAt,
  findOwnVersion,
  listOwnTitles,
  lockOwnCalculator,
} from './ownCalculators.queries'

/**
 * An exercise as it is kept: one made of an own calculator holds the version as this course has kept it,
 * whatever was sent. 400 where the course has no such version. The calculator cannot be removed meanwhile.
 */
export async function attachOwn(
  exercise: Exercise,
  courseId: number,
  tx: Transaction,
): Promise<Exercise> {
  if (exercise.kind !== 'calculator' || !exercise.definition.own) return exercise
  const { own, calculator: id } = exercise.definition
  const calculator = await lockOwnCalculator(courseId, own.key, tx)
  const kept = calculator && (await findOwnVersion(calculator.id, own.version, tx))
  if (!kept || id !== `${OWN_PREFIX}${own.key}`) {
    throw invalid([
      {
        field: 'exercise.definition.calculator',
        message: 'This course has kept no such version of a calculator. Choose it again.',
      },
    ])
  }
  const { key, version } = own
  return {
    ...exercise,
    definition: { ...exercise.definition, own: { key, version, definition: kept.definition } },
  }
}

/** The own calculator that a stop of a revision is made of, as it was when it was attached; or null. */
export async function findOwnAtStop(
  revisionId: number,
  lessonKey: string,
  stopKey: string,
): Promise<OwnSnapshot | null> {
  const definition = await findCalculatorAt(revisionId, lessonKey, stopKey)
  return definition?.own ?? null
}

/** Titles of a course's own calculators by the ids they have in exercises and field books. */
export async function nameOwnCalculators(courseId: number): Promise<Map<string, string>> {
  const titles = await listOwnTitles(courseId)
  return new Map([...titles].map(([key, title]) => [`${OWN_PREFIX}${key}`, title]))
}
