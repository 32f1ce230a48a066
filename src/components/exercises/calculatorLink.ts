import type { Calculator } from '../../../shared/calculators/calculator'
import type { TypedInputs } from '../../composables/useCalculator'

/** Longer than any input; what is longer was not written by this page. */
const LONGEST = 80

/** The inputs a link carries, as they were typed; null for a link without any. */
export function readCalculatorLink(
  { inputs }: Calculator,
  query: Readonly<Record<string, unknown>>,
): TypedInputs | null {
  const system = query['units'] === 'imperial' ? 'imperial' : 'metric'
  const carried = inputs.flatMap(({ name }) => {
    const text = query[name]
    return typeof text === 'string' && text.length <= LONGEST ? [[name, text] as const] : []
  })
  if (carried.length === 0) return null
  const usual = inputs.map(({ name, initial }) => [name, initial[system]] as const)
  return { texts: Object.fromEntries([...usual, ...carried]), system }
}

/** The query of a link that opens the calculator with these inputs; none for those it starts with anyway. */
export const writeCalculatorLink = (typed: TypedInputs | null): Record<string, string> =>
  typed ? { units: typed.system, ...typed.texts } : {}
