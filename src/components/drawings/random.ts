/** Makes a repeatable source of numbers from 0 up to 1, so that a drawing looks the same every time. */
export function createRandom(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (state * 1664525 + 1013904223) >>> 0
    return state / 4294967296
  }
}
