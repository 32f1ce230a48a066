import { isCueText } from './strictParser'

const knownEscape = /&(?!(?:amp|lt|gt|lrm|rlm|nbsp|#\d{1,7}|#x[\da-f]{1,6});)/gi
const signs: Record<string, string> = {
  amp: '&',
  lt: '<',
  gt: '>',
  nbsp: '\u00A0',
  lrm: '\u200E',
  rlm: '\u200F',
}

/** A caption's words as they appear on the screen: without tags, escapes read. */
export const showCueText = (text: string): string =>
  text
    .replace(/<[^<>]*>/g, '')
    .replace(/&(amp|lt|gt|nbsp|lrm|rlm);/g, (all, name: string) => signs[name] ?? all)

/**
 * A caption's text as WebVTT takes it: no blank line, no arrow, signs that stand for themselves
 * escaped, and tags kept only where all of them are in order. The times bound the times within.
 */
export function escapeCueText(text: string, startMs: number, endMs: number): string {
  const whole = text
    .replaceAll('\0', '\uFFFD')
    .split(/\r\n|\r|\n/)
    .filter((line) => line !== '')
    .join('\n')
    .replaceAll('-->', '--&gt;')
    .replace(knownEscape, '&amp;')
  if (!whole.includes('<') || isCueText(whole, startMs, endMs)) return whole
  return whole.replaceAll('<', '&lt;')
}
