import type { DetailedError, PreviousUpload, Upload } from 'tus-js-client'
import { problemSchema } from '../../shared/contracts/errors'

const endpoint = '/api/uploads'
/** Tried again after each of these; a line that is back by itself goes on unseen. */
const retryDelays = [0, 1000, 3000, 5000, 10_000, 20_000, 30_000, 30_000, 30_000, 30_000]
const noRoom = 507

/** What is told of an upload while it goes. */
export interface UploadListener {
  onProgress: (sentBytes: number) => void
  /** The line is down or the server does not answer; it is tried again. */
  onCut: () => void
  onDone: () => void
  /** The server refused it; `isFinal` when going on would not help. */
  onRefused: (message: string, isFinal: boolean) => void
}

/** An upload under way. */
export interface VideoUpload {
  pause: () => Promise<void>
  goOn: () => void
  /** Stops it and has the server throw away what came in. */
  forget: () => Promise<void>
}

/** An upload of this device that did not come in whole; the same file goes on where it stopped. */
export interface RememberedUpload {
  filename: string
  bytes: number
  sentBytes: number
  url: string
  storageKey: string
}

const loadTus = () => import('tus-js-client')

/** The same for the same file of the same lesson, whatever page it is chosen on. */
const fingerprintOf = (file: File, lessonId: number) =>
  ['gf-upload', lessonId, file.name, file.size, file.lastModified].join('/')

const isDetailed = (error: Error | DetailedError): error is DetailedError =>
  'originalResponse' in error

function readRefusal(error: Error | DetailedError): { message: string; status: number } {
  const response = isDetailed(error) ? error.originalResponse : null
  if (!response) return { status: 0, message: '' }
  const status = response.getStatus()
  try {
    const problem = problemSchema.parse(JSON.parse(response.getBody()))
    return { status, message: problem.errors?.[0]?.message ?? problem.detail }
  } catch {
    return { status, message: 'The server could not take the file just now. Go on in a while.' }
  }
}

const isRefusal = (status: number) => status >= 400 && status < 500 && ![409, 423].includes(status)

async function resumeIfKnown(upload: Upload) {
  const [previous] = await upload.findPreviousUploads()
  if (previous) upload.resumeFromPreviousUpload(previous)
}

/** Sends a video, from where an earlier try of the same file stopped. */
export async function startVideoUpload(
  file: File,
  lessonId: number,
  listener: UploadListener,
): Promise<VideoUpload> {
  const tus = await loadTus()
  const upload = new tus.Upload(file, {
    endpoint,
    retryDelays,
    removeFingerprintOnSuccess: true,
    fingerprint: async () => fingerprintOf(file, lessonId),
    metadata: { lessonId: String(lessonId), filename: file.name, filetype: file.type },
    onProgress: (sentBytes) => listener.onProgress(sentBytes),
    onSuccess: () => listener.onDone(),
    onShouldRetry: (error) => {
      const status = error.originalResponse?.getStatus() ?? 0
      const again = !isRefusal(status) && status !== noRoom
      if (again) listener.onCut()
      return again
    },
    onError: (error) => {
      const { status, message } = readRefusal(error)
      if (status === 0) {
        listener.onCut()
        return
      }
      listener.onRefused(message, isRefusal(status) && status !== 401 && status !== 429)
    },
  })
  await resumeIfKnown(upload)
  upload.start()
  return {
    pause: () => upload.abort(false),
    goOn: () => upload.start(),
    forget: () => upload.abort(true),
  }
}

/** How much of an upload the server holds; null when it does not know it any more. */
async function askOffset(url: string): Promise<number | null> {
  const response = await fetch(url, { method: 'HEAD', headers: { 'Tus-Resumable': '1.0.0' } })
  return response.ok ? Number(response.headers.get('Upload-Offset')) : null
}

async function recall(previous: PreviousUpload): Promise<RememberedUpload | null> {
  const tus = await loadTus()
  const sentBytes = previous.uploadUrl ? await askOffset(previous.uploadUrl) : null
  if (sentBytes === null || !previous.uploadUrl) {
    await tus.defaultOptions.urlStorage.removeUpload(previous.urlStorageKey)
    return null
  }
  return {
    filename: previous.metadata['filename'] ?? '',
    bytes: previous.size ?? 0,
    sentBytes,
    url: previous.uploadUrl,
    storageKey: previous.urlStorageKey,
  }
}

/** The newest upload for this lesson that this device began and that is still wanted by the server. */
export async function findRememberedUpload(lessonId: number): Promise<RememberedUpload | null> {
  const isAny = Object.keys(localStorage).some((key) => key.startsWith('tus::'))
  if (!isAny) return null
  const tus = await loadTus()
  const all = await tus.defaultOptions.urlStorage.findAllUploads()
  const newest = all
    .filter(({ metadata }) => metadata['lessonId'] === String(lessonId))
    .sort((a, b) => Date.parse(b.creationTime) - Date.parse(a.creationTime))[0]
  return newest ? recall(newest) : null
}

/** Has the server throw away what came in of a remembered upload. */
export async function forgetRememberedUpload({ url, storageKey }: RememberedUpload): Promise<void> {
  const tus = await loadTus()
  await tus.Upload.terminate(url, { retryDelays: [0, 1000, 3000] })
  await tus.defaultOptions.urlStorage.removeUpload(storageKey)
}
