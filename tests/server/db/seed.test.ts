import { readFileSync } from 'node:fs'
import { asc, eq, getTableName, isNotNull, sql } from 'drizzle-orm'
import { beforeAll, describe, expect, it } from 'vitest'
import { signIn } from '../../../server/accounts/accounts.service'
import { loadOutline } from '../../../server/courses/outline.service'
import { db } from '../../../server/db/client'
import * as schema from '../../../server/db/schema'
import {
  demoCourses,
  demoSignIns,
  isEmpty,
  reseedDatabase,
  seedDatabase,
} from '../../../server/db/seed'
import { sharedVideos, videoOfLesson } from '../../../server/db/seed/videos'
import { createUser } from '../../support/factories'

const {
  answers,
  attempts,
  captionCues,
  captionTracks,
  courseRevisions,
  courses,
  courseStaff,
  enrolments,
  fenceEvents,
  fenceRooms,
  kitItems,
  kitTicks,
  lessonProgress,
  lessons,
  questions,
  stages,
  stopStates,
  stops,
  users,
  videos,
} = schema

const filledTables = [
  users,
  courses,
  courseStaff,
  courseRevisions,
  stages,
  lessons,
  kitItems,
  stops,
  schema.exercises,
  schema.quizQuestions,
  schema.ownCalculators,
  schema.ownCalculatorVersions,
  videos,
  captionTracks,
  captionCues,
  schema.hindsightNotes,
  enrolments,
  schema.builds,
  kitTicks,
  lessonProgress,
  stopStates,
  attempts,
  schema.fieldBookEntries,
  fenceRooms,
  questions,
  answers,
  fenceEvents,
]
async function countRows() {
  const counts = filledTables.map(
    async (table) => [getTableName(table), await db.$count(table)] as const,
  )
  return Object.fromEntries(await Promise.all(counts)) as Record<string, number>
}

const issued = demoCourses.filter(({ issuedOn }) => issuedOn !== null)
const draft = demoCourses.filter(({ issuedOn }) => issuedOn === null)
const lessonsOf = (list: typeof demoCourses) =>
  list.flatMap((course) => course.stages.flatMap((stage) => stage.lessons))
