import { mkdirSync, readdirSync, statSync, writeFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath, pathToFileURL } from 'node:url'
import { createCanvas } from '@napi-rs/canvas'
import { findCueFaults, toWebVtt } from './kit/captions'
import { film, HEIGHT, WIDTH, writeNarration } from './kit/film'
import { registerFonts } from './kit/pen'
import type { Lesson } from './kit/lesson'
import { FRAME_RATE, layTimeline } from './kit/timeline'
import type { Timeline } from './kit/timeline'
import { speak } from './kit/voice'

const here = dirname(fileURLToPath(import.meta.url))
const cacheDir = join(here, '../.cache/media')
const builtDir = join(here, 'built')

interface Asked {
  ids: string[]
  /** Seconds of which stills are wanted instead of the film. */
  stills: number[]
}

function readArguments(argv: string[]): Asked {
  const isStill = (word: string) => word.startsWith('--still=')
  const stills = argv.filter(isStill).flatMap((word) => word.slice(8).split(',').map(Number))
  return { ids: argv.filter((word) => !isStill(word)), stills }
}

async function loadLessons(ids: string[]): Promise<Lesson[]> {
  const known = readdirSync(join(here, 'lessons'))
    .filter((name) => name.endsWith('.ts'))
    .map((name) => name.slice(0, -3))
    .sort()
  const unknown = ids.find((id) => !known.includes(id))
  if (unknown) throw new Error(`There is no lesson "${unknown}". Known: ${known.join(', ')}.`)
  const wanted = ids.length ? ids : known
  return Promise.all(
    wanted.map(async (id) => {
      const module = (await import(pathToFileURL(join(here, 'lessons', `${id}.ts`)).href)) as {
        lesson: Lesson
      }
      return module.lesson
    }),
  )
}

function prepare(lesson: Lesson) {
  const sentences = lesson.steps.flatMap(({ lines }) => lines.map(({ say }) => say))
  const speech = speak(sentences, join(cacheDir, 'voice'))
  const timeline = layTimeline(
    lesson,
    speech.map(({ length }) => length),
  )
  const faults = findCueFaults(timeline.cues)
  if (faults.length) throw new Error(faults.join('\n'))
  return { speech, timeline }
}

function easel(lesson: Lesson, timeline: Timeline) {
  const canvas = createCanvas(WIDTH, HEIGHT)
  const ctx = canvas.getContext('2d')
  const paint = (seconds: number) => {
    ctx.reset()
    lesson.draw(ctx, seconds, timeline)
    return canvas
  }
  return paint
}

async function build(lesson: Lesson): Promise<void> {
  const { speech, timeline } = prepare(lesson)
  const paint = easel(lesson, timeline)
  const narration = join(cacheDir, `${lesson.id}.wav`)
  const file = (extension: string) => join(builtDir, `${lesson.id}.${extension}`)
  mkdirSync(builtDir, { recursive: true })
  writeNarration(narration, timeline, speech)
  await film(file('mp4'), narration, timeline, (index) =>
    Buffer.from(paint(index / FRAME_RATE).data()),
  )
  const { cues, stops, chapters, durationSeconds } = timeline
  const facts = {
    id: lesson.id,
    title: lesson.title,
    durationMs: Math.round(durationSeconds * 1000),
    width: WIDTH,
    height: HEIGHT,
    cues,
    stops,
    chapters,
  }
  writeFileSync(file('json'), `${JSON.stringify(facts, null, 2)}\n`)
  writeFileSync(file('vtt'), toWebVtt(cues))
  writeFileSync(file('webp'), paint(timeline.end(lesson.posterLine)).toBuffer('image/webp', 80))
  const megabytes = (statSync(file('mp4')).size / 1e6).toFixed(2)
  console.log(`${lesson.id}: ${durationSeconds.toFixed(1)} s, ${cues.length} cues, ${megabytes} MB`)
}

function drawStills(lesson: Lesson, stills: number[]): void {
  const { timeline } = prepare(lesson)
  const paint = easel(lesson, timeline)
  for (const seconds of stills) {
    const file = join(cacheDir, `${lesson.id}-${seconds.toFixed(1)}.png`)
    writeFileSync(file, paint(seconds).toBuffer('image/png'))
  }
  for (const { line } of timeline.placed) {
    console.log(`${timeline.start(line.id).toFixed(2)}  ${line.id}  ${line.say}`)
  }
  console.log(`${timeline.durationSeconds.toFixed(2)}  end`)
}

const asked = readArguments(process.argv.slice(2))
registerFonts()
for (const lesson of await loadLessons(asked.ids)) {
  if (asked.stills.length) drawStills(lesson, asked.stills)
  else await build(lesson)
}
