import type { FieldBookEntry, PutInFieldBook } from '../../shared/contracts/builds'
import type { FieldError } from '../../shared/contracts/errors'
import type { Page, PageQuery } from '../../shared/contracts/pagination'
import type { Calculator, Values } from '../../shared/calculators/calculator'
import { findCalculator, runCalculator } from '../../shared/calculators'
import { answerOnce } from '../accounts/idempotency.service'
import type { CourseAccess } from '../courses/access.service'
import { invalid } from '../errors'
import { readCursor } from '../paging'
import { hasLesson, hasStop, insertEntry, listEntries, type EntryRow } from './fieldBook.queries'
import { findOwnBuild } from './builds.service'

const present = ({ buildId: _buildId, createdAt, ...row }: EntryRow): FieldBookEntry => ({
  ...row,
  createdAt: createdAt.toISOString(),
})

function compute(calculator: Calculator, entry: PutInFieldBook) {
  const names = new Set(calculator.inputs.map(({ name }) => name))
  const unknown = Object.keys(entry.inputs).filter((name) => !names.has(name))
  const run = runCalculator(calculator, entry.inputs, entry.units)
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
  const calculator = findCalculator(entry.calculator)
  if (!calculator) {
    throw invalid([{ field: 'calculator', message: 'There is no such calculator.' }])
  }
  await checkPlace(entry, access.enrolment?.revisionId ?? 0)
  const outputs = compute(calculator, entry)
  const route = `POST builds/${build.id}/field-book-entries`
  const { response } = await answerOnce({ userId, route, key, payload: entry }, async (tx) => {
    const { lessonKey, stopKey, atMs, inputs } = entry
    const row = await insertEntry(
      {
        buildId: build.id,
        lessonKey,
        stopKey,
        atMs,
        calculator: calculator.id,
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
