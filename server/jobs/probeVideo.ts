import { z } from 'zod'
import { checkVideo, refuseUncheckable } from '../media/videos.service'
import { defineJob } from './job'

/** Finds out whether an uploaded file is a video that browsers play, and makes its poster. */
export const probeVideo = defineJob({
  kind: 'probe-video',
  payload: z.object({ videoId: z.number() }),
  run: ({ videoId }, signal) => checkVideo(videoId, signal),
  giveUp: ({ videoId }) => refuseUncheckable(videoId),
})
