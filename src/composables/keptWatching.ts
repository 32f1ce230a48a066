import { z } from 'zod'
import { intervalSchema } from '../../shared/contracts/progress'
import { reportProgress } from '../api/progress'
import type { LessonPlace } from '../api/courses'

const prefixOf = (personId: number) => `gf-watched:${personId}:`

/** Where on this device a lesson's unsent stretches are kept, apart for each person. */
export const keptWatchingName = (personId: number | null, { slug, lessonKey }: LessonPlace) =>
  `${prefixOf(personId ?? 0)}${slug}/${lessonKey}`

function readIntervals(name: string) {
  try {
    const read: unknown = JSON.parse(localStorage.getItem(name) ?? '[]')
    const intervals = z.array(intervalSchema).safeParse(read)
    return intervals.success ? intervals.data.slice(0, 500) : []
  } catch {
    return []
  }
}

async function sendOne(name: string, personId: number) {
  const intervals = readIntervals(name)
  const [slug = '', lessonKey = ''] = name.slice(prefixOf(personId).length).split('/')
  const last = intervals.at(-1)
  if (last) {
    const place = { slug, lessonKey, isDraft: false }
    await reportProgress(place, { intervals, positionMs: last[1] })
  }
  localStorage.removeItem(name)
}

/** Sends what was watched of other lessons while the line was down; what fails stays for the next time. */
export async function sendKeptWatching(personId: number, openName: string): Promise<void> {
  const names = Object.keys(localStorage).filter(
    (name) => name.startsWith(prefixOf(personId)) && name !== openName,
  )
  await Promise.allSettled(names.map((name) => sendOne(name, personId)))
}
