import type { Job } from './job'
import { probeVideo } from './probeVideo'
import { sweepMedia } from './sweepMedia'

/** Every kind of background work, one line each. */
export const jobs: Job[] = [probeVideo, sweepMedia]
