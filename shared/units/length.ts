import { AMOUNT, readAmount } from './number'

const INCH = 0.0254
const FEET_INCHES = new RegExp(
  String.raw`^(${AMOUNT}) ?(?:'|ft|foot|feet)(?: ?- ?| )?(?:(${AMOUNT}) ?(?:"|in|inch|inches)?)$`,
  'i',
)

/** Reads feet and inches together (12' 6-1/2", 12 ft 6 1/2 in) in metres; undefined where it is something else. */
export function readFeetInches(text: string): number | undefined {
  const match = FEET_INCHES.exec(text)
  const feet = readAmount(match?.[1] ?? '')
  const inches = readAmount(match?.[2] ?? '')
  if (feet === undefined || inches === undefined || inches >= 12 || !Number.isInteger(feet)) {
    return undefined
  }
  return (feet * 12 + inches) * INCH
}

/** Inches as a whole number and a fraction of sixteenths in its lowest terms: 6-1/2, 5/8, 0. */
export function formatSixteenths(sixteenths: number): string {
  const whole = Math.floor(sixteenths / 16)
  let over = sixteenths % 16
  let under = 16
  while (over > 0 && over % 2 === 0) {
    over /= 2
    under /= 2
  }
  if (over === 0) return String(whole)
  return whole === 0
    ? `${String(over)}/${String(under)}`
    : `${String(whole)}-${String(over)}/${String(under)}`
}

/** A length in metres as feet and inches to the nearest 1/16 in: 12' 6-1/2", 8', 5/8". */
export function formatFeetInches(metres: number): string {
  const sixteenths = Math.round(Number(((Math.abs(metres) / INCH) * 16).toPrecision(14)))
  const feet = Math.floor(sixteenths / 192)
  const rest = sixteenths % 192
  const sign = metres < 0 && sixteenths > 0 ? '−' : ''
  if (feet === 0) return `${sign}${formatSixteenths(rest)}"`
  return rest === 0
    ? `${sign}${String(feet)}'`
    : `${sign}${String(feet)}' ${formatSixteenths(rest)}"`
}
