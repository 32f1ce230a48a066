import type { Request, RequestHandler } from 'express'
import { can, type Action } from '../../shared/contracts/policies'
import {
  accessCourse,
  accessLesson,
  type CourseAccess,
  type LessonAccess,
} from '../courses/access.service'
import { notFound } from '../errors'
import { assertCan } from './authorize'

const courses = new WeakMap<Request, CourseAccess>()
const lessons = new WeakMap<Request, LessonAccess>()

const nameOf = (request: Request, part: string) => {
  const value = request.params[part]
  return typeof value === 'string' ? value : ''
}

function kept<T>(found: T | undefined): T {
  if (found === undefined) throw new Error('the route reads what it did not authorize')
  return found
}

/**
 * Lets a request for `courses/:slug` through when the policy table allows `action`;
 * 404 for whoever may not even see the sheet.
 */
export function authorizeCourse(action: Action): RequestHandler {
  return async (request, _response, next) => {
    const access = await accessCourse({ slug: nameOf(request, 'slug') }, request.actor)
    if (!can(request.actor, 'course:see-sheet', access.thing)) throw notFound('course')
    assertCan(request.actor, action, access.thing)
    courses.set(request, access)
    next()
  }
}

/**
 * Lets a request for `courses/:slug/lessons/:lessonKey` through when the policy table allows
 * `action`; 404 when the revision the person reads has no such lesson. `?draft=1` is the bench's preview.
 */
export function authorizeLesson(action: Action): RequestHandler {
  return async (request, _response, next) => {
    const access = await accessLesson(
      {
        slug: nameOf(request, 'slug'),
        lessonKey: nameOf(request, 'lessonKey'),
        draft: request.query['draft'] === '1',
      },
      request.actor,
    )
    assertCan(request.actor, action, access.thing)
    lessons.set(request, access)
    next()
  }
}

/** What `authorizeCourse` found. */
export const courseOf = (request: Request) => kept(courses.get(request))
/** What `authorizeLesson` found. */
export const lessonOf = (request: Request) => kept(lessons.get(request))
