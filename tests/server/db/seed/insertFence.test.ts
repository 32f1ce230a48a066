import { asc, eq } from 'drizzle-orm'
import { beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../../server/db/client'
import {
  answers,
  courseStaff,
  enrolments,
  fenceEvents,
  fenceRooms,
  questions,
} from '../../../../server/db/schema'
import { demoCourses, seedDatabase } from '../../../../server/db/seed'

describe('what is asked and answered in the demo', () => {
  beforeAll(() => seedDatabase(db))

  it('numbers the changes of every room from one without a gap, in the order of time', async () => {
    const rooms = await db.select().from(fenceRooms)
    for (const room of rooms) {
      const events = await db
        .select()
        .from(fenceEvents)
        .where(eq(fenceEvents.roomId, room.id))
        .orderBy(asc(fenceEvents.number))
      expect(events.map(({ number }) => number)).toEqual(
        Array.from({ length: room.lastNumber }, (_, index) => index + 1),
      )
      const times = events.map(({ createdAt }) => createdAt.getTime())
      expect(times).toEqual([...times].sort((a, b) => a - b))
    }
    const asked = await db.$count(fenceEvents, eq(fenceEvents.kind, 'asked'))
    const answered = await db.$count(fenceEvents, eq(fenceEvents.kind, 'answered'))
    const settled = await db.$count(fenceEvents, eq(fenceEvents.kind, 'settled'))
    expect([asked, answered, settled]).toEqual([
      await db.$count(questions),
      await db.$count(answers),
      await db.$count(questions, eq(questions.state, 'settled')),
    ])
  })

  it('lets only staff and learners enrolled by then write over the fence', async () => {
    const posts = [
      ...(await db
        .select({ room: questions.roomId, author: questions.authorId, at: questions.createdAt })
        .from(questions)),
      ...(await db
        .select({ room: questions.roomId, author: answers.authorId, at: answers.createdAt })
        .from(answers)
        .innerJoin(questions, eq(questions.id, answers.questionId))),
    ]
    const courseOfRoom = new Map(
      (await db.select().from(fenceRooms)).map(({ id, courseId }) => [id, courseId]),
    )
    const staff = await db.select().from(courseStaff)
    const enrolled = await db.select().from(enrolments)
    const strangers = posts.filter(({ room, author, at }) => {
      const courseId = courseOfRoom.get(room)
      const isStaff = staff.some((row) => row.courseId === courseId && row.userId === author)
      const isEnrolled = enrolled.some(
        (row) => row.courseId === courseId && row.userId === author && row.createdAt <= at,
      )
      return !isStaff && !isEnrolled
    })
    expect(strangers).toEqual([])
  })

  it('answers after asking, and settles after answering', () => {
    for (const { questions: seeds, issuedOn } of demoCourses) {
      for (const { on, answers: given, settled } of seeds) {
        const times = [issuedOn, on, ...given.map((answer) => answer.on)].map((text) =>
          new Date(text ?? 0).getTime(),
        )
        expect(times).toEqual([...times].sort((a, b) => a - b))
        if (!settled) continue
        const answer = given[settled.answer]
        expect(new Date(settled.on) > new Date(answer?.on ?? '2100-01-01')).toBe(true)
      }
    }
  })
})
