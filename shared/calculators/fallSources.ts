import type { Caution, Source } from './calculator'

/** What stands before the numbers of `fall`. */
export const fallCautions: Caution[] = [
  {
    title: 'Away from the house, and not to the neighbour',
    text: 'Water must never run towards a wall, a cellar window or next door. Where it may go, and how far the ground must fall beside a building, stands in the local code, which comes before any figure here.',
  },
  {
    title: 'Before you dig',
    text: 'Have buried cables and pipes located, and wait for the answer.',
  },
  {
    title: 'Keep wood clear of the ground',
    text: 'Raising a surface to get the fall must not bury the foot of a wall: at least 200 mm (8 in) from the finished ground to timber cladding.',
  },
]

/** Where the figures of `fall` come from. */
export const fallSources: Source[] = [
  {
    title: 'International Residential Code 2006, R401.3, as quoted by inspectors',
    detail: 'hard surfaces within 10 ft (3048 mm) of a building: at least 2 %',
    kind: 'published',
  },
  {
    title: 'Planning guide of a concrete contractor',
    detail: 'outdoor slabs: at least 1/8 in a foot, better 1/4 in a foot',
    kind: 'published',
  },
  {
    title: '1/8 in a foot (1.04 %) taken as 10 mm a metre (1 %)',
    kind: 'common practice, no source',
  },
  {
    title: 'CMHC, Canadian Wood-Frame House Construction',
    detail: 'fig. 29: 200 mm (8 in) from the ground to wood cladding',
    kind: 'published',
  },
]
