import { useEventListener } from '@vueuse/core'
import { defineStore } from 'pinia'
import { reactive } from 'vue'
import { maxVideoBytes, type Cue, type UploadCaptionsQuery } from '../../shared/contracts/media'
import { asProblem } from '../api/client'
import * as api from '../api/media'
import * as uploading from '../api/uploads'

export interface UploadState {
  filename: string
  bytes: number
  sentBytes: number
  state: 'sending' | 'paused' | 'cut' | 'refused' | 'done'
  message: string
  /** Going on may help. */
  canGoOn: boolean
  /** When it was begun or went on, and with how much: the speed is reckoned from there. */
  since: { at: number; bytes: number }
}

const tooLarge = (file: File) =>
  `“${file.name}” is larger than 4 GiB, the most a video may have. Export it at a lower rate, or cut the lesson in two.`
const isEmpty = (file: File) => `“${file.name}” is empty. Choose the video itself.`

/** Captions, and videos on their way to the server; an upload goes on while its page is left. */
export const useMediaStore = defineStore('media', () => {
  const uploads = reactive(new Map<number, UploadState>())
  const handles = new Map<number, uploading.VideoUpload>()

  const begin = (file: File): UploadState => ({
    filename: file.name,
    bytes: file.size,
    sentBytes: 0,
    state: 'sending',
    message: '',
    canGoOn: true,
    since: { at: Date.now(), bytes: 0 },
  })
  function listen(lessonId: number): uploading.UploadListener {
    const of = () => uploads.get(lessonId)
    let hasBegun = false
    return {
      onProgress(sentBytes) {
        const upload = of()
        if (!upload || upload.state === 'paused') return
        if (!hasBegun || upload.state === 'cut') {
          upload.since = { at: Date.now(), bytes: sentBytes }
          hasBegun = true
        }
        upload.state = 'sending'
        upload.sentBytes = sentBytes
      },
      onCut() {
        const upload = of()
        if (upload && upload.state !== 'paused') upload.state = 'cut'
      },
      onDone() {
        const upload = of()
        if (upload) Object.assign(upload, { state: 'done', sentBytes: upload.bytes })
        handles.delete(lessonId)
      },
      onRefused(message, isFinal) {
        const upload = of()
        if (upload) Object.assign(upload, { state: 'refused', message, canGoOn: !isFinal })
      },
    }
  }

  async function startUpload(lessonId: number, file: File) {
    const upload = begin(file)
    const wrong = file.size > maxVideoBytes ? tooLarge(file) : file.size === 0 ? isEmpty(file) : ''
    uploads.set(
      lessonId,
      wrong ? { ...upload, state: 'refused', message: wrong, canGoOn: false } : upload,
    )
    if (wrong) return
    try {
      handles.set(lessonId, await uploading.startVideoUpload(file, lessonId, listen(lessonId)))
    } catch (error) {
      listen(lessonId).onRefused(asProblem(error).message, true)
    }
  }
  async function pauseUpload(lessonId: number) {
    const upload = uploads.get(lessonId)
    if (!upload) return
    upload.state = 'paused'
    await handles.get(lessonId)?.pause()
  }
  function goOnWithUpload(lessonId: number) {
    const upload = uploads.get(lessonId)
    const handle = handles.get(lessonId)
    if (!upload || !handle) return
    Object.assign(upload, { state: 'sending', message: '' })
    upload.since = { at: Date.now(), bytes: upload.sentBytes }
    handle.goOn()
  }
  /** A line that is back, or thought to be: what waited for it goes on at once. */
  async function tryAgain(lessonId: number) {
    await handles.get(lessonId)?.pause()
    goOnWithUpload(lessonId)
  }
  useEventListener(window, 'online', () => {
    for (const [lessonId, { state }] of uploads) if (state === 'cut') void tryAgain(lessonId)
  })
  async function forgetUpload(lessonId: number) {
    const handle = handles.get(lessonId)
    handles.delete(lessonId)
    await handle?.forget()
    dropUpload(lessonId)
  }
  /** Takes a finished or refused upload off the page. */
  function dropUpload(lessonId: number) {
    uploads.delete(lessonId)
  }

  /** Every caption of a track, in order, with the version to send back. */
  async function loadCues(trackId: number) {
    const cues: Cue[] = []
    let cursor: string | null = null
    for (;;) {
      const page = await api.fetchCues(trackId, cursor)
      cues.push(...page.items)
      cursor = page.nextCursor
      if (cursor === null) return { track: page.track, cues }
    }
  }
  const saveCues = (trackId: number, version: number, cues: Cue[]) =>
    api.saveCues(trackId, { version, cues })
  const uploadCaptions = (lessonId: number, file: Blob, query: UploadCaptionsQuery) =>
    api.uploadCaptions(lessonId, file, query)

  return {
    uploads,
    startUpload,
    pauseUpload,
    goOnWithUpload,
    tryAgain,
    forgetUpload,
    dropUpload,
    findRemembered: uploading.findRememberedUpload,
    forgetRemembered: uploading.forgetRememberedUpload,
    loadCues,
    saveCues,
    uploadCaptions,
    removeTrack: api.deleteTrack,
  }
})
