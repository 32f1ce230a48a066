import type {
  CopyableOwnCalculator,
  CopyOwnCalculator,
  OwnCalculator,
} from '../../shared/contracts/ownCalculators'
import type { Page, PageQuery } from '../../shared/contracts/pagination'
import type { Actor } from '../../shared/contracts/policies'
import { answerOnce } from '../accounts/idempotency.service'
import { notFound } from '../errors'
import { readCursor } from '../paging'
import { findOwnCalculator, listCopyable, updateOwnCalculator } from './ownCalculators.queries'
import { accessOwnCalculators, addToCourse, describeOwnCalculator } from './ownCalculators.service'
import { keepVersion } from './ownCalculatorVersions.service'

/** A page of the own calculators of other courses on whose staff a person is, the newest first. */
export async function listCopyableFor(
  courseId: number,
  actor: Actor,
  { cursor, limit }: PageQuery,
): Promise<Page<CopyableOwnCalculator>> {
  const below = { before: readCursor(cursor), limit: limit + 1 }
  const rows = await listCopyable(actor.id, courseId, below)
  const shown = rows.slice(0, limit)
  return {
    items: shown.map(({ calculator, courseTitle }) => ({
      course: { id: calculator.courseId, title: courseTitle },
      key: calculator.key,
      title: calculator.title,
      question: calculator.definition.question,
      attachable: calculator.attachable,
    })),
    nextCursor: rows.length > limit ? String(shown.at(-1)?.calculator.id) : null,
  }
}

/**
 * Copies an own calculator of another course: its newest kept version, which then is the first of the copy,
 * or else its draft. 404 for a calculator of a course on whose staff the person is not.
 */
export async function copyOwnCalculator(
  courseId: number,
  actor: Actor,
  input: CopyOwnCalculator,
  key: string | undefined,
): Promise<OwnCalculator> {
  const access = await accessOwnCalculators(input.fromCourseId, actor)
  const found = access.mayReadDraft ? await findOwnCalculator(input.fromCourseId, input.key) : null
  if (!found) throw notFound('calculator')
  const { calculator, kept } = found
  const route = `POST bench/courses/${courseId}/own-calculator-copies`
  const { response } = await answerOnce(
    { userId: actor.id, route, key, payload: input },
    async (tx) => {
      const made = await addToCourse(courseId, kept ?? calculator.definition, tx)
      if (kept) {
        const attachable = await keepVersion({ ...made, attachable: null }, kept, actor.id, tx)
        await updateOwnCalculator(made.id, { attachable }, tx)
      }
      return { status: 201, response: { key: made.key } }
    },
  )
  return describeOwnCalculator(courseId, response.key, actor)
}
