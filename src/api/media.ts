import {
  captionTrackSchema,
  captionUploadSchema,
  cuePageSchema,
  type SaveCues,
  type UploadCaptionsQuery,
} from '../../shared/contracts/media'
import { queryString, request, requestNothing } from './client'

const largestPage = 500

/** Sends a caption file as it is; what is wrong with it comes back as a list, not as a problem. */
export const uploadCaptions = (lessonId: number, file: Blob, query: UploadCaptionsQuery) =>
  request(captionUploadSchema, `/bench/lessons/${lessonId}/captions${queryString(query)}`, {
    method: 'POST',
    bytes: file,
  })
export const fetchCues = (trackId: number, cursor: string | null) =>
  request(
    cuePageSchema,
    `/bench/captions/${trackId}/cues${queryString({ cursor, limit: largestPage })}`,
  )
export const saveCues = (trackId: number, body: SaveCues) =>
  request(captionTrackSchema, `/bench/captions/${trackId}/cues`, { method: 'PUT', body })
export const deleteTrack = (trackId: number) =>
  requestNothing(`/bench/captions/${trackId}`, { method: 'DELETE' })
