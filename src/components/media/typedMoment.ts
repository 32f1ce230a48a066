/** A number once it could be read, else what was typed. */
export type Typed = number | string

/** A moment as it is typed, to the tenth, finer only where it stands finer: 380 000 ms is `6:20.0`. */
export function showTypedMoment(ms: number): string {
  const whole = Math.max(0, Math.round(ms))
  const minutes = Math.floor(whole / 60_000)
  const rest = whole % 60_000
  const seconds = (rest / 1000).toFixed(rest % 100 === 0 ? 1 : 3)
  return `${minutes}:${rest < 10_000 ? '0' : ''}${seconds}`
}

const moment = /^(?:(?:(\d{1,2}):)?(\d{1,3}):)?(\d{1,5}(?:[.,]\d{1,3})?)$/

/** Milliseconds of `6:20.5`, `1:02:30`, `75` (seconds); undefined for anything else. */
export function readTypedMoment(text: string): number | undefined {
  const [, hours, minutes, seconds] = moment.exec(text.trim()) ?? []
  if (seconds === undefined) return undefined
  const amount = Number(seconds.replace(',', '.'))
  if (minutes !== undefined && amount >= 60) return undefined
  if (hours !== undefined && Number(minutes) >= 60) return undefined
  return Math.round((Number(hours ?? 0) * 3600 + Number(minutes ?? 0) * 60 + amount) * 1000)
}

/** What to write where a moment cannot be read. */
export const momentHelp = 'Write minutes and seconds, such as 6:20.5.'
