import type { Build } from '../../shared/contracts/builds'
import { can, type Actor } from '../../shared/contracts/policies'
import { describeBuild, startBuild } from '../builds/builds.service'
import { revisionFor, type CourseAccess } from '../courses/access.service'
import { inTransaction, isDuplicate } from '../db/transaction'
import { conflict, notAllowed, notFound } from '../errors'
import { findEnrolment, insertEnrolment } from './enrolments.queries'

function refuse({ course, thing }: CourseAccess, actor: Actor) {
  if (course.state === 'closed') {
    throw conflict('course-closed', 'This course takes nobody new. Its sheet stays here to read.')
  }
  if (!can(actor, 'course:enrol', thing))
    throw notAllowed('The staff of a course do not enrol in it.')
  if (course.priceCents > 0) {
    throw conflict(
      'course-has-a-price',
      'This course has a price, and cannot be paid for here yet.',
    )
  }
}

/** Enrols a person in a free course and starts their build; asked again it answers with the same build. */
export async function enrol(
  access: CourseAccess,
  actor: Actor,
): Promise<{ isNew: boolean; build: Build }> {
  const { course } = access
  if (access.enrolment) return { isNew: false, build: await describeBuild(access, actor.id) }
  refuse(access, actor)
  const revision = await revisionFor(access)
  if (!revision) throw notFound('course')
  let isNew = true
  try {
    await inTransaction(async (tx) => {
      const enrolmentId = await insertEnrolment(
        { userId: actor.id, courseId: course.id, revisionId: revision.id },
        tx,
      )
      await startBuild(enrolmentId, revision.title, tx)
    })
  } catch (error) {
    if (!isDuplicate(error)) throw error
    isNew = false
  }
  const enrolment = await findEnrolment(actor.id, course.id)
  return { isNew, build: await describeBuild({ ...access, enrolment }, actor.id) }
}
