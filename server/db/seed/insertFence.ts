import { eq } from 'drizzle-orm'
import { renderMarkdown } from '../../fence/markdown'
import type { FenceEventKind } from '../../../shared/contracts/fence'
import type { Transaction } from '../client'
import { answers, fenceEvents, fenceRooms, questions } from '../schema'
import type { InsertedCourse } from './insertCourse'
import { insertedId } from './insertedId'
import type { PersonIds } from './insertPeople'
import type { AnswerSeed, QuestionSeed } from './shapes'
import { momentMs, videoOfLesson } from './videos'

interface RoomEvent {
  questionId: number
  kind: FenceEventKind
  createdAt: Date
}

const time = (on: string) => new Date(on).getTime()
const textsOf = (markdown: string) => ({ markdown, html: renderMarkdown(markdown) })

/** Adds what was asked and answered in a course; ids rise with time, as if it had been written live. */
export async function insertFence(
  seeds: QuestionSeed[],
  course: InsertedCourse,
  people: PersonIds,
  tx: Transaction,
) {
  const rooms = new Map<string, { id: number; events: RoomEvent[] }>()
  const inTime = [...seeds].sort((a, b) => time(a.on) - time(b.on))
  for (const seed of inTime) {
    let room = rooms.get(seed.lesson)
    if (!room) {
      const values = { courseId: course.id, lessonKey: seed.lesson }
      room = {
        id: await insertedId(tx.insert(fenceRooms).values(values).$returningId()),
        events: [],
      }
      rooms.set(seed.lesson, room)
    }
    room.events.push(...(await insertQuestion(seed, room.id, people, tx)))
  }
  for (const { id, events } of rooms.values()) await insertEvents(id, events, tx)
}

async function insertQuestion(
  seed: QuestionSeed,
  roomId: number,
  people: PersonIds,
  tx: Transaction,
): Promise<RoomEvent[]> {
  const createdAt = new Date(seed.on)
  const questionId = await insertedId(
    tx
      .insert(questions)
      .values({
        roomId,
        atMs: seed.at && momentMs(videoOfLesson(seed.lesson), seed.at),
        title: seed.title,
        ...textsOf(seed.markdown),
        authorId: people[seed.by],
        createdAt,
      })
      .$returningId(),
  )
  const events: RoomEvent[] = [{ questionId, kind: 'asked', createdAt }]
  const answerIds = await insertAnswers(seed.answers, questionId, people, tx)
  for (const { on, editedOn } of seed.answers) {
    events.push({ questionId, kind: 'answered', createdAt: new Date(on) })
    if (editedOn) events.push({ questionId, kind: 'edited', createdAt: new Date(editedOn) })
  }
  if (seed.settled) {
    const { answer, by, on } = seed.settled
    await tx
      .update(questions)
      .set({ state: 'settled', settledAnswerId: answerIds[answer], settledById: people[by] })
      .where(eq(questions.id, questionId))
    events.push({ questionId, kind: 'settled', createdAt: new Date(on) })
  }
  return events
}

async function insertAnswers(
  seeds: AnswerSeed[],
  questionId: number,
  people: PersonIds,
  tx: Transaction,
): Promise<number[]> {
  if (seeds.length === 0) return []
  const values = seeds.map(({ by, on, markdown, editedOn }) => ({
    questionId,
    ...textsOf(markdown),
    authorId: people[by],
    createdAt: new Date(on),
    editedAt: editedOn === undefined ? null : new Date(editedOn),
    version: editedOn === undefined ? 1 : 2,
  }))
  const rows = await tx.insert(answers).values(values).$returningId()
  return rows.map(({ id }) => id)
}

/** Numbers the changes of a room in the order they happened. */
async function insertEvents(roomId: number, events: RoomEvent[], tx: Transaction) {
  const inTime = events.toSorted((a, b) => a.createdAt.getTime() - b.createdAt.getTime())
  await tx
    .insert(fenceEvents)
    .values(inTime.map((event, index) => ({ ...event, roomId, number: index + 1 })))
  await tx.update(fenceRooms).set({ lastNumber: inTime.length }).where(eq(fenceRooms.id, roomId))
}
