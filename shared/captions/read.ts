import { maxCues, type CaptionError, type Cue } from '../contracts/media'
import { scanCaptions, splitLines, type CueBlock, type ScannedCaptions } from './blocks'
import { showCueText } from './cueText'
import { decodeCaptions } from './decode'
import { lintCue } from './lint'
import { sayOwnWords } from './parserMessages'
import { parseStrictly, type ParserError } from './strictParser'

export type ReadCaptions =
  | { ok: true; preamble: string; cues: Cue[]; marks: CaptionError[] }
  | { ok: false; errors: CaptionError[] }

const mostListed = 200
/** Findings of the parser that are looked at; a hostile file brings forth hundreds of thousands. */
const mostFindings = 1000
/** In a whole file; more would keep the parser busy for seconds. */
const mostTags = 40_000
const longest = { cueId: 190, settings: 255, text: 2000, preamble: 20_000 }
const latestMs = 86_400_000

const at = (line: number, message: string, column = 1): CaptionError => ({ line, column, message })
const fail = (errors: CaptionError[]): ReadCaptions => ({
  ok: false,
  errors: errors.slice(0, mostListed),
})

const textErrors =
  /^(Incorrect |Required end tag|Only <v>|<v> |Timestamp must (be (between|greater)|not have))/
/** A header like `Kind: captions` is not in the standard, but many programs write it. */
const headerLine = /^[A-Za-z][\w -]*[:=]/

/** What is wrong in a caption's text is counted by the parser from the text's start: find the line. */
function placeTextError({ line, column }: ParserError, cues: CueBlock[]) {
  const cue = cues.find(({ textLine, textLines }) => textLine + textLines.length === line)
  if (!cue) return { line, column: column ?? 1 }
  let rest = (column ?? 1) - 1
  for (const [index, text] of cue.textLines.entries()) {
    const isLast = index === cue.textLines.length - 1
    if (rest <= text.length || isLast) {
      return { line: cue.textLine + index, column: Math.min(rest, text.length) + 1 }
    }
    rest -= text.length + 1
  }
  return { line, column: 1 }
}

/** The parser's findings in our own words, parted into what is wrong and what is only marked. */
function sortFindings(lines: string[], cues: CueBlock[]) {
  const errors: CaptionError[] = []
  const marks: CaptionError[] = []
  for (const found of parseStrictly(lines.join('\n')).slice(0, mostFindings)) {
    const isInText = textErrors.test(found.message) || (lines[found.line - 1] ?? '') === ''
    const place = isInText
      ? placeTextError(found, cues)
      : { line: found.line, column: found.column ?? 1 }
    const isMetadata =
      found.message.startsWith('No blank line after') &&
      headerLine.test(lines[found.line - 1] ?? '')
    const isLoneSign = found.message === 'Incorrect escape.'
    if (isMetadata) continue
    const finding = { ...place, message: sayOwnWords(found.message) }
    if (isLoneSign) marks.push(finding)
    else errors.push(finding)
  }
  return { errors, marks }
}

/** What nothing is kept of, whatever else is right; looked at first, so that the parser gets nothing huge. */
function checkSize(lines: string[], { cues, preamble }: ScannedCaptions): CaptionError[] {
  const count = lines.filter((line) => line.includes('-->')).length
  if (count > maxCues) {
    return [
      at(
        1,
        `The file has ${count} captions; at most ${maxCues} are kept. Take it apart, or make fewer.`,
      ),
    ]
  }
  if (preamble.length > longest.preamble) {
    return [
      at(1, `What stands above the first caption has more than ${longest.preamble} characters.`),
    ]
  }
  if (lines.reduce((sum, line) => sum + line.split('<').length - 1, 0) > mostTags) {
    return [at(1, `The file has more than ${mostTags} tags. Take out those that style the words.`)]
  }
  const huge = lines.findIndex((line) => line.length > longest.text * 2)
  if (huge >= 0) return [at(huge + 1, `This line has more than ${longest.text * 2} characters.`)]
  return cues
    .map(({ textLine, textLines }) => ({ textLine, length: textLines.join('\n').length }))
    .filter(({ length }) => length > longest.text)
    .map(({ textLine, length }) =>
      at(
        textLine,
        `This caption has ${length} characters; at most ${longest.text} are kept. Make several of it.`,
      ),
    )
}

function checkBlock({ cueId, settings, textLines, timingLine, endMs }: CueBlock): CaptionError[] {
  const errors: CaptionError[] = []
  if (showCueText(textLines.join('\n')).trim() === '') {
    const message = 'This caption has no words. Write them below its times, or take it out.'
    errors.push(at(timingLine, message))
  }
  if (cueId.length > longest.cueId) {
    const message = `A caption's name has at most ${longest.cueId} characters. Shorten it.`
    errors.push(at(timingLine - 1, message))
  }
  if (settings.length > longest.settings) {
    errors.push(
      at(timingLine, `Settings have at most ${longest.settings} characters. Shorten them.`),
    )
  }
  if (endMs > latestMs) {
    errors.push(at(timingLine, 'This caption stands later than a day. Check its hours.'))
  }
  return errors
}

function markAll(lines: string[], { cues, laterNotes }: ScannedCaptions): CaptionError[] {
  const timed = cues.map((cue) => ({ ...cue, text: cue.textLines.join('\n') }))
  const replaced = lines.findIndex((line) => line.includes('\uFFFD'))
  return [
    ...timed.flatMap((cue, index) =>
      lintCue(cue, timed[index + 1]).map((message) => at(cue.timingLine, message)),
    ),
    ...laterNotes.map((line) =>
      at(line, 'A comment between captions is not kept. Those above the first caption are.'),
    ),
    ...(replaced < 0
      ? []
      : [
          at(
            replaced + 1,
            'A character here cannot be shown (\uFFFD). Write it again.',
            (lines[replaced] ?? '').indexOf('\uFFFD') + 1,
          ),
        ]),
  ]
}

const byPlace = (a: CaptionError, b: CaptionError) => a.line - b.line || a.column - b.column

/**
 * Reads the bytes of a WebVTT file. Either all of it, with marks on what is worth mending, or the
 * errors with line and column (both from 1) and what to do.
 */
export function readCaptions(bytes: Uint8Array): ReadCaptions {
  const decoded = decodeCaptions(bytes)
  if (decoded.error) return fail([decoded.error])
  const lines = splitLines(decoded.text.replaceAll('\0', '\uFFFD'))
  if (lines.every((line) => line.trim() === '')) return fail([at(1, 'The file is empty.')])
  const scanned = scanCaptions(lines)
  const tooMuch = checkSize(lines, scanned)
  if (tooMuch.length > 0) return fail(tooMuch)
  const { errors, marks } = sortFindings(lines, scanned.cues)
  const all = [...scanned.cues.flatMap(checkBlock), ...errors].sort(byPlace)
  if (all.length > 0) return fail(all)
  if (scanned.cues.length === 0) {
    const message =
      'There is no caption in this file. Each is its times, as in 00:01.000 --> 00:04.000, with its words below.'
    return fail([at(1, message)])
  }
  const cues = scanned.cues.map(({ cueId, startMs, endMs, settings, textLines }) => ({
    cueId,
    startMs,
    endMs,
    settings,
    text: textLines.join('\n'),
  }))
  const allMarks = [...marks, ...markAll(lines, scanned)].sort(byPlace).slice(0, mostListed)
  return { ok: true, preamble: scanned.preamble, cues, marks: allMarks }
}
