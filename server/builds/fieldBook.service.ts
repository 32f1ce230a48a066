import type { FieldBookEntry, PutInFieldBook } from '../../shared/contracts/builds'
import type { FieldError } from '../../shared/contracts/errors'
import type { Page, PageQuery } from '../../shared/contracts/pagination'
import type { Values } from '../../shared/calculators/calculator'
import { findCalculator } from '../../shared/calculators'
import { OWN_PREFIX } from '../../shared/contracts/ownCalculators'
import { answerOnce } from '../accounts/idempotency.service'
import type { CourseAccess } from '../courses/access.service'
import { invalid } from '../errors'
import { findOwnAtStop } from '../exercises/ownCalculatorAttaching.service'
import { workCalculator } from '../exercises/ownCalculatorTasks.service'
import { readCursor } from '../paging'
import { hasLesson, hasStop, insertEntry, listEntries, type EntryRow } from './fieldBook.queries'
import { findOwnBuild } from './builds.service'

const present = ({ buildId: _buildId, createdAt, ...row }: EntryRow): FieldBookEntry => ({
  ...row,
  createdAt: createdAt.toISOString(),
})

type Which = Parameters<typeof workCalculator>[0]

async function compute(calculator: Which, entry: PutInFieldBook) {
  const { inputs } = 'definition' in calculator ? calculator.definition : calculator
  const names = new Set(inputs.map(({ name }) => name))
  const unknown = Object.keys(entry.inputs).filter((name) => !names.has(name))
  const run = await workCalculator(calculator, entry.inputs, entry.units)
  const errors: FieldError[] = [
    ...unknown.map((name) => ({
      field: `inputs.${name}`,
      message: 'The calculator has no such input.',
    })),
    ...(run.ok
      ? []
      : Object.entries(run.errors).map(([name, message]) => ({
          field: `inputs.${name}`,
          message,
        }))),
  ]
  if (errors.length > 0 || !run.ok) throw invalid(errors)
  return onlyKnown(run.outputs)
}

/** Outputs that this calculation does not give are left out. */
const onlyKnown = (values: Values) =>
  Object.fromEntries(
    Object.entries(values).flatMap(([name, value]) =>
      value === undefined ? [] : [[name, value] as const],
    ),
  )

async function checkPlace({ lessonKey, stopKey }: PutInFieldBook, revisionId: number) {
  if (stopKey !== null && lessonKey === null) {
    throw invalid([{ field: 'lessonKey', message: 'Name the lesson the stop belongs to.' }])
  }
  if (lessonKey !== null && !(await hasLesson(revisionId, lessonKey))) {
    throw invalid([
      { field: 'lessonKey', message: 'Your revision of the course has no such lesson.' },
    ])
  }
  if (lessonKey !== null && stopKey !== null && !(await hasStop(revisionId, lessonKey, stopKey))) {
    throw invalid([{ field: 'stopKey', message: 'The lesson has no such stop.' }])
  }
}

/** A built-in calculator by its id; an own one as the stop that the entry names is made of it. */
async function findWhich(entry: PutInFieldBook, revisionId: number): Promise<Which | undefined> {
  const { calculator: id, lessonKey, stopKey } = entry
  if (!id.startsWith(OWN_PREFIX)) return findCalculator(id)
  const own =
    lessonKey === null || stopKey === null
      ? null
      : await findOwnAtStop(revisionId, lessonKey, stopKey)
  return own && id === `${OWN_PREFIX}${own.key}` ? own : undefined
}

/**
 * Puts a number in the field book: computed here from the inputs as typed, in the units that go with
 * them. 400 with an error for each input that cannot be used.
 */
export async function putInFieldBook(
  access: CourseAccess,
  userId: number,
  entry: PutInFieldBook,
  key: string | undefined,
): Promise<FieldBookEntry> {
  const build = await findOwnBuild(access)
  const revisionId = access.enrolment?.revisionId ?? 0
  const calculator = await findWhich(entry, revisionId)
  if (!calculator) {
    throw invalid([{ field: 'calculator', message: 'There is no such calculator.' }])
  }
  await checkPlace(entry, revisionId)
  const outputs = await compute(calculator, entry)
  const route = `POST builds/${build.id}/field-book-entries`
  const { response } = await answerOnce({ userId, route, key, payload: entry }, async (tx) => {
    const { lessonKey, stopKey, atMs, inputs } = entry
    const row = await insertEntry(
      {
        buildId: build.id,
        lessonKey,
        stopKey,
        atMs,
        calculator: entry.calculator,
        calculatorVersion: calculator.version,
        inputs,
        outputs,
      },
      tx,
    )
    return { status: 201, response: present(row) }
  })
  return response
}

/** A page of one's field book for a course, the newest entry first. */
export async function listFieldBook(
  access: CourseAccess,
  { cursor, limit }: PageQuery,
): Promise<Page<FieldBookEntry>> {
  const build = await findOwnBuild(access)
  const found = await listEntries(build.id, readCursor(cursor), limit + 1)
  const rows = found.slice(0, limit)
  return {
    items: rows.map(present),
    nextCursor: found.length > limit ? String(rows.at(-1)?.id) : null,
  }
}
