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
  { title: 'Finish', about: 'Screws and oil', ids: ['coating', 'fixings'] },
]
