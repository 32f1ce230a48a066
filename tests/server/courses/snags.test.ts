import { describe, expect, it } from 'vitest'
import { findSnags, type CourseToCheck, type LessonToCheck } from '../../../server/courses/snags'
import type { BenchStop } from '../../../shared/contracts/benchCourses'
import { findExerciseProblems } from '../../../shared/grading'
import { singleQuestion } from '../../support/factories'

const exercise: NonNullable<BenchStop['exercise']> = {
  kind: 'quiz',
  prompt: 'Choose one.',
  tries: 3,
  passMark: 100,
  questions: [singleQuestion()],
}
const stop = (values: Partial<BenchStop> = {}): BenchStop => ({
  id: 7,
  key: 'stop-7',
  name: 'Bags to buy',
  atMs: 5000,
  isRequired: true,
  version: 1,
  exercise,
  ...values,
})
const lesson = (values: Partial<LessonToCheck> = {}): LessonToCheck => ({
  id: 3,
  title: 'Squaring the form',
  summary: 'Diagonals.',
  hazards: [],
  isSample: true,
  kit: [],
  video: { state: 'ready', refusal: null, durationMs: 60_000 },
  captions: [{ label: 'English', isOriginal: true, cues: 12, lastStartMs: 58_000 }],
  stops: [stop()],
  ...values,
})
const course = (values: Partial<CourseToCheck> = {}, only = lesson()): CourseToCheck => ({
  outcome: 'A store.',
  tools: ['Saw'],
  stages: [{ title: 'Base', lessons: [only] }],
  ...values,
})
const kitItem = (kind: 'on-you' | 'caution') => ({
  key: `k-${kind}`,
  kind,
  icon: '',
  title: 'x',
  detail: '',
})
const hazards = [{ kind: 'cement' as const, label: 'Wet cement' }]

const find = (subject: CourseToCheck) =>
  findSnags(subject, findExerciseProblems).map(({ weight, code, place }) => [
    weight,
    code,
    place.kind,
  ])

describe('findSnags', () => {
  it('finds nothing in a course that is whole', () => {
    expect(find(course())).toEqual([])
    const kit = [kitItem('caution')]
    expect(find(course({}, lesson({ hazards, kit })))).toEqual([])
  })

  it.each<[string, CourseToCheck, [string, string, string]]>([
    ['no outcome', course({ outcome: ' ' }), ['must', 'no-outcome', 'course']],
    ['no tools', course({ tools: [] }), ['worth-mending', 'no-tools', 'course']],
    [
      'an empty stage',
      course({ stages: [...course().stages, { title: 'Roof', lessons: [] }] }),
      ['worth-mending', 'empty-stage', 'course'],
    ],
    [
      'no sample',
      course({}, lesson({ isSample: false })),
      ['worth-mending', 'no-sample', 'course'],
    ],
    ['no video', course({}, lesson({ video: null })), ['must', 'no-video', 'lesson']],
    [
      'a video that is being checked',
      course({}, lesson({ video: { state: 'checking', refusal: null, durationMs: null } })),
      ['must', 'video-checking', 'lesson'],
    ],
    [
      'a refused video',
      course({}, lesson({ video: { state: 'refused', refusal: 'No.', durationMs: null } })),
      ['must', 'video-refused', 'lesson'],
    ],
    ['no captions', course({}, lesson({ captions: [] })), ['must', 'no-captions', 'lesson']],
    [
      'captions in another language alone',
      course(
        {},
        lesson({ captions: [{ label: 'Deutsch', isOriginal: false, cues: 3, lastStartMs: 0 }] }),
      ),
      ['must', 'no-captions', 'lesson'],
    ],
    [
      'captions of a longer cut',
      course(
        {},
        lesson({
          captions: [{ label: 'English', isOriginal: true, cues: 3, lastStartMs: 60_000 }],
        }),
      ),
      ['must', 'captions-beyond-end', 'lesson'],
    ],
    ['hazards without a kit check', course({}, lesson({ hazards })), ['must', 'no-kit', 'lesson']],
    [
      'hazards without a caution',
      course({}, lesson({ hazards, kit: [kitItem('on-you')] })),
      ['worth-mending', 'no-caution', 'lesson'],
    ],
    ['no summary', course({}, lesson({ summary: '' })), ['worth-mending', 'no-summary', 'lesson']],
    [
      'a stop without exercise',
      course({}, lesson({ stops: [stop({ exercise: null })] })),
      ['must', 'no-exercise', 'stop'],
    ],
    [
      'a required stop after the end',
      course({}, lesson({ stops: [stop({ atMs: 60_001 })] })),
      ['must', 'stop-beyond-end', 'stop'],
    ],
    [
      'a stop by the way after the end',
      course({}, lesson({ stops: [stop({ atMs: 60_001, isRequired: false })] })),
      ['worth-mending', 'stop-beyond-end', 'stop'],
    ],
    [
      'a quiz without a question',
      course({}, lesson({ stops: [stop({ exercise: { ...exercise, questions: [] } as never })] })),
      ['must', 'exercise', 'stop'],
    ],
  ])('names %s and its place', (_what, subject, snag) => {
    expect(find(subject)).toEqual([snag])
  })

  it('names a question without a right answer', () => {
    const question = singleQuestion()
    const choices = (question.definition as { choices: { right: boolean }[] }).choices
    const wrong = {
      ...question,
      definition: { choices: choices.map((c) => ({ ...c, right: false })) },
    }
    const stops = [stop({ exercise: { ...exercise, questions: [wrong] } as never })]
    expect(find(course({}, lesson({ stops })))).toContainEqual(['must', 'exercise', 'stop'])
  })

  it('says a course without lessons once', () => {
    expect(find(course({ stages: [] }))).toEqual([['must', 'no-lessons', 'course']])
  })

  it('tells where each snag is to be mended', () => {
    const [snag] = findSnags(
      course({}, lesson({ stops: [stop({ exercise: null })] })),
      findExerciseProblems,
    )
    expect(snag?.place).toEqual({ kind: 'stop', lessonId: 3, stopId: 7 })
    expect(snag?.message).toContain('Squaring the form, stop “Bags to buy”')
  })
})
