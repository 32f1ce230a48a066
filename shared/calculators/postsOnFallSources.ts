import type { Caution, Source } from './calculator'

/** What stands before the numbers of `posts-on-fall`. */
export const postsOnFallCautions: Caution[] = [
  {
    title: 'A post carries what lies on it',
    text: 'Its size, its foot, what holds it down in wind and how much snow the roof takes follow the local code. Anything people stand on or under: ask the building department and, where it is required, a licensed engineer.',
  },
  {
    title: 'The saw',
    text: 'Support the post on both sides of the cut, eye and ear protection on, hands well clear of the blade, and let it stop before you reach in.',
  },
  {
    title: 'Standing posts fall over',
    text: 'Brace each one both ways as soon as it stands, and have a second person hold it. No work from a ladder that leans on a loose post.',
  },
]

/** Where the figures of `posts-on-fall` come from. */
export const postsOnFallSources: Source[] = [
  {
    title: 'Two straight lines from one edge',
    detail: 'geometry; checked against drops printed for falls of 1/8 and 1/4 in a foot',
    kind: 'published',
  },
  {
    title: 'Posts measured to their middle, cut square at the foot',
    detail: 'a post 90 mm wide on 20 mm a metre stands open by less than 2 mm',
    kind: 'common practice, no source',
  },
]