describe('seedDatabase', () => {
  beforeAll(async () => {
    const [blocking] = await db
      .insert(courses)
      .values({ slug: 'in-the-way', sheetNumber: 3 })
      .$returningId()
    await expect(seedDatabase(db)).rejects.toThrow()
    expect(await db.$count(users)).toBe(0)
    await db.delete(courses).where(eq(courses.id, blocking?.id ?? 0))
    expect(await isEmpty(db)).toBe(true)
    await seedDatabase(db)
  })

  it('fills every table of the demo, and does nothing when it is called again', async () => {
    expect(await isEmpty(db)).toBe(false)
    const before = await countRows()
    expect(Object.entries(before).filter(([, rows]) => rows === 0)).toEqual([])
    await seedDatabase(db)
    expect(await countRows()).toEqual(before)
  })

  it('has the people, courses and questions the demo promises', async () => {
    const roles = await db
      .select({ role: users.role, n: sql`count(*)`.mapWith(Number) })
      .from(users)
      .groupBy(users.role)
    expect(Object.fromEntries(roles.map(({ role, n }) => [role, n]))).toEqual({
      admin: 1,
      instructor: 2,
      learner: 10,
    })
    const helpers = await db
      .selectDistinct({ id: courseStaff.userId })
      .from(courseStaff)
      .where(eq(courseStaff.role, 'helper'))
    expect(helpers).toHaveLength(2)
    const sheets = await db
      .select({ slug: courses.slug, state: courses.state, price: courses.priceCents })
      .from(courses)
      .orderBy(asc(courses.sheetNumber))
    expect(sheets).toEqual([
      { slug: 'a-log-store-on-a-concrete-pad', state: 'issued', price: 0 },
      { slug: 'a-deck-at-ground-level', state: 'issued', price: 0 },
      { slug: 'a-picket-fence-with-a-gate', state: 'issued', price: 0 },
      { slug: 'a-compost-bay-in-three-boxes', state: 'draft', price: 0 },
    ])
    expect(await db.$count(questions)).toBe(25)
    expect(await db.$count(questions, eq(questions.state, 'settled'))).toBeGreaterThan(10)
    const unanswered = await db
      .select({ id: questions.id })
      .from(questions)
      .leftJoin(answers, eq(answers.questionId, questions.id))
      .where(sql`${answers.id} is null`)
    expect(unanswered).toHaveLength(1)
  })

  it('leads the log store over all six stages and the others over three lessons each', () => {
    const [logStore, ...others] = issued
    expect(logStore?.stages.map(({ kind }) => kind)).toEqual([
      'ground',
      'base',
      'frame',
      'cladding',
      'roof',
      'finish',
    ])
    expect(lessonsOf(logStore ? [logStore] : []).length).toBeGreaterThanOrEqual(8)
    expect(others.map((course) => lessonsOf([course]).length)).toEqual([3, 3])
  })

  it.each(demoSignIns)('lets $email sign in', async ({ email, passphrase }) => {
    const [row] = await db.select().from(users).where(eq(users.email, email))
    expect(await signIn({ email, passphrase })).toBe(row?.id)
  })

  it('gives every lesson of an issued course a ready video with captions and all stops within it', async () => {
    const rows = await db
      .select({
        key: lessons.key,
        state: videos.state,
        durationMs: videos.durationMs,
        storageKey: videos.storageKey,
        cues: sql`count(${captionCues.id})`.mapWith(Number),
      })
      .from(lessons)
      .innerJoin(courseRevisions, eq(courseRevisions.id, lessons.revisionId))
      .leftJoin(videos, eq(videos.id, lessons.videoId))
      .leftJoin(captionTracks, eq(captionTracks.videoId, videos.id))
      .leftJoin(captionCues, eq(captionCues.trackId, captionTracks.id))
      .where(isNotNull(courseRevisions.issuedAt))
      .groupBy(lessons.id, videos.id)
    expect(rows).toHaveLength(lessonsOf(issued).length)
    for (const row of rows) {
      const video = videoOfLesson(row.key)
      expect(row).toMatchObject({
        state: 'ready',
        durationMs: video.durationMs,
        storageKey: `demo:${video.id}.mp4`,
        cues: video.cues.length,
      })
    }
    const late = await db
      .select({ key: stops.key })
      .from(stops)
      .innerJoin(lessons, eq(lessons.id, stops.lessonId))
      .innerJoin(videos, eq(videos.id, lessons.videoId))
      .where(sql`${stops.atMs} not between 1 and ${videos.durationMs} - 1`)
    expect(late).toEqual([])
  })

  it('takes the captions as they stand in the caption file of each video', () => {
    const keys = lessonsOf(issued).map(({ key }) => key)
    for (const video of new Set(keys.map(videoOfLesson))) {
      const file = readFileSync(`media/built/${video.id}.vtt`, 'utf8')
      const ends = [...file.matchAll(/--> (\d\d):(\d\d):(\d\d)\.(\d{3})/g)].map(
        ([, hours, minutes, seconds, ms]) =>
          ((Number(hours) * 60 + Number(minutes)) * 60 + Number(seconds)) * 1000 + Number(ms),
      )
      expect(video.cues.map(({ endMs }) => endMs)).toEqual(ends)
    }
  })

  it('names which lessons borrow a video, and no lesson that is not there', () => {
    const keys = lessonsOf(demoCourses).map(({ key }) => key)
    expect(Object.keys(sharedVideos).filter((key) => !keys.includes(key))).toEqual([])
  })

  it('leaves no must on the snag list of an issued course, and real ones on the draft', async () => {
    const revisions = await db.select().from(courseRevisions)
    const musts = new Map<string, string[]>()
    for (const revision of revisions) {
      const { snags } = await loadOutline(revision)
      musts.set(
        revision.title,
        snags.filter(({ weight }) => weight === 'must').map(({ code }) => code),
      )
    }
    for (const { title } of issued) expect(musts.get(title)).toEqual([])
    for (const { title } of draft) {
      expect(new Set(musts.get(title))).toEqual(
        new Set(['no-video', 'no-captions', 'no-kit', 'no-exercise', 'exercise']),
      )
    }
  })
})

describe('reseedDatabase', () => {
  it('renews the demo with all that was done in it, and keeps what others have made', async () => {
    const before = await countRows()
    const guest = await createUser({ email: 'guest@example.org' })
    const [own] = await db
      .insert(courses)
      .values({ slug: 'a-shelf-for-boots', sheetNumber: 40 })
      .$returningId()
    const [sheet] = await db.select().from(courseRevisions).limit(1)
    await db
      .insert(enrolments)
      .values({ userId: guest.id, courseId: sheet?.courseId ?? 0, revisionId: sheet?.id ?? 0 })
    await db.update(users).set({ displayName: 'Changed' }).where(eq(users.email, 'jo@example.test'))

    await reseedDatabase(db)

    expect(await countRows()).toEqual({
      ...before,
      users: (before['users'] ?? 0) + 1,
      courses: (before['courses'] ?? 0) + 1,
    })
    const [jo] = await db.select().from(users).where(eq(users.email, 'jo@example.test'))
    expect(jo?.displayName).toBe('Jo Varga')
    expect(await db.$count(users, eq(users.id, guest.id))).toBe(1)
    expect(await db.$count(courses, eq(courses.id, own?.id ?? 0))).toBe(1)
  })
})
