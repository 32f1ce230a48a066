import { z } from 'zod'
import { sweepUploads } from '../media/uploads.service'
import { sweepVideos } from '../media/videos.service'
import { defineJob } from './job'
import { deleteOldJobs } from './jobs.queries'

/** Clears away uploads that nobody goes on with, videos that nothing shows, and finished jobs. */
export const sweepMedia = defineJob({
  kind: 'sweep-media',
  payload: z.object({}),
  everyMs: 3600_000,
  async run() {
    await sweepUploads()
    await sweepVideos()
    await deleteOldJobs()
  },
})
