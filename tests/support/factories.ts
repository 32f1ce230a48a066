import { eq } from 'drizzle-orm'
import { hashPassphrase } from '../../server/accounts/passwords'
import { db } from '../../server/db/client'
import {
  builds,
  captionCues,
  captionTracks,
  courseRevisions,
  courses,
  courseStaff,
  enrolments,
  exercises,
  hindsightNotes,
  kitItems,
  lessons,
  quizQuestions,
  stages,
  stops,
  users,
  videos,
} from '../../server/db/schema'
import type { CalculatorDefinition, QuizQuestion } from '../../shared/contracts/exercises'

type Insert<T extends { $inferInsert: object }> = Partial<T['$inferInsert']>

/** Every account of the tests has this passphrase. */
export const passphrase = 'gravel sand and a string'
let passphraseHash: Promise<string> | null = null

let running = 0
/** A number that no other row of this test file has. */
export const nextNumber = () => ++running

async function onlyRow<T>(rows: Promise<T[]>): Promise<T> {
  const [row] = await rows
  if (!row) throw new Error('nothing was inserted')
  return row
}

/** A learner, unless told otherwise. */
export async function createUser(values: Insert<typeof users> = {}) {
  const number = nextNumber()
  const row = {
    email: `person-${number}@example.org`,
    displayName: `Person ${number}`,
    passwordHash: await (passphraseHash ??= hashPassphrase(passphrase)),
    role: 'learner' as const,
    ...values,
  }
  const { id } = await onlyRow(db.insert(users).values(row).$returningId())
  return { ...row, id }
}
export const createInstructor = (values: Insert<typeof users> = {}) =>
  createUser({ role: 'instructor', ...values })

interface CourseOptions {
  course?: Insert<typeof courses>
  revision?: Insert<typeof courseRevisions>
  /** The instructor who owns it; made when left out. */
  owner?: { id: number }
}

/** A course with its owner and an empty draft, which becomes Rev A by `issueRevision`. */
export async function createCourse({ course = {}, revision = {}, owner }: CourseOptions = {}) {
  const number = nextNumber()
  const slug = course.slug ?? `course-${number}`
  const { id } = await onlyRow(
    db
      .insert(courses)
      .values({ sheetNumber: number, ...course, slug })
      .$returningId(),
  )
  const ownerId = (owner ?? (await createInstructor())).id
  await db.insert(courseStaff).values({ courseId: id, userId: ownerId, role: 'owner' })
  const revisionId = await createRevision(id, revision)
  return { id, slug, revisionId, ownerId, sheetNumber: course.sheetNumber ?? number }
}

/** A draft of a course; its `number` is 0 for what will be Rev A. */
export async function createRevision(
  courseId: number,
  values: Insert<typeof courseRevisions> = {},
) {
  const { id } = await onlyRow(
    db
      .insert(courseRevisions)
      .values({
        number: 0,
        title: 'A bench by the pond',
        outcome: 'You will have built a bench that stays dry.',
        weekends: 2,
        tools: ['Saw', 'Spirit level'],
        hazards: [],
        coverDrawing: 'log-store',
        facts: [],
        ...values,
        courseId,
      })
      .$returningId(),
  )
  return id
}

/** Adds a helper to a course. */
export async function addHelper(courseId: number, userId: number) {
  await db.insert(courseStaff).values({ courseId, userId, role: 'helper' })
}

/** Freezes a revision and opens its course; nothing can be added to it afterwards. */
export async function issueRevision(revisionId: number, issuedAt = new Date()) {
  const [row] = await db
    .select({ courseId: courseRevisions.courseId })
    .from(courseRevisions)
    .where(eq(courseRevisions.id, revisionId))
  await db.update(courseRevisions).set({ issuedAt }).where(eq(courseRevisions.id, revisionId))
  await db.update(courses).set({ state: 'issued' }).where(eq(courses.id, row!.courseId))
}

/** Takes no new enrolments from now on. */
export async function closeCourse(courseId: number) {
  await db.update(courses).set({ state: 'closed' }).where(eq(courses.id, courseId))
}

/** A stage at the end of a revision. */
export async function createStage(revisionId: number, values: Insert<typeof stages> = {}) {
  const number = nextNumber()
  const row = {
    key: `stage-${number}`,
    kind: 'base' as const,
    title: `Stage ${number}`,
    position: number,
    ...values,
    revisionId,
  }
  const { id } = await onlyRow(db.insert(stages).values(row).$returningId())
  return { ...row, id }
}

/** A lesson at the end of a stage. */
export async function createLesson(
  stage: { id: number; revisionId: number },
  values: Insert<typeof lessons> = {},
) {
  const number = nextNumber()
  const row = {
    key: `lesson-${number}`,
    title: `Lesson ${number}`,
    hazards: [],
    position: number,
    ...values,
    revisionId: stage.revisionId,
    stageId: stage.id,
  }
  const { id } = await onlyRow(db.insert(lessons).values(row).$returningId())
  return { ...row, id }
}

/** A video that is ready; shown by `lesson` when one is given. */
export async function createVideo(
  courseId: number,
  lesson: { id: number; key: string } | null = null,
  values: Insert<typeof videos> = {},
) {
  const number = nextNumber()
  const row = {
    lessonKey: lesson?.key ?? 'no-lesson',
    storageKey: `videos/${number}.mp4`,
    originalName: `film-${number}.mp4`,
    bytes: 1000,
    state: 'ready' as const,
    durationMs: 100_000,
    ...values,
    courseId,
  }
  const { id } = await onlyRow(db.insert(videos).values(row).$returningId())
  if (lesson) await db.update(lessons).set({ videoId: id }).where(eq(lessons.id, lesson.id))
  return { ...row, id }
}

