/** What the mix allows, as a multiple of the thickness. */
const factors: Record<string, number> = { 'small-stone': 24, 'large-stone': 30, stiff: 36 }

/** The mixes, from the one that shrinks most; bagged mixes have small stone. */
export const mixChoices = [
  { value: 'small-stone', label: 'bagged, or stone under 20 mm (3/4 in)' },
  { value: 'large-stone', label: 'stone of 20 mm (3/4 in) and more' },
  { value: 'stiff', label: 'stiff, slump under 100 mm (4 in)' },
]

/** How many times the thickness joints may lie apart in this mix. */
export function factorOf(mix: string): number {
  const factor = factors[mix]
  if (factor === undefined) throw new Error(`No mix “${mix}”`)
  return factor
}

/** Joints of a slab without steel are never farther apart: 18 ft. */
export const MOST_SPACING = 18 * 0.3048
/** No panel is longer than so many times its width. */
export const MOST_ASPECT = 1.5
/** The least depth of a cut, in m. */
export const depthAtLeast = { metric: 0.025, imperial: 0.0254 } as const
