import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { maxVideoBytes } from '../../../shared/contracts/media'
import * as api from '../../../src/api/media'
import { startVideoUpload, type UploadListener } from '../../../src/api/uploads'
import { useMediaStore } from '../../../src/stores/media'
import { patience } from '../../support/patience'

vi.mock('../../../src/api/media')
vi.mock('../../../src/api/uploads')

let listener: UploadListener
const handle = { pause: vi.fn(), goOn: vi.fn(), forget: vi.fn() }
const fileOf = (size: number) => {
  const file = new File(['x'], 'pour.mp4', { type: 'video/mp4' })
  Object.defineProperty(file, 'size', { value: size })
  return file
}

beforeEach(() => {
  vi.resetAllMocks()
  setActivePinia(createPinia())
  vi.mocked(startVideoUpload).mockImplementation(async (_file, _lessonId, heard) => {
    listener = heard
    return handle
  })
})

describe('useMediaStore, uploads', () => {
  it('refuses a file that is too large before anything is sent', async () => {
    const media = useMediaStore()
    await media.startUpload(5, fileOf(maxVideoBytes + 1))
    expect(media.uploads.get(5)).toMatchObject({ state: 'refused', canGoOn: false })
    expect(media.uploads.get(5)?.message).toContain('4 GiB')
    expect(startVideoUpload).not.toHaveBeenCalled()
  })
  it('takes a file of just the largest size', async () => {
    const media = useMediaStore()
    await media.startUpload(5, fileOf(maxVideoBytes))
    expect(media.uploads.get(5)?.state).toBe('sending')
  })
  it('stays paused when a last word of progress comes late', async () => {
    const media = useMediaStore()
    await media.startUpload(5, fileOf(100))
    listener.onProgress(40)
    await media.pauseUpload(5)
    listener.onProgress(45)
    expect(media.uploads.get(5)).toMatchObject({ state: 'paused', sentBytes: 40 })
    expect(handle.pause).toHaveBeenCalledOnce()
  })
  it('waits for a line that is cut and goes on once it is back', async () => {
    const media = useMediaStore()
    await media.startUpload(5, fileOf(100))
    listener.onProgress(40)
    listener.onCut()
    expect(media.uploads.get(5)?.state).toBe('cut')
    window.dispatchEvent(new Event('online'))
    await vi.waitFor(() => expect(handle.goOn).toHaveBeenCalledOnce(), patience)
    expect(media.uploads.get(5)?.state).toBe('sending')
  })
  it('keeps the sentence of a refusal', async () => {
    const media = useMediaStore()
    await media.startUpload(5, fileOf(100))
    listener.onRefused('There is no room.', false)
    expect(media.uploads.get(5)).toMatchObject({
      state: 'refused',
      message: 'There is no room.',
      canGoOn: true,
    })
  })
  it('has the server forget what is stopped for good', async () => {
    const media = useMediaStore()
    await media.startUpload(5, fileOf(100))
    await media.forgetUpload(5)
    expect(handle.forget).toHaveBeenCalledOnce()
    expect(media.uploads.has(5)).toBe(false)
  })
})

describe('useMediaStore, captions', () => {
  it('reads all pages of a track in order', async () => {
    const cue = (text: string) => ({ cueId: '', settings: '', startMs: 0, endMs: 1000, text })
    const track = { id: 3, language: 'en', label: 'English', isOriginal: true, cues: 2 }
    const whole = { ...track, version: 4, savedAt: '2026-12-01T08:00:00.000Z' }
    vi.mocked(api.fetchCues)
      .mockResolvedValueOnce({ track: whole, items: [cue('one')], nextCursor: '0' })
      .mockResolvedValueOnce({ track: whole, items: [cue('two')], nextCursor: null })
    const { cues } = await useMediaStore().loadCues(3)
    expect(cues.map(({ text }) => text)).toEqual(['one', 'two'])
    expect(api.fetchCues).toHaveBeenNthCalledWith(2, 3, '0')
  })
})
