/** A number as a builder writes it: 12, 3.2, 3,2, 5/8, 6-1/2 or 6 1/2, as one alternative for a regular expression. */
export const AMOUNT = String.raw`\d+[ -]\d+\/\d+|\d+\/\d+|\d+(?:[.,]\d+)?|[.,]\d+`

const VULGAR: Record<string, string> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅓': '1/3',
  '⅔': '2/3',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
}

/**
 * Brings typed text into one spelling: plain quotes for feet and inches, plain minus, single spaces,
 * fractions written out and thousands closed up (2 250 000).
 */
export function normaliseText(text: string): string {
  return text
    .replace(/[½¼¾⅓⅔⅛⅜⅝⅞]/g, (sign) => ` ${VULGAR[sign] ?? ''}`)
    .replace(/[−–]/g, '-')
    .replace(/[′’‘]/g, "'")
    .replace(/[″”“]|''/g, '"')
    .replace(/⁄/g, '/')
    .replace(/\s+/g, ' ')
    .trim()
    .replace(/(?<![\d.,/])\d{1,3}(?: \d{3})+(?![\d/])/g, (digits) => digits.replaceAll(' ', ''))
}

/** The value of an amount, or undefined where it is none: no denominator of 0, no 6-9/8, nothing infinite. */
export function readAmount(text: string): number | undefined {
  const mixed = /^(?:(\d+)[ -])?(\d+)\/(\d+)$/.exec(text)
  if (mixed) {
    const whole = mixed[1] === undefined ? 0 : Number(mixed[1])
    const over = Number(mixed[2])
    const under = Number(mixed[3])
    if (under === 0 || (mixed[1] !== undefined && over >= under)) return undefined
    return finite(whole + over / under)
  }
  if (!/^(?:\d+(?:[.,]\d+)?|[.,]\d+)$/.test(text)) return undefined
  return finite(Number(text.replace(',', '.')))
}

const finite = (value: number) => (Number.isFinite(value) ? value : undefined)

/** Thin space that does not break: the thousands separator. */
const THIN_SPACE = '\u202f'

/** A number with this many decimals at most, zeros trimmed down to `least`; thousands apart from five digits on. */
export function formatNumber(value: number, decimals: number, least = 0): string {
  if (!Number.isFinite(value)) return '–'
  const [whole = '0', tail = ''] = Number(Math.abs(value).toPrecision(14))
    .toFixed(decimals)
    .split('.')
  let fraction = tail
  while (fraction.length > least && fraction.endsWith('0')) fraction = fraction.slice(0, -1)
  const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE) : whole
  const shown = fraction === '' ? grouped : `${grouped}.${fraction}`
  return value < 0 && /[1-9]/.test(shown) ? `−${shown}` : shown
}

/** Brings sums of decimal steps back to what a person would write: 0.30000000000000004 is 0.3. */
export const clean = (value: number): number => Number(value.toPrecision(12))

/** The next whole number up, where 27.000000001 bags out of binary arithmetic are still 27. */
export const roundUp = (value: number): number => Math.ceil(clean(value) - 1e-9)

/** The next multiple of a step up. */
export const roundUpTo = (value: number, step: number): number =>
  clean(roundUp(value / step) * step)

/** The next multiple of a step down. */
export const roundDownTo = (value: number, step: number): number =>
  clean(Math.floor(clean(value / step) + 1e-9) * step)
