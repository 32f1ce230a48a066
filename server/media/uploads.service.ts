import type { IncomingMessage } from 'node:http'
import { Readable } from 'node:stream'
import type { ReadableStream } from 'node:stream/web'
import { Server } from '@tus/server'
import { maxVideoBytes } from '../../shared/contracts/media'
import type { Actor, Thing } from '../../shared/contracts/policies'
import { accessBenchRow, accessCourse } from '../courses/access.service'
import { findLessonToFilm } from '../courses/lessonVideos.service'
import { notFound } from '../errors'
import { findFreeBytes, reservedBytes } from './diskSpace'
import { createUploadLocks } from './uploadLocks'
import { refusals } from './uploadRefusals'
import { keptMs, uploadStore, type UploadNote } from './uploadStore'
import { addUploadedVideo, findUploaded } from './videos.service'

/** One person's uploads that are under way at once; the oldest idle one gives way to a new one. */
const mostUnfinished = 5
/** An upload that got nothing for so long is idle. */
const idleMs = 10 * 60_000

const idPattern = /^[0-9a-f]{32}$/

/** What the browser says of the file it is about to send. */
export interface UploadPlan {
  bytes: number
  lessonId: number
  filename: string
}

/** An upload as the one who sent it stands to it. */
export interface UploadAccess {
  thing: Thing
  /** Size of an upload that has come in whole. */
  finishedBytes: number | null
}

async function finish(id: string, note: UploadNote) {
  await addUploadedVideo({
    uploadId: id,
    path: uploadStore.pathOf(id),
    bytes: note.size,
    courseId: note.courseId,
    lessonKey: note.lessonKey,
    uploaderId: note.userId,
    originalName: note.filename,
  })
  await uploadStore.remove(id)
}

/** Takes over an upload that was whole when the server stopped; false when bytes are missing. */
async function finishIfWhole(id: string, note: UploadNote): Promise<boolean> {
  const file = await uploadStore.findFile(id)
  if (file && file.bytes < note.size) return false
  await finish(id, note)
  return true
}

/** How a person stands to the lesson they want to send a video for. */
export const accessTarget = async (lessonId: number, actor: Actor | null): Promise<Thing> =>
  (await accessBenchRow({ lessonId }, actor)).thing

/** How a person stands to an upload; 404 unless it is their own. */
export async function accessUpload(id: string, actor: Actor): Promise<UploadAccess> {
  if (!idPattern.test(id)) throw notFound('upload')
  const note = await uploadStore.findNote(id)
  if (note) {
    if (note.userId !== actor.id) throw notFound('upload')
    const { thing } = await accessBenchRow({ lessonId: note.lessonId }, actor)
    return { thing, finishedBytes: (await finishIfWhole(id, note)) ? note.size : null }
  }
  const video = await findUploaded(id, actor.id)
  if (!video) throw notFound('upload')
  const { thing } = await accessCourse({ id: video.courseId }, actor)
  return { thing, finishedBytes: video.bytes }
}

async function listUnfinished() {
  const uploads = []
  for (const id of await uploadStore.listIds()) {
    const note = await uploadStore.findNote(id)
    const file = await uploadStore.findFile(id)
    if (note && file) uploads.push({ id, note, file })
  }
  return uploads.sort((a, b) => a.file.changedAt - b.file.changedAt)
}

async function makeRoom(actor: Actor, bytes: number, findFree: () => Promise<number>) {
  const unfinished = await listUnfinished()
  const own = unfinished.filter(({ note }) => note.userId === actor.id)
  if (own.length >= mostUnfinished) {
    const idle = own.find(({ file }) => file.changedAt < Date.now() - idleMs)
    if (!idle) throw refusals.tooMany(mostUnfinished)
    await uploadStore.remove(idle.id)
  }
  const promised = unfinished.reduce((sum, { note, file }) => sum + note.size - file.bytes, 0)
  if ((await findFree()) < bytes + promised + reservedBytes) throw refusals.diskFull()
}

function toWebRequest(request: IncomingMessage, path: string): Request {
  const headers = new Headers()
  for (const [name, value] of Object.entries(request.headers)) {
    if (typeof value === 'string') headers.set(name, value)
  }
  const hasBody = request.method === 'PATCH' || request.method === 'POST'
  const init = {
    method: request.method ?? 'GET',
    headers,
    body: hasBody ? (Readable.toWeb(request) as ReadableStream<Uint8Array>) : null,
    duplex: 'half',
  }
  return new Request(`http://localhost${path}`, init as RequestInit)
}

interface UploadOptions {
  /** Bytes that may still be written; the disk's own answer unless told otherwise. */
  findFree?: () => Promise<number>
}

/** The receiving end of tus, behind our own sessions and policies. */
export function createUploads({
  findFree = () => findFreeBytes(uploadStore.folder),
}: UploadOptions = {}) {
  const notes = new WeakMap<Request, Record<string, string>>()
  const tus = new Server({
    path: '/api/uploads',
    datastore: uploadStore.makeDataStore(),
    locker: createUploadLocks(uploadStore.folder),
    maxSize: maxVideoBytes,
    relativeLocation: true,
    onUploadCreate: (request) => Promise.resolve({ metadata: notes.get(request as Request) ?? {} }),
    async onUploadFinish(_request, { id }) {
      const note = await uploadStore.findNote(id)
      if (note) await finish(id, note)
      return {}
    },
    async onResponseError(_request, error) {
      // The library tells a failed write apart only by the object it throws, which may be a copy of its own.
      const status = 'status_code' in error ? error.status_code : 500
      const isFull = status >= 500 && (await findFree()) < reservedBytes
      return isFull ? { status_code: 507, body: '' } : undefined
    },
  })
  return {
    /** Answers a request for an upload that is there. */
    async handle(request: IncomingMessage, path: string): Promise<Response> {
      const length = Number(request.headers['content-length'] ?? 0)
      if (request.method === 'PATCH' && (await findFree()) < length) throw refusals.diskFull()
      return tus.handleWeb(toWebRequest(request, path))
    },

    /** Begins an upload; 409 when the lesson is issued, 507 when there is no room for the file. */
    async begin(
      request: IncomingMessage,
      path: string,
      { actor, plan }: { actor: Actor; plan: UploadPlan },
    ): Promise<Response> {
      const lesson = await findLessonToFilm(plan.lessonId)
      await makeRoom(actor, plan.bytes, findFree)
      const webRequest = toWebRequest(request, path)
      notes.set(webRequest, {
        userId: String(actor.id),
        lessonId: String(lesson.id),
        courseId: String(lesson.courseId),
        lessonKey: lesson.key,
        filename: plan.filename,
      })
      return tus.handleWeb(webRequest)
    },
  }
}
export type Uploads = ReturnType<typeof createUploads>

/** Takes over what came in whole, and forgets what nobody has gone on with for days. */
export async function sweepUploads() {
  for (const { id, note, file } of await listUnfinished()) {
    if (file.bytes >= note.size) await finish(id, note)
    else if (Math.max(file.changedAt, note.createdAt) < Date.now() - keptMs) {
      await uploadStore.remove(id)
    }
  }
}
