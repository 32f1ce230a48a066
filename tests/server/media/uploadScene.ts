import { request as httpRequest, type IncomingHttpHeaders } from 'node:http'
import { eq } from 'drizzle-orm'
import { db } from '../../../server/db/client'
import { videos } from '../../../server/db/schema'
import { startJobs, stopJobs } from '../../../server/jobs/queue'
import { createSessionCookie, type TestApp } from '../../support/app'
import { createCourse, createInstructor, createLesson, createStage } from '../../support/factories'

export interface Answer {
  status: number
  headers: IncomingHttpHeaders
  body: string
}
export interface Sending {
  method: string
  path?: string
  cookie?: string
  headers?: Record<string, string>
  body?: Buffer
  /** Cut the line after so many bytes of the body. */
  cutAfter?: number
  /** `http://` and the address to send to. */
  base: string
}

/** Speaks tus over a socket of its own, and can cut it. */
export function send({ method, path = '', cookie, headers = {}, body, cutAfter, base }: Sending) {
  return new Promise<Answer | 'cut'>((resolve, reject) => {
    const origin = base
    const request = httpRequest(`${origin}/api/uploads${path}`, {
      method,
      headers: {
        Origin: origin,
        'Tus-Resumable': '1.0.0',
        ...(cookie ? { Cookie: cookie } : {}),
        ...(body ? { 'Content-Length': String(body.length) } : {}),
        ...headers,
      },
    })
    request.on('error', (error) => (cutAfter === undefined ? reject(error) : resolve('cut')))
    request.on('response', (response) => {
      const parts: Buffer[] = []
      response.on('data', (part: Buffer) => parts.push(part))
      response.on('end', () =>
        resolve({
          status: response.statusCode ?? 0,
          headers: response.headers,
          body: Buffer.concat(parts).toString(),
        }),
      )
    })
    if (cutAfter === undefined) request.end(body)
    else request.write(body!.subarray(0, cutAfter), () => setTimeout(() => request.destroy(), 150))
  })
}
export async function ask(sending: Sending): Promise<Answer> {
  const answer = await send(sending)
  if (answer === 'cut') throw new Error('the line was cut')
  return answer
}
/** The code of a refusal. */
export const codeOf = ({ body }: Answer) => (JSON.parse(body) as { code: string }).code

/** The Upload-Metadata header. */
export const metadata = (values: Record<string, string>) =>
  Object.entries(values)
    .map(([name, value]) => `${name} ${Buffer.from(value).toString('base64')}`)
    .join(',')

/** A lesson to film, and its owner with tus in their hands. */
export async function setUpUpload(app: TestApp) {
  const base = app.url
  const owner = await createInstructor()
  const course = await createCourse({ owner })
  const lesson = await createLesson(await createStage(course.revisionId))
  const cookie = await createSessionCookie(owner.id)
  const begin = (length: number, values: Partial<Sending> = {}) =>
    ask({
      method: 'POST',
      base,
      cookie,
      ...values,
      headers: {
        'Upload-Length': String(length),
        'Upload-Metadata': metadata({
          lessonId: String(lesson.id),
          filename: 'Säge.mp4',
          filetype: 'video/mp4',
        }),
        ...values.headers,
      },
    })
  const open = async (length: number) => {
    const { headers } = await begin(length)
    return (headers.location ?? '').replace('/api/uploads', '')
  }
  const patch = (path: string, offset: number, body: Buffer, values: Partial<Sending> = {}) =>
    send({
      method: 'PATCH',
      base,
      path,
      cookie,
      body,
      ...values,
      headers: {
        'Upload-Offset': String(offset),
        'Content-Type': 'application/offset+octet-stream',
        ...values.headers,
      },
    })
  const head = (path: string, who = cookie) => ask({ method: 'HEAD', base, path, cookie: who })
  const findVideo = async () =>
    (await db.select().from(videos).where(eq(videos.lessonKey, lesson.key)))[0]
  return { owner, course, lesson, cookie, begin, open, patch, head, findVideo }
}

/** Lets the jobs run until the lesson's last video is judged. */
export async function waitUntilChecked(lessonKey: string) {
  startJobs()
  try {
    for (;;) {
      const rows = await db.select().from(videos).where(eq(videos.lessonKey, lessonKey))
      const open = rows.some(({ state }) => state === 'checking')
      if (!open) return rows.at(-1)!
      await new Promise((resolve) => setTimeout(resolve, 100))
    }
  } finally {
    await stopJobs()
  }
}
