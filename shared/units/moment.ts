/** A moment of a video as minutes and seconds: 380 000 ms is `6:20`. */
export function formatMoment(ms: number): string {
  const seconds = Math.floor(ms / 1000)
  const hours = Math.floor(seconds / 3600)
  const minutes = Math.floor((seconds % 3600) / 60)
  const rest = String(seconds % 60).padStart(2, '0')
  return hours ? `${hours}:${String(minutes).padStart(2, '0')}:${rest}` : `${minutes}:${rest}`
}

/** How long things last in words: `37 min`, `3 h 29 min`. */
export function formatDuration(ms: number): string {
  const minutes = Math.max(1, Math.round(ms / 60_000))
  return minutes < 60 ? `${minutes} min` : `${Math.floor(minutes / 60)} h ${minutes % 60} min`
}

const MONTHS =
  'January February March April May June July August September October November December'.split(' ')

/**
 * A day in the person's own zone: `12 May`, with the year when it is not this one.
 * By hand: the first `toLocaleDateString` of a page costs a phone a tenth of a second.
 */
export function formatDay(iso: string): string {
  const date = new Date(iso)
  const day = `${date.getDate()} ${MONTHS[date.getMonth()] ?? ''}`
  const year = date.getFullYear()
  return year === new Date().getFullYear() ? day : `${day} ${year}`
}

/** A time of day in the person's own zone: `08:05`, `15:45`. */
export function formatClock(date: Date): string {
  const two = (value: number) => String(value).padStart(2, '0')
  return `${two(date.getHours())}:${two(date.getMinutes())}`
}

/** A number of things in words: `1 lesson`, `3 lessons`. */
export const countOf = (n: number, one: string, many = `${one}s`) => `${n} ${n === 1 ? one : many}`
