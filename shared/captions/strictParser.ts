import parser from 'webvtt-parser'
import { isAside, splitLines } from './blocks'

/** Something the parser found; `column` is null where it names the line only. */
export interface ParserError {
  message: string
  line: number
  column: number | null
}

const arrow = '-->'

/** Regions are part of the standard but unknown to the parser: for its eyes they become comments. */
function hideRegions(lines: string[]): string[] {
  let isInRegion = false
  return lines.map((line) => {
    if (line === '') isInRegion = false
    else if (/^REGION($|[ \t])/.test(line)) isInRegion = true
    if (isInRegion) return isAside(line) ? 'NOTE' : line.replaceAll(arrow, '')
    if (!line.includes(arrow)) return line
    return line.replace(/([ \t])region:\S+/, (all) => ' '.repeat(all.length))
  })
}

/** Every place where a text departs from WebVTT, found by webvtt-parser. */
export function parseStrictly(text: string): ParserError[] {
  const lines = hideRegions(splitLines(text))
  const { errors } = new parser.WebVTTParser().parse(
    lines.join('\n'),
    'subtitles/captions/descriptions',
  )
  return errors.map(({ message, line, col }) => ({ message, line, column: col ?? null }))
}

/** True when this is the whole text of a caption, tags and all, as the standard wants it. */
export function isCueText(text: string, startMs: number, endMs: number): boolean {
  return (
    parseStrictly(`WEBVTT\n\n${showTime(startMs)} --> ${showTime(endMs)}\n${text}`).length === 0
  )
}

/** True when these settings may follow the times of a caption. */
export function areCueSettings(settings: string): boolean {
  if (/[\r\n]/.test(settings) || settings.includes(arrow)) return false
  return parseStrictly(`WEBVTT\n\n00:00.000 --> 00:01.000 ${settings}\nx`).length === 0
}

/** Milliseconds as `01:02:03.004`. */
export function showTime(ms: number): string {
  const pad = (value: number, length = 2) => String(value).padStart(length, '0')
  const seconds = Math.floor(ms / 1000)
  const clock = [Math.floor(seconds / 3600), Math.floor(seconds / 60) % 60, seconds % 60]
  return `${clock.map((part) => pad(part)).join(':')}.${pad(ms % 1000, 3)}`
}
