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

/** The calculators along the stages of a build. */
export const calculatorGroups: { title: string; about: string; ids: string[] }[] = [
  {
    title: 'Ground',
    about: 'Setting out and digging',
    ids: ['square', 'diagonals', 'fall', 'corner', 'posthole'],
  },
  { title: 'Base', about: 'Stone and concrete', ids: ['slab', 'mix', 'joints', 'gravel', 'batch'] },
  {
    title: 'Frame',
    about: 'Posts and slopes',
    ids: ['pitch', 'spacing', 'posts-on-fall', 'angle-cut', 'stairs', 'lumber-size'],
  },
  { title: 'Cladding', about: 'Boards', ids: ['taper', 'boards'] },
  { title: 'Roof', about: 'Sheets and snow', ids: ['sheets', 'snow', 'lid', 'rafter'] },
  { title: 'Finish', about: 'Oil, and what to buy', ids: ['coating', 'fixings', 'cutlist'] },
]
