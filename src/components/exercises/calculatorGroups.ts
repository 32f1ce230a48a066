import { findCalculator } from '../../../shared/calculators'

/** What the list says of a calculator. */
interface ListedCalculator {
  id: string
  title: string
  question: string
}

/** Tables instead of single numbers: it has a page of its own and is not in the registry. */
export const cutListEntry: ListedCalculator = {
  id: 'cutlist',
  title: 'Cut list',
  question: 'Which lengths to buy, and how to cut them?',
}

/** A calculator of the list by its id, whichever page it has. */
export const findListed = (id: string): ListedCalculator | undefined =>
  id === cutListEntry.id ? cutListEntry : findCalculator(id)

/** The calculators along the stages of a build, in each the one that is met first in front. */
export const calculatorGroups: { title: string; about: string; ids: string[] }[] = [
  {
    title: 'Ground',
    about: 'Setting out and digging',
    ids: ['square', 'corner', 'diagonals', 'fall', 'posthole'],
  },
  { title: 'Base', about: 'Stone and concrete', ids: ['gravel', 'slab', 'mix', 'joints', 'batch'] },
  {
    title: 'Frame',
    about: 'Posts, rafters, steps',
    ids: ['posts-on-fall', 'spacing', 'pitch', 'rafter', 'angle-cut', 'stairs', 'lumber-size'],
  },
  { title: 'Cladding', about: 'Boards and gaps', ids: ['boards', 'taper', 'fixings'] },
  { title: 'Roof', about: 'Sheets, lids, snow', ids: ['sheets', 'lid', 'snow'] },
  { title: 'Finish', about: 'Coats, and what to buy', ids: ['coating', 'cutlist'] },
]
