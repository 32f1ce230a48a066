import type { Exercise } from '../../shared/contracts/exercises'
import { OWN_PREFIX } from '../../shared/contracts/ownCalculators'
import type { Transaction } from '../db/client'
import { invalid } from '../errors'
import { findOwnVersion, lockOwnCalculator } from './ownCalculators.queries'

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
