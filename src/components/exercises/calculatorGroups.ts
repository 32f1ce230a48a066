/** The calculators along the stages of a build. */
export const calculatorGroups: { title: string; about: string; ids: string[] }[] = [
  { title: 'Ground', about: 'Setting out', ids: ['square', 'diagonals'] },
  { title: 'Base', about: 'Concrete', ids: ['slab', 'mix'] },
  { title: 'Frame', about: 'Slopes', ids: ['pitch'] },
]
