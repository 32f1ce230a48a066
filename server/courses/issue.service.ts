import type { BenchCourse, IssueCourse, Snag } from '../../shared/contracts/benchCourses'
import type { Actor } from '../../shared/contracts/policies'
import { conflict, invalid, notFound } from '../errors'
import { openCourse, updateRevision } from './benchCourses.queries'
import { describeBenchCourse } from './benchCourses.service'
import { lockCourse } from './drafts.queries'
import { changeDraftOf } from './drafts.service'
import { loadOutline } from './outline.service'

const snagsLeft = (snags: Snag[]) => {
  const musts = snags.filter(({ weight }) => weight === 'must').length
  return conflict(
    'snags',
    musts === 1
      ? 'One thing on the snag list must be put right first.'
      : `${musts} things on the snag list must be put right first.`,
    snags,
  )
}

/**
 * Issues a course's draft: from then on its rows are frozen and learners build from it.
 * 409 with the snag list while anything on it must be put right.
 */
export async function issueCourse(
  courseId: number,
  actor: Actor,
  { changeNote }: IssueCourse,
): Promise<BenchCourse> {
  await changeDraftOf(courseId, async (tx, revision) => {
    if (!(await lockCourse(courseId, tx))) throw notFound('course')
    if (revision.number > 0 && changeNote === '') {
      throw invalid([
        {
          field: 'changeNote',
          message: 'Say what has changed: those who build from the last one read it.',
        },
      ])
    }
    const { snags } = await loadOutline(revision, tx)
    if (snags.some(({ weight }) => weight === 'must')) throw snagsLeft(snags)
    await openCourse(courseId, tx)
    await updateRevision(
      revision.id,
      { changeNote, issuedAt: new Date(), issuedById: actor.id },
      tx,
    )
  })
  return describeBenchCourse(courseId, actor)
}
