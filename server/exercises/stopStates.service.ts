import { randomInt } from 'node:crypto'
import type { TapeStop } from '../../shared/contracts/lessons'
import type { Executor } from '../db/client'
import {
  findStopState,
  insertStopState,
  listSolvedKeys,
  listStops,
  type StopOfPerson,
  type StopStateRow,
} from './stopStates.queries'

interface LessonRows {
  course: { id: number }
  lesson: { id: number; key: string }
  revision: { id: number; issuedAt: Date | null }
}

/** Fits the column, so that the same number comes back. */
const seedLimit = 2 ** 32

/** A seed that gives one person numbers of their own. */
export const drawSeed = () => randomInt(seedLimit)

/** The name under which a session remembers a stop; a draft's apart from what is issued. */
export const sessionNameOf = ({ course, lesson, revision }: LessonRows, stopKey: string) =>
  `${revision.issuedAt ? course.id : `draft-${revision.id}`}/${lesson.key}/${stopKey}`

/** The stops on a lesson's tape, and which of them the person (or their session) has solved. */
export async function listTapeStops(
  access: LessonRows,
  userId: number | null,
  remembered: Record<string, { solved: boolean }>,
): Promise<TapeStop[]> {
  const which = { courseId: access.course.id, lessonKey: access.lesson.key }
  const [stops, solvedKeys] = await Promise.all([
    listStops(access.lesson.id),
    userId === null ? [] : listSolvedKeys({ ...which, userId }),
  ])
  const solved = new Set(solvedKeys)
  return stops.map((stop) => ({
    ...stop,
    isSolved:
      userId === null
        ? (remembered[sessionNameOf(access, stop.key)]?.solved ?? false)
        : solved.has(stop.key),
  }))
}

/** True when a person has solved every stop at which a lesson's video waits. */
export async function areRequiredStopsSolved(
  which: Omit<StopOfPerson, 'stopKey'> & { lessonId: number },
  on: Executor,
): Promise<boolean> {
  const { lessonId, ...person } = which
  const stops = await listStops(lessonId)
  const solved = new Set(await listSolvedKeys(person, on))
  return stops.every(({ key, isRequired }) => !isRequired || solved.has(key))
}

/** How a person stands at a stop; their first look draws the seed, once for all devices. */
export async function openStopState(which: StopOfPerson): Promise<StopStateRow> {
  const found = await findStopState(which)
  if (found) return found
  await insertStopState(which, drawSeed())
  const made = await findStopState(which)
  if (!made) throw new Error('the state of a stop was not kept')
  return made
}
