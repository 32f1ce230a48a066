import type { Hazard } from '../../shared/contracts/courses'
import type { KitItem } from '../../shared/contracts/lessons'
import type { BenchStop, Snag } from '../../shared/contracts/benchCourses'
import type { Exercise } from '../../shared/contracts/exercises'

/** What the snag list looks at of one lesson. */
export interface LessonToCheck {
  id: number
  title: string
  summary: string
  hazards: Hazard[]
  isSample: boolean
  kit: KitItem[]
  video: {
    state: 'checking' | 'ready' | 'refused'
    refusal: string | null
    durationMs: number | null
  } | null
  captions: { label: string; isOriginal: boolean; cues: number; lastStartMs: number }[]
  stops: BenchStop[]
}

/** What the snag list looks at of a draft. */
export interface CourseToCheck {
  outcome: string
  tools: string[]
  stages: { title: string; lessons: LessonToCheck[] }[]
}

/** What is wrong with an exercise, as the grading code finds it. */
type FindProblems = (exercise: Exercise) => { path: string; message: string; blocking: boolean }[]

type Found = [weight: Snag['weight'], code: string, message: string]

function checkCourse({ outcome, tools, stages }: CourseToCheck): Found[] {
  const lessons = stages.flatMap((stage) => stage.lessons)
  const found: Found[] = []
  if (outcome.trim() === '') {
    found.push(['must', 'no-outcome', 'Say what the learner will have built.'])
  }
  if (lessons.length === 0) found.push(['must', 'no-lessons', 'The course has no lesson yet.'])
  for (const stage of stages) {
    if (stage.lessons.length > 0) continue
    found.push(['worth-mending', 'empty-stage', `The stage “${stage.title}” has no lesson.`])
  }
  if (tools.length === 0) {
    found.push(['worth-mending', 'no-tools', 'List the tools, so that they are bought in time.'])
  }
  if (lessons.length > 0 && !lessons.some(({ isSample }) => isSample)) {
    found.push([
      'worth-mending',
      'no-sample',
      'No lesson is open as a sample: nobody can look in before they enrol.',
    ])
  }
  return found
}

function checkVideo({ video, captions }: LessonToCheck): Found[] {
  if (!video) return [['must', 'no-video', 'There is no video yet.']]
  const found: Found[] = []
  if (video.state === 'checking') {
    found.push(['must', 'video-checking', 'The video is still being checked.'])
  }
  if (video.state === 'refused') {
    found.push(['must', 'video-refused', `The video cannot be used. ${video.refusal ?? ''}`.trim()])
  }
  if (!captions.some(({ isOriginal, cues }) => isOriginal && cues > 0)) {
    found.push(['must', 'no-captions', 'There are no captions in the language that is spoken.'])
  }
  for (const { label, lastStartMs } of captions) {
    if (video.durationMs === null || lastStartMs < video.durationMs) continue
    found.push([
      'must',
      'captions-beyond-end',
      `The captions in ${label} go on after the video has ended. They belong to another cut of it.`,
    ])
  }
  return found
}

function checkLesson(lesson: LessonToCheck): Found[] {
  const { summary, hazards, kit } = lesson
  const found = checkVideo(lesson)
  if (hazards.length > 0 && kit.length === 0) {
    found.push([
      'must',
      'no-kit',
      'It has hazards but no kit check. Say what to wear and what to watch before the video plays.',
    ])
  } else if (hazards.length > 0 && !kit.some(({ kind }) => kind === 'caution')) {
    found.push(['worth-mending', 'no-caution', 'It has hazards, but its kit check has no caution.'])
  }
  if (summary.trim() === '') {
    found.push(['worth-mending', 'no-summary', 'Say in a sentence what it is about.'])
  }
  return found
}

function checkStop(
  { atMs, isRequired, exercise }: BenchStop,
  durationMs: number | null,
  findProblems: FindProblems,
): Found[] {
  const found: Found[] = []
  if (durationMs !== null && atMs > durationMs) {
    found.push(
      isRequired
        ? [
            'must',
            'stop-beyond-end',
            'It stands after the end of the video, and nobody could pass it.',
          ]
        : ['worth-mending', 'stop-beyond-end', 'It stands after the end of the video.'],
    )
  }
  if (!exercise) {
    found.push(['must', 'no-exercise', 'There is nothing to work out: add an exercise.'])
    return found
  }
  for (const { message, blocking } of findProblems(exercise)) {
    found.push([blocking ? 'must' : 'worth-mending', 'exercise', message])
  }
  return found
}

const toSnags = (found: Found[], place: Snag['place'], prefix: string): Snag[] =>
  found.map(([weight, code, message]) => ({
    weight,
    code,
    message: prefix === '' ? message : `${prefix}: ${message}`,
    place,
  }))

/** What of a lesson must be put right before its revision is issued, and what is worth mending. */
export function findLessonSnags(lesson: LessonToCheck, findProblems: FindProblems): Snag[] {
  const place = { kind: 'lesson', lessonId: lesson.id, stopId: null } as const
  const durationMs = lesson.video?.durationMs ?? null
  return [
    ...toSnags(checkLesson(lesson), place, lesson.title),
    ...lesson.stops.flatMap((stop) =>
      toSnags(
        checkStop(stop, durationMs, findProblems),
        { kind: 'stop', lessonId: lesson.id, stopId: stop.id },
        `${lesson.title}, stop “${stop.name}”`,
      ),
    ),
  ]
}

/** The snag list of a draft: the course's own snags, then each lesson's with its stops. */
export function findSnags(course: CourseToCheck, findProblems: FindProblems): Snag[] {
  return [
    ...toSnags(checkCourse(course), { kind: 'course', lessonId: null, stopId: null }, ''),
    ...course.stages.flatMap(({ lessons }) =>
      lessons.flatMap((lesson) => findLessonSnags(lesson, findProblems)),
    ),
  ]
}
