import { shallowReactive } from 'vue'
import type { Calculator } from '../../shared/calculators/calculator'
import { calculatorLoaders } from '../../shared/calculators/loaders'

const fetched = shallowReactive(new Map<string, Calculator>())

/** Fetches a calculator once; throws when the line is cut. One that there is not is left alone. */
export async function fetchCalculator(id: string): Promise<void> {
  const load = Object.hasOwn(calculatorLoaders, id) ? calculatorLoaders[id] : undefined
  if (!fetched.has(id) && load) fetched.set(id, await load())
}

/** A calculator that was fetched. */
export const fetchedCalculator = (id: string): Calculator | undefined => fetched.get(id)
