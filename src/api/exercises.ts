import {
  gradedAttemptSchema,
  stopStateSchema,
  type Answer,
  type UnitSystem,
} from '../../shared/contracts/exercises'
import { request } from './client'
import { lessonPath, type LessonPlace } from './courses'

/** The address of a stop, with its numbers in the units of whoever asks. */
function stopPath(place: LessonPlace, rest: string, units: UnitSystem) {
  return `${lessonPath(place, `/stops/${rest}`)}${place.isDraft ? '&' : '?'}units=${units}`
}

export const fetchStop = (place: LessonPlace, stopKey: string, units: UnitSystem) =>
  request(stopStateSchema, stopPath(place, stopKey, units))

export const sendAttempt = (
  place: LessonPlace,
  { stopKey, units }: { stopKey: string; units: UnitSystem },
  body: Answer,
  idempotencyKey: string,
) =>
  request(gradedAttemptSchema, stopPath(place, `${stopKey}/attempts`, units), {
    method: 'POST',
    body,
    idempotencyKey,
  })
