import type { Cue } from './timeline'

const MAX_LINE = 42
const MAX_LINES = 2
const MAX_PER_SECOND = 20
const MIN_MS = 830
const MAX_MS = 7000
const MIN_GAP_MS = 83

/** The sentences that say what is wrong with the cues; none when they can be issued. */
export function findCueFaults(cues: Cue[]): string[] {
  return cues.flatMap((cue, index) => {
    const faults: string[] = []
    const lines = cue.text.split('\n')
    const lengthMs = cue.endMs - cue.startMs
    const perSecond = cue.text.replace('\n', ' ').length / (lengthMs / 1000)
    const next = cues[index + 1]
    const gapMs = next ? next.startMs - cue.endMs : MIN_GAP_MS
    if (lines.length > MAX_LINES) faults.push(`${lines.length} lines`)
    for (const line of lines) if (line.length > MAX_LINE) faults.push(`${line.length} characters`)
    if (perSecond > MAX_PER_SECOND) faults.push(`${perSecond.toFixed(1)} characters a second`)
    if (lengthMs < MIN_MS || lengthMs > MAX_MS) faults.push(`${lengthMs} ms long`)
    if (gapMs < 0) faults.push('overlaps the next one')
    if (gapMs > 0 && gapMs < MIN_GAP_MS) faults.push(`${gapMs} ms before the next one`)
    return faults.map((fault) => `Cue ${index + 1} "${cue.text}": ${fault}.`)
  })
}

/** The cues as a WebVTT file. */
export function toWebVtt(cues: Cue[]): string {
  const blocks = cues.map(
    (cue, index) => `${index + 1}\n${stamp(cue.startMs)} --> ${stamp(cue.endMs)}\n${cue.text}\n`,
  )
  return `WEBVTT\n\n${blocks.join('\n')}`
}

function stamp(ms: number): string {
  const pad = (value: number, width: number) => String(value).padStart(width, '0')
  const seconds = Math.floor(ms / 1000)
  const [hours, minutes] = [Math.floor(seconds / 3600), Math.floor(seconds / 60) % 60]
  return `${pad(hours, 2)}:${pad(minutes, 2)}:${pad(seconds % 60, 2)}.${pad(ms % 1000, 3)}`
}
