import type { Transaction } from '../db/client'
import { errorNumber, inTransaction } from '../db/transaction'
import { AppError, conflict, notFound } from '../errors'
import { findDraftRevision, type RevisionRow } from './access.queries'
import { lockRevision, touchRevision } from './drafts.queries'

/** What the triggers raise when a row of an issued revision is written. */
const frozenErrno = 1644

/** 409 `issued`: learners have this revision. */
export const issuedRevision = () =>
  conflict(
    'issued',
    'This revision is issued and stays as learners have it. Changes belong into the next one.',
  )

/**
 * Runs `work` on a draft that is locked against every other writer, and notes when it was saved.
 * 404 when the revision is gone, 409 `issued` when it is no draft any more.
 */
export async function changeDraft<T>(
  revisionId: number,
  work: (tx: Transaction, revision: RevisionRow) => Promise<T>,
): Promise<T> {
  try {
    return await inTransaction(async (tx) => {
      const revision = await lockRevision(revisionId, tx)
      if (!revision) throw notFound('revision')
      if (revision.issuedAt) throw issuedRevision()
      const result = await work(tx, revision)
      await touchRevision(revisionId, tx)
      return result
    })
  } catch (error) {
    throw errorNumber(error) === frozenErrno ? issuedRevision() : error
  }
}

/** The same for the draft of a course; 409 `issued` when it has none. */
export async function changeDraftOf<T>(
  courseId: number,
  work: (tx: Transaction, revision: RevisionRow) => Promise<T>,
): Promise<T> {
  const draft = await findDraftRevision(courseId)
  if (!draft) throw issuedRevision()
  return changeDraft(draft.id, work)
}

/** 409 `stale`: somebody else's save came first. */
export const staleVersion = (what: string) =>
  conflict('stale', `This ${what} was changed meanwhile. Look at both and save again.`)

/** Adds to a refusal of `save` as stale what the server holds now, read when its transaction is over. */
export async function withCurrent<T>(
  save: Promise<T>,
  describe: () => Promise<unknown>,
): Promise<T> {
  try {
    return await save
  } catch (error) {
    if (!(error instanceof AppError) || error.code !== 'stale') throw error
    throw conflict(error.code, error.message, await describe())
  }
}