/** English captions of a video. */
export async function createCaptions(videoId: number, texts = ['Set the string.']) {
  const { id } = await onlyRow(
    db
      .insert(captionTracks)
      .values({ videoId, language: 'en', label: 'English', isOriginal: true, preamble: 'WEBVTT' })
      .$returningId(),
  )
  await db.insert(captionCues).values(
    texts.map((text, index) => ({
      trackId: id,
      position: index,
      startMs: index * 2000,
      endMs: index * 2000 + 1500,
      text,
    })),
  )
  return { id }
}

/** A row of a lesson's kit check. */
export async function createKitItem(lessonId: number, values: Insert<typeof kitItems> = {}) {
  const number = nextNumber()
  const row = {
    key: `kit-${number}`,
    kind: 'on-you' as const,
    title: 'Gloves that keep cement out',
    position: number,
    ...values,
    lessonId,
  }
  const { id } = await onlyRow(db.insert(kitItems).values(row).$returningId())
  return { ...row, id }
}

/** A required stop, unless told otherwise. */
export async function createStop(lessonId: number, values: Insert<typeof stops> = {}) {
  const number = nextNumber()
  const row = {
    key: `stop-${number}`,
    name: `Stop ${number}`,
    atMs: number * 1000,
    isRequired: true,
    ...values,
    lessonId,
  }
  const { id } = await onlyRow(db.insert(stops).values(row).$returningId())
  return { ...row, id }
}

interface CalculatorExercise {
  definition: CalculatorDefinition
  tries?: number | null
  prompt?: string
}
/** A calculator exercise at a stop. */
export async function createCalculatorExercise(
  stopId: number,
  { definition, tries = 3, prompt = 'Work it out.' }: CalculatorExercise,
) {
  const key = `exercise-${nextNumber()}`
  return onlyRow(
    db
      .insert(exercises)
      .values({ stopId, key, kind: 'calculator', prompt, tries, definition })
      .$returningId(),
  )
}

interface QuizExercise {
  questions: QuizQuestion[]
  tries?: number | null
  passMark?: number
}
/** A quiz at a stop. */
export async function createQuiz(
  stopId: number,
  { questions, tries = 3, passMark = 100 }: QuizExercise,
) {
  const exercise = await onlyRow(
    db
      .insert(exercises)
      .values({ stopId, key: `exercise-${nextNumber()}`, kind: 'quiz', tries, passMark })
      .$returningId(),
  )
  await db
    .insert(quizQuestions)
    .values(questions.map((q, position) => ({ ...q, exerciseId: exercise.id, position })))
  return exercise
}

/** A pad of 2.6 × 1.1 × 0.1 m whose volume is asked: 0.286 m³, named slips among the wrong ones. */
export const slabDefinition: CalculatorDefinition = {
  calculator: 'slab',
  inputs: {
    length: { mode: 'fixed', value: '2.6 m' },
    width: { mode: 'fixed', value: '1.1 m' },
    thickness: { mode: 'fixed', value: '100 mm' },
  },
  asked: 'volume',
  tolerance: { kind: 'absolute', value: 0.001 },
  hints: ['All three sides in metres.', 'Then multiply.'],
  slips: ['litres', 'thickness-in-centimetres'],
}

/** A question with one right choice, `wet`, and one wrong choice, `dry`. */
export const singleQuestion = (key = 'which-mix'): QuizQuestion => ({
  key,
  kind: 'single',
  prompt: 'Which mix holds its shape?',
  definition: {
    choices: [
      {
        id: 'wet',
        text: 'The one that slumps a little',
        right: true,
        feedback: 'It fills the form.',
      },
      { id: 'dry', text: 'The one that crumbles', right: false, feedback: 'It leaves holes.' },
    ],
  },
})

/** A hindsight note of a lesson. */
export async function createHindsight(values: typeof hindsightNotes.$inferInsert) {
  return onlyRow(db.insert(hindsightNotes).values(values).$returningId())
}

/** Enrols a person with a revision and starts their build. */
export async function enrol(userId: number, course: { id: number; revisionId: number }) {
  const enrolment = await onlyRow(
    db
      .insert(enrolments)
      .values({ userId, courseId: course.id, revisionId: course.revisionId })
      .$returningId(),
  )
  const build = await onlyRow(
    db.insert(builds).values({ enrolmentId: enrolment.id, name: 'Mine' }).$returningId(),
  )
  return { id: enrolment.id, buildId: build.id }
}

interface IssuedCourseOptions extends CourseOptions {
  isSample?: boolean
  durationMs?: number
  /** Adds stops, kit and the like before the revision is frozen. */
  furnish?: (lesson: { id: number; key: string }) => Promise<unknown>
}
/** An issued course of one lesson with a video and captions. */
export async function createIssuedCourse(options: IssuedCourseOptions = {}) {
  const course = await createCourse(options)
  const stage = await createStage(course.revisionId)
  const lesson = await createLesson(stage, { isSample: options.isSample ?? false })
  const video = await createVideo(course.id, lesson, { durationMs: options.durationMs ?? 100_000 })
  const captions = await createCaptions(video.id)
  await options.furnish?.(lesson)
  await issueRevision(course.revisionId)
  return { ...course, stage, lesson, video, captions }
}
