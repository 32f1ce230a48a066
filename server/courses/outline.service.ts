import type { BenchStage, BenchStop, Snag } from '../../shared/contracts/benchCourses'
import type { Exercise } from '../../shared/contracts/exercises'
import type { ExerciseProblem } from '../../shared/grading'
import type { Executor } from '../db/client'
import { listStopsOf } from '../exercises/benchStops.service'
import { judgeExercise } from '../exercises/ownCalculatorTasks.service'
import { listLessonMedia, type LessonMedia } from '../media/lessonMedia.service'
import type { LessonRow, RevisionRow } from './access.queries'
import { listLessons } from './benchLessons.queries'
import { listKits } from './kit.queries'
import { findLessonSnags, findSnags, type LessonToCheck } from './snags'
import { listStages } from './stages.queries'

/** A lesson of the bench with all that belongs to it. */
export interface FullLesson extends LessonToCheck {
  row: LessonRow
  media: LessonMedia
  /** What is wrong with the exercises of its stops. */
  problems: Map<Exercise, ExerciseProblem[]>
}

/** These lessons with their videos, captions, kit checks and stops. */
export async function loadLessons(
  courseId: number,
  rows: LessonRow[],
  on?: Executor,
): Promise<FullLesson[]> {
  const ids = rows.map(({ id }) => id)
  const media = await listLessonMedia(courseId, rows, on)
  const kits = await listKits(ids, on)
  const stops = await listStopsOf(ids, on)
  const problems = await judgeAll([...stops.values()].flat())
  return rows.map((row) => {
    const own = media.get(row.id) ?? { video: null, refused: null, captions: [] }
    return {
      row,
      media: own,
      id: row.id,
      title: row.title,
      summary: row.summary,
      hazards: row.hazards,
      isSample: row.isSample,
      kit: kits.get(row.id) ?? [],
      video: own.video,
      captions: own.captions,
      stops: stops.get(row.id) ?? [],
      problems,
    }
  })
}

async function judgeAll(stops: BenchStop[]): Promise<FullLesson['problems']> {
  const exercises = stops.flatMap(({ exercise }) => (exercise ? [exercise] : []))
  const judged = exercises.map(async (one) => [one, await judgeExercise(one)] as const)
  return new Map(await Promise.all(judged))
}

/** What is left to mend in one lesson. */
export const checkLesson = (lesson: FullLesson): Snag[] =>
  findLessonSnags(lesson, (exercise) => lesson.problems.get(exercise) ?? [])

/** A revision's stages and lessons as rows of the bench, and its snag list. */
export async function loadOutline(
  revision: RevisionRow,
  on?: Executor,
): Promise<{ stages: BenchStage[]; snags: Snag[] }> {
  const stages = await listStages(revision.id, on)
  const lessons = await loadLessons(revision.courseId, await listLessons(revision.id, on), on)
  const problems = new Map(lessons.flatMap((lesson) => [...lesson.problems]))
  const inStage = (stageId: number) => lessons.filter(({ row }) => row.stageId === stageId)
  const snags = findSnags(
    {
      outcome: revision.outcome,
      tools: revision.tools,
      stages: stages.map(({ id, title }) => ({ title, lessons: inStage(id) })),
    },
    (exercise) => problems.get(exercise) ?? [],
  )
  const countMusts = (lessonId: number) =>
    snags.filter(({ weight, place }) => weight === 'must' && place.lessonId === lessonId).length
  return {
    snags,
    stages: stages.map(({ id, key, kind, title }) => ({
      id,
      key,
      kind,
      title,
      lessons: inStage(id).map(({ row, video, captions, stops }) => ({
        id: row.id,
        key: row.key,
        title: row.title,
        video: {
          state: video?.state ?? 'none',
          durationMs: video?.durationMs ?? null,
          refusal: video?.refusal ?? null,
        },
        captions: captions.length,
        stops: stops.length,
        musts: countMusts(row.id),
        isSample: row.isSample,
      })),
    })),
  }
}
