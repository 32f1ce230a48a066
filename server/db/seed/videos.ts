import { readFileSync, statSync } from 'node:fs'
import { join } from 'node:path'
import { config } from '../../config'
import type { MomentSeed } from './shapes'

/** A video that ships with the project, by its file name in media/built. */
export type DemoVideo = 'squaring-the-form' | 'mixing-and-pouring' | 'roof-pitch'

/** Lessons with a video of their own. */
const ownVideos: Record<string, DemoVideo> = {
  'squaring-the-form': 'squaring-the-form',
  'mixing-and-pouring': 'mixing-and-pouring',
  'the-roof-and-its-pitch': 'roof-pitch',
}

/**
 * Every other lesson of the demo borrows one of these until its own is filmed: what is said in it
 * belongs to the lesson it was made for. Their stops stand at moments of the borrowed video.
 */
export const sharedVideos: Record<string, DemoVideo> = {
  'reading-your-ground': 'squaring-the-form',
  'setting-out-the-corner': 'squaring-the-form',
  'stone-and-form-boards': 'squaring-the-form',
  'posts-and-their-feet': 'mixing-and-pouring',
  'rails-and-rafters': 'squaring-the-form',
  'slats-with-even-gaps': 'squaring-the-form',
  'cut-ends-and-first-stack': 'squaring-the-form',
  'twelve-pads-in-line': 'mixing-and-pouring',
  'a-frame-that-stays-square': 'squaring-the-form',
  'boards-and-their-gaps': 'squaring-the-form',
  'posts-that-stay-put': 'mixing-and-pouring',
  'rails-and-even-pickets': 'squaring-the-form',
  'a-gate-that-still-shuts': 'squaring-the-form',
  'three-bays-on-paper': 'squaring-the-form',
  'posts-and-slides': 'squaring-the-form',
}

/** What the build of a video writes beside it; times in ms. */
export interface BuiltVideo {
  id: DemoVideo
  durationMs: number
  width: number
  height: number
  bytes: number
  cues: { startMs: number; endMs: number; text: string }[]
  stops: { key: string; atMs: number }[]
}

const read = new Map<DemoVideo, BuiltVideo>()

function readBuilt(id: DemoVideo): BuiltVideo {
  const found = read.get(id)
  if (found) return found
  const path = join(config.demoMediaDir, id)
  const built = {
    ...(JSON.parse(readFileSync(`${path}.json`, 'utf8')) as Omit<BuiltVideo, 'bytes'>),
    bytes: statSync(`${path}.mp4`).size,
  }
  read.set(id, built)
  return built
}

/** The video that a lesson of the demo shows, its own or a shared one. */
export function videoOfLesson(lessonKey: string): BuiltVideo {
  const id = ownVideos[lessonKey] ?? sharedVideos[lessonKey]
  if (!id) throw new Error(`the demo names no video for the lesson ${lessonKey}`)
  return readBuilt(id)
}

/** A moment in ms of a video. */
export function momentMs(video: BuiltVideo, moment: MomentSeed): number {
  const atMs =
    'stop' in moment
      ? video.stops.find(({ key }) => key === moment.stop)?.atMs
      : video.cues[moment.afterCue - 1]?.endMs
  if (atMs === undefined) {
    throw new Error(`the video ${video.id} has no moment ${JSON.stringify(moment)}`)
  }
  return atMs
}
