import type { SKRSContext2D } from '@napi-rs/canvas'
import type { Timeline } from './timeline'

/** A moment at which the video waits for an exercise. */
interface StopMark {
  key: string
  name: string
}

/** One sentence: spoken as `say`, read as `cap` (its line break is set by hand). */
export interface Line {
  id: string
  say: string
  cap: string
  /** Set when the video waits after this sentence. */
  stop?: StopMark
  /** Seconds of quiet after the sentence, where the usual pause is too short. */
  after?: number
}

/** A chapter: some sentences in a row, with quiet before and after them in seconds. */
export interface Step {
  id: string
  title: string
  before?: number
  after?: number
  lines: Line[]
}

export interface Lesson {
  id: string
  title: string
  /** The sentence whose end gives the poster. */
  posterLine: string
  steps: Step[]
  /** Draws the frame at `t` seconds; depends on nothing but `t` and the timeline. */
  draw: (ctx: SKRSContext2D, t: number, timeline: Timeline) => void
}
