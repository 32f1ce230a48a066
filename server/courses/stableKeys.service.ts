import { randomInt } from 'node:crypto'

const alphabet = 'abcdefghijkmnpqrstuvwxyz23456789'
const randomLength = 5
const longestReadable = 40 - randomLength - 1

/** A title in lower-case ASCII letters, digits and single dashes, at most `longest` long; may be empty. */
export function makeSlug(title: string, longest: number): string {
  return title
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/ß/g, 'ss')
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, longest)
    .replace(/^-+|-+$/g, '')
}

/** A key that a person can read and that nothing else in the course has: `squaring-the-form-k3x9p`. */
export function makeStableKey(title: string): string {
  const random = Array.from({ length: randomLength }, () => alphabet[randomInt(alphabet.length)])
  return [makeSlug(title, longestReadable), random.join('')].filter(Boolean).join('-')
}
