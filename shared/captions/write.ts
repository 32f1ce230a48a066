import type { Cue } from '../contracts/media'
import { isAside } from './blocks'
import { escapeCueText } from './cueText'
import { showTime } from './strictParser'

const onOneLine = (text: string) => text.replace(/\s+/g, ' ').replaceAll('-->', '').trim()

function writeCue({ cueId, startMs, endMs, settings, text }: Cue): string {
  const id = onOneLine(cueId)
  const times = `${showTime(startMs)} --> ${showTime(endMs)} ${onOneLine(settings)}`.trim()
  const lines = [times, escapeCueText(text, startMs, endMs)]
  return (id === '' || isAside(id) ? lines : [id, ...lines]).join('\n')
}

/** A WebVTT file from what stands above its first caption and its captions. */
export function writeCaptions({ preamble }: { preamble: string }, cues: Cue[]): string {
  const above = preamble.trim()
  const header = /^WEBVTT($|[ \t\r\n])/.test(above) ? above : `WEBVTT\n\n${above}`.trim()
  return `${[header, ...cues.map(writeCue)].join('\n\n')}\n`
}
