import { drawSeed } from './stopStates.service'

interface RememberedStop {
  seed: number
  triesUsed: number
  solved: boolean
  /** Key of the answer that was graded last, so that a repetition costs no try. */
  answeredKey?: string
}
/** Stops of sample lessons and previews, as one session remembers them. */
export type RememberedStops = Record<string, RememberedStop>

/** The oldest are forgotten beyond this, so that a session stays small. */
const maxRemembered = 60

/** The standing at a stop; the first look draws its seed. */
export function openRemembered(stops: RememberedStops, name: string): RememberedStop {
  const found = stops[name]
  if (found) return found
  const made = { seed: drawSeed(), triesUsed: 0, solved: false }
  stops[name] = made
  const names = Object.keys(stops)
  for (const old of names.slice(0, Math.max(0, names.length - maxRemembered))) {
    Reflect.deleteProperty(stops, old)
  }
  return made
}

/** Grades against what the session remembers; the last key once more costs no further try. */
export async function answerRemembered<T>(
  stops: RememberedStops,
  name: string,
  key: string | undefined,
  grade: (
    before: RememberedStop,
    costsTry: boolean,
  ) => Promise<{ after: RememberedStop; graded: T }>,
): Promise<T> {
  const before = openRemembered(stops, name)
  const isRepeated = key !== undefined && before.answeredKey === key
  const { after, graded } = await grade(before, !isRepeated)
  stops[name] = { ...after, ...(key === undefined ? {} : { answeredKey: key }) }
  return graded
}
