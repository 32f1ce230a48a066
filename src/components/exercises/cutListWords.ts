import type { CutList, CutProof } from '../../../shared/cutlist/cutList'
import type { CutlistState } from '../../composables/useCutlist'
import { formatNumber } from '../../../shared/units/number'

/** Why a cut list is made, in the manner of the other calculators. */
export const cutListHelp =
  'Laid out on paper first, the same parts come out of fewer bars, and every cut is known before the first one is made. The saw takes its own width each time: four slats of 900 mm do not come out of 3600 mm, and three of 4 ft do not come out of 12 ft.'

export const cutListSources = [
  {
    title: 'Search and proof',
    detail:
      'P. C. Gilmore and R. E. Gomory, A linear programming approach to the cutting-stock problem, Operations Research 9 (1961); the last step by the HiGHS solver',
    kind: 'from memory',
  },
  {
    title: 'Named sizes such as 2x4',
    detail: 'PS 20, American Softwood Lumber Standard, dry',
    kind: 'published',
  },
  { title: 'Kerf, end trim, and the log store’s list', kind: 'common practice, no source' },
]

/** A gap as it may be promised: never rounded down. */
function gapWords(gapPercent: number): string {
  if (gapPercent === 0)
    return 'Nothing is cheaper; whether as much could be bought with less waste is not proved.'
  if (!(gapPercent <= 100)) return 'How far it is from the best possible is not known.'
  const shown = gapPercent < 1 ? Math.ceil(gapPercent * 10) / 10 : Math.ceil(gapPercent)
  return `Within ${formatNumber(shown, 1)} % of the best possible.`
}

/** What is known of a list. */
export function proofWords(proof: CutProof, isPriced: boolean): string {
  if (proof !== 'optimal') return gapWords(proof.gapPercent)
  return isPriced ? 'Proved: nothing cheaper is possible.' : 'Proved: it cannot be done with less.'
}

/** How the search stands, in a sentence; empty where the proof says it all. */
export function searchWords(state: CutlistState, seconds: number, hasList: boolean): string {
  if (state === 'searching' && !hasList) return 'Stock is scarce: looking for a way that fits.'
  if (state === 'searching') return `Looking for a better list, for up to ${seconds} seconds.`
  if (state === 'gap') return 'The time is up; longer may find a better one.'
  if (state === 'stopped') return 'Stopped. This is the best list found so far.'
  if (state === 'failed') {
    return 'The search for a better list needs a signal once, and starts by itself when it is back. This list can be cut as it is.'
  }
  return ''
}

/** One line of what to buy. */
export interface Purchase {
  section: string
  lengthMm: number
  count: number
  /** For one, in hundredths; null without a price. */
  price: number | null
}

/** The bars of a list as they are bought: alike ones together, in the order of the list. */
export function gatherPurchases({ bars }: CutList): Purchase[] {
  const lines = new Map<string, Purchase>()
  for (const { section, stock } of bars) {
    const key = [section, stock.lengthMm, stock.price ?? ''].join('|')
    const line = lines.get(key)
    if (line) line.count += 1
    else {
      const { lengthMm, price } = stock
      lines.set(key, { section, lengthMm, count: 1, price: price ?? null })
    }
  }
  return [...lines.values()].sort(
    (one, other) =>
      one.section.localeCompare(other.section, 'en', { numeric: true }) ||
      one.lengthMm - other.lengthMm,
  )
}
