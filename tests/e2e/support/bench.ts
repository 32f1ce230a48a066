import { readFileSync } from 'node:fs'
import type { APIResponse, Page } from '@playwright/test'
import type { BenchCourse, BenchLesson, BenchStop } from '../../../shared/contracts/benchCourses'
import type { OwnCalculator } from '../../../shared/contracts/ownCalculators'
import { barrows } from '../../shared/ownCalculators/definitions'
import { captions, film, filmName } from './films'
import { newWord } from './people'
import { expect } from './watched'

interface Sent {
  data?: unknown
  headers?: Record<string, string>
}

/** Asks the server as the page's own person, from the page's own site. */
async function ask(page: Page, method: string, path: string, sent: Sent = {}) {
  const origin = new URL(page.url()).origin
  const response: APIResponse = await page.request.fetch(`${origin}/api/${path}`, {
    method,
    ...sent,
    headers: { Origin: origin, ...sent.headers },
  })
  expect(response.ok(), `${method} ${path}: ${await response.text()}`).toBe(true)
  return response
}
const send = async <T>(page: Page, method: string, path: string, data?: unknown): Promise<T> =>
  (await ask(page, method, path, data === undefined ? {} : { data })).json() as Promise<T>

export const readCourse = (page: Page, id: number) =>
  send<BenchCourse>(page, 'GET', `bench/courses/${id}`)
export const readLesson = (page: Page, id: number) =>
  send<BenchLesson>(page, 'GET', `bench/lessons/${id}`)

/** A draft with one stage and these lessons. */
export async function makeCourse(page: Page, lessons: string[]) {
  const response = await ask(page, 'POST', 'bench/courses', {
    headers: { 'Idempotency-Key': crypto.randomUUID() },
    data: {
      title: `A tool shelf ${newWord()}`,
      outcome: 'A shelf under a roof, dry and level.',
      weekends: 2,
      coverDrawing: 'log-store',
      stages: ['ground'],
    },
  })
  let course = (await response.json()) as BenchCourse
  for (const title of lessons) {
    const stageId = course.stages[0]?.id ?? 0
    course = await send<BenchCourse>(page, 'POST', `bench/stages/${stageId}/lessons`, { title })
  }
  return course
}

/** A calculator of the course's own that could be kept as it is. */
export async function makeOwnCalculator(page: Page, courseId: number) {
  const response = await ask(page, 'POST', `bench/courses/${courseId}/own-calculators`, {
    headers: { 'Idempotency-Key': crypto.randomUUID() },
    data: { definition: barrows() },
  })
  return (await response.json()) as OwnCalculator
}

const base64 = (text: string | number) => Buffer.from(String(text)).toString('base64')

/** A lesson's film, sent in one piece, and looked at by the server. */
export async function sendFilm(page: Page, lessonId: number) {
  const bytes = readFileSync(film)
  const tus = { 'Tus-Resumable': '1.0.0' }
  const created = await ask(page, 'POST', 'uploads', {
    headers: {
      ...tus,
      'Upload-Length': String(bytes.length),
      'Upload-Metadata': `lessonId ${base64(lessonId)},filename ${base64(filmName)}`,
    },
  })
  const place = new URL(created.headers()['location'] ?? '', page.url()).pathname
  await ask(page, 'PATCH', place.replace(/^\/api\//, ''), {
    headers: { ...tus, 'Upload-Offset': '0', 'Content-Type': 'application/offset+octet-stream' },
    data: bytes,
  })
  await expect
    .poll(async () => (await readLesson(page, lessonId)).video?.state, { timeout: 30_000 })
    .toBe('ready')
}
export const sendCaptions = (page: Page, lessonId: number) =>
  ask(page, 'POST', `bench/lessons/${lessonId}/captions?language=en&label=English`, {
    headers: { 'Content-Type': 'text/vtt' },
    data: Buffer.from(captions),
  })
export const setStop = (
  page: Page,
  lessonId: number,
  atMs: number,
  name = 'Length of the rafter',
) =>
  send<BenchStop>(page, 'POST', `bench/lessons/${lessonId}/stops`, {
    name,
    atMs,
    isRequired: true,
  })

export const lessonIdOf = ({ stages }: BenchCourse, title: string) =>
  stages.flatMap(({ lessons }) => lessons).find((lesson) => lesson.title === title)?.id ?? 0
export const lessonPath = (course: BenchCourse, lessonId: number) =>
  `/bench/courses/${course.id}/lessons/${lessonId}`

/** What was typed and waits on this device to be sent. */
const findUnsent = (page: Page) =>
  page.evaluate(() =>
    Object.entries(localStorage).filter(
      ([key, text]) =>
        key.startsWith('gf-unsent:') &&
        Object.keys((JSON.parse(String(text)) as { changes?: object }).changes ?? {}).length > 0,
    ),
  )
/** Waits until all that was typed is on the server and the page says so. */
export async function expectSaved(page: Page) {
  await expect.poll(() => findUnsent(page)).toEqual([])
  const said = page.getByRole('status').filter({ hasText: /^\s*Saved \d\d:\d\d/ })
  await expect(said.first()).toBeVisible()
}
