import type { Cue } from '../contracts/media'
import { isAside } from './blocks'
import { showCueText } from './cueText'
import { areCueSettings } from './strictParser'

/** One field of a list of cues that cannot be kept; `field` is a dotted path such as `12.endMs`. */
export interface CueProblem {
  field: string
  message: string
}

const mostListed = 50
const latestMs = 86_400_000

function checkCue(cue: Cue, before: Cue | undefined): { name: keyof Cue; message: string }[] {
  const problems: { name: keyof Cue; message: string }[] = []
  if (cue.endMs <= cue.startMs) {
    problems.push({ name: 'endMs', message: 'A caption ends after it has begun.' })
  }
  if (cue.endMs > latestMs) {
    problems.push({ name: 'endMs', message: 'A caption stands within the first day.' })
  }
  if (before && cue.startMs < before.startMs) {
    problems.push({
      name: 'startMs',
      message: 'This caption begins before the one above it. Put them in the order of their times.',
    })
  }
  if (showCueText(cue.text).trim() === '') {
    problems.push({
      name: 'text',
      message: 'An empty caption shows nothing: write it or take it out.',
    })
  }
  if (/[\r\n]|-->/.test(cue.cueId) || isAside(cue.cueId)) {
    problems.push({ name: 'cueId', message: 'This cannot be the name of a caption.' })
  }
  if (cue.settings !== '' && !areCueSettings(cue.settings)) {
    problems.push({ name: 'settings', message: 'These settings cannot be read as WebVTT.' })
  }
  return problems
}

/** What keeps an edited list of captions from being kept; an empty list when nothing does. */
export const findCueProblems = (cues: Cue[]): CueProblem[] =>
  cues
    .flatMap((cue, index) =>
      checkCue(cue, cues[index - 1]).map(({ name, message }) => ({
        field: `${index}.${name}`,
        message,
      })),
    )
    .slice(0, mostListed)
