import type { Lesson, Line } from './lesson'

/** Samples a second of the narration: the one clock from which all other times follow. */
export const SAMPLE_RATE = 32_000
export const FRAME_RATE = 30

const PAUSE = 0.5
const STEP_PAUSE = 0.6
/** After a question the picture stands still; the video waits inside this quiet. */
const STOP_PAUSE = 2
const STOP_DELAY = 0.5
/** A caption stays this long after its sentence unless the next one follows. */
const LINGER = 0.35
/** A gap between captions up to this is closed: a blink reads as a mistake. */
const CLOSE_GAP = 0.7

export interface Cue {
  startMs: number
  endMs: number
  text: string
}
interface Stop {
  key: string
  name: string
  atMs: number
}
interface Chapter {
  startMs: number
  endMs: number
  title: string
}

interface Placed {
  line: Line
  startSample: number
  endSample: number
}

export interface Timeline {
  durationSeconds: number
  frames: number
  placed: Placed[]
  cues: Cue[]
  stops: Stop[]
  chapters: Chapter[]
  /** Seconds at which a sentence begins. */
  start: (lineId: string) => number
  /** Seconds at which a sentence ends. */
  end: (lineId: string) => number
}

const toSamples = (seconds: number) => Math.round(seconds * SAMPLE_RATE)
const toMs = (samples: number) => Math.round((samples / SAMPLE_RATE) * 1000)

/** Lays sentences end to end; `lengths` are their lengths in samples, in the order of the script. */
export function layTimeline(lesson: Lesson, lengths: number[]): Timeline {
  const placed: Placed[] = []
  const chapters: Chapter[] = []
  let clock = 0
  for (const step of lesson.steps) {
    const stepStart = clock
    clock += toSamples(step.before ?? 0)
    step.lines.forEach((line, index) => {
      const length = lengths[placed.length]
      if (length === undefined) throw new Error(`No narration for the sentence "${line.id}".`)
      placed.push({ line, startSample: clock, endSample: clock + length })
      const isLast = index === step.lines.length - 1
      const usual = line.stop ? STOP_PAUSE : isLast ? STEP_PAUSE : PAUSE
      clock += length + toSamples(line.after ?? usual)
    })
    clock += toSamples(step.after ?? 0)
    chapters.push({ startMs: toMs(stepStart), endMs: toMs(clock), title: step.title })
  }
  const frames = Math.ceil((clock / SAMPLE_RATE) * FRAME_RATE)
  const find = (id: string) => {
    const found = placed.find(({ line }) => line.id === id)
    if (!found) throw new Error(`The script has no sentence "${id}".`)
    return found
  }
  return {
    durationSeconds: frames / FRAME_RATE,
    frames,
    placed,
    cues: placed.map((_, index) => cueOf(placed, index)),
    stops: placed.flatMap(stopOf),
    chapters,
    start: (id) => find(id).startSample / SAMPLE_RATE,
    end: (id) => find(id).endSample / SAMPLE_RATE,
  }
}

function cueOf(placed: Placed[], index: number): Cue {
  const now = placed[index]
  if (!now) throw new Error(`No sentence at ${index}.`)
  const next = placed[index + 1]
  const wanted = now.endSample + toSamples(now.line.stop ? STOP_PAUSE : LINGER)
  const closes = next && next.startSample - now.endSample <= toSamples(CLOSE_GAP)
  const end = next && (closes || wanted > next.startSample) ? next.startSample : wanted
  return { startMs: toMs(now.startSample), endMs: toMs(end), text: now.line.cap }
}

function stopOf({ line, endSample }: Placed): Stop[] {
  if (!line.stop) return []
  return [{ ...line.stop, atMs: toMs(endSample + toSamples(STOP_DELAY)) }]
}
