import { showCueText } from './cueText'

/**
 * Limits of a readable caption. 42 characters a line, two lines, 20 characters a second, 5/6 s to
 * 7 s and two frames between captions: general timed-text guides. 37 characters a line: BBC subtitle
 * guidelines. 160 words a minute: DCMP captioning key and Ofcom. 17 characters a second: the same
 * guides, for children.
 */
const limits = {
  lineCharacters: { hard: 42, soft: 37 },
  lines: 2,
  charactersPerSecond: { hard: 20, soft: 17 },
  wordsPerMinute: 160,
  shortestMs: { hard: 833, soft: 1000 },
  longestMs: { hard: 7000, soft: 6000 },
  gapMs: 83,
}

interface TimedText {
  startMs: number
  endMs: number
  text: string
}

const seconds = (ms: number) => `${(ms / 1000).toFixed(1)} s`

function lintLines(lines: string[]): string[] {
  const longest = Math.max(...lines.map((line) => line.length))
  const marks: string[] = []
  if (longest > limits.lineCharacters.hard) {
    marks.push(
      `A line of ${longest} characters; more than ${limits.lineCharacters.hard} do not fit a small screen. Break it.`,
    )
  } else if (longest > limits.lineCharacters.soft) {
    marks.push(`A line of ${longest} characters; up to ${limits.lineCharacters.soft} read easily.`)
  }
  if (lines.length > limits.lines) {
    marks.push(`${lines.length} lines hide the picture. Make two captions of it.`)
  }
  return marks
}

function lintSpeed(text: string, ms: number): string[] {
  const perSecond = (text.length * 1000) / ms
  const perMinute = (text.split(/\s+/).length * 60_000) / ms
  const rounded = Math.round(perSecond)
  if (perSecond > limits.charactersPerSecond.hard) {
    return [
      `${rounded} characters a second; nobody reads more than ${limits.charactersPerSecond.hard}. Shorten it, or let it stand longer.`,
    ]
  }
  if (perSecond > limits.charactersPerSecond.soft) {
    return [`${rounded} characters a second; up to ${limits.charactersPerSecond.soft} read easily.`]
  }
  if (perMinute > limits.wordsPerMinute) {
    return [
      `${Math.round(perMinute)} words a minute; up to ${limits.wordsPerMinute} can be followed while learning.`,
    ]
  }
  return []
}

function lintLength(ms: number): string[] {
  const { shortestMs, longestMs } = limits
  if (ms < shortestMs.hard)
    return [`It stands for ${seconds(ms)}, which is gone before it is seen.`]
  if (ms < shortestMs.soft) return [`It stands for ${seconds(ms)}; a second is better.`]
  if (ms > longestMs.hard) {
    return [
      `It stands for ${seconds(ms)}; after ${seconds(longestMs.hard)} people read it again. Make two of it.`,
    ]
  }
  if (ms > longestMs.soft)
    return [`It stands for ${seconds(ms)}; up to ${seconds(longestMs.soft)} is better.`]
  return []
}

function lintNext(cue: TimedText, next: TimedText | undefined): string[] {
  if (!next) return []
  const gapMs = next.startMs - cue.endMs
  if (gapMs < 0) return [`It still stands when the next one comes, for ${seconds(-gapMs)}.`]
  if (gapMs > 0 && gapMs < limits.gapMs) {
    return [
      `Only ${gapMs} ms before the next one: it flickers. Close the gap, or leave ${limits.gapMs} ms.`,
    ]
  }
  return []
}

/** What makes a caption hard to read, worst first; `next` is the one that follows. */
export function lintCue(cue: TimedText, next?: TimedText): string[] {
  const lines = showCueText(cue.text).split('\n')
  const ms = cue.endMs - cue.startMs
  if (ms <= 0) return []
  return [
    ...lintLines(lines),
    ...lintSpeed(lines.join(' ').trim(), ms),
    ...lintLength(ms),
    ...lintNext(cue, next),
  ]
}
