import type { Caution, Source } from './calculator'

/** What stands before the numbers of `gravel`. */
export const gravelCautions: Caution[] = [
  {
    title: 'Before you dig',
    text: 'Have buried cables and pipes located, and wait for the answer. Dig by hand near a mark.',
  },
  {
    title: 'Stone is heavy, and its dust is silica',
    text: 'Small loads in the barrow, two people to a tamper. Wet the stone before you tamp or cut, and wear a respirator rated for silica where it dusts. Boots with caps, ear protection at a plate tamper.',
  },
  {
    title: 'Soft or filled ground',
    text: 'Stone over mud, roots or old fill settles with it. Depth, drainage and what the ground may carry follow the local code; for a base that carries a building or holds back earth, ask the building department and, where it is required, a licensed engineer.',
  },
]

/** Where the figures of `gravel` come from. */
export const gravelSources: Source[] = [
  {
    title: 'IRC R506.2.2 (2009), as summarised',
    detail: 'base course of 4 in (102 mm) under a slab below the ground around it',
    kind: 'published',
  },
  {
    title: 'IRC R506.2.1 (2009), as summarised',
    detail: 'sand or gravel fill at most 24 in deep, tamped: the most this takes',
    kind: 'published',
  },
  {
    title: 'Loose for one tamped: 1.2 for crushed stone with fines; 1.1 to 1.35 are met',
    detail: 'ask the yard',
    kind: 'from memory',
  },
  {
    title: 'Loose crushed stone, about 1600 kg/m³ (100 lb/ft³)',
    detail: 'ask the yard',
    kind: 'from memory',
  },
]
