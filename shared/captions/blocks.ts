/** A caption as it stands in the file, with the lines it stands on (counted from 1). */
export interface CueBlock {
  cueId: string
  startMs: number
  endMs: number
  settings: string
  textLines: string[]
  timingLine: number
  /** Of its first text line. */
  textLine: number
}

export interface ScannedCaptions {
  /** What stands above the first caption: header, comments, styles, regions. */
  preamble: string
  cues: CueBlock[]
  /** First lines of comments that stand between captions and are not kept. */
  laterNotes: number[]
}

const arrow = '-->'
const timingPattern =
  /^\s*(?:(\d+):)?(\d\d):(\d\d)\.(\d{3})\s*-->\s*(?:(\d+):)?(\d\d):(\d\d)\.(\d{3})(.*)$/

/** The lines of a text, whatever ends them. */
export const splitLines = (text: string): string[] => text.split(/\r\n|\r|\n/)

/** True for the first line of a comment, a style sheet or a region. */
export const isAside = (line: string): boolean => /^(NOTE|STYLE|REGION)($|[ \t])/.test(line)

function toMs(parts: (string | undefined)[]): number {
  const [hours = 0, minutes = 0, seconds = 0, ms = 0] = parts.map((part) => Number(part ?? 0))
  return ((hours * 60 + minutes) * 60 + seconds) * 1000 + ms
}

function readCue(lines: string[], firstLine: number): CueBlock | null {
  const at = lines.findIndex((line) => line.includes(arrow))
  const match = timingPattern.exec(lines[at] ?? '')
  if (at > 1 || !match) return null
  return {
    cueId: at === 1 ? (lines[0] ?? '') : '',
    startMs: toMs(match.slice(1, 5)),
    endMs: toMs(match.slice(5, 9)),
    settings: (match[9] ?? '').trim().replace(/\s+/g, ' '),
    textLines: lines.slice(at + 1),
    timingLine: firstLine + at,
    textLine: firstLine + at + 1,
  }
}

/** Runs of lines that are not blank, with the number of their first line. */
function listBlocks(lines: string[]) {
  const blocks: { firstLine: number; lines: string[] }[] = []
  let open: string[] | null = null
  lines.forEach((line, index) => {
    if (line === '') open = null
    else if (open) open.push(line)
    else blocks.push({ firstLine: index + 1, lines: (open = [line]) })
  })
  return blocks
}

/** Finds the captions of a file by its blank lines and arrows; whether all of it is right is the parser's to say. */
export function scanCaptions(lines: string[]): ScannedCaptions {
  const cues: CueBlock[] = []
  const laterNotes: number[] = []
  let preambleEnd = lines.length
  for (const { firstLine, lines: block } of listBlocks(lines)) {
    if (firstLine === 1) continue
    if (isAside(block[0] ?? '')) {
      if (cues.length > 0) laterNotes.push(firstLine)
      continue
    }
    const cue = readCue(block, firstLine)
    if (!cue) continue
    if (cues.length === 0) preambleEnd = firstLine - 1
    cues.push(cue)
  }
  const preamble = lines.slice(0, preambleEnd).join('\n').trimEnd()
  return { preamble, cues, laterNotes }
}
