const units = [
  { name: 'GB', bytes: 1e9, decimals: 1 },
  { name: 'MB', bytes: 1e6, decimals: 0 },
  { name: 'kB', bytes: 1e3, decimals: 0 },
] as const

const unitFor = (bytes: number) => units.find((unit) => bytes >= unit.bytes) ?? units[2]

/** An amount of bytes as people say it: `1.9 GB`, `240 MB`. */
export function showBytes(bytes: number): string {
  const unit = unitFor(bytes)
  return `${(bytes / unit.bytes).toFixed(unit.decimals)} ${unit.name}`
}

/** How far an upload is: `1.2 of 1.9 GB`. */
export function showAmount(sentBytes: number, bytes: number): string {
  const unit = unitFor(bytes)
  return `${(sentBytes / unit.bytes).toFixed(unit.decimals)} of ${showBytes(bytes)}`
}

const numbers = 'one two three four five six seven eight nine ten eleven twelve'.split(' ')
const inWords = (count: number) => numbers[count - 1] ?? String(count)

const soonMs = 3000

/**
 * How long it will still take: `about six minutes left`; empty until `elapsedMs` says something of
 * the speed. `movedBytes` came in meanwhile.
 */
export function showTimeLeft(leftBytes: number, movedBytes: number, elapsedMs: number): string {
  if (elapsedMs < soonMs || movedBytes <= 0) return ''
  const leftMs = (leftBytes / movedBytes) * elapsedMs
  if (leftMs < 45_000) return 'less than a minute left'
  const minutes = Math.round(leftMs / 60_000)
  if (minutes < 90) return `about ${inWords(minutes)} ${minutes === 1 ? 'minute' : 'minutes'} left`
  const hours = Math.round(minutes / 60)
  return `about ${inWords(hours)} ${hours === 1 ? 'hour' : 'hours'} left`
}
