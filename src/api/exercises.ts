import { gradedAttemptSchema, stopStateSchema, type Answer } from '../../shared/contracts/exercises'
import { request } from './client'
import { lessonPath, type LessonPlace } from './courses'

export const fetchStop = (place: LessonPlace, stopKey: string) =>
  request(stopStateSchema, lessonPath(place, `/stops/${stopKey}`))

export const sendAttempt = (
  place: LessonPlace,
  stopKey: string,
  body: Answer,
  idempotencyKey: string,
) =>
  request(gradedAttemptSchema, lessonPath(place, `/stops/${stopKey}/attempts`), {
    method: 'POST',
    body,
    idempotencyKey,
  })
