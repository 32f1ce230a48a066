import { eq } from 'drizzle-orm'
import type { Transaction } from '../client'
import {
  courseRevisions,
  courses,
  courseStaff,
  hindsightNotes,
  kitItems,
  lessons,
  ownCalculators,
  ownCalculatorVersions,
  stages,
} from '../schema'
import { insertedId } from './insertedId'
import { insertStop, type InsertedStop } from './insertStop'
import { insertVideo } from './insertVideo'
import type { PersonIds } from './insertPeople'
import type { CourseSeed, LessonSeed, StageSeed } from './shapes'
import { momentMs, videoOfLesson, type BuiltVideo } from './videos'

export interface InsertedLesson {
  id: number
  /** Null while it is still to be filmed. */
  video: BuiltVideo | null
  kitItemIds: number[]
  stops: Map<string, InsertedStop>
}

export interface InsertedCourse {
  id: number
  revisionId: number
  slug: string
  lessons: Map<string, InsertedLesson>
}

interface CourseRows {
  courseId: number
  revisionId: number
  ownerId: number
  createdAt: Date
}

/** Adds a course with all its rows and issues it last, because an issued revision is frozen. */
export async function insertCourse(
  course: CourseSeed,
  people: PersonIds,
  tx: Transaction,
): Promise<InsertedCourse> {
  const createdAt = new Date(course.createdOn)
  const ownerId = people[course.owner]
  const courseId = await insertSheet(course, createdAt, tx)
  await tx.insert(courseStaff).values([
    { courseId, userId: ownerId, role: 'owner' },
    ...course.helpers.map((helper) => ({
      courseId,
      userId: people[helper],
      role: 'helper' as const,
    })),
  ])
  const revisionId = await insertRevision(course, courseId, tx)
  await insertOwnCalculators(course, { courseId, ownerId, createdAt }, tx)
  const rows = { courseId, revisionId, ownerId, createdAt }
  const inserted = new Map<string, InsertedLesson>()
  for (const [position, stage] of course.stages.entries()) {
    await insertStage(stage, position, rows, inserted, tx)
  }
  await insertHindsight(course, courseId, people, tx)
  if (course.issuedOn !== null) {
    const issuedAt = new Date(course.issuedOn)
    await tx
      .update(courseRevisions)
      .set({ issuedAt, issuedById: ownerId, savedAt: issuedAt })
      .where(eq(courseRevisions.id, revisionId))
  }
  return { id: courseId, revisionId, slug: course.slug, lessons: inserted }
}

const insertSheet = (course: CourseSeed, createdAt: Date, tx: Transaction) =>
  insertedId(
    tx
      .insert(courses)
      .values({
        slug: course.slug,
        sheetNumber: course.sheetNumber,
        state: course.issuedOn === null ? 'draft' : 'issued',
        createdAt,
      })
      .$returningId(),
  )

const insertRevision = (course: CourseSeed, courseId: number, tx: Transaction) =>
  insertedId(
    tx
      .insert(courseRevisions)
      .values({
        courseId,
        number: 0,
        title: course.title,
        outcome: course.outcome,
        weekends: course.weekends,
        tools: course.tools,
        hazards: course.hazards,
        coverDrawing: course.coverDrawing,
        facts: course.facts,
        notCovered: course.notCovered,
        changeNote: course.changeNote,
        savedAt: new Date(course.createdOn),
      })
      .$returningId(),
  )

async function insertStage(
  { lessons: stageLessons, ...stage }: StageSeed,
  position: number,
  rows: CourseRows,
  inserted: Map<string, InsertedLesson>,
  tx: Transaction,
) {
  const stageId = await insertedId(
    tx
      .insert(stages)
      .values({ ...stage, revisionId: rows.revisionId, position })
      .$returningId(),
  )
  for (const [lessonPosition, lesson] of stageLessons.entries()) {
    inserted.set(lesson.key, await insertLesson(lesson, stageId, lessonPosition, rows, tx))
  }
}

async function insertLesson(
  lesson: LessonSeed,
  stageId: number,
  position: number,
  rows: CourseRows,
  tx: Transaction,
): Promise<InsertedLesson> {
  const video = lesson.withoutVideo ? null : videoOfLesson(lesson.key)
  const videoId =
    video &&
    (await insertVideo(video, {
      courseId: rows.courseId,
      lessonKey: lesson.key,
      uploaderId: rows.ownerId,
      createdAt: rows.createdAt,
      withCaptions: !lesson.withoutCaptions,
      tx,
    }))
  const id = await insertedId(
    tx
      .insert(lessons)
      .values({
        revisionId: rows.revisionId,
        stageId,
        key: lesson.key,
        title: lesson.title,
        summary: lesson.summary,
        youWillWant: lesson.youWillWant,
        hazards: lesson.hazards,
        position,
        isSample: lesson.isSample ?? false,
        videoId,
      })
      .$returningId(),
  )
  const kitItemIds = await insertKit(lesson, id, tx)
  const lessonStops = new Map<string, InsertedStop>()
  for (const stop of lesson.stops) {
    const atMs = video ? momentMs(video, stop.at) : 0
    lessonStops.set(stop.key, await insertStop(stop, id, atMs, tx))
  }
  return { id, video, kitItemIds, stops: lessonStops }
}

async function insertKit({ kit }: LessonSeed, lessonId: number, tx: Transaction) {
  if (kit.length === 0) return []
  const rows = await tx
    .insert(kitItems)
    .values(kit.map((item, position) => ({ ...item, lessonId, position })))
    .$returningId()
  return rows.map(({ id }) => id)
}

async function insertOwnCalculators(
  { ownCalculators: own = {} }: CourseSeed,
  { courseId, ownerId, createdAt }: Omit<CourseRows, 'revisionId'>,
  tx: Transaction,
) {
  for (const [key, definition] of Object.entries(own)) {
    const { title } = definition
    const calculatorId = await insertedId(
      tx
        .insert(ownCalculators)
        .values({ courseId, key, title, definition, attachable: 1, savedAt: createdAt, createdAt })
        .$returningId(),
    )
    await tx
      .insert(ownCalculatorVersions)
      .values({ calculatorId, number: 1, definition, createdById: ownerId, createdAt })
  }
}

async function insertHindsight(
  { hindsight }: CourseSeed,
  courseId: number,
  people: PersonIds,
  tx: Transaction,
) {
  if (hindsight.length === 0) return
  await tx.insert(hindsightNotes).values(
    hindsight.map(({ lesson, at, text, by, on }) => ({
      courseId,
      lessonKey: lesson,
      atMs: momentMs(videoOfLesson(lesson), at),
      text,
      authorId: people[by],
      createdAt: new Date(on),
    })),
  )
}
