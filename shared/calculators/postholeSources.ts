import type { Caution, Source } from './calculator'
import { bagSources } from './bags'

/** What stands before the numbers of `posthole`. */
export const postholeCautions: Caution[] = [
  {
    title: 'Before you dig',
    text: 'Have buried cables and pipes located, and wait for the answer. Dig by hand near a mark. Cover an open hole as soon as you turn away: children and animals find it.',
  },
  {
    title: 'How deep is not for this sum to say',
    text: 'Depth below the frost, the width of a footing and what a post may carry follow the local code. Posts under a deck, a roof or a gate that people stand on or under: ask the building department and, where it is required, a licensed engineer.',
  },
  {
    title: 'Wet cement burns',
    text: 'Waterproof gloves, long sleeves, boots and eye protection. Rinse splashes at once with clean water. The dust harms lungs: wear a respirator rated for silica when you open and mix bags.',
  },
  {
    title: 'Lift less, and brace first',
    text: 'Two people to a bag and to a long post. Brace the post plumb both ways before you pour; it is too late when the concrete stiffens.',
  },
]

/** Where the figures of `posthole` come from. */
export const postholeSources: Source[] = [
  {
    title: 'A cylinder less the post that stands in it',
    detail: 'geometry; checked by worked examples in inches',
    kind: 'published',
  },
  {
    title: 'Jon Eakes, fence post specifications',
    detail: 'hole three times as wide as the post where it is set in concrete',
    kind: 'published',
  },
  {
    title: 'NY Residential Code R403.1.4 (IRC based)',
    detail: 'footings at least 12 in (305 mm) below undisturbed ground; the frost may ask for more',
    kind: 'published',
  },
  ...bagSources,
  { title: '10 % waste, as for a slab', kind: 'common practice, no source' },
]
