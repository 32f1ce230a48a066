/** A 32-bit seed of its own for each name, so that one draw never moves another. */
export function seedFor(seed: number, name: string): number {
  let hash = seed ^ 0x9e3779b9
  for (const sign of name) {
    hash = Math.imul(hash ^ (sign.codePointAt(0) ?? 0), 0x01000193)
  }
  return hash >>> 0
}

/** Numbers from 0 up to 1 that are the same for the same seed on every device (mulberry32, public domain). */
export function createRandom(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296
  }
}

/** A shuffled copy, the same for the same seed. */
export function shuffle<Item>(items: readonly Item[], seed: number): Item[] {
  const random = createRandom(seed)
  const keyed = items.map((item) => ({ item, key: random() }))
  return keyed.sort((a, b) => a.key - b.key).map(({ item }) => item)
}
