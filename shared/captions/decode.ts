import type { CaptionError } from '../contracts/media'

/** The part of the platform's decoder that is used; browsers and Node both have it. */
declare class TextDecoder {
  constructor(label: string, options: { fatal: boolean; ignoreBOM?: boolean })
  decode(bytes: Uint8Array): string
}

const newline = 0x0a
const carriageReturn = 0x0d
/** A text in UTF-16 without its mark gives itself away: every other byte of it is empty. */
const emptyShare = 0.2

const saveAsUtf8 =
  'Open it in a text editor, choose “save as” with the encoding UTF-8, and send it again.'

/** A file's text without its byte order mark, or the one error that keeps it from being read. */
export type Decoded = { text: string; error: null } | { text: null; error: CaptionError }

const failure = (line: number, column: number, message: string): Decoded => ({
  text: null,
  error: { line, column, message: `${message} ${saveAsUtf8}` },
})

const decodeStrictly = (bytes: Uint8Array) => {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes)
  } catch {
    return null
  }
}

/** Line by line: no character of UTF-8 but the line break itself holds its byte. */
function findBadByte(bytes: Uint8Array): { line: number; column: number } {
  let line = 1
  let from = 0
  for (let at = 0; at <= bytes.length; at++) {
    const byte = bytes[at]
    const isEnd = at === bytes.length || byte === newline || byte === carriageReturn
    if (!isEnd) continue
    const part = bytes.subarray(from, at)
    if (decodeStrictly(part) === null) {
      const text = new TextDecoder('utf-8', { fatal: false }).decode(part)
      return { line, column: text.indexOf('\uFFFD') + 1 }
    }
    if (byte === carriageReturn && bytes[at + 1] === newline) at++
    from = at + 1
    line++
  }
  return { line: 1, column: 1 }
}

function looksLikeUtf16(bytes: Uint8Array): boolean {
  const [first, second] = bytes
  if ((first === 0xff && second === 0xfe) || (first === 0xfe && second === 0xff)) return true
  return bytes.filter((byte) => byte === 0).length > bytes.length * emptyShare
}

/** Reads the bytes of a caption file as UTF-8; another encoding is named with its first bad byte. */
export function decodeCaptions(bytes: Uint8Array): Decoded {
  if (looksLikeUtf16(bytes)) {
    return failure(1, 1, 'This file is saved as UTF-16, and captions have to be UTF-8.')
  }
  const text = decodeStrictly(bytes)
  if (text !== null) return { text, error: null }
  const { line, column } = findBadByte(bytes)
  return failure(
    line,
    column,
    'This file is saved in another encoding than UTF-8; here is the first character that cannot be read.',
  )
}
