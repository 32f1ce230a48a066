import {
  kitStateSchema,
  lessonProgressSchema,
  type ReportProgress,
} from '../../shared/contracts/progress'
import { request } from './client'
import { lessonPath, type LessonPlace } from './courses'

export const tickKit = (place: LessonPlace, ticked: string[]) =>
  request(kitStateSchema, lessonPath(place, '/kit-ticks'), { method: 'PUT', body: { ticked } })

export const reportProgress = (place: LessonPlace, body: ReportProgress) =>
  request(lessonProgressSchema, lessonPath(place, '/progress'), { method: 'POST', body })

/** Hands a report to the browser to send even while the page goes away; false when it did not take it. */
export const beaconProgress = (place: LessonPlace, body: ReportProgress) =>
  navigator.sendBeacon(
    `/api${lessonPath(place, '/progress')}`,
    new Blob([JSON.stringify(body)], { type: 'application/json' }),
  )
